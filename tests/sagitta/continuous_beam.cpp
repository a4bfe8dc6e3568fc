// Continuous beams beside handbooks, textbooks and the beams of one span. Published values are given with half a
// unit of their last printed digit; where a handbook has rounded worse than that, with one unit.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/extremes.hpp>
#include <sagitta/zeros.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <string>
#include <type_traits>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto unit_EI = 1.0 * N * m2;

/// A computed value beside a printed one; unit is one unit of its last digit.
bool printed(double computed, double value, double unit) { return std::abs(computed - value) <= unit / 2 + 1e-12; }

/// Equal spans of 1 m, EI = 1, on unyielding supports, w = 1 on the spans that are marked.
continuous_line<double> equal_spans(const std::string& loaded) {
    const auto count = static_cast<double>(loaded.size());
    continuous_beam<> b(count * m, unit_EI);
    load_list<> loads;
    for (std::size_t i = 0; i <= loaded.size(); ++i) b.support_at(static_cast<double>(i) * m);
    for (std::size_t i = 0; i < loaded.size(); ++i) {
        const auto x = static_cast<double>(i);
        if (loaded[i] == 'w') loads += partial_uniform_load(1.0 * N / m, between(x * m, (x + 1) * m));
    }
    return b.under(loads);
}

double moment_at(const continuous_line<double>& line, double x) { return line.moment(x * m) / (N * m); }
double reaction_at(const continuous_line<double>& line, double x) { return line.reaction_at(x * m) / N; }
double greatest_moment(const continuous_line<double>& line, double from, double to) {
    return extremes_of_moment(line, between(from * m, to * m)).greatest.value / (N * m);
}

}  // namespace

TEST_CASE("two equal spans, one loaded") {
    // AISC Steel Construction Manual table 3-23 diagram 29, from memory.
    const auto line = equal_spans("w-");
    CHECK(relative(reaction_at(line, 0), 7.0 / 16) < 1e-12);
    CHECK(relative(reaction_at(line, 1), 5.0 / 8) < 1e-12);
    CHECK(relative(reaction_at(line, 2), -1.0 / 16) < 1e-12);
    CHECK(relative(moment_at(line, 1), -1.0 / 16) < 1e-12);
    const auto span = extremes_of_moment(line).greatest;
    CHECK(relative(span.value / (N * m), 49.0 / 512) < 1e-12);
    CHECK(relative(span.at / m, 7.0 / 16) < 1e-12);
    const auto worst = greatest_deflection(line);
    CHECK(printed(worst.value / m, 0.0092, 1e-4));
    CHECK(printed(worst.at / m, 0.472, 1e-3));
}

TEST_CASE("two spans, both loaded") {
    // American Wood Council, Design Aid No. 6, figure 29.
    const auto line = equal_spans("ww");
    CHECK(printed(reaction_at(line, 0), 0.375, 1e-3));
    CHECK(printed(reaction_at(line, 1), 1.25, 1e-2));
    CHECK(printed(moment_at(line, 1), -0.125, 1e-3));
    CHECK(printed(moment_at(line, 0.375), 0.0703, 1e-4));
    const auto worst = greatest_deflection(line);
    CHECK(printed(worst.value / m, 0.0054, 1e-4));
    CHECK(printed(worst.at / m, 0.4215, 1e-4));
    // The same, figure 30: a force P in the middle of each span.
    const auto P = 7.0 * kN;
    const auto l = 10.0 * m;
    const auto pair = continuous_beam(2 * l, 1.0 * MN * m2)
                          .support_at(0.0 * m)
                          .support_at(l)
                          .support_at(2 * l)
                          .under(point_load(P, at(l / 2)) + point_load(P, at(1.5 * l)));
    CHECK(relative(pair.reaction(end::left) / N, 5 * P / 16 / N) < 1e-12);
    CHECK(relative(pair.reaction_at(l) / N, 11 * P / 8 / N) < 1e-12);
    CHECK(relative(pair.moment(l) / (N * m), -3 * P * l / 16 / (N * m)) < 1e-12);
    // The same, figure 31: unequal spans, w (l1^3 + l2^3)/(8 (l1 + l2)) over the support.
    const auto unequal = continuous_beam(11.0 * m, 1.0 * MN * m2)
                             .support_at(0.0 * m)
                             .support_at(4.0 * m)
                             .support_at(11.0 * m)
                             .under(uniform_load(3.0 * kN / m));
    CHECK(relative(unequal.moment(4.0 * m) / (kN * m), -3.0 * (64 + 343) / (8 * 11)) < 1e-12);
}

