// One part of a longer beam: its share of the loads, and its ends once they are placed.
#include <sagitta/detail/beam_part.hpp>

#include <support/relative.hpp>

#include <doctest/doctest.h>

#include <cmath>

using namespace sagitta;
using namespace sagitta::units;
using sagitta::detail::beam_part;
using response = sagitta::detail::response;

namespace {

constexpr double EI = 1e7, kGA = 2e6;
using flexibility = quantity<beam_part<double>::inverse_force>;

/// From 4 m to 10 m of some longer beam.
beam_part<double> part(const flexibility& shear = {}) { return {4.0 * m, 10.0 * m, EI * N * m2, shear}; }

void place(beam_part<double>& p, double M_left = 0, double M_right = 0, double v_left = 0, double v_right = 0) {
    // Moments about the right end.
    const auto shear = ((M_right - M_left) * N * m + p.moment_of_forces() - p.couples_of_loads()) / (6.0 * m);
    p.place(M_left * N * m, M_right * N * m, v_left * m, v_right * m, (v_right - v_left) / 6 * rad, shear);
}

double deflection(const beam_part<double>& p, double x) { return p.at<response::deflection>(x * m, just_right) / m; }
double moment_of(const beam_part<double>& p, double x, side which = just_right) {
    return p.at<response::moment>(x * m, which) / (N * m);
}
double shear_of(const beam_part<double>& p, double x, side which = just_right) {
    return p.at<response::shear>(x * m, which) / N;
}

}  // namespace

TEST_CASE("places are those of the whole beam") {
    auto p = part();
    p.add(point_load(12.0 * kN, at(6.0 * m)));
    place(p);
    // P b/L and P a/L, P a b/L under the force: common practice.
    CHECK(relative(p.outer_shear_left() / kN, 8) < 1e-14);
    CHECK(relative(p.outer_shear_right() / kN, -4) < 1e-14);
    CHECK(relative(moment_of(p, 6), 16e3) < 1e-14);
    CHECK(relative(shear_of(p, 6, just_left), 8e3) < 1e-14);
    CHECK(relative(shear_of(p, 6, just_right), -4e3) < 1e-14);
}

TEST_CASE("forces as the node equations see them") {
    auto p = part();
    p.add(point_load(3.0 * kN, at(4.0 * m)));   // right at the left end
    p.add(point_load(5.0 * kN, at(10.0 * m)));  // and at the right one
    p.add(point_load(12.0 * kN, at(6.0 * m)));
    p.add(partial_uniform_load(2.0 * kN / m, between(3.0 * m, 7.0 * m)));
    p.add(linear_load(0.0 * kN / m, 3.0 * kN / m, between(5.0 * m, 8.0 * m)));
    p.add(applied_couple(9.0 * kN * m, at(6.0 * m)));
    CHECK(p.force_at_left_end() == 3.0 * kN);
    CHECK(relative(p.force_of_loads() / kN, 5 + 12 + 2 * 3 + 4.5) < 1e-14);
    // Resultants times their distances from 10 m: half of 4 m to 7 m, two thirds of 5 m to 8 m.
    CHECK(relative(p.moment_of_forces() / (kN * m), 12 * 4 + 6 * 4.5 + 4.5 * 3) < 1e-14);
    CHECK(p.couples_of_loads() == 9.0 * kN * m);
    place(p);
    const double V = (12 * 4 + 6 * 4.5 + 4.5 * 3 - 9) / 6;
    CHECK(relative(shear_of(p, 4) / 1e3, V) < 1e-14);
    CHECK(relative(p.outer_shear_left() / kN, V + 3) < 1e-14);
    CHECK(relative(p.outer_shear_right() / kN, V - 27.5) < 1e-14);
    CHECK(relative(shear_of(p, 10, just_left) / 1e3, V - 22.5) < 1e-14);
    // Beyond its ends a part answers from inside.
    CHECK(shear_of(p, 10, just_right) == shear_of(p, 10, just_left));
    CHECK(shear_of(p, 4, just_left) == shear_of(p, 4, just_right));
}

TEST_CASE("line loads are cut to the part") {
    auto p = part();
    // These only touch it.
    p.add(partial_uniform_load(5.0 * kN / m, between(1.0 * m, 4.0 * m)));
    p.add(linear_load(5.0 * kN / m, 2.0 * kN / m, between(10.0 * m, 12.0 * m)));
    p.add(imposed_curvature(0.01 / m, between(2.0 * m, 4.0 * m)));
    // 1 kN/m at 2 m to 11 kN/m at 12 m: 3 kN/m and 9 kN/m at the ends of the part.
    p.add(linear_load(1.0 * kN / m, 11.0 * kN / m, between(2.0 * m, 12.0 * m)));
    place(p);
    CHECK(relative(p.load(4.0 * m, just_right) / (kN / m), 3) < 1e-14);
    CHECK(relative(p.load(10.0 * m, just_left) / (kN / m), 9) < 1e-14);
    // Reactions (2 w1 + w2) L/6 and (w1 + 2 w2) L/6.
    CHECK(relative(p.outer_shear_left() / kN, 15) < 1e-14);
    CHECK(relative(p.outer_shear_right() / kN, -21) < 1e-14);
    auto beside = part();
    beside.add(partial_uniform_load(5.0 * kN / m, between(1.0 * m, 4.0 * m)));
    beside.add(partial_uniform_load(5.0 * kN / m, between(10.0 * m, 12.0 * m)));
    beside.add(imposed_curvature(0.001 / m, between(1.0 * m, 4.0 * m)));
    place(beside);
    CHECK(beside.outer_shear_left() == 0.0 * N);
    CHECK(deflection(beside, 7) == 0);
    auto bent = part();
    bent.add(imposed_curvature(0.002 / m, between(0.0 * m, 14.0 * m)));
    place(bent);
    CHECK(relative(deflection(bent, 7), 0.002 * 36 / 8) < 1e-14);
    CHECK(bent.imposed_curvature(7.0 * m, just_right) == 0.002 / m);
}

