// How a released structure answers the force method: unit redundants, turns of sections, what cannot be released.
#include <sagitta/detail/released_structure.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/shear_flexible.hpp>

#include <support/doctest_quantities.hpp>

#include <doctest/doctest.h>

#include <cmath>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto EI = 5.0 * MN * m2;

}  // namespace

TEST_CASE("a clamp holds the section, not the slope, where the beam deforms in shear") {
    const auto beam = cantilever(3.0 * m, EI).with_shear_rigidity(4.0 * MN).under(point_load(6.0 * kN, at(3.0 * m)));
    CHECK(beam.slope(0.0 * m) / rad == doctest::Approx(6.0 / 4000).epsilon(1e-14));  // P/kGA
    CHECK(std::abs(detail::turn_of_section(beam, 0.0 * m) / rad) < 1e-18);
    // P L^2/2 EI, whatever the shear does (common practice, no source).
    CHECK(detail::turn_of_section(beam, 3.0 * m) / rad == doctest::Approx(6e3 * 9 / 2 / 5e6).epsilon(1e-14));
    const auto long_beam = continuous_beam(3.0 * m, EI).clamp(end::left).shear_rigidity(4.0 * MN);
    const auto line = long_beam.under(point_load(6.0 * kN, at(3.0 * m)));
    CHECK(std::abs(detail::turn_of_section(line, 0.0 * m) / rad) < 1e-17);
    CHECK(detail::turn_of_section(line, 3.0 * m) / rad == doctest::Approx(6e3 * 9 / 2 / 5e6).epsilon(1e-13));
}

TEST_CASE("at an end it is the section inside the beam that turns, not what lies on the support") {
    const auto pinned = continuous_beam(3.0 * m, EI).support_at(0.0 * m).support_at(3.0 * m).shear_rigidity(4.0 * MN);
    const auto load = uniform_load(2.0 * kN / m);
    const auto ends = point_load(6.0 * kN, at(0.0 * m)) + point_load(9.0 * kN, at(3.0 * m));
    for (const auto& x : {0.0 * m, 3.0 * m}) {
        CHECK(detail::turn_of_section(pinned.under(load + ends), x) / rad ==
              doctest::Approx(detail::turn_of_section(pinned.under(load), x) / rad).epsilon(1e-13));
    }
}

TEST_CASE("the pair of couples of a hinge sags it") {
    // Two spans of 4 m and 6 m, hinged over the support: (l1 + l2)/3 EI for a unit pair (common practice, no source).
    const auto hinged =
        continuous_beam(10.0 * m, EI).support_at(0.0 * m).support_at(4.0 * m).support_at(10.0 * m).hinge_at(4.0 * m);
    const auto release = relative_rotation_at(4.0 * m);
    const auto line = detail::line_under_unit<double>(hinged, release);
    CHECK(line.moment(4.0 * m, just_left) / (N * m) == doctest::Approx(1).epsilon(1e-14));
    CHECK(line.moment(4.0 * m, just_right) / (N * m) == doctest::Approx(1).epsilon(1e-14));
    CHECK(detail::displacement_in(line, release) / rad == doctest::Approx(10.0 / 3 / 5e6).epsilon(1e-13));
    CHECK_THROWS_WITH_AS((void)detail::line_under_unit<double>(hinged, relative_rotation_at(3.0 * m)),
                         "relative_rotation_at: x = 3 m must be a place where the released structure has a hinge",
                         invalid_input);
}

TEST_CASE("what a support holds does not move, what stands close to it does") {
    const auto moves = [](const auto& beam, const auto& release) {
        return detail::moves(detail::line_under_unit<double>(beam, release), release);
    };
    constexpr auto simple = simple_beam(7.0 * m, EI);
    constexpr auto arm = cantilever(7.0 * m, EI);
    CHECK_FALSE(moves(simple, translation_at(0.0 * m)));
    CHECK_FALSE(moves(simple, translation_at(7.0 * m)));
    CHECK(moves(simple, translation_at(7.0e-6 * m)));
    CHECK(moves(simple, rotation_at(0.0 * m)));
    CHECK_FALSE(moves(arm, translation_at(0.0 * m)));
    CHECK_FALSE(moves(arm, rotation_at(0.0 * m)));
    CHECK(moves(arm, translation_at(7.0e-6 * m)));
    CHECK(moves(arm, rotation_at(7.0e-6 * m)));
    // As close to a support, of beams of any size.
    for (const double L : {1e-3, 1e3}) {
        CAPTURE(L);
        const auto beam = simple_beam(L * m, EI);
        CHECK(moves(beam, translation_at(1e-10 * L * m)));
        CHECK_FALSE(moves(beam, translation_at(L * m)));
    }
    // The same held by the nodes of a continuous beam, at a place that rounding has moved.
    const double x = 0.1 * 3;
    const auto nodes = continuous_beam(1.0 * m, EI).support_at(x * m).clamp(end::left).support_at(1.0 * m);
    CHECK_FALSE(moves(nodes, translation_at(x * m)));
    CHECK_FALSE(moves(nodes, translation_at(std::nextafter(x, 0) * m)));
    CHECK_FALSE(moves(nodes, translation_at(std::nextafter(x, 1) * m)));
    CHECK_FALSE(moves(nodes, rotation_at(0.0 * m)));
    CHECK(moves(nodes, rotation_at(x * m)));
    CHECK(moves(nodes, translation_at(0.5 * m)));
}