TEST_CASE("three and four equal spans") {
    // AISC Steel Construction Manual table 3-23 diagrams 35, 37 and 39, from memory.
    const auto outer = equal_spans("w-w");
    CHECK(printed(reaction_at(outer, 0), 0.450, 1e-3));
    CHECK(printed(reaction_at(outer, 1), 0.550, 1e-3));
    CHECK(printed(moment_at(outer, 1), -0.050, 1e-3));
    CHECK(printed(greatest_moment(outer, 0, 1), 0.1013, 1e-4));
    CHECK(printed(greatest_deflection(outer).value / m, 0.0099, 1e-4));
    const double summit = greatest_deflection(outer).at / m;  // one of two alike
    CHECK(printed(std::min(summit, 3 - summit), 0.479, 1e-3));

    const auto third_empty = equal_spans("ww-w");
    CHECK(printed(reaction_at(third_empty, 0), 0.380, 2e-3));  // 0.3795
    CHECK(printed(reaction_at(third_empty, 1), 1.223, 1e-3));
    CHECK(printed(reaction_at(third_empty, 2), 0.357, 1e-3));
    CHECK(printed(reaction_at(third_empty, 3), 0.598, 1e-3));
    CHECK(printed(reaction_at(third_empty, 4), 0.442, 1e-3));
    CHECK(printed(moment_at(third_empty, 1), -0.1205, 1e-4));
    CHECK(printed(moment_at(third_empty, 2), -0.0179, 1e-4));
    CHECK(printed(moment_at(third_empty, 3), -0.0580, 1e-4));
    CHECK(printed(greatest_moment(third_empty, 0, 1), 0.0720, 1e-4));
    CHECK(printed(greatest_moment(third_empty, 1, 2), 0.0611, 1e-4));
    CHECK(printed(greatest_moment(third_empty, 3, 4), 0.0977, 1e-4));
    CHECK(printed(greatest_deflection(third_empty).value / m, 0.0094, 1e-4));
    CHECK(printed(4 - greatest_deflection(third_empty).at / m, 0.475, 1e-3));

    const auto all = equal_spans("wwww");
    CHECK(printed(reaction_at(all, 0), 0.393, 1e-3));
    CHECK(printed(reaction_at(all, 1), 1.143, 1e-3));
    CHECK(printed(reaction_at(all, 2), 0.928, 2e-3));  // 0.9286
    CHECK(printed(moment_at(all, 1), -0.1071, 1e-4));
    CHECK(printed(moment_at(all, 2), -0.0714, 1e-4));
    CHECK(printed(greatest_moment(all, 0, 1), 0.0772, 1e-4));
    CHECK(printed(greatest_moment(all, 1, 2), 0.0364, 1e-4));
    CHECK(printed(greatest_deflection(all).value / m, 0.0065, 1e-4));
    const double place = greatest_deflection(all).at / m;
    CHECK(printed(std::min(place, 4 - place), 0.440, 1e-3));
}

TEST_CASE("forces in kip, a spring in lb/in") {
    // I. J. Levinson, Statics and Strength of Materials, examples 13.7 and 13.8 (force method).
    const auto line = continuous_beam(12.0 * ft, 1.0e6 * kN * m2)
                          .support_at(0.0 * ft)
                          .support_at(6.0 * ft)
                          .support_at(12.0 * ft)
                          .under(point_load(4.0 * kip, at(3.0 * ft)) + point_load(8.0 * kip, at(9.0 * ft)));
    CHECK(printed(line.reaction(end::left) / kip, 0.875, 1e-3));
    CHECK(printed(line.reaction_at(6.0 * ft) / kip, 8.25, 1e-2));
    CHECK(printed(line.reaction(end::right) / kip, 2.875, 1e-3));
    // EI so that the cantilever alone has 5/12 of the spring's stiffness, as in the source: 3 EI/L^3.
    const auto sprung = continuous_beam(72.0 * in, 51.84e6 * lbf * in2)
                            .clamp(end::left)
                            .spring_at(72.0 * in, 1000.0 * lbf / in)
                            .under(point_load(680.0 * lbf, at(72.0 * in)));
    CHECK(printed(sprung.reaction(end::right) / lbf, 480, 1));
}

