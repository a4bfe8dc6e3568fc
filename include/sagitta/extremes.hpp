// Where is it greatest? Exact answers from the polynomials of the elastic line: no sampling, none missed.
#pragma once

#include <sagitta/detail/polynomial.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/units.hpp>

namespace sagitta {

/// A value and the place where it stands.
template <class Dimension, class T>
struct extreme {
    quantity<length, T> at;
    quantity<Dimension, T> value;
};

namespace detail {

/// The slope of the elastic line between two neighbouring joints, as a polynomial in t = (x - from)/(to - from)
/// from 0 to 1. Its coefficients are the closed forms at the first joint.
template <class Line>
constexpr auto slope_between(const Line& line, const quantity<length, typename Line::number>& from,
                             const quantity<length, typename Line::number>& to) {
    using T = typename Line::number;
    const auto h = to - from;
    const auto flexibility = h / line.supported().EI();
    const auto w = line.load(from, just_right);
    const auto growth = line.load(to, just_left) - w;
    return polynomial<T, 4>{{
        line.slope(from).value(),
        -(line.moment(from, just_right) * flexibility).value(),
        -(line.shear(from, just_right) * h * flexibility / T(2)).value(),
        (w * h * h * flexibility / T(6)).value(),
        (growth * h * h * flexibility / T(24)).value(),
    }};
}

}  // namespace detail

/// The deflection that is greatest in magnitude, with its sign, and where it is. Every stationary point of
/// every stretch and every joint is considered; of equal ones the leftmost is returned.
///
/// Accuracy in double: the value to 1e-12 of itself; the place to 1e-12 of the span, unless the moment nearly
/// vanishes there (the line is then flat and its summit as ill-defined as the loads make it).
template <class Line>
[[nodiscard]] constexpr auto greatest_deflection(const Line& line) {
    using T = typename Line::number;
    extreme<length, T> greatest{};
    const auto consider = [&](const quantity<length, T>& x) {
        const auto v = line.deflection(x);
        if (abs(v) > abs(greatest.value)) greatest = {x, v};
    };
    const auto joints = line.joints();
    consider(joints.front());
    for (std::size_t i = 1; i < joints.size(); ++i) {
        const auto from = joints[i - 1];
        const auto to = joints[i];
        if (!(from < to)) continue;
        for (const T& t : detail::sign_changes(detail::slope_between(line, from, to))) {
            const auto x = from + (to - from) * t;
            consider(x < to ? x : to);
        }
        consider(to);
    }
    return greatest;
}

}  // namespace sagitta
