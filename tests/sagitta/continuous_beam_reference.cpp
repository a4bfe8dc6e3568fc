// The stiffness reference that continuous beams are tested against is itself held to formulas worked out by hand:
// exactly, in rational numbers.
#include <support/stiffness_reference.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <limits>

namespace {

using exact = boost::multiprecision::number<boost::multiprecision::cpp_rational_backend, boost::multiprecision::et_off>;
using reference::quantity;
using beam = reference::continuous<exact>;
using reference::from;

constexpr double rigid = std::numeric_limits<double>::infinity();
constexpr double L = 6;
constexpr double EI = 512;
constexpr double kGA = 40;
const exact l(L), K(EI), S(kGA);

exact deflection(const beam& b, double x) { return b.value(quantity::deflection, exact(x)); }
exact slope(const beam& b, double x, from side = from::right) { return b.value(quantity::slope, exact(x), side); }
exact moment(const beam& b, double x, from side = from::right) { return b.value(quantity::moment, exact(x), side); }
exact shear(const beam& b, double x, from side = from::right) { return b.value(quantity::shear, exact(x), side); }

beam simple(double shear_rigidity = rigid) {
    beam b(L, EI);
    b.shear_rigidity(shear_rigidity);
    b.add_spring(0, rigid);
    b.add_spring(L, rigid);
    return b;
}
beam arm(double shear_rigidity = rigid) {
    beam b(L, EI);
    b.shear_rigidity(shear_rigidity);
    b.add_spring(0, rigid);
    b.hold_turning(true, rigid);
    return b;
}

}  // namespace

// The formulas are common practice without one source, shear terms included: integrate M/EI and V/kGA.

TEST_CASE("stiffness reference: simple beams, with shear deformation too") {
    const exact P(10), w(3);
    auto b = simple(kGA);
    b.add_force(10, L / 2);
    REQUIRE(b.solve());
    CHECK(deflection(b, L / 2) == P * l * l * l / (48 * K) + P * l / (4 * S));
    CHECK(slope(b, 0) == P * l * l / (16 * K) + P / (2 * S));
    CHECK(slope(b, L / 2, from::left) == P / (2 * S));
    CHECK(slope(b, L / 2, from::right) == -P / (2 * S));
    CHECK(moment(b, L / 2) == P * l / 4);
    CHECK(shear(b, L / 2, from::left) == P / 2);
    CHECK(shear(b, L / 2, from::right) == -P / 2);
    CHECK(b.misfit() == 0);

    auto even = simple(kGA);
    even.add_line(3, 3, 0, L);
    REQUIRE(even.solve());
    CHECK(deflection(even, L / 2) == 5 * w * l * l * l * l / (384 * K) + w * l * l / (8 * S));
    CHECK(even.reaction(0) == w * l / 2);

    auto turned = simple();
    turned.add_couple(12, 0);
    REQUIRE(turned.solve());
    CHECK(slope(turned, 0) == exact(12) * l / (3 * K));
    CHECK(slope(turned, L) == -exact(12) * l / (6 * K));
    CHECK(turned.reaction(L) == exact(12) / l);
    CHECK(turned.end_moment(true) == 0);
    CHECK(moment(turned, 0) == 12);

    auto warm = simple();
    warm.add_curvature(0.25, 0, L);
    REQUIRE(warm.solve());
    CHECK(deflection(warm, L / 2) == l * l / 32);
    CHECK(moment(warm, 2) == 0);
}

TEST_CASE("stiffness reference: cantilevers") {
    const exact P(10);
    auto b = arm(kGA);
    b.add_force(10, L);
    REQUIRE(b.solve());
    CHECK(deflection(b, L) == P * l * l * l / (3 * K) + P * l / S);
    CHECK(slope(b, L) == P * l * l / (2 * K) + P / S);
    CHECK(slope(b, 0) == P / S);
    CHECK(b.reaction(0) == P);
    CHECK(b.end_moment(true) == -P * l);

    // Stepped at its middle: the inner half turns by its moments P L/2 and P L/2 on average 3 P L/4.
    auto stepped = arm();
    stepped.rigidity_from(L / 2, 2 * EI);
    stepped.add_force(10, L);
    REQUIRE(stepped.solve());
    CHECK(deflection(stepped, L) == P * l * l * l * (exact(7, 24) / K + exact(1, 24) / (2 * K)));

    auto warm = arm();
    warm.add_curvature(0.25, 0, L / 2);
    REQUIRE(warm.solve());
    CHECK(slope(warm, L) == -l / 8);
    CHECK(deflection(warm, L) == -(l * l / 32 + l * l / 16));
}