TEST_CASE("settlement and stiffness of the spans") {
    // TU Delft, Bridging Course Structural Mechanics (open book), week 7, session 3: the support at 4 m settles
    // by 24 mm, EI = 34000 kN m2, 17 kN/m on the first span: 128 kNm, sagging.
    const auto line = continuous_beam(10.0 * m, 34000.0 * kN * m2)
                          .support_at(0.0 * m)
                          .support_at(4.0 * m)
                          .settle_at(4.0 * m, 24.0 * mm)
                          .clamp(end::right)
                          .under(partial_uniform_load(17.0 * kN / m, between(0.0 * m, 4.0 * m)));
    CHECK(printed(line.moment(4.0 * m) / (kN * m), 128, 1));
    CHECK(relative(line.deflection(4.0 * m) / mm, 24) < 1e-13);
    // The same, influence of stiffness: EI on the loaded span, n EI on the other: n/(n + 1) 3 F L/16.
    for (const double n : {0.25, 1.0, 3.0}) {
        const auto two = continuous_beam(2.0 * m, 1.0 * unit_EI)
                             .rigidity_from(1.0 * m, n * unit_EI)
                             .support_at(0.0 * m)
                             .support_at(1.0 * m)
                             .support_at(2.0 * m)
                             .under(point_load(1.0 * N, at(0.5 * m)));
        CHECK(relative(two.moment(1.0 * m) / (N * m), -n / (n + 1) * 3 / 16) < 1e-12);
    }
}

TEST_CASE("overhangs") {
    // AISC Steel Construction Manual table 3-23 diagrams 25, 27 and 28, from memory. l between supports, a beyond.
    const double l = 10, a = 10.0 / 3, EI = 1e6, w = 2e3, P = 7e3;
    const auto b = continuous_beam((l + a) * m, EI * N * m2).support_at(0.0 * m).support_at(l * m);
    const auto beyond = b.under(partial_uniform_load(w * N / m, between(l * m, (l + a) * m)));
    CHECK(relative(beyond.deflection((l + a) * m) / m, w * a * a * a * (4 * l + 3 * a) / (24 * EI)) < 1e-12);
    const auto up = extremes_of_deflection(beyond).least;
    CHECK(relative(up.value / m, -w * a * a * l * l / (18 * std::sqrt(3.0) * EI)) < 1e-12);
    CHECK(relative(up.at / m, l / std::sqrt(3.0)) < 1e-12);
    CHECK(relative(beyond.reaction(end::left) / N, -w * a * a / (2 * l)) < 1e-12);
    const auto between_supports = b.under(partial_uniform_load(w * N / m, between(0.0 * m, l * m)));
    const double x1 = 1.25;
    CHECK(relative(between_supports.deflection((l + x1) * m) / m, -w * l * l * l * x1 / (24 * EI)) < 1e-12);
    const double c = 4, d = l - c;
    const auto point = b.under(point_load(P * N, at(c * m)));
    CHECK(relative(point.deflection((l + x1) * m) / m, -P * c * d * x1 * (l + c) / (6 * EI * l)) < 1e-12);
}

