// What every number type has to answer: beams under all kinds of loads against the reference solution, two equal
// spans against the textbook, the integrator against the closed forms. Inputs are binary fractions, which every type
// holds exactly, so that what differs is the rounding of the type.
#pragma once

#include "reference.hpp"

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <limits>
#include <vector>

namespace number_types {

using exact = boost::multiprecision::number<boost::multiprecision::cpp_bin_float<100>, boost::multiprecision::et_off>;

inline exact magnitude(const exact& x) { return x < 0 ? -x : x; }

/// Errors relative to the greatest value of the same answer, in units of last place of T; the greatest is kept.
template <class T>
class error_budget {
public:
    explicit error_budget(double ulps) : ulps_(ulps) {}

    void compare(const T& computed, const exact& expected, const exact& greatest) {
        const exact error = magnitude(static_cast<exact>(computed) - expected) /
                            (greatest * static_cast<exact>(std::numeric_limits<T>::epsilon()));
        worst_ = std::max(worst_, static_cast<double>(error));
        CHECK(static_cast<double>(error) <= ulps_);
    }
    [[nodiscard]] double worst() const { return worst_; }

private:
    double ulps_;
    double worst_ = 0;
};

constexpr double L = 7.25;
constexpr double EI = 1048576;
constexpr double P = 2048, a = 3.125, C = -5120, c = 5.25, w1 = 704, w2 = -320, from = 1.25, to = 6.5, w = 128;
constexpr double sunk = 0.001953125;

template <class T>
auto loads() {
    using namespace sagitta;
    using namespace sagitta::units;
    return point_load(T(P) * N, at(T(a) * m)) + applied_couple(T(C) * N * m, at(T(c) * m)) +
           linear_load(T(w1) * N / m, T(w2) * N / m, between(T(from) * m, T(to) * m)) + uniform_load(T(w) * N / m) +
           settlement(end::left, T(sunk) * m);
}

/// The greatest magnitude of a response of the reference, by dense sampling.
inline exact greatest(const reference::beam<exact>& b, reference::quantity what) {
    exact most(0);
    for (int i = 0; i <= 232; ++i) most = std::max(most, magnitude(b.value(what, exact(i) / 32)));
    return most;
}

template <class T, class Beam>
void check_beam(const Beam& b, reference::hold left, reference::hold right, error_budget<T>& budget) {
    using namespace sagitta;
    using namespace sagitta::units;
    using reference::quantity;
    reference::beam<exact> solved(left, right, L, EI);
    solved.add_force(P, a);
    solved.add_couple(C, c);
    solved.add_line(w1, w2, from, to);
    solved.add_line(w, w, 0, L);
    solved.add_settlement(true, sunk);
    solved.solve();
    const exact v = greatest(solved, quantity::deflection);
    const exact slope = greatest(solved, quantity::slope);
    const exact M = greatest(solved, quantity::moment);
    const exact V = greatest(solved, quantity::shear);

    const auto line = b.under(loads<T>());
    load_list<T> list;
    list += loads<T>();
    const auto same = b.under(list);
    const auto pieces = piecewise_form(line);
    for (const double place : {0.0, 1.0, 1.25, 2.5, 3.125, 4.0, 5.25, 6.5, 6.875, 7.25}) {
        CAPTURE(place);
        const auto x = T(place) * m;
        budget.compare(line.deflection(x).value(), solved.value(quantity::deflection, place), v);
        budget.compare(same.deflection(x).value(), solved.value(quantity::deflection, place), v);
        budget.compare(line.slope(x).value(), solved.value(quantity::slope, place), slope);
        budget.compare(line.moment(x, just_right).value(), solved.value(quantity::moment, place), M);
        budget.compare(line.shear(x, just_right).value(), solved.value(quantity::shear, place), V);
        for (const auto& piece : pieces) {
            if (!(piece.from() <= x && x <= piece.to())) continue;
            budget.compare(piece.deflection(x).value(), solved.value(quantity::deflection, place), v);
        }
        const auto area = moment_area(line, T(1) * m, x);
        const exact turned = solved.value(quantity::slope, place) - solved.value(quantity::slope, 1);
        budget.compare(area.angle_change.value(), turned, slope);
        const exact tangent = solved.value(quantity::deflection, 1) + solved.value(quantity::slope, 1) * (place - 1);
        budget.compare(area.deviation.value(), solved.value(quantity::deflection, place) - tangent, v + slope * L);
    }
    budget.compare(line.reaction(end::left).value(), solved.reaction_left(), V);
    budget.compare(line.reaction(end::right).value(), solved.reaction_right(), V);
    budget.compare(line.end_moment(end::left).value(), solved.end_moment_left(), M);
    budget.compare(line.end_moment(end::right).value(), solved.end_moment_right(), M);

    // Where the greatest stands the reference has the same value, and no greater one anywhere.
    const auto worst = greatest_deflection(line);
    const auto at_worst = static_cast<exact>(worst.at.value());
    budget.compare(worst.value.value(), solved.value(quantity::deflection, at_worst), v);
    CHECK(magnitude(static_cast<exact>(worst.value.value())) >=
          v * (1 - 64 * static_cast<exact>(std::numeric_limits<T>::epsilon())));
    const auto moments = extremes_of_moment(line);
    CHECK(magnitude(static_cast<exact>(moments.governing().value.value())) >=
          M * (1 - 64 * static_cast<exact>(std::numeric_limits<T>::epsilon())));
    for (const auto& zero : zeros_of_deflection(line)) {
        budget.compare(T(0), solved.value(quantity::deflection, static_cast<exact>(zero.from.value())), v);
    }
    CHECK(cross_check(line).greatest() <= T(1000) * std::numeric_limits<T>::epsilon());
}

/// Two equal spans under a uniform load: -w l^2/8 over the middle support, 5/4 w l on it (three-moment equation).
template <class T>
void check_two_spans(error_budget<T>& budget) {
    using namespace sagitta;
    using namespace sagitta::units;
    const auto line = continuous_beam(T(8) * m, T(EI) * N * m2)
                          .support_at(T(0) * m)
                          .support_at(T(4) * m)
                          .support_at(T(8) * m)
                          .under(uniform_load(T(128) * N / m));
    budget.compare(line.moment(T(4) * m).value(), -256, 256);
    budget.compare(line.reaction_at(T(4) * m).value(), 640, 640);
    budget.compare(line.reaction(end::left).value(), 192, 640);
    budget.compare(line.deflection(T(4) * m).value(), 0, exact(128) * 256 / (185 * exact(EI)));
}

template <class T>
double check(double ulps) {
    using namespace sagitta;
    using namespace sagitta::units;
    using reference::hold;
    error_budget<T> budget(ulps);
    const auto span = T(L) * m;
    const auto rigidity = T(EI) * N * m2;
    check_beam<T>(simple_beam(span, rigidity), hold::pinned, hold::pinned, budget);
    check_beam<T>(propped_cantilever(span, rigidity), hold::fixed, hold::pinned, budget);
    check_beam<T>(fixed_beam(span, rigidity), hold::fixed, hold::fixed, budget);
    check_beam<T>(cantilever(span, rigidity), hold::fixed, hold::free, budget);
    check_two_spans<T>(budget);
    MESSAGE("greatest error in units of last place: ", budget.worst());
    return budget.worst();
}

}  // namespace number_types
