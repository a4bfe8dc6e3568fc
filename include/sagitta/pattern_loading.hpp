// Pattern loading: which spans of a continuous beam have to be loaded for an action to become greatest or least.
//
//     const auto worst = governing_patterns(influence_of_moment(bridge, 9.0*m), 12.0*kN/m);
//     worst.greatest.value;  worst.greatest.spans;    // the moment, and the numbers of the spans loaded for it
//
// The influence line tells at once: a span adds to the action if the load on it has a positive effect. No pattern is
// tried.
#pragma once

#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/units.hpp>

#include <cstddef>
#include <type_traits>
#include <vector>

namespace sagitta {

/// Spans that are loaded together, and what they cause.
template <class Action, class T>
struct span_pattern {
    /// The numbers of the loaded spans from left to right, the first being 0; overhangs count as spans.
    std::vector<std::size_t> spans;
    quantity<Action, T> value;
    /// The loads of the pattern, ready for beam.under(...).
    load_list<T> loads;
};

template <class Action, class T>
struct span_patterns {
    span_pattern<Action, T> greatest;
    span_pattern<Action, T> least;
};

namespace detail {

template <class Influence>
auto spans_along(const Influence& influence) {
    constexpr bool right = requires { influence.deflected().supported().spans(); };
    static_assert(right, "sagitta: patterns are asked of a continuous_beam; a single span is loaded or not");
    if constexpr (right) {
        return influence.deflected().supported().spans();
    } else {
        return std::vector<load_types::stretch<typename Influence::number>>{};
    }
}

}  // namespace detail

/// The patterns of a load that may act on any span or not: loads holds one case for each span (a load_list that may be
/// empty), in the order of beam.spans(). invalid_input where their number is not that of the spans. A pattern that
/// cannot do better than no load at all is empty, and its value 0.
template <class Influence>
[[nodiscard]] auto governing_patterns(const Influence& influence,
                                      const std::vector<load_list<typename Influence::number>>& loads) {
    using T = typename Influence::number;
    const auto spans = detail::spans_along(influence);
    if (loads.size() != spans.size()) [[unlikely]] {
        const auto count = [](const auto& list) {
            return quantity<dimension::dimensionless>(static_cast<double>(list.size()));
        };
        detail::refuse("governing_patterns: number of loads", count(loads), "must be the number of spans, ",
                       count(spans));
    }
    span_patterns<typename Influence::action_unit, T> found;
    const auto add = [&](auto& pattern, std::size_t i, const auto& effect) {
        pattern.spans.push_back(i);
        pattern.value += effect;
        pattern.loads += loads[i];
    };
    for (std::size_t i = 0; i < spans.size(); ++i) {
        const auto effect = influence.effect_of(loads[i]);
        if (effect.value() > T(0)) add(found.greatest, i, effect);
        if (effect.value() < T(0)) add(found.least, i, effect);
    }
    return found;
}

/// The same for a uniform load w (force per length) on whole spans.
template <class Influence, class W>
requires(!std::is_convertible_v<W, std::vector<load_list<typename Influence::number>>>)
    [[nodiscard]] auto governing_patterns(const Influence& influence, const W& uniform) {
    using T = typename Influence::number;
    const auto w = detail::expect_line_load<T>(uniform);
    std::vector<load_list<T>> loads;
    for (const auto& span : detail::spans_along(influence)) {
        loads.push_back(partial_uniform_load(w, between(span.from, span.to)));
    }
    return governing_patterns(influence, loads);
}

}  // namespace sagitta