TEST_CASE("guided ends") {
    const double L = 10, EI = 1e6, w = 2e3, P = 7e3;
    const auto b = continuous_beam(L * m, EI * N * m2).guide(end::left).clamp(end::right);
    // AISC Steel Construction Manual table 3-23 diagram 20, from memory.
    const auto even = b.under(uniform_load(w * N / m));
    CHECK(relative(greatest_deflection(even).value / m, w * std::pow(L, 4) / (24 * EI)) < 1e-12);
    CHECK(even.end_moment(end::left) / (N * m) == doctest::Approx(w * L * L / 6).epsilon(1e-12));
    CHECK(relative(even.end_moment(end::right) / (N * m), -w * L * L / 3) < 1e-12);
    const double x = 3;
    CHECK(relative(even.deflection(x * m) / m, w * std::pow(L * L - x * x, 2) / (24 * EI)) < 1e-12);
    CHECK(even.reaction(end::left) / N == 0);
    // Roark's Formulas for Stress and Strain, table 8.1 cases 1b, 2b and 3b, from memory; downward positive here.
    const double a = 3, s = L - a;
    const auto point = b.under(point_load(P * N, at(a * m)));
    CHECK(relative(point.end_moment(end::left) / (N * m), P * s * s / (2 * L)) < 1e-12);
    CHECK(relative(point.end_moment(end::right) / (N * m), -P * (L * L - a * a) / (2 * L)) < 1e-12);
    CHECK(relative(point.deflection(0.0 * m) / m, P * s * s * (L + 2 * a) / (12 * EI)) < 1e-12);
    const double v = 5e3;
    const auto ramp = b.under(linear_load(w * N / m, v * N / m, between(a * m, L * m)));
    CHECK(relative(ramp.end_moment(end::left) / (N * m), w * s * s * s / (6 * L) + (v - w) * s * s * s / (24 * L)) <
          1e-12);
    CHECK(relative(ramp.end_moment(end::right) / (N * m),
                   -w * s * s * (2 * L + a) / (6 * L) - (v - w) * s * s * (3 * L + a) / (24 * L)) < 1e-12);
    CHECK(relative(ramp.deflection(0.0 * m) / m,
                   w * s * s * s * (L + a) / (24 * EI) + (v - w) * s * s * s * (3 * L + 2 * a) / (240 * EI)) < 1e-12);
    const double C = 3e3;
    const auto turned = b.under(applied_couple(C * N * m, at(a * m)));
    CHECK(relative(turned.end_moment(end::left) / (N * m), -C * s / L) < 1e-12);
    CHECK(relative(turned.end_moment(end::right) / (N * m), C * a / L) < 1e-12);
    CHECK(relative(turned.deflection(0.0 * m) / m, -C * a * s / (2 * EI)) < 1e-12);
    // The same, case 1f: guided left, simply supported right.
    const auto roller =
        continuous_beam(L * m, EI * N * m2).guide(end::left).support_at(L * m).under(point_load(P * N, at(a * m)));
    CHECK(relative(roller.end_moment(end::left) / (N * m), P * s) < 1e-12);
    CHECK(relative(roller.deflection(0.0 * m) / m, P * s * (2 * L * L + 2 * a * L - a * a) / (6 * EI)) < 1e-12);
    CHECK(relative(roller.slope(L * m) / rad, -P * (L * L - a * a) / (2 * EI)) < 1e-12);
}

TEST_CASE("the line load is answered too, at an end of it from inside the beam") {
    const auto line = continuous_beam(4.0 * m, unit_EI)
                          .support_at(0.0 * m)
                          .support_at(4.0 * m)
                          .under(linear_load(1.0 * kN / m, 3.0 * kN / m, between(0.0 * m, 2.0 * m)));
    CHECK(relative(line.load(0.0 * m) / (kN / m), 1) < 1e-15);
    CHECK(relative(line.load(1.0 * m) / (kN / m), 2) < 1e-15);
    CHECK(line.load(3.0 * m) == 0.0 * kN / m);
}

TEST_CASE("shear deformation") {
    // The shear part of the greatest deflection: Roark's Formulas, section 8.10, and Blodgett, Design of Welded
    // Structures.
    const double L = 5, EI = 2e6, kGA = 3e6, w = 4e3, P = 9e3;
    const auto span = [&] { return continuous_beam(L * m, EI * N * m2).support_at(0.0 * m).support_at(L * m); };
    const auto arm = [&] { return continuous_beam(L * m, EI * N * m2).clamp(end::left); };
    const auto even = uniform_load(w * N / m);
    const auto added = [&](auto beam, const auto& loads, double x) {
        const double stiff = beam.under(loads).deflection(x * m) / m;
        return beam.shear_rigidity(kGA * N).under(loads).deflection(x * m) / m - stiff;
    };
    CHECK(relative(added(span(), even, L / 2), w * L * L / (8 * kGA)) < 1e-12);
    CHECK(relative(added(span(), point_load(P * N, at(L / 2 * m)), L / 2), P * L / (4 * kGA)) < 1e-12);
    CHECK(relative(added(arm(), even, L), w * L * L / (2 * kGA)) < 1e-12);
    CHECK(relative(added(arm(), point_load(P * N, at(L * m)), L), P * L / kGA) < 1e-12);
    // Boresi and Schmidt, Advanced Mechanics of Materials, chapter 5, example 6: rectangle with L/h = 5, equal forces
    // at the tip and in the middle: 3.42 % of the deflection is shear. Steel, E = 200 GPa, G = 77.5 GPa.
    // With EI = 1 and L = 1, GA = 12 (G/E)/h^2, kGA = GA/1.2.
    const double shear_stiffness = 12 * (77.5 / 200) * 25 / 1.2;
    const auto pair = point_load(1.0 * N, at(1.0 * m)) + point_load(1.0 * N, at(0.5 * m));
    const auto plain = continuous_beam(1.0 * m, unit_EI).clamp(end::left);
    auto deep = plain;
    deep.shear_rigidity(shear_stiffness * N);
    const double whole = deep.under(pair).deflection(1.0 * m) / m;
    CHECK(printed(100 * (1 - plain.under(pair).deflection(1.0 * m) / m / whole), 3.42, 1e-2));
}

