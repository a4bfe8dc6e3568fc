// The spelling that calculation scripts depend on.
#include <sagitta/sagitta.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

// clang-format off
constexpr auto EI    = 210.0*GPa * 8356.0*cm4;
constexpr auto joist = fixed_beam(7.2*m, EI);

constexpr auto dead  = uniform_load(4.5*kN/m);
constexpr auto live  = partial_uniform_load(9.0*kN/m, between(1.2*m, 4.8*m))
                     + linear_load(0.0*kN/m, 6.0*kN/m, between(4.8*m, 7.2*m))
                     + point_load(22.0*kN, at(3.0*m))
                     + applied_couple(8.0*kN*m, at(7.2*m));
constexpr auto sunk  = settlement(end::right, 5.0*mm) + support_rotation(end::left, 0.5*mrad);

constexpr auto line  = simple_beam(7.2*m, EI).under(1.0*dead + 0.7*live);

constexpr auto worst = greatest_deflection(line);
static_assert(abs(worst.value) < 7.2*m / 250);
// clang-format on

static_assert(line.deflection(3.6 * m) > 0.0 * mm);
static_assert(line.slope(0.0 * m) > 0.0 * mrad);
static_assert(line.moment(3.6 * m) > 0.0 * kN * m);
static_assert(line.shear(0.0 * m) == line.reaction(end::left));
static_assert(line.end_moment(end::left) == 0.0 * kN * m);
static_assert(joist.under(sunk).deflection(7.2 * m) == 5.0 * mm);
static_assert(joist.under(sunk).slope(0.0 * m) == 0.5 * mrad);
static_assert(joist.under(1.0 * dead + 0.7 * live + sunk).deflection(0.0 * m) == 0.0 * mm);

}  // namespace

TEST_CASE("statics of the spelled example by hand") {
    // About the left support: 4.5 kN/m over 7.2 m; 0.7 times 9 kN/m over 3.6 m at 3.0 m, a triangle of 7.2 kN at
    // 4.8 + 2/3 2.4 = 6.4 m, 22 kN at 3.0 m, and a couple of 8 kN*m.
    const double right = (4.5 * 7.2 * 3.6 + 0.7 * (32.4 * 3.0 + 7.2 * 6.4 + 22.0 * 3.0 + 8.0)) / 7.2;
    const double all = 4.5 * 7.2 + 0.7 * (32.4 + 7.2 + 22.0);
    CHECK(std::abs(line.reaction(end::right) / kN - right) < 1e-13 * right);
    CHECK(std::abs(line.reaction(end::left) / kN - (all - right)) < 1e-13 * all);
    // Moment at 3.6 m: left part.
    const double moment_there = (all - right) * 3.6 - 4.5 * 3.6 * 1.8 - 0.7 * (9.0 * 2.4 * 1.2 + 22.0 * 0.6);
    CHECK(std::abs(line.moment(3.6 * m) / (kN * m) - moment_there) < 1e-12 * moment_there);
}

TEST_CASE("the cross check and the moment-area theorems of the spelled example") {
    const auto check = cross_check(line);
    CHECK(check.greatest() < 1e-12);
    const auto area = moment_area(line, 0.0 * m, 3.6 * m);
    const auto turned = line.slope(3.6 * m) - line.slope(0.0 * m);
    CHECK(std::abs((area.angle_change - turned).value()) < 1e-13 * std::abs(turned.value()));
    const double off_tangent =
        line.deflection(3.6 * m).value() - line.deflection(0.0 * m).value() - line.slope(0.0 * m).value() * 3.6;
    CHECK(std::abs(area.deviation.value() - off_tangent) < 1e-13 * std::abs(off_tangent));
}

TEST_CASE("the result as text") {
    const std::string text = fmt::format("{:.1f mm} at {:.2f m}\n", worst.value, worst.at);
    CHECK(parse<dimension::length>(text.substr(0, text.find(" at"))) == std::round(worst.value / mm * 10) / 10 * mm);
    CHECK(text.find(" m\n") != std::string::npos);
}

TEST_CASE("a list of loads is the same thing") {
    load_list loads;
    loads += 1.0 * dead;
    loads += 0.7 * live;
    const auto same = simple_beam(7.2 * m, EI).under(loads);
    CHECK(std::abs((same.deflection(3.6 * m) - line.deflection(3.6 * m)).value()) < 1e-17);
}

TEST_CASE("the other beams of the spelled example") {
    for (const double check : {cross_check(cantilever(7.2 * m, EI).under(dead + live)).greatest(),
                               cross_check(mirrored(cantilever(7.2 * m, EI)).under(dead + live)).greatest(),
                               cross_check(propped_cantilever(7.2 * m, EI).under(dead + live + sunk)).greatest(),
                               cross_check(joist.under(dead + live + sunk)).greatest()}) {
        CHECK(check < 1e-12);
    }
}
