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