TEST_CASE("a stepped beam") {
    // E. P. Popov, Engineering Mechanics of Solids, example 10.7: 4 I up to 4 m, I beyond, 20 kN there:
    // EI times the slope at the left support is 4.8 kN m2 (here EI = 1 kN m2, so that it is the slope).
    const auto line = continuous_beam(5.0 * m, 4.0 * kN * m2)
                          .rigidity_from(4.0 * m, 1.0 * kN * m2)
                          .support_at(0.0 * m)
                          .support_at(5.0 * m)
                          .under(point_load(20.0 * kN, at(4.0 * m)));
    CHECK(printed(line.slope(0.0 * m) / rad, 4.8, 0.1));
    CHECK(relative(line.slope(0.0 * m) / rad, 4.8) < 1e-12);
}

TEST_CASE("temperature on a beam that is held too often") {
    // TU Delft, Bridging Course Structural Mechanics, week 7, session 3: top 20 K warmer, 1e-5/K, 0.2 m deep,
    // EI = 6000 kN m2.
    const auto line = continuous_beam(6.0 * m, 6000.0 * kN * m2)
                          .clamp(end::left)
                          .support_at(6.0 * m)
                          .under(temperature_gradient(1e-5 / K, 20.0 * K, warm_side::top, 0.2 * m));
    CHECK(printed(line.reaction(end::right) / kN, 1.5, 0.1));
    CHECK(printed(std::abs(line.end_moment(end::left) / (kN * m)), 9, 1));
}

TEST_CASE("2000 equal spans: the support moments of Clapeyron's recurrence") {
    // M(i-1) + 4 M(i) + M(i+1) = -w l^2/2, M = 0 at both ends, solved: with r = sqrt 3 - 2,
    // M(i) = -(w l^2/12) (1 - (r^i + r^(n-i))/(1 + r^n)). Worked out for this test.
    const int n = 2000;
    const auto line = equal_spans(std::string(n, 'w'));
    const long double r = std::sqrt(3.0L) - 2;
    double worst = 0;
    for (int i = 0; i <= n; ++i) {
        const long double expected = -(1 - (std::pow(r, i) + std::pow(r, n - i)) / (1 + std::pow(r, n))) / 12;
        worst = std::max(worst, static_cast<double>(std::abs(moment_at(line, i) - expected) * 10));
    }
    MESSAGE("greatest error of a support moment, of the greatest of them: " << worst);
    CHECK(worst <= 1e-12);
    // A couple at the far left dies out by r from support to support.
    continuous_beam<> b(200.0 * m, unit_EI);
    for (int i = 0; i <= 200; ++i) b.support_at(i * m);
    const auto turned = b.under(applied_couple(1.0 * N * m, at(0.0 * m)));
    for (int i = 1; i < 30; ++i) {
        CHECK(std::abs(moment_at(turned, i) - static_cast<double>(std::pow(r, i))) <= 1e-15);
    }
}

