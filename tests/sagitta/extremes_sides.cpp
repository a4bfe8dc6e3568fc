// Extremes at jumps, at the ends of a stretch, at hinges: both sides count.
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/extremes.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <limits>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto EI = 1.0e4 * kN * m2;
constexpr auto span = simple_beam(8.0 * m, EI);

}  // namespace

TEST_CASE("shear on both sides of a force") {
    // P b/L before it, -P a/L behind it.
    constexpr auto line = span.under(point_load(8.0 * kN, at(2.0 * m)));
    constexpr auto shear = extremes_of_shear(line);
    static_assert(abs(shear.greatest.value - 6.0 * kN) < 1e-9 * N);
    static_assert(abs(shear.least.value + 2.0 * kN) < 1e-9 * N);
    static_assert(shear.greatest.at <= 2.0 * m && shear.least.at >= 2.0 * m);
    static_assert(shear.governing().value == shear.greatest.value);
}

TEST_CASE("moments on both sides of a couple") {
    // -C a/L before it, C b/L behind it (couple clockwise, reactions C/L): common practice.
    constexpr auto line = span.under(applied_couple(8.0 * kN * m, at(2.0 * m)));
    constexpr auto moment = extremes_of_moment(line);
    static_assert(moment.greatest.at == 2.0 * m && moment.least.at == 2.0 * m);
    static_assert(abs(moment.greatest.value - 6.0 * kN * m) < 1e-9 * N * m);
    static_assert(abs(moment.least.value + 2.0 * kN * m) < 1e-9 * N * m);
}

TEST_CASE("a couple at the end of the beam") {
    // The beam itself carries it; the support does not.
    const auto left = extremes_of_moment(span.under(applied_couple(8.0 * kN * m, at(0.0 * m))));
    CHECK(left.greatest.at == 0.0 * m);
    CHECK(relative(left.greatest.value / (kN * m), 8) < 1e-13);
    const auto right = extremes_of_moment(span.under(applied_couple(8.0 * kN * m, at(8.0 * m))));
    CHECK(right.least.at == 8.0 * m);
    CHECK(relative(right.least.value / (kN * m), -8) < 1e-13);
}

TEST_CASE("over a stretch that begins or ends at a jump, only the side inside counts") {
    const auto line = span.under(applied_couple(8.0 * kN * m, at(2.0 * m)));
    const auto before = extremes_of_moment(line, between(0.0 * m, 2.0 * m));
    CHECK(std::abs(before.greatest.value / (kN * m)) < 1e-12);
    CHECK(relative(before.least.value / (kN * m), -2) < 1e-13);
    const auto behind = extremes_of_moment(line, between(2.0 * m, 8.0 * m));
    CHECK(relative(behind.greatest.value / (kN * m), 6) < 1e-13);
    CHECK(std::abs(behind.least.value / (kN * m)) < 1e-12);
    const auto force = span.under(point_load(8.0 * kN, at(2.0 * m)));
    CHECK(relative(extremes_of_shear(force, between(2.0 * m, 3.0 * m)).greatest.value / kN, -2) < 1e-13);
    CHECK(relative(extremes_of_shear(force, between(1.0 * m, 2.0 * m)).least.value / kN, 6) < 1e-13);
}

TEST_CASE("over a stretch inside a span") {
    // w L^2/8 in the middle, w x (L - x)/2 anywhere: common practice.
    constexpr auto line = span.under(uniform_load(2.0 * kN / m));
    constexpr auto whole = extremes_of_moment(line, between(3.0 * m, 6.0 * m));
    static_assert(abs(whole.greatest.value - 16.0 * kN * m) < 1e-9 * N * m);
    static_assert(abs(whole.greatest.at - 4.0 * m) < 1e-12 * m);
    static_assert(abs(whole.least.value - 12.0 * kN * m) < 1e-9 * N * m && whole.least.at == 6.0 * m);
    // Without the middle, at the nearer end.
    constexpr auto beside = extremes_of_moment(line, between(5.0 * m, 6.0 * m));
    static_assert(beside.greatest.at == 5.0 * m && beside.least.at == 6.0 * m);
    const auto slope = extremes_of_slope(line, between(2.0 * m, 4.0 * m));
    CHECK(slope.greatest.at == 2.0 * m);
    CHECK(slope.greatest.value == line.slope(2.0 * m));
    CHECK(extremes_of_deflection(line, between(1.0 * m, 2.0 * m)).greatest.value == line.deflection(2.0 * m));
}

