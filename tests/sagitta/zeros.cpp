// Zeros that random loads do not make: touching ones, flat stretches, jumps, supports.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/zeros.hpp>

#include <doctest/doctest.h>

#include <cmath>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto EI = 1.0e4 * kN * m2;

template <class Zero>
bool stands_at(const Zero& zero, double x, bool changes_sign) {
    return std::abs(zero.from / m - x) <= 1e-12 && zero.from == zero.to && zero.changes_sign == changes_sign;
}
template <class Zero>
bool runs(const Zero& zero, double from, double to, bool changes_sign) {
    return zero.from / m == from && zero.to / m == to && zero.changes_sign == changes_sign;
}

}  // namespace

TEST_CASE("the supports of a simple beam, and nothing else") {
    constexpr auto line = simple_beam(6.0 * m, EI).under(uniform_load(3.0 * kN / m));
    constexpr auto zeros = zeros_of_deflection(line);
    static_assert(zeros.size() == 2);
    static_assert(zeros[0].from == 0.0 * m && zeros[0].to == 0.0 * m && !zeros[0].changes_sign);
    static_assert(zeros[1].from == 6.0 * m && !zeros[1].changes_sign);
    constexpr auto level = stationary_points(line);
    static_assert(level.size() == 1);
    static_assert(abs(level[0].from - 3.0 * m) < 1e-15 * m && level[0].changes_sign);
    static_assert(points_of_contraflexure(line).empty());
}

TEST_CASE("points of contraflexure of clamped beams") {
    // Fixed: x = L (1/2 - 1/sqrt 12) = 0.2113 L; propped: L/4 from the clamp. AISC Steel Construction Manual table
    // 3-23 diagrams 15 and 12, from memory (both follow from the moment being zero).
    const auto fixed = points_of_contraflexure(fixed_beam(6.0 * m, EI).under(uniform_load(3.0 * kN / m)));
    REQUIRE(fixed.size() == 2);
    CHECK(stands_at(fixed[0], 6 * (0.5 - 1 / std::sqrt(12.0)), true));
    CHECK(stands_at(fixed[1], 6 * (0.5 + 1 / std::sqrt(12.0)), true));
    const auto propped = points_of_contraflexure(propped_cantilever(6.0 * m, EI).under(uniform_load(3.0 * kN / m)));
    REQUIRE(propped.size() == 1);
    CHECK(stands_at(propped[0], 1.5, true));
}

TEST_CASE("a jump of the moment through zero is a point of contraflexure") {
    const auto line = simple_beam(8.0 * m, EI).under(applied_couple(5.0 * kN * m, at(3.0 * m)));
    const auto turns = points_of_contraflexure(line);
    REQUIRE(turns.size() == 1);
    CHECK(runs(turns[0], 3, 3, true));
    // In a load_list alike.
    const auto listed =
        points_of_contraflexure(simple_beam(8.0 * m, EI).under(load_list(applied_couple(5.0 * kN * m, at(3.0 * m)))));
    REQUIRE(listed.size() == 1);
    CHECK(runs(listed[0], 3, 3, true));
    // From one side of zero to the same one is none: 3 kNm before the couple, 1 kNm after it.
    const auto same =
        simple_beam(8.0 * m, EI)
            .under(applied_couple(-2.0 * kN * m, at(4.0 * m)) + applied_couple(4.0 * kN * m, at(0.0 * m)) +
                   applied_couple(-2.0 * kN * m, at(8.0 * m)));
    CHECK(points_of_contraflexure(same).empty());
}

TEST_CASE("a free end without load bends nothing: flat moments") {
    constexpr auto line = cantilever(6.0 * m, EI).under(partial_uniform_load(3.0 * kN / m, between(0.0 * m, 2.0 * m)));
    // The moment vanishes from 2 m on, and does not change its sign.
    static_assert(points_of_contraflexure(line).empty());
    // Straight beyond the load, but not level.
    CHECK(stationary_points(line).size() == 1);
    // An overhang that is hung up: unloaded between, level from end to end.
    const auto level =
        simple_beam(6.0 * m, EI).under(settlement(end::left, 5.0 * mm) + settlement(end::right, 5.0 * mm));
    const auto flat = stationary_points(level);
    REQUIRE(flat.size() == 1);
    CHECK(runs(flat[0], 0, 6, false));
    CHECK(zeros_of_deflection(level).empty());
}

TEST_CASE("a stretch that stays straight between curvatures of two signs") {
    // Two couples make the middle third free of moment: sagging left of it, hogging right of it, or once more
    // sagging.
    const auto b = simple_beam(9.0 * m, EI);
    const auto outer = [&](double left, double right) {
        // Equal couples that balance each other over each outer third: no reactions, moment on that third alone.
        return b.under(applied_couple(left * kN * m, at(0.0 * m)) + applied_couple(-left * kN * m, at(3.0 * m)) +
                       applied_couple(right * kN * m, at(6.0 * m)) + applied_couple(-right * kN * m, at(9.0 * m)));
    };
    const auto opposite = points_of_contraflexure(outer(4, -2));
    REQUIRE(opposite.size() == 1);
    CHECK(runs(opposite[0], 3, 6, true));
    CHECK(points_of_contraflexure(outer(4, 2)).empty());
}