TEST_CASE("one span is the beam of that name") {
    constexpr std::uint64_t seed = 61;
    CAPTURE(seed);
    scene::chance random(seed);
    double worst = 0;
    for (int i = 0; i < 60; ++i) {
        const double L = random.in(0.1, 100);
        const double EI = 1.75e7;
        scene::with_each_beam(L, EI, [&](const std::string& name, const auto& b, auto left, auto right) {
            using beam = std::decay_t<decltype(b)>;
            const auto all = scene::random_loads(random, random.whole(1, 5), L, EI, left, right);
            const auto loads = scene::list_of(all);
            continuous_beam<> described(b.span(), b.EI());
            if (beam::left_type::against_deflection) described.support_at(0.0 * m);
            if (beam::left_type::against_rotation) described.guide(end::left);
            if (beam::right_type::against_deflection) described.support_at(b.span());
            if (beam::right_type::against_rotation) described.guide(end::right);
            const auto one = described.under(loads);
            const auto line = b.under(loads);
            std::vector<double> places = scene::joints_of(L, all);
            for (int k = 0; k < 10; ++k) places.push_back(random.in(0, L));
            std::array<double, 4> size{}, error{};
            const auto compare = [&](std::size_t q, double computed, double expected) {
                size[q] = std::max(size[q], std::abs(expected));
                error[q] = std::max(error[q], std::abs(computed - expected));
            };
            for (const double place : places) {
                const auto x = place * m;
                compare(0, one.deflection(x).value(), line.deflection(x).value());
                compare(1, one.slope(x).value(), line.slope(x).value());
                compare(2, one.moment(x).value(), line.moment(x).value());
                compare(3, one.shear(x).value(), line.shear(x).value());
                if (place == 0 || place == L) continue;
                compare(2, one.moment(x, just_left).value(), line.moment(x, just_left).value());
                compare(3, one.shear(x, just_left).value(), line.shear(x, just_left).value());
            }
            compare(3, one.reaction(end::left).value(), line.reaction(end::left).value());
            compare(3, one.reaction(end::right).value(), line.reaction(end::right).value());
            compare(2, one.end_moment(end::left).value(), line.end_moment(end::left).value());
            compare(2, one.end_moment(end::right).value(), line.end_moment(end::right).value());
            CAPTURE(name);
            CAPTURE(i);
            // What vanishes but for rounding is measured by what the others imply.
            const double M = std::max({size[0] * EI / L / L, size[1] * EI / L, size[2], size[3] * L});
            const std::array<double, 4> implied{M * L * L / EI, M * L / EI, M, M / L};
            for (std::size_t q = 0; q < 4; ++q) {
                const double of = error[q] / (size[q] < 2e-10 * implied[q] ? implied[q] : size[q]);
                CAPTURE(q);
                CHECK(!(of > 1e-13));
                worst = std::max(worst, of);
            }
        });
    }
    MESSAGE("greatest difference between a span and the beam of its name: " << worst);
}

TEST_CASE("at the ends of the beam the other side answers for the support") {
    // As for the beams of one span: just left of the left end, just right of the right one.
    const auto loads = point_load(3.0 * kN, at(0.0 * m)) + point_load(5.0 * kN, at(4.0 * m)) +
                       applied_couple(2.0 * kN * m, at(0.0 * m)) + applied_couple(7.0 * kN * m, at(4.0 * m));
    const auto named = simple_beam(4.0 * m, 1.0 * MN * m2).under(loads);
    const auto line = continuous_beam(4.0 * m, 1.0 * MN * m2).support_at(0.0 * m).support_at(4.0 * m).under(loads);
    CHECK(relative(line.shear(0.0 * m, just_left) / kN, named.shear(0.0 * m, just_left) / kN) < 1e-13);
    CHECK(relative(line.shear(4.0 * m, just_right) / kN, named.shear(4.0 * m, just_right) / kN) < 1e-13);
    CHECK(std::abs(line.moment(0.0 * m, just_left) / (kN * m)) < 1e-13);
    CHECK(std::abs(line.moment(4.0 * m, just_right) / (kN * m)) < 1e-13);
}

