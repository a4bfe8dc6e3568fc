// The whole library in 50 decimal digits: what is left is the formulas alone.
#include <support/reference.hpp>

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <limits>

using namespace sagitta;
using namespace sagitta::units;
using precise = boost::multiprecision::cpp_bin_float_50;

namespace {

template <class Beam>
void compare(const Beam& b, reference::hold left, reference::hold right) {
    const double L = 7.2;
    const auto loads =
        point_load(precise(2000) * N, at(precise(3.1) * m)) +
        applied_couple(precise(-5000) * N * m, at(precise(5.3) * m)) +
        linear_load(precise(700) * N / m, precise(-300) * N / m, between(precise(1.25) * m, precise(6.5) * m)) +
        uniform_load(precise(123) * N / m);
    reference::beam<precise> exact(left, right, L, 1e6);
    exact.add_force(2000, 3.1);
    exact.add_couple(-5000, 5.3);
    exact.add_line(700, -300, 1.25, 6.5);
    exact.add_line(123, 123, 0, L);
    exact.solve();
    const auto line = b.under(loads);
    const precise bound = 200 * std::numeric_limits<precise>::epsilon();
    for (const double x : {0.0, 1.0, 1.25, 3.1, 4.0, 5.3, 6.9, 7.2}) {
        CAPTURE(x);
        const auto at_x = precise(x) * m;
        using reference::quantity;
        // Sizes: about 1e-2 m, 1e-2 rad, 1e4 N*m, 1e4 N.
        CHECK(abs(line.deflection(at_x).value() - exact.value(quantity::deflection, x)) < bound * 1e-1);
        CHECK(abs(line.slope(at_x).value() - exact.value(quantity::slope, x)) < bound * 1e-1);
        CHECK(abs(line.moment(at_x, just_right).value() - exact.value(quantity::moment, x)) < bound * 1e4);
        CHECK(abs(line.shear(at_x, just_right).value() - exact.value(quantity::shear, x)) < bound * 1e4);
    }
    CHECK(cross_check(line).greatest() < 1e-45);
}

}  // namespace

TEST_CASE("in 50 digits the closed forms agree with the reference solution to 48") {
    using reference::hold;
    const auto L = precise(7.2) * m;
    const auto EI = precise(1e6) * N * m2;
    compare(simple_beam(L, EI), hold::pinned, hold::pinned);
    compare(propped_cantilever(L, EI), hold::fixed, hold::pinned);
    compare(fixed_beam(L, EI), hold::fixed, hold::fixed);
    compare(cantilever(L, EI), hold::fixed, hold::free);
}

TEST_CASE("the greatest deflection in 50 digits") {
    // Uniform load on a propped cantilever: x = L (15 - sqrt 33)/16 from the clamped end, a root of the slope
    // 8 s^2 - 15 s + 6 = 0 (solved for this test).
    const auto line = propped_cantilever(precise(1) * m, precise(1) * N * m2).under(uniform_load(precise(1) * N / m));
    const auto greatest = greatest_deflection(line);
    const precise s = (15 - sqrt(precise(33))) / 16;
    CHECK(abs(greatest.at.value() - s) < 1e-47);
    CHECK(abs(greatest.value.value() - s * s * (3 - 2 * s) * (1 - s) / 48) < 1e-48);
}

TEST_CASE("lists and movements in 50 digits") {
    load_list<precise> list;
    list += settlement(end::right, precise(3) * mm);
    list += point_load(precise(2) * kN, at(precise(1) / precise(3) * m));
    const auto line = fixed_beam(precise(1) * m, precise(1) * kN * m2).under(list);
    CHECK(abs(line.deflection(precise(1) * m).value() - precise(3) / 1000) < 1e-50);
    CHECK(cross_check(line).greatest() < 1e-45);
}