TEST_CASE("nothing acts: everything is zero everywhere") {
    const auto idle = fixed_beam(6.0 * m, EI).under(point_load(0.0 * kN, at(2.0 * m)));
    for (const auto& zeros : {zeros_of_deflection(idle), stationary_points(idle)}) {
        REQUIRE(zeros.size() == 1);
        CHECK(runs(zeros[0], 0, 6, false));
    }
    CHECK(points_of_contraflexure(idle).empty());
    const auto empty = zeros_of_deflection(simple_beam(6.0 * m, EI).under(load_list{}));
    REQUIRE(empty.size() == 1);
    CHECK(runs(empty[0], 0, 6, false));
    // A fixed beam does not deflect under one curvature all over; it is only strained.
    const auto strained = fixed_beam(6.0 * m, EI).under(imposed_curvature(0.001 / m));
    const auto straight = zeros_of_deflection(strained);
    REQUIRE(straight.size() == 1);
    CHECK(runs(straight[0], 0, 6, false));
}

TEST_CASE("deflection that only touches zero inside the span") {
    // Two spans alike, loaded alike: the middle support is touched with a level tangent.
    const auto line = continuous_beam(8.0 * m, EI)
                          .support_at(0.0 * m)
                          .support_at(4.0 * m)
                          .support_at(8.0 * m)
                          .under(uniform_load(5.0 * kN / m));
    const auto zeros = zeros_of_deflection(line);
    REQUIRE(zeros.size() == 3);
    CHECK(stands_at(zeros[0], 0, false));
    CHECK(stands_at(zeros[1], 4, false));
    CHECK(stands_at(zeros[2], 8, false));
    const auto level = stationary_points(line);
    REQUIRE(level.size() == 3);
    CHECK(stands_at(level[1], 4, true));
    // The same deflected shape without a support there: a simple beam under w and the middle reaction, 5 w L/8
    // upward for a whole length L. Published in every table of two-span beams (AISC table 3-23, from memory).
    const auto pushed =
        simple_beam(8.0 * m, EI).under(uniform_load(5.0 * kN / m) + point_load(-5.0 * 8 * 5.0 / 8 * kN, at(4.0 * m)));
    const auto touching = zeros_of_deflection(pushed);
    REQUIRE(touching.size() == 3);
    CHECK(stands_at(touching[1], 4, false));
    // At a clamp.
    const auto ends = zeros_of_deflection(fixed_beam(4.0 * m, EI).under(uniform_load(5.0 * kN / m)));
    REQUIRE(ends.size() == 2);
    CHECK(stands_at(ends[0], 0, false));
    CHECK(stands_at(ends[1], 4, false));
}

TEST_CASE("a touching moment inside a uniform load") {
    // End couples that lift the parabola so that its summit is just zero: w L^2/8 each. Binary fractions.
    const auto line = simple_beam(4.0 * m, EI)
                          .under(uniform_load(2.0 * kN / m) + applied_couple(-4.0 * kN * m, at(0.0 * m)) +
                                 applied_couple(4.0 * kN * m, at(4.0 * m)));
    CHECK(points_of_contraflexure(line).empty());
    const auto level = stationary_points(line);
    REQUIRE(level.size() == 1);
    CHECK(stands_at(level[0], 2, true));
}

TEST_CASE("the slope touches zero where a couple kinks it") {
    // Antisymmetric about the middle: couples C at both ends turn alike, the middle one is chosen so that the slope
    // vanishes there. Simple beam: slope in the middle from the end couples -C L/(12 EI) in all, from the middle one
    // + C_m L/(12 EI); so C_m = C. Worked out for this test.
    const auto line = simple_beam(8.0 * m, EI)
                          .under(applied_couple(6.0 * kN * m, at(0.0 * m)) + applied_couple(6.0 * kN * m, at(4.0 * m)) +
                                 applied_couple(6.0 * kN * m, at(8.0 * m)));
    bool found = false;
    for (const auto& zero : stationary_points(line)) found = found || stands_at(zero, 4, false);
    CHECK(found);
}

TEST_CASE("a hinge between two spans: the slope jumps through zero") {
    const auto line = continuous_beam(8.0 * m, EI)
                          .clamp(end::left)
                          .hinge_at(4.0 * m)
                          .clamp(end::right)
                          .under(point_load(5.0 * kN, at(4.0 * m)));
    const auto level = stationary_points(line);
    REQUIRE(level.size() == 3);
    CHECK(stands_at(level[0], 0, false));
    CHECK(runs(level[1], 4, 4, true));
    CHECK(stands_at(level[2], 8, false));
}

TEST_CASE("zeros of a continuous beam: every support") {
    const auto line = continuous_beam(15.0 * m, EI)
                          .support_at(0.0 * m)
                          .support_at(5.0 * m)
                          .support_at(9.0 * m)
                          .support_at(15.0 * m)
                          .under(partial_uniform_load(5.0 * kN / m, between(0.0 * m, 5.0 * m)));
    const auto zeros = zeros_of_deflection(line);
    REQUIRE(zeros.size() == 4);
    CHECK(stands_at(zeros[1], 5, true));
    CHECK(stands_at(zeros[2], 9, true));
    CHECK(points_of_contraflexure(line).size() == 2);
}

TEST_CASE("a deflection that touches zero between the supports, without changing its sign") {
    // 5 w L^4/384 of the load are C L^2/8 of the couples (common practice): 80 kN m to 48 kN/m over 4 m.
    const auto line = simple_beam(4.0 * m, 1.0 * MN * m2)
                          .under(uniform_load(48.0 * kN / m) - applied_couple(80.0 * kN * m, at(0.0 * m)) +
                                 applied_couple(80.0 * kN * m, at(4.0 * m)));
    const auto zeros = zeros_of_deflection(line);
    REQUIRE(zeros.size() == 3);
    CHECK(std::abs(zeros[1].from / m - 2) < 1e-7);
    CHECK(zeros[1].to - zeros[1].from < 1e-7 * m);
    CHECK_FALSE(zeros[1].changes_sign);
}
