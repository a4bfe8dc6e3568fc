// Where does it vanish? Every place where a response of the elastic line is zero, flat stretches included.
#pragma once

#include <sagitta/detail/polynomial.hpp>
#include <sagitta/piecewise.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <cstddef>

namespace sagitta {

/// A place (from = to) or a whole stretch where a response is zero.
template <class T>
struct zero_place {
    quantity<dimension::length, T> from;
    quantity<dimension::length, T> to;
    /// True where the response has different signs on the two sides; false where it only touches zero, and at
    /// the ends of the beam.
    bool changes_sign;
};

namespace detail {

/// What counts as zero for a response of a line: rounding of its greatest coefficients.
template <response R, class Line>
constexpr auto zero_tolerance(const Line& line) {
    using T = typename Line::number;
    T tolerance(0);
    for_each_stretch(line, {}, line.supported().span(), [&](const auto& from, const auto& to) {
        const T noise = profile_between<R>(line, from, to).noise();
        if (noise > tolerance) tolerance = noise;
    });
    return tolerance;
}

template <class Profile, class T>
constexpr auto all_roots(const Profile& profile, const T& tolerance) {
    if constexpr (requires { profile.roots(tolerance); }) {
        return profile.roots(tolerance);
    } else {
        return roots_between_0_and_1(profile, tolerance);
    }
}

/// Walks a response from left to right as runs of one sign and keeps the places between them.
template <class T, class Places>
class sign_walk {
public:
    constexpr explicit sign_walk(Places& places) : places_(places) {}

    /// The response has this sign (-1, 0, 1) between two places; touches says that it is zero just at from.
    constexpr void run(const quantity<dimension::length, T>& from, const quantity<dimension::length, T>& to, int sign,
                       bool touches) {
        if (sign == 0) {
            if (open_) {
                places_.back().to = to;
            } else {
                add(from, to);
            }
        } else {
            if (!open_ && (touches || (before_ != 0 && before_ != sign))) add(from, from);
            if (open_) places_.back().changes_sign = before_ != 0 && before_ != sign;
            open_ = false;
            before_ = sign;
        }
    }
    /// The response is zero at the right end of the beam.
    constexpr void stop_at_zero(const quantity<dimension::length, T>& x) {
        if (!open_) add(x, x);
    }

private:
    constexpr void add(const quantity<dimension::length, T>& from, const quantity<dimension::length, T>& to) {
        places_.push_back({from, to, false});
        open_ = true;
    }

    Places& places_;
    int before_ = 0;
    bool open_ = false;
};

template <response R, class Line>
constexpr auto zeros_along(const Line& line) {
    using T = typename Line::number;
    const T tolerance = zero_tolerance<R>(line);
    const auto sign_of = [&](const T& value) { return value > tolerance ? 1 : value < -tolerance ? -1 : 0; };
    // Within a segment at most as many roots as the degree, and the joint before it.
    list_along<zero_place<T>, 6, Line> places;
    sign_walk<T, decltype(places)> walk(places);
    T at_end(0);
    for_each_stretch(line, {}, line.supported().span(), [&](const auto& start, const auto& stop) {
        const auto profile = profile_between<R>(line, start, stop);
        auto from = start;
        T low(0);
        bool zero_at_low = sign_of(profile(T(0))) == 0;
        const auto step = [&](const T& high, const quantity<dimension::length, T>& to) {
            walk.run(from, to, sign_of(profile((low + high) / T(2))), zero_at_low);
            from = to;
            low = high;
            zero_at_low = true;
        };
        for (const auto& root : all_roots(profile, tolerance))
            step(root.at, std::min(start + (stop - start) * root.at, stop));
        step(T(1), stop);
        at_end = profile(T(1));
    });
    if (sign_of(at_end) == 0) walk.stop_at_zero(line.supported().span());
    return places;
}

template <response R, class Line>
constexpr auto zeros_of(const Line& line) {
    expect_line<Line>();
    if constexpr (is_line_in_order<Line>) {
        return zeros_along<R>(line);
    } else {
        return no_answer{};
    }
}

template <response R, class Line>
constexpr auto sign_changes_of(const Line& line) {
    expect_line<Line>();
    if constexpr (is_line_in_order<Line>) {
        const auto zeros = zeros_along<R>(line);
        list_along<zero_place<typename Line::number>, 6, Line> places;
        for (const auto& zero : zeros) {
            if (zero.changes_sign) places.push_back(zero);
        }
        return places;
    } else {
        return no_answer{};
    }
}

}  // namespace detail

// Each takes a line and returns a list of zero_place from left to right: none missed, double roots and flat
// stretches included, supports included. What rounding cannot tell from zero (some 1e-15 of the greatest value)
// counts as zero. Accuracy in double: places to 1e-12 of the span; where the response grazes zero, to what its
// rounding allows (a slope of s per length makes it some 1e-15 of the greatest value over s).

/// Where the deflection is zero.
template <class Line>
[[nodiscard]] constexpr auto zeros_of_deflection(const Line& line) {
    return detail::zeros_of<detail::response::deflection>(line);
}
/// Where the elastic line is level: its stationary points.
template <class Line>
[[nodiscard]] constexpr auto stationary_points(const Line& line) {
    return detail::zeros_of<detail::response::slope>(line);
}
/// Points of contraflexure: where the moment changes its sign, also by the jump of a couple.
template <class Line>
[[nodiscard]] constexpr auto points_of_contraflexure(const Line& line) {
    return detail::sign_changes_of<detail::response::moment>(line);
}

}  // namespace sagitta
