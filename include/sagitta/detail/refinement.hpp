// Panels of integration that are narrow enough for a tolerance.
#pragma once

#include <sagitta/detail/panel.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/tolerance_not_reached.hpp>

#include <algorithm>
#include <array>
#include <cstddef>
#include <limits>
#include <vector>

namespace sagitta::detail {

template <class T>
struct refined_panels {
    std::vector<T> bounds;
    /// Relative to the integral of the magnitude over all panels; 0 where it is but rounding.
    T error_estimate{};
};

/// Halves panels until what fields(from, to) integrates over a panel and over its halves agrees within the tolerance,
/// relative to the sum over all panels. Throws tolerance_not_reached where it cannot be.
template <class T, std::size_t count, class Fields>
refined_panels<T> refine_panels(const std::vector<T>& bounds, const Fields& fields, const T& tolerance) {
    const auto magnitude = [](const T& x) { return x < T(0) ? -x : x; };
    std::array<T, count> size{};
    for (std::size_t i = 1; i < bounds.size(); ++i) {
        const auto moments = fields(bounds[i - 1], bounds[i]);
        for (std::size_t k = 0; k < count; ++k) size[k] += magnitude(moments[k].area);
    }
    const auto gap = [&](const T& from, const T& middle, const T& to) {
        const auto whole = fields(from, to);
        const auto first = fields(from, middle);
        const auto second = fields(middle, to);
        T greatest(0);
        for (std::size_t k = 0; k < count; ++k) {
            if (size[k] == T(0)) continue;
            const T area = whole[k].area - first[k].area - second[k].area;
            const T lever =
                whole[k].about_from - first[k].about_from - second[k].about_from - second[k].area * (middle - from);
            greatest = std::max(greatest, (magnitude(area) + magnitude(lever) / (to - from)) / size[k]);
        }
        return greatest;
    };

    const T rounding = T(16) * std::numeric_limits<T>::epsilon();
    constexpr std::size_t panel_limit = 20000;
    refined_panels<T> result{{bounds.front()}};
    std::vector<T> pending;  // bounds still ahead, the nearest last
    for (std::size_t i = bounds.size(); i-- > 1;) pending.push_back(bounds[i]);
    while (!pending.empty()) {
        const T from = result.bounds.back();
        const T to = pending.back();
        const T middle = (from + to) / T(2);
        const T error = gap(from, middle, to);
        const bool fine = error <= std::max(tolerance / T(8), rounding);
        if (fine || !(from < middle && middle < to) || result.bounds.size() + pending.size() > panel_limit) {
            if (error > rounding) result.error_estimate += error;
            result.bounds.push_back(to);
            pending.pop_back();
        } else {
            pending.push_back(middle);
        }
    }
    if (result.error_estimate > tolerance) [[unlikely]]
        throw tolerance_not_reached("integration of M/EI: asked for a relative error of " +
                                        number_text(as_double(tolerance)) + ", reached " +
                                        number_text(as_double(result.error_estimate)),
                                    as_double(result.error_estimate));
    return result;
}

}  // namespace sagitta::detail