TEST_CASE("end moments and end movements") {
    auto p = part();
    place(p, 3e3, -6e3, 0.01, 0.04);
    CHECK(relative(moment_of(p, 4), 3e3) < 1e-14);
    CHECK(relative(moment_of(p, 10), -6e3) < 1e-14);
    CHECK(relative(shear_of(p, 5), -1.5e3) < 1e-14);
    CHECK(relative(deflection(p, 4), 0.01) < 1e-14);
    CHECK(relative(deflection(p, 10), 0.04) < 1e-14);
    // Chord plus M_l L^2/16 and M_r L^2/16 in the middle: common practice.
    CHECK(relative(deflection(p, 7), 0.025 + (3e3 - 6e3) * 36 / (16 * EI)) < 1e-14);
    // Slope at the left end: chord + (2 M_l + M_r) L/(6 EI).
    CHECK(relative(p.at<response::slope>(4.0 * m, just_right) / rad, 0.005 + (6e3 - 6e3) * 6 / (6 * EI)) < 1e-12);
}

TEST_CASE("shear deformation adds the integral of V/kGA, zero at both ends") {
    const auto soft = 1.0 / (kGA * N);
    auto stiff = part();
    auto p = part(soft);
    for (auto* each : {&stiff, &p}) {
        each->add(partial_uniform_load(2.0 * kN / m, between(0.0 * m, 12.0 * m)));
        place(*each);
    }
    // w L^2/(8 kGA) in the middle: Roark's Formulas for Stress and Strain, section 8.10.
    CHECK(relative(deflection(p, 7) - deflection(stiff, 7), 2e3 * 36 / (8 * kGA)) < 1e-12);
    CHECK(deflection(p, 4) == 0);
    CHECK(std::abs(deflection(p, 10)) < 1e-17);
    // dv/dx is steeper by V/kGA at the end; the section itself turns no more than before.
    const auto slope = [](const auto& q) { return q.template at<response::slope>(4.0 * m, just_right) / rad; };
    CHECK(relative(slope(p) - slope(stiff), 6e3 / kGA) < 1e-12);
    // The mean shear is 0: that at the left end less w L/2.
    CHECK(relative(p.shear_turn() / rad, 6e3 / kGA) < 1e-14);
}

TEST_CASE("couples make a shear that deflects nothing") {
    auto p = part(1.0 / (kGA * N));
    p.add(applied_couple(9.0 * kN * m, at(6.0 * m)));
    place(p);
    CHECK(p.shear_turn() == 0.0 * rad);  // the shear is the same everywhere
    // Between ends that do not move it tilts the sections and deflects nothing.
    auto stiff = part();
    stiff.add(applied_couple(9.0 * kN * m, at(6.0 * m)));
    place(stiff);
    for (const double x : {4.5, 6.0, 7.0, 9.9}) CHECK(relative(deflection(p, x), deflection(stiff, x)) < 1e-12);
}

TEST_CASE("an offset right at an end lies between the part and the node, one inside bends the simple beam") {
    auto p = part();
    p.add(imposed_offset(0.2 * m, at(4.0 * m)));
    p.add(imposed_offset(0.1 * m, at(10.0 * m)));
    CHECK(p.offset_at_left_end() == 0.2 * m);
    CHECK(p.offset_at_right_end() == 0.1 * m);
    place(p, 0, 0, 0.3, 0.6);
    for (const double x : {4.0, 5.0, 10.0}) {
        CHECK(relative(p.at<response::deflection>(x * m, x < 10 ? just_right : just_left) / m, 0.3 + (x - 4) * 0.05) <
              1e-15);
    }
    CHECK(relative(p.at<response::deflection>(4.0 * m, just_left) / m, 0.1) < 1e-15);
    CHECK(relative(p.at<response::deflection>(10.0 * m, just_right) / m, 0.7) < 1e-15);
    auto inside = part();
    inside.add(imposed_offset(0.6 * m, at(6.0 * m)));
    place(inside);
    CHECK(inside.offset_at_left_end() == 0.0 * m);
    // Both pieces stay parallel: down to the left of it, up to the right.
    CHECK(relative(deflection(inside, 5), -0.1) < 1e-14);
    CHECK(relative(deflection(inside, 7), 0.3) < 1e-14);
}