TEST_CASE("an infinite shear rigidity is none, to the bit") {
    constexpr std::uint64_t seed = 62;
    scene::chance random(seed);
    const auto plain = continuous_beam(13.0 * m, 7.0 * MN * m2)
                           .clamp(end::left)
                           .support_at(5.0 * m)
                           .spring_at(11.0 * m, 3.0 * kN / mm)
                           .rigidity_from(3.3 * m, 9.0 * MN * m2)
                           .hinge_at(7.1 * m);
    auto told = plain;
    told.shear_rigidity(std::numeric_limits<double>::infinity() * N);
    const auto loads = linear_load(1.0 * kN / m, 6.0 * kN / m) + point_load(9.0 * kN, at(4.0 * m)) +
                       applied_couple(5.0 * kN * m, at(8.0 * m)) + imposed_curvature(0.001 / m) +
                       support_rotation(end::left, 1.0 * mrad);
    const auto a = plain.under(loads);
    const auto b = told.under(loads);
    for (int i = 0; i < 200; ++i) {
        const auto x = random.in(0, 13) * m;
        CHECK(a.deflection(x) == b.deflection(x));
        CHECK(a.slope(x) == b.slope(x));
        CHECK(a.moment(x) == b.moment(x));
        CHECK(a.shear(x) == b.shear(x));
    }
    CHECK(a.reaction_at(11.0 * m) == b.reaction_at(11.0 * m));
}

TEST_CASE("a hinge that passes on the moment that stood there changes nothing") {
    const auto loads = uniform_load(3.0 * kN / m) + point_load(9.0 * kN, at(4.0 * m)) + imposed_curvature(0.001 / m);
    const auto whole = continuous_beam(13.0 * m, 7.0 * MN * m2)
                           .clamp(end::left)
                           .support_at(5.0 * m)
                           .settle_at(5.0 * m, 3.0 * mm)
                           .spring_at(11.0 * m, 3.0 * kN / mm)
                           .rigidity_from(3.3 * m, 9.0 * MN * m2)
                           .shear_rigidity(4.0 * MN);
    const auto expected = whole.under(loads);
    for (const double at_hinge : {2.0, 5.0, 8.5}) {  // in the span, over the support, in the next span
        CAPTURE(at_hinge);
        const auto x = at_hinge * m;
        const auto line = continuous_beam(whole).hinge_at(x, expected.moment(x)).under(loads);
        CHECK(line.moment(x) == expected.moment(x));
        CHECK(line.moment(x, just_left) == expected.moment(x));
        for (double place = 0; place <= 13; place += 0.5) {
            CAPTURE(place);
            CHECK(std::abs((line.deflection(place * m) - expected.deflection(place * m)) / m) < 1e-14);
            CHECK(std::abs((line.slope(place * m) - expected.slope(place * m)) / rad) < 1e-14);
            CHECK(std::abs((line.moment(place * m) - expected.moment(place * m)) / (kN * m)) < 1e-10);
            CHECK(std::abs((line.shear(place * m) - expected.shear(place * m)) / kN) < 1e-10);
        }
        // The last description counts, and none passed on is a hinge as ever.
        const auto plain = continuous_beam(whole).hinge_at(x, 5.0 * kN * m).hinge_at(x).under(loads);
        CHECK(plain.moment(x) == 0.0 * kN * m);
        CHECK(plain.moment(1.0 * m) == continuous_beam(whole).hinge_at(x).under(loads).moment(1.0 * m));
    }
    // By hand: two spans of l turn against each other by M (l + l)/3 EI (common practice, no source).
    const auto spans =
        continuous_beam(8.0 * m, 6.0 * MN * m2).support_at(0.0 * m).support_at(4.0 * m).support_at(8.0 * m);
    const auto bent = continuous_beam(spans).hinge_at(4.0 * m, 9.0 * kN * m).under(load_list<>{});
    CHECK(relative((bent.slope(4.0 * m, just_right) - bent.slope(4.0 * m, just_left)) / rad, 9e3 * 8 / 18e6) < 1e-13);
    CHECK(relative(bent.reaction_at(4.0 * m) / kN, -2 * 9.0 / 4) < 1e-13);

    // Unmoved: nothing but loads moves it.
    const auto still = continuous_beam(spans).hinge_at(4.0 * m, 9.0 * kN * m).settle_at(8.0 * m, 5.0 * mm).unmoved();
    CHECK(still.under(load_list<>{}).deflection(6.0 * m) == 0.0 * m);
    CHECK(still.under(loads).moment(4.0 * m) == 0.0 * kN * m);
}

