// Chords and tangents of an elastic line.
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/chord.hpp>
#include <sagitta/continuous_beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/moment_area.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <limits>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto EI = 1.0e4 * kN * m2;
constexpr auto line = simple_beam(8.0 * m, EI).under(uniform_load(6.0 * kN / m));
constexpr double w_over_EI = 6e3 / 1e7;

}  // namespace

TEST_CASE("the tangent at a support meets the one at midspan, and the undeformed line") {
    // End slope w L^3/(24 EI), middle 5 w L^4/(384 EI): AISC Steel Construction Manual table 3-23 diagram 1, from
    // memory.
    constexpr auto at_end = tangent_at(line, 0.0 * m);
    CHECK(relative(at_end.slope() / rad, w_over_EI * 512 / 24) < 1e-14);
    CHECK(at_end.deflection(0.0 * m) == 0.0 * m);
    CHECK(relative(at_end.deflection(3.0 * m) / m, 3 * w_over_EI * 512 / 24) < 1e-14);
    // Also before the beam and beyond it.
    CHECK(relative(at_end.deflection(-1.0 * m) / m, -w_over_EI * 512 / 24) < 1e-14);
    const auto middle = tangent_at(line, 4.0 * m);
    CHECK(std::abs(middle.slope() / rad) < 1e-17);
    CHECK(relative(middle.deflection(20.0 * m) / m, 5 * w_over_EI * 4096 / 384) < 1e-12);
    constexpr auto met = at_end.meets_undeformed_line();
    static_assert(met.has_value());
    CHECK(*met == 0.0 * m);
    // A tangent elsewhere: x0 - v/slope.
    const auto there = tangent_at(line, 1.0 * m);
    CHECK(std::abs(there.deflection(*there.meets_undeformed_line()) / m) < 1e-17);
    CHECK(*there.meets_undeformed_line() < 0.0 * m);
}

TEST_CASE("a level line meets the undeformed line nowhere") {
    const auto level =
        simple_beam(8.0 * m, EI).under(settlement(end::left, 5.0 * mm) + settlement(end::right, 5.0 * mm));
    CHECK_FALSE(chord_between(level, 1.0 * m, 7.0 * m).meets_undeformed_line().has_value());
    CHECK(chord_between(level, 1.0 * m, 7.0 * m).deflection(100.0 * m) == 5.0 * mm);
}

TEST_CASE("the chord between supports, and what sags below it") {
    constexpr auto chord = chord_between(line, 0.0 * m, 8.0 * m);
    static_assert(chord.slope() == 0.0 * rad);
    static_assert(deflection_from_chord(line, 0.0 * m, 8.0 * m, 3.0 * m) == line.deflection(3.0 * m));
    // Settled supports tilt the chord and change nothing of the sag.
    const auto sunk = simple_beam(8.0 * m, EI).under(uniform_load(6.0 * kN / m) + settlement(end::right, 20.0 * mm));
    CHECK(relative(chord_between(sunk, 0.0 * m, 8.0 * m).slope() / rad, 0.0025) < 1e-13);
    CHECK(relative(deflection_from_chord(sunk, 0.0 * m, 8.0 * m, 3.0 * m) / m, line.deflection(3.0 * m) / m) < 1e-12);
    // Between other places: v(x) less the straight line, by hand.
    const double a = 1, b = 5, x = 2.5;
    const auto v = [&](double place) { return line.deflection(place * m) / m; };
    const double expected = v(x) - (v(a) + (v(b) - v(a)) * (x - a) / (b - a));
    CHECK(relative(deflection_from_chord(line, a * m, b * m, x * m) / m, expected) < 1e-13);
    // The chord runs through both of its places.
    const auto part = chord_between(line, a * m, b * m);
    CHECK(relative(part.deflection(a * m) / m, v(a)) < 1e-15);
    CHECK(relative(part.deflection(b * m) / m, v(b)) < 1e-15);
}

TEST_CASE("the deviation from a tangent is the moment-area theorem's") {
    // Second theorem (Mohr): the moment of the M/EI diagram about the point; which way it counts as positive is
    // moment_area's to say, the size must agree.
    scene::chance random(21);
    for (int i = 0; i < 50; ++i) {
        const auto a = random.in(0, 4) * m;
        const auto b = random.in(4.1, 8) * m;
        const auto area = moment_area(line, a, b);
        const auto gap = line.deflection(b) - tangent_at(line, a).deflection(b);
        CHECK(relative(std::abs(gap / m), std::abs(area.deviation / m)) < 1e-11);
    }
}

TEST_CASE("chords of a continuous beam") {
    const auto two = continuous_beam(16.0 * m, EI)
                         .support_at(0.0 * m)
                         .support_at(8.0 * m)
                         .settle_at(8.0 * m, 16.0 * mm)
                         .support_at(16.0 * m)
                         .under(uniform_load(6.0 * kN / m));
    const auto chord = chord_between(two, 0.0 * m, 8.0 * m);
    CHECK(relative(chord.slope() / mrad, 2) < 1e-12);
    CHECK(deflection_from_chord(two, 0.0 * m, 8.0 * m, 4.0 * m) > 0.0 * m);
    CHECK(relative(tangent_at(two, 3.0 * m).slope() / rad, two.slope(3.0 * m) / rad) < 1e-15);
}

TEST_CASE("wrong places are refused") {
    const auto has = [](const std::string& said, const char* part) { return said.find(part) != std::string::npos; };
    CHECK(has(refusal([] { (void)tangent_at(line, 9.0 * m); }), "x = 9 m"));
    CHECK(has(refusal([] { (void)chord_between(line, 3.0 * m, 3.0 * m); }), "chord: second = 3 m"));
    CHECK(has(refusal([] { (void)chord_between(line, 3.0 * m, 2.0 * m); }), "beyond the first place, 3 m"));
    CHECK(has(refusal([] { (void)chord_between(line, -1.0 * m, 2.0 * m); }), "x = -1 m"));
    CHECK(has(refusal([] { (void)chord_between(line, 1.0 * m, 8.5 * m); }), "x = 8.5 m"));
    const double not_a_number = std::numeric_limits<double>::quiet_NaN();
    CHECK(has(refusal([&] { (void)chord_between(line, 1.0 * m, not_a_number * m); }), "chord: second = nan m"));
    CHECK(has(refusal([&] { (void)deflection_from_chord(line, 1.0 * m, 2.0 * m, 9.0 * m); }), "x = 9 m"));
}
