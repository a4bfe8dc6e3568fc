// Panels of a curvature diagram: where they lie, Gauss quadrature over one, the sum over several.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/gauss_rule.hpp>
#include <sagitta/detail/statics.hpp>

#include <algorithm>
#include <cstddef>
#include <vector>

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

/// A kink is curvature on no width; an offset is a pair of them, of no area but with a moment.
template <class T>
panel_moments<T> moments_of(const acting_misfit<T>& misfit) {
    return {misfit.kink, misfit.offset, -misfit.offset};
}

/// Inserts a lack of fit among the panels of a curvature diagram, which are in order, as one of no width.
template <class Panel, class T>
void insert_misfit(std::vector<Panel>& panels, const acting_misfit<T>& misfit) {
    const auto here = std::find_if(panels.begin(), panels.end(), [&](const Panel& p) { return p.from >= misfit.at; });
    panels.insert(here, Panel{misfit.at, misfit.at, moments_of(misfit)});
}

/// The places that bound so many equal panels between each joint and the next, ascending, none twice.
template <class T>
std::vector<T> panel_places(const std::vector<T>& joints, int between_joints) {
    std::vector<T> places{joints.front()};
    places.reserve((joints.size() - 1) * static_cast<std::size_t>(between_joints) + 1);
    const auto add = [&](const T& place) {
        if (places.back() < place) places.push_back(place);
    };
    for (std::size_t i = 1; i < joints.size(); ++i) {
        const T width = (joints[i] - joints[i - 1]) / T(between_joints);
        for (int k = 1; k < between_joints; ++k) add(joints[i - 1] + T(k) * width);
        add(joints[i]);
    }
    return places;
}

/// Adds what a panel bends within a stretch from a to b to its moments about a and b. The last argument integrates
/// the curvature between two places of the panel. A panel of no width (a lack of fit) counts between a and b, not at
/// them.
template <class T, class Panel, class Part>
void add_within(panel_moments<T>& sum, const T& a, const T& b, const Panel& p, const Part& part_of_panel) {
    const T from = std::max(a, p.from);
    const T to = std::min(b, p.to);
    const bool is_misfit_within = p.from == p.to && a < p.from && p.from < b;
    if (!(from < to) && !is_misfit_within) return;
    const bool is_whole = from == p.from && to == p.to;
    const auto part = is_whole ? p.curvature : part_of_panel(from, to);
    sum.area += part.area;
    sum.about_from += part.about_from + part.area * (from - a);
    sum.about_to += part.about_to + part.area * (b - to);
}

}  // namespace sagitta::detail
