#include <sagitta/tolerance_not_reached.hpp>

#include <sagitta/moment_area.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

// A stiffness that oscillates faster than any number of panels can follow.
TEST_CASE("an integration that cannot reach its tolerance says what it reached") {
    const auto rippled = [](auto x) { return 1000.0 * kN * m2 * (1.001 + std::sin(1e6 * (x / m))); };
    const auto b = fixed_beam(6.0 * m, 1000.0 * kN * m2);
    try {
        (void)integrate_moment_area(b, uniform_load(5.0 * kN / m), rippled, {}, 1e-13);
        FAIL("nothing was thrown");
    } catch (const tolerance_not_reached& failure) {
        CHECK(failure.reached() > 1e-13);
        CHECK(std::string(failure.what()).find("asked for a relative error of 1e-13") != std::string::npos);
    }
}

TEST_CASE("one that can does not") {
    const auto gentle = [](auto x) { return 1000.0 * kN * m2 * (1.0 + 0.1 * (x / m)); };
    const auto line =
        integrate_moment_area(fixed_beam(6.0 * m, 1000.0 * kN * m2), uniform_load(5.0 * kN / m), gentle, {}, 1e-13);
    CHECK(line.error_estimate() <= 1e-13);
}
