// Many places at once, into memory of the caller's.
#pragma once

#include <sagitta/detail/refuse.hpp>
#include <sagitta/units.hpp>

#include <cstddef>
#include <span>

namespace sagitta {
namespace detail {

template <class Line, class Result, class Response>
constexpr void fill(std::span<const quantity<dimension::length, typename Line::number>> places,
                    std::span<Result> results, const Response& response_at) {
    if (places.size() != results.size()) [[unlikely]]
        refuse("series: number of results", static_cast<double>(results.size()), "must be the number of places");
    for (std::size_t i = 0; i < places.size(); ++i) results[i] = response_at(places[i]);
}

}  // namespace detail

// Each takes a line, places in any order (lengths on the beam, else invalid_input) and as many results.

/// Deflections, downward positive.
template <class Line>
constexpr void fill_deflections(const Line& line,
                                std::span<const quantity<dimension::length, typename Line::number>> places,
                                std::span<quantity<dimension::length, typename Line::number>> results) {
    detail::fill<Line>(places, results, [&](const auto& x) { return line.deflection(x); });
}
/// Slopes, clockwise positive.
template <class Line>
constexpr void fill_slopes(const Line& line, std::span<const quantity<dimension::length, typename Line::number>> places,
                           std::span<quantity<dimension::plane_angle, typename Line::number>> results) {
    detail::fill<Line>(places, results, [&](const auto& x) { return line.slope(x); });
}
/// Bending moments, sagging positive; where a couple stands, the value just right of it.
template <class Line>
constexpr void fill_moments(const Line& line,
                            std::span<const quantity<dimension::length, typename Line::number>> places,
                            std::span<quantity<dimension::moment, typename Line::number>> results) {
    detail::fill<Line>(places, results, [&](const auto& x) { return line.moment(x); });
}
/// Shear forces; where a point load stands, the value just right of it.
template <class Line>
constexpr void fill_shears(const Line& line, std::span<const quantity<dimension::length, typename Line::number>> places,
                           std::span<quantity<dimension::force, typename Line::number>> results) {
    detail::fill<Line>(places, results, [&](const auto& x) { return line.shear(x); });
}

}  // namespace sagitta
