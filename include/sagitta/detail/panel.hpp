// Gauss quadrature over one panel of a curvature diagram.
#pragma once

#include <sagitta/detail/gauss_rule.hpp>
#include <sagitta/detail/statics.hpp>

#include <cstddef>

namespace sagitta::detail {

/// The moments of the curvature diagram over one panel: all that both moment-area theorems need.
template <class T>
struct panel_moments {
    T area{};        // integral of curvature
    T about_from{};  // integral of curvature times the distance from the start
    T about_to{};    // integral of curvature times the distance from the end
};

template <class T, std::size_t points, class Curvature>
panel_moments<T> integrate_panel(const T& from, const T& to, const Curvature& curvature) {
    using rule = gauss_rule<T, points>;
    const T half = (to - from) / T(2);
    panel_moments<T> sum;
    const auto add = [&](const T& offset, const T& weight) {
        const T passed = half * (T(1) + offset);
        const T part = weight * half * curvature(section<T>{from, passed});
        sum.area += part;
        sum.about_from += part * passed;
        sum.about_to += part * half * (T(1) - offset);
    };
    const auto& offsets = rule::abscissa();
    const auto& weights = rule::weights();
    for (std::size_t i = 0; i < offsets.size(); ++i) {
        add(offsets[i], weights[i]);
        if (offsets[i] != T(0)) add(-offsets[i], weights[i]);
    }
    return sum;
}

}  // namespace sagitta::detail
