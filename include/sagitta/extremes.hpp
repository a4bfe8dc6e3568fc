// Where is it greatest? Exact answers from the polynomials of the elastic line: no sampling, none missed.
#pragma once

#include <sagitta/detail/polynomial.hpp>
#include <sagitta/load.hpp>
#include <sagitta/piecewise.hpp>
#include <sagitta/units.hpp>

#include <limits>

namespace sagitta {

/// A value and the place where it stands.
template <class Dimension, class T>
struct extreme {
    quantity<dimension::length, T> at;
    quantity<Dimension, T> value;
};

/// The greatest and the least value of a response (with their signs), and where they stand.
template <class Dimension, class T>
struct extreme_pair {
    extreme<Dimension, T> greatest;
    extreme<Dimension, T> least;

    /// Whichever is greater in magnitude.
    [[nodiscard]] constexpr const extreme<Dimension, T>& governing() const {
        return abs(least.value) > abs(greatest.value) ? least : greatest;
    }
};

namespace detail {

/// The response of a line at a place, by its closed forms.
template <response R, class Line, class X>
constexpr auto answer_of(const Line& line, const X& x, side which) {
    if constexpr (R == response::deflection) {
        return line.deflection(x, which);
    } else if constexpr (R == response::slope) {
        return line.slope(x, which);
    } else if constexpr (R == response::moment) {
        return line.moment(x, which);
    } else {
        return line.shear(x, which);
    }
}

/// Offers to consider(x, value, turns) every place between first and last where a response can be extreme: both sides
/// of every joint, and every turning point between joints. invalid_input where a value is not finite.
template <response R, class Line, class Consider>
constexpr void for_each_candidate(const Line& line, const quantity<dimension::length, typename Line::number>& first,
                                  const quantity<dimension::length, typename Line::number>& last,
                                  const Consider& consider) {
    using place = quantity<dimension::length, typename Line::number>;
    constexpr const char* name = R == response::deflection ? "deflection"
                                 : R == response::slope    ? "slope"
                                 : R == response::moment   ? "moment"
                                                           : "shear";
    for_each_stretch(line, first, last, [&](const place& from, const place& to) {
        const auto offer = [&](const place& x, side which, bool turns = false) {
            const auto value = answer_of<R>(line, x, which);
            require_finite(name, value);
            consider(x, value, turns);
        };
        offer(from, just_right);
        for (const auto& turning : turning_points(profile_between<R>(line, from, to))) {
            const auto x = from + (to - from) * turning.at;
            if (x < to) offer(x, just_right, true);
        }
        offer(to, just_left);
    });
}

/// Whatever was offered with the greatest size. Where a joint and a turning point beside it differ by rounding only,
/// the turning point is taken; of equal sizes the first.
template <class Found, class T>
class greatest_of {
public:
    constexpr void offer(const Found& offered, const T& size, bool turns) {
        const T magnitude = size_ < T(0) ? -size_ : size_;
        const T rounding = magnitude * (T(8) * std::numeric_limits<T>::epsilon());
        const T lead = turns == turns_ ? T(0) : turns ? -rounding : rounding;
        if (!empty_ && !(size > size_ + lead)) return;
        found_ = offered;
        size_ = size;
        turns_ = turns;
        empty_ = false;
    }
    [[nodiscard]] constexpr const Found& found() const { return found_; }

private:
    Found found_{};
    T size_{};
    bool turns_ = false;
    bool empty_ = true;
};

template <response R, class Line>
constexpr auto extremes_between(const Line& line, const quantity<dimension::length, typename Line::number>& first,
                                const quantity<dimension::length, typename Line::number>& last) {
    using T = typename Line::number;
    using found = extreme<unit_of_response<R>, T>;
    greatest_of<found, T> greatest, least;
    for_each_candidate<R>(line, first, last,
                          [&](const quantity<dimension::length, T>& x, const auto& value, bool turns) {
                              greatest.offer({x, value}, value.value(), turns);
                              least.offer({x, value}, -value.value(), turns);
                          });
    return extreme_pair<unit_of_response<R>, T>{greatest.found(), least.found()};
}

/// Extremes over the whole beam, or over a stretch of it.
template <response R, class Line>
constexpr auto extremes_of(const Line& line) {
    expect_line<Line>();
    if constexpr (is_line_in_order<Line>) {
        return extremes_between<R>(line, {}, line.supported().span());
    } else {
        return no_answer{};
    }
}
template <response R, class Line, class Stretch>
constexpr auto extremes_of(const Line& line, const Stretch& where) {
    expect_line<Line>();
    if constexpr (is_line_in_order<Line>) {
        const auto stretch = expect_stretch<typename Line::number>(where);
        if (!(stretch.to <= line.supported().span())) [[unlikely]]
            refuse("between: to", stretch.to, "must not lie beyond the span of the beam, ", line.supported().span());
        return extremes_between<R>(line, stretch.from, stretch.to);
    } else {
        return no_answer{};
    }
}

}  // namespace detail

// Each takes a line, and optionally a stretch of the beam: extremes_of_moment(line, between(1.0*m, 3.0*m)).
// Accuracy in double: values to 1e-12 of the greatest; places to 1e-12 of the span, unless the next response in
// the chain (the moment, for a deflection) nearly vanishes there: the line is then flat and its summit as
// ill-defined as the loads make it. invalid_input where the stretch does not lie on the beam.

/// Greatest and least deflection (lengths, downward positive).
template <class Line, class... Stretch>
[[nodiscard]] constexpr auto extremes_of_deflection(const Line& line, const Stretch&... where) {
    return detail::extremes_of<detail::response::deflection>(line, where...);
}
/// Greatest and least slope (plane angles, clockwise positive).
template <class Line, class... Stretch>
[[nodiscard]] constexpr auto extremes_of_slope(const Line& line, const Stretch&... where) {
    return detail::extremes_of<detail::response::slope>(line, where...);
}
/// Greatest and least bending moment (sagging positive); both sides of a couple are considered.
template <class Line, class... Stretch>
[[nodiscard]] constexpr auto extremes_of_moment(const Line& line, const Stretch&... where) {
    return detail::extremes_of<detail::response::moment>(line, where...);
}
/// Greatest and least shear force; both sides of a point load are considered.
template <class Line, class... Stretch>
[[nodiscard]] constexpr auto extremes_of_shear(const Line& line, const Stretch&... where) {
    return detail::extremes_of<detail::response::shear>(line, where...);
}

/// The deflection that is greatest in magnitude, with its sign, and where it is; of equal ones the leftmost.
template <class Line>
[[nodiscard]] constexpr auto greatest_deflection(const Line& line) {
    detail::expect_line<Line>();
    if constexpr (detail::is_line_in_order<Line>) {
        using T = typename Line::number;
        detail::greatest_of<extreme<dimension::length, T>, T> greatest;
        detail::for_each_candidate<detail::response::deflection>(
            line, {}, line.supported().span(),
            [&](const quantity<dimension::length, T>& x, const quantity<dimension::length, T>& v, bool turns) {
                greatest.offer({x, v}, abs(v).value(), turns);
            });
        return greatest.found();
    } else {
        return detail::no_answer{};
    }
}

}  // namespace sagitta