TEST_CASE("a stretch beyond the beam is refused") {
    const auto line = span.under(uniform_load(2.0 * kN / m));
    std::string said;
    try {
        (void)extremes_of_moment(line, between(1.0 * m, 9.0 * m));
    } catch (const invalid_input& refused) {
        said = refused.what();
    }
    CHECK(said.find("between: to = 9 m") != std::string::npos);
    CHECK(said.find("8 m") != std::string::npos);
}

TEST_CASE("the steepest place of a triangular load") {
    // Where the shear vanishes the moment is greatest: L/sqrt 3, w L^2/(9 sqrt 3). AISC Steel Construction Manual
    // table 3-23 diagram 2, from memory.
    const auto line = span.under(linear_load(0.0 * kN / m, 3.0 * kN / m));
    const auto moment = extremes_of_moment(line).greatest;
    CHECK(relative(moment.at / m, 8 / std::sqrt(3.0)) < 1e-13);
    CHECK(relative(moment.value / (kN * m), 3 * 64 / (9 * std::sqrt(3.0))) < 1e-13);
    // Slopes 7 and -8 w L^3/(360 EI) at the ends: Roark's Formulas for Stress and Strain, table 8.1 case 2e.
    const auto slope = extremes_of_slope(line);
    CHECK(relative(slope.greatest.value / rad, 7 * 3e3 * 512 / (360 * 1e7)) < 1e-13);
    CHECK(relative(slope.least.value / rad, -8 * 3e3 * 512 / (360 * 1e7)) < 1e-13);
    CHECK(slope.least.at == 8.0 * m);
}

TEST_CASE("slopes on both sides of a hinge") {
    // Two cantilevers that meet at a hinge, a force there: half of it bends each; steepest at the hinge,
    // +-(P/2) a^2/(2 EI).
    const auto line = continuous_beam(8.0 * m, EI)
                          .clamp(end::left)
                          .hinge_at(4.0 * m)
                          .clamp(end::right)
                          .under(point_load(6.0 * kN, at(4.0 * m)));
    const double steepest = 3e3 * 16 / (2 * 1e7);
    CHECK(relative(line.slope(4.0 * m, just_left) / rad, steepest) < 1e-12);
    CHECK(relative(line.slope(4.0 * m, just_right) / rad, -steepest) < 1e-12);
    const auto slope = extremes_of_slope(line);
    CHECK(relative(slope.greatest.value / rad, steepest) < 1e-12);
    CHECK(relative(slope.least.value / rad, -steepest) < 1e-12);
    CHECK(std::abs(slope.greatest.at / m - 4) < 1e-12);
}

TEST_CASE("slopes on both sides of a force on a beam that deforms in shear") {
    // dv/dx has the kink V/kGA of the shear: slope P L^2/(16 EI) + P/(2 kGA) at the left support, and
    // +-P/(2 kGA) beside the force.
    const auto line = continuous_beam(8.0 * m, EI)
                          .support_at(0.0 * m)
                          .support_at(8.0 * m)
                          .shear_rigidity(1.0 * MN)
                          .under(point_load(6.0 * kN, at(4.0 * m)));
    const auto left_half = extremes_of_slope(line, between(0.0 * m, 4.0 * m));
    CHECK(relative(left_half.greatest.value / rad, 6e3 * 64 / (16 * 1e7) + 6e3 / 2e6) < 1e-12);
    CHECK(relative(left_half.least.value / rad, 6e3 / 2e6) < 1e-12);
}