TEST_CASE("stiffness reference: clamped at both ends") {
    const exact w(3);
    auto b = arm();
    b.add_spring(L, rigid);
    b.hold_turning(false, rigid);
    auto triangle = b;
    triangle.add_line(0, 3, 0, L);
    REQUIRE(triangle.solve());
    CHECK(triangle.end_moment(true) == -w * l * l / 30);
    CHECK(triangle.end_moment(false) == -w * l * l / 20);
    CHECK(triangle.reaction(0) == 3 * w * l / 20);
    CHECK(triangle.reaction(L) == 7 * w * l / 20);

    auto sunk = b;
    sunk.add_settlement(L, 0.5);
    REQUIRE(sunk.solve());
    CHECK(sunk.end_moment(true) == -6 * K * exact(0.5) / (l * l));
    CHECK(shear(sunk, 1) == 12 * K * exact(0.5) / (l * l * l));

    // With shear the same end movement needs less: flexibility L^3/(12 EI) + L/kGA.
    auto soft = sunk;
    soft.shear_rigidity(kGA);
    REQUIRE(soft.solve());
    CHECK(shear(soft, 1) == exact(0.5) / (l * l * l / (12 * K) + l / S));

    auto warm = b;
    warm.add_curvature(0.25, 0, L);
    REQUIRE(warm.solve());
    CHECK(moment(warm, 2) == -K / 4);
    CHECK(deflection(warm, 2) == 0);

    auto turned = b;
    turned.add_rotation(true, 0.5);
    REQUIRE(turned.solve());
    CHECK(turned.end_moment(true) == 4 * K * exact(0.5) / l);
    CHECK(turned.end_moment(false) == -2 * K * exact(0.5) / l);
}

TEST_CASE("stiffness reference: a triangular load on a propped cantilever that deforms in shear") {
    // The prop's force from the tip deflection of the cantilever: w (0 at the clamp, w at the tip) gives
    // 11 w L^4/(120 EI) + w L^2/(3 kGA) for loads growing to the tip, and L^3/(3 EI) + L/kGA for a unit force.
    const exact w(3);
    auto b = arm(kGA);
    b.add_spring(L, rigid);
    b.add_line(0, 3, 0, L);
    REQUIRE(b.solve());
    const exact tip = 11 * w * l * l * l * l / (120 * K) + w * l * l / (3 * S);
    CHECK(b.reaction(L) == tip / (l * l * l / (3 * K) + l / S));
}

TEST_CASE("stiffness reference: springs, guides, hinges, continuity") {
    const exact P(10), w(3);
    // A beam on two springs, load at a third of the span.
    beam on_springs(L, EI);
    on_springs.add_spring(0, 8);
    on_springs.add_spring(L, 16);
    on_springs.add_force(10, 2);
    REQUIRE(on_springs.solve());
    CHECK(on_springs.reaction(0) == P * 2 / 3);
    CHECK(deflection(on_springs, 0) == P * 2 / 3 / 8);
    CHECK(deflection(on_springs, L) == P / 3 / 16);

    // A cantilever whose clamp gives: k in place of rigid.
    beam loose(L, EI);
    loose.add_spring(0, rigid);
    loose.hold_turning(true, 64);
    loose.add_force(10, L);
    REQUIRE(loose.solve());
    CHECK(slope(loose, 0) == P * l / 64);
    CHECK(loose.end_moment(true) == -P * l);

    // Clamped left, guided right: P L^3/(12 EI).
    auto guided = arm();
    guided.hold_turning(false, rigid);
    guided.add_force(10, L);
    REQUIRE(guided.solve());
    CHECK(deflection(guided, L) == P * l * l * l / (12 * K));
    CHECK(guided.end_moment(false) == P * l / 2);

    // Two equal spans: w L^2/8 over the middle; with it sunk, 3 EI d/L^2 less hogging.
    beam two(12, EI);
    for (const double x : {0.0, 6.0, 12.0}) two.add_spring(x, rigid);
    two.add_line(3, 3, 0, 12);
    two.add_settlement(6, 0.25);
    REQUIRE(two.solve());
    CHECK(moment(two, 6) == -w * l * l / 8 + 3 * K * exact(0.25) / (l * l));

    // A hinged beam (Gerber): support, hinge at 4, clamp at 12; load 3 on the hung part.
    beam hung(12, EI);
    hung.add_spring(0, rigid);
    hung.add_hinge(4);
    hung.add_spring(12, rigid);
    hung.hold_turning(false, rigid);
    hung.add_line(3, 3, 0, 4);
    REQUIRE(hung.solve());
    CHECK(hung.reaction(0) == 6);
    CHECK(moment(hung, 4) == 0);
    CHECK(hung.end_moment(false) == -6 * 8);
    CHECK(deflection(hung, 4) == exact(6) * 8 * 8 * 8 / (3 * K));
    CHECK(slope(hung, 4, from::right) == -exact(6) * 8 * 8 / (2 * K));
    CHECK(slope(hung, 4, from::left) != slope(hung, 4, from::right));
}

TEST_CASE("stiffness reference: free movements are seen") {
    beam one_support(L, EI);
    one_support.add_spring(3, rigid);
    CHECK_FALSE(one_support.solve());
    beam guided(L, EI);
    guided.hold_turning(true, rigid);
    guided.hold_turning(false, rigid);
    CHECK_FALSE(guided.solve());
    auto hinged = simple();
    hinged.add_hinge(3);
    CHECK_FALSE(hinged.solve());
    beam no_spring(L, EI);
    no_spring.add_spring(0, rigid);
    no_spring.add_spring(L, 0);
    CHECK_FALSE(no_spring.solve());
}
