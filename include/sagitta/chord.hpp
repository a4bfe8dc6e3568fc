// Straight lines laid against the elastic line: the chord between two of its points, the tangent at one.
#pragma once

#include <sagitta/detail/end_state.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/units.hpp>

#include <optional>

namespace sagitta {

/// A straight line: through the deflection v at the place x0, with a slope. Tangents and chords are such lines.
template <class T>
class straight_line {
public:
    constexpr straight_line(const quantity<dimension::length, T>& x0, const quantity<dimension::length, T>& v,
                            const quantity<dimension::plane_angle, T>& slope)
        : x0_(x0), v_(v), slope_(slope) {}

    [[nodiscard]] constexpr const quantity<dimension::plane_angle, T>& slope() const { return slope_; }

    /// Its deflection at x (a length from the left end of the beam, also beyond the beam; downward positive).
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::length, T> deflection(const X& x) const {
        return v_ + detail::as_ratio(slope_) * (detail::expect_length<T>(x) - x0_);
    }

    /// Where it meets the undeformed line, which may be beyond the beam; nothing if it is level.
    [[nodiscard]] constexpr std::optional<quantity<dimension::length, T>> meets_undeformed_line() const {
        if (slope_.value() == T(0)) return std::nullopt;
        return x0_ - v_ / detail::as_ratio(slope_);
    }

private:
    quantity<dimension::length, T> x0_;
    quantity<dimension::length, T> v_;
    quantity<dimension::plane_angle, T> slope_;
};

/// The tangent to an elastic line at x (a length on the beam, else invalid_input).
template <class Line, class X>
[[nodiscard]] constexpr auto tangent_at(const Line& line, const X& x) {
    using T = typename Line::number;
    return straight_line<T>(detail::expect_length<T>(x), line.deflection(x), line.slope(x));
}

/// The chord of an elastic line between two places, first < second (lengths on the beam, else invalid_input).
template <class Line, class First, class Second>
[[nodiscard]] constexpr auto chord_between(const Line& line, const First& first, const Second& second) {
    using T = typename Line::number;
    const auto a = detail::expect_length<T>(first);
    const auto b = detail::expect_length<T>(second);
    if (!(a < b)) [[unlikely]]
        detail::refuse("chord: second", b, "must lie beyond the first place, ", a);
    const auto v = line.deflection(a);
    return straight_line<T>(a, v, detail::as_angle((line.deflection(b) - v) / (b - a)));
}

/// The deflection at x relative to the chord between two places, downward positive (lengths).
template <class Line, class First, class Second, class X>
[[nodiscard]] constexpr auto deflection_from_chord(const Line& line, const First& first, const Second& second,
                                                   const X& x) {
    return line.deflection(x) - chord_between(line, first, second).deflection(x);
}

}  // namespace sagitta
