// Beams, loads and answers in plain SI numbers, as handbooks write their formulas.
#pragma once

#include <sagitta/core.hpp>

#include <algorithm>
#include <cmath>
#include <vector>

namespace published {

using namespace sagitta::units;
using sagitta::end::left;
using sagitta::end::right;
using loads = sagitta::load_list<>;

inline auto stiffness(double EI) { return EI * N * m2; }

inline loads point(double P, double a) { return loads{} + sagitta::point_load(P * N, sagitta::at(a * m)); }
inline loads couple(double C, double a) { return loads{} + sagitta::applied_couple(C * N * m, sagitta::at(a * m)); }
inline loads linear(double w_from, double w_to, double from, double to) {
    return loads{} + sagitta::linear_load(w_from * N / m, w_to * N / m, sagitta::between(from * m, to * m));
}
inline loads uniform(double w, double from, double to) {
    return loads{} + sagitta::partial_uniform_load(w * N / m, sagitta::between(from * m, to * m));
}
inline loads uniform(double w) { return loads{} + sagitta::uniform_load(w * N / m); }

template <class Line>
double deflection(const Line& line, double x) {
    return line.deflection(x * m) / m;
}
template <class Line>
double slope(const Line& line, double x) {
    return line.slope(x * m) / rad;
}
template <class Line>
double moment(const Line& line, double x) {
    return line.moment(x * m) / (N * m);
}
template <class Line>
double shear(const Line& line, double x) {
    return line.shear(x * m) / N;
}
template <class Line, class End>
double reaction(const Line& line, End which) {
    return line.reaction(which) / N;
}
template <class Line, class End>
double end_moment(const Line& line, End which) {
    return line.end_moment(which) / (N * m);
}
template <class Line>
double span(const Line& line) {
    return line.supported().span() / m;
}

/// The greatest magnitudes along a beam, near enough to be the yardstick of a tolerance.
struct sizes {
    double force = 0;
    double moment = 0;
    double slope = 0;
    double deflection = 0;
};

template <class Line>
sizes sizes_of(const Line& line) {
    sizes greatest;
    const auto raise = [](double& size, double value) { size = std::max(size, std::abs(value)); };
    const auto look_at = [&](const auto& x) {
        for (const auto which : {sagitta::just_left, sagitta::just_right}) {
            raise(greatest.force, line.shear(x, which) / N);
            raise(greatest.moment, line.moment(x, which) / (N * m));
        }
        raise(greatest.slope, line.slope(x) / rad);
        raise(greatest.deflection, line.deflection(x) / m);
    };
    for (const auto& joint : line.joints()) look_at(joint);
    constexpr int parts = 24;
    for (int i = 1; i < parts; ++i) look_at(line.supported().span() * (double(i) / parts));
    return greatest;
}

struct place_and_value {
    double at = 0;
    double value = 0;
};

/// The greatest moment by sign (sagging: +1, hogging: -1): at a joint, or between joints where the shear, found
/// by bisection, is zero.
template <class Line>
place_and_value greatest_moment(const Line& line, double sign = 1) {
    place_and_value greatest{0, sign * moment(line, 0)};
    const auto consider = [&](double x) {
        if (sign * moment(line, x) > greatest.value) greatest = {x, sign * moment(line, x)};
    };
    const auto joints = line.joints();
    for (std::size_t i = 1; i < joints.size(); ++i) {
        double from = joints[i - 1] / m;
        double to = joints[i] / m;
        consider(to);
        const auto rises = [&](double x) { return sign * shear(line, x) > 0; };
        const double inset = 1e-12 * (to - from);
        if (!(from < to) || !rises(from + inset) || rises(to - inset)) continue;
        for (int k = 0; k < 60; ++k) {
            const double middle = (from + to) / 2;
            (rises(middle) ? from : to) = middle;
        }
        consider((from + to) / 2);
    }
    greatest.value *= sign;
    return greatest;
}

/// Where a function with one maximum between two places has it, by golden section (to about 1e-8 of them).
template <class Function>
place_and_value maximum(const Function& f, double from, double to) {
    const double golden = (std::sqrt(5.0) - 1) / 2;
    while (to - from > 1e-9 * std::abs(to)) {
        const double low = to - golden * (to - from);
        const double high = from + golden * (to - from);
        (f(low) < f(high) ? from : to) = f(low) < f(high) ? low : high;
    }
    const double at = (from + to) / 2;
    return {at, f(at)};
}

}  // namespace published