TEST_CASE("an offset at a node puts the beam beside what holds it, and costs no digits where little is bent") {
    // By the definition of an offset: the part right of it is lower. Its 2 m are 10,000 million times the deflection.
    const double L = 10, EI = 1e6, w = 1e-3;
    const auto offset_at = [](double x) { return imposed_offset(2.0 * m, at(x * m)); };
    const auto load = uniform_load(w * N / m);
    const auto guided = continuous_beam(L * m, EI * N * m2).guide(end::left).hinge_at(3.0 * m).clamp(end::right);
    const auto plain = guided.under(load);
    const auto moved = guided.under(load + offset_at(0));
    const auto free = continuous_beam(L * m, EI * N * m2).clamp(end::left).hinge_at(7.0 * m).guide(end::right);
    const auto free_plain = free.under(load);
    const auto free_moved = free.under(load + offset_at(L));
    for (const double x : {0.0, 1.0, 3.0, 5.0, 9.0, 10.0}) {
        CAPTURE(x);
        CHECK(moved.deflection(x * m) == plain.deflection(x * m));
        CHECK(moved.slope(x * m) == plain.slope(x * m));
        CHECK(free_moved.deflection(x * m) == free_plain.deflection(x * m));
        CHECK(free_moved.slope(x * m) == free_plain.slope(x * m));
    }
    CHECK(moved.deflection(0.0 * m, just_left) == plain.deflection(0.0 * m) - 2.0 * m);
    CHECK(free_moved.deflection(L * m, just_right) == free_plain.deflection(L * m) + 2.0 * m);

    // At a rigid support the part left of it rests on it, at the left end whatever holds that.
    const auto two = continuous_beam(L * m, EI * N * m2).support_at(0.0 * m).support_at(4.0 * m).support_at(L * m);
    const auto stepped = two.under(offset_at(4));
    CHECK(stepped.deflection(4.0 * m, just_left) == 0.0 * m);
    CHECK(stepped.deflection(4.0 * m, just_right) == 2.0 * m);
    const auto lower = continuous_beam(L * m, EI * N * m2).support_at(0.0 * m).support_at(L * m).under(offset_at(0));
    CHECK(lower.deflection(0.0 * m, just_left) == 0.0 * m);
    CHECK(relative(lower.deflection(2.5 * m) / m, 1.5) < 1e-15);
    const auto higher = continuous_beam(L * m, EI * N * m2).support_at(0.0 * m).support_at(L * m).under(offset_at(L));
    CHECK(higher.deflection(L * m, just_right) == 0.0 * m);
    CHECK(relative(higher.deflection(2.5 * m) / m, -0.5) < 1e-15);
}

TEST_CASE("where it is supported: at its supports and springs, not at its other nodes or between") {
    const auto beam = continuous_beam(10.0 * m, 1.0 * MN * m2)
                          .clamp(end::left)
                          .hinge_at(3.0 * m)
                          .spring_at(6.0 * m, 2.0 * kN / mm)
                          .guide(end::right);
    for (const double x : {0.0, 6.0}) CHECK(beam.is_supported_at(x * m));
    for (const double x : {1.0, 3.0, 5.999, 10.0}) CHECK_FALSE(beam.is_supported_at(x * m));
}

TEST_CASE("a kink at a node lies between the node and the part right of it") {
    const double EI = 1e6, kink = 2e-3, left = 4, right = 6;
    const auto three =
        continuous_beam((left + right) * m, EI * N * m2).support_at(0.0 * m).support_at(left * m).support_at(10.0 * m);
    const auto kinked = three.under(imposed_kink(kink * rad, at(left * m)));
    // The moment that closes a kink over a support: (l1 + l2) M/3 EI turns as much (common practice, no source).
    CHECK(relative(kinked.moment(left * m) / (N * m), -3 * EI * kink / (left + right)) < 1e-13);
    CHECK(relative((kinked.slope(left * m, just_left) - kinked.slope(left * m, just_right)) / rad, kink) < 1e-13);
    // At a clamped end it is as if the clamp were turned.
    const auto propped = continuous_beam(left * m, EI * N * m2).clamp(end::left).support_at(left * m);
    const auto at_clamp = propped.under(imposed_kink(kink * rad, at(0.0 * m)));
    const auto turned = propped.under(support_rotation(end::left, -kink * rad));
    CHECK(relative(at_clamp.end_moment(end::left) / (N * m), turned.end_moment(end::left) / (N * m)) < 1e-13);
    CHECK(relative(std::abs(at_clamp.end_moment(end::left) / (N * m)), 3 * EI * kink / left) < 1e-13);
    CHECK(relative(at_clamp.deflection(1.0 * m) / m, turned.deflection(1.0 * m) / m) < 1e-13);
}