TEST_CASE("an overhang's tip") {
    const auto line = continuous_beam(10.0 * m, EI)
                          .support_at(0.0 * m)
                          .support_at(6.0 * m)
                          .under(partial_uniform_load(3.0 * kN / m, between(6.0 * m, 10.0 * m)));
    const auto deflection = extremes_of_deflection(line);
    CHECK(deflection.greatest.at == 10.0 * m);
    CHECK(deflection.least.at < 6.0 * m);
    CHECK(deflection.least.value < 0.0 * m);
    // -w a^2/2 over the support: statics.
    const auto moment = extremes_of_moment(line);
    CHECK(std::abs(moment.least.at / m - 6) < 1e-12);
    CHECK(relative(moment.least.value / (kN * m), -24) < 1e-13);
    CHECK(relative(moment.governing().value / (kN * m), -24) < 1e-13);
}

TEST_CASE("the extreme that governs is the greater in magnitude, of equal ones the greatest") {
    const auto governing = [](double greatest, double least) {
        using one = extreme<dimension::length, double>;
        const extreme_pair<dimension::length, double> pair{one{1.0 * m, greatest * m}, one{2.0 * m, least * m}};
        return pair.governing().value / m;
    };
    CHECK(governing(3, -2) == 3);
    CHECK(governing(2, -3) == -3);
    CHECK(governing(2, -2) == 2);
    CHECK(governing(-1, -3) == -3);
}

TEST_CASE("a response that overflows is refused by its name") {
    const auto huge = [](double P, double L) {
        return simple_beam(L * m, 1.0 * N * m2)
            .under(point_load(P * N, at(L / 4 * m)) + point_load(P * N, at(0.0 * m)));
    };
    const auto begins = [](const std::string& said, const char* with) { return said.rfind(with, 0) == 0; };
    CHECK(begins(refusal([&] { (void)extremes_of_deflection(huge(1e300, 1e4)); }), "deflection = inf m"));
    CHECK(begins(refusal([&] { (void)extremes_of_slope(huge(1e300, 1e5)); }), "slope = "));
    CHECK(begins(refusal([&] { (void)extremes_of_moment(huge(1e305, 1e5)); }), "moment = inf N*m"));
    const auto sheared =
        simple_beam(1.0 * m, 1.0 * N * m2)
            .under(uniform_load(1.7e308 * N / m) + uniform_load(1.7e308 * N / m) + uniform_load(1.7e308 * N / m));
    CHECK(begins(refusal([&] { (void)extremes_of_shear(sheared); }), "shear = inf N"));
}

TEST_CASE("of equal sizes the first is kept; a turning point takes it from a joint that is greater by rounding only") {
    const auto kept = [](double first, bool first_turns, double second, bool second_turns) {
        detail::greatest_of<int, double> greatest;
        greatest.offer(1, first, first_turns);
        greatest.offer(2, second, second_turns);
        return greatest.found();
    };
    constexpr double ulp = std::numeric_limits<double>::epsilon();
    for (const double size : {1.0, -1.0}) {
        CAPTURE(size);
        const double more = size + 4 * ulp, much_more = size + 20 * ulp;
        CHECK(kept(size, false, size, false) == 1);
        CHECK(kept(size, true, size, true) == 1);
        CHECK(kept(size, false, more, false) == 2);
        CHECK(kept(more, false, size, true) == 2);
        CHECK(kept(much_more, false, size, true) == 1);
        CHECK(kept(size, true, more, false) == 1);
        CHECK(kept(size, true, much_more, false) == 2);
    }
    CHECK(kept(-5, false, -7, true) == 1);
    CHECK(kept(-5, true, -3, false) == 2);
    CHECK(kept(0, false, 0, true) == 1);
}

TEST_CASE("a turning point right at the end of the beam is seen from inside") {
    // The moment of a cantilever turns where its shear vanishes, at the free end; the couple there is a hogging one.
    const auto line = cantilever(4.0 * m, 1.0 * MN * m2)
                          .under(uniform_load(2.0 * kN / m) + applied_couple(3.0 * kN * m, at(4.0 * m)));
    const auto moment = extremes_of_moment(line);
    CHECK(relative(moment.greatest.value / (kN * m), -3) < 1e-13);
    CHECK(relative(moment.least.value / (kN * m), -19) < 1e-13);
}
