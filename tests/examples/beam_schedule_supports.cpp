// Continuous beams and elastic ends: the numbers of the results against handbook formulas, worked by hand here.
// Diagram numbers are those of AISC Steel Construction Manual table 3-23, coefficients of equal spans those of its
// table 3-22, all from memory; what is derived here says so.
#include "project_folder.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <cstddef>
#include <cstdio>
#include <string>
#include <utility>
#include <vector>

namespace {

using namespace examples_test;

constexpr double E = 210e9;       // Pa
constexpr double I = 8356e-8;     // m4
constexpr double EI = E * I;      // N m2
constexpr double w = 4.5e3;       // N/m
constexpr double P = 22e3;        // N
constexpr double precise = 1e-9;  // results.csv has 12 digits

struct beam_results {
    run_outcome ran;
    result_row worst;
    std::vector<span_row> spans;
    std::vector<support_row> supports;
};

/// One beam on its supports under loads of one case.
beam_results results_of(const std::string& ends_and_span, const std::string& loads, const std::string& supports,
                        const std::string& limit = "L/250") {
    const project_folder project;
    project.write_rows("B," + ends_and_span + ",210 GPa,8356 cm4," + limit + "\n", loads, "all,dead,1\n");
    project.write_supports(supports);
    beam_results out{project.run(), {}, {}, {}};
    CAPTURE(out.ran.err);
    REQUIRE(out.ran.status <= 1);
    out.worst = project.results().at({"B", "all"});
    out.spans = project.spans().at({"B", "all"});
    out.supports = project.supports().at({"B", "all"});
    CHECK(out.worst.cross_check <= 1e-9);
    return out;
}

/// Newton and metre against kN, kN m and mm; size is the greatest of its kind.
void check_force(const support_row& support, double reaction, double size) {
    CHECK(std::abs(support.reaction_kN * 1000 - reaction) <= precise * size);
}
void check_moment(const support_row& support, double moment, double size) {
    CHECK(std::abs(support.moment_kNm * 1000 - moment) <= precise * size);
}
void check_deflection(const span_row& span, double deflection, double at) {
    CHECK(span.greatest_deflection_mm == doctest::Approx(deflection * 1000).epsilon(precise));
    CHECK(span.at_m == doctest::Approx(at).epsilon(1e-7));  // a summit is flat
}

}  // namespace

TEST_CASE("two equal spans under a uniform load") {
    const double l = 3.6;
    const auto of = results_of("pinned,pinned,7.2 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,3.6 m,pinned,,\n");
    REQUIRE(of.supports.size() == 3);
    check_force(of.supports[0], 3 * w * l / 8, w * l);
    check_force(of.supports[1], 10 * w * l / 8, w * l);
    check_force(of.supports[2], 3 * w * l / 8, w * l);
    check_moment(of.supports[1], -w * l * l / 8, w * l * l);
    check_moment(of.supports[0], 0, w * l * l);
    // By symmetry each span is a propped cantilever: diagram 12, greatest at l (1 + sqrt(33)) / 16 from its pinned end.
    const double x = l * (1 + std::sqrt(33.0)) / 16;
    const double v = w * x * (l * l * l - 3 * l * x * x + 2 * x * x * x) / (48 * EI);
    CHECK(v == doctest::Approx(w * std::pow(l, 4) / (185 * EI)).epsilon(0.01));
    REQUIRE(of.spans.size() == 2);
    check_deflection(of.spans[0], v, x);
    check_deflection(of.spans[1], v, 2 * l - x);
    for (const auto& span : of.spans) CHECK(span.limit_mm == doctest::Approx(l * 1000 / 250).epsilon(precise));
    CHECK(of.worst.utilisation == doctest::Approx(v * 250 / l).epsilon(precise));
    CHECK(of.worst.limit_mm == doctest::Approx(l * 1000 / 250).epsilon(precise));
}

TEST_CASE("three equal spans under a uniform load") {
    const double l = 4.0;
    const auto of =
        results_of("pinned,pinned,12 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,8 m,pinned,,\nB,400 cm,pinned,,\n");
    REQUIRE(of.supports.size() == 4);
    const double coefficients[]{0.4, 1.1, 1.1, 0.4};
    for (std::size_t i = 0; i < 4; ++i) {
        CHECK(of.supports[i].at_m == doctest::Approx(l * double(i)).epsilon(precise));
        CHECK(of.supports[i].kind == "pinned");
        check_force(of.supports[i], coefficients[i] * w * l, w * l);
        check_moment(of.supports[i], i == 1 || i == 2 ? -0.1 * w * l * l : 0, w * l * l);
    }
    CHECK(of.spans.at(0).greatest_deflection_mm ==
          doctest::Approx(0.0069 * w * std::pow(l, 4) / EI * 1000).epsilon(0.01));
}

TEST_CASE("a beam that overhangs one support") {
    const double l = 4.0;
    const double a = 3.2;
    // Diagram 24: uniform over the whole beam; with an overhang as long as this its tip deflects most of it.
    const auto uniform = results_of("pinned,free,7.2 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,4 m,pinned,,\n");
    REQUIRE(uniform.supports.size() == 2);
    check_force(uniform.supports[0], w * (l * l - a * a) / (2 * l), w * l);
    check_force(uniform.supports[1], w * (l + a) * (l + a) / (2 * l), w * l);
    check_moment(uniform.supports[1], -w * a * a / 2, w * l * l);
    const double tip = w * a * (4 * a * a * l - l * l * l + 3 * a * a * a) / (24 * EI);
    REQUIRE(uniform.spans.size() == 2);
    check_deflection(uniform.spans[1], tip, l + a);

    // Diagram 26: a point load at the tip, which lifts the span by P a l2 / (9 sqrt(3) EI) at l / sqrt(3).
    const auto point = results_of("pinned,free,7.2 m", "B,dead,point,22 kN,,7.2 m,\n", "B,4 m,pinned,,\n");
    check_force(point.supports[0], -P * a / l, P);
    check_force(point.supports[1], P * (l + a) / l, P);
    check_deflection(point.spans[0], -P * a * l * l / (9 * std::sqrt(3) * EI), l / std::sqrt(3));
    check_deflection(point.spans[1], P * a * a * (l + a) / (3 * EI), l + a);
    // Of an overhang L is twice the length: common practice, no source.
    CHECK(point.spans[0].limit_mm == doctest::Approx(l * 1000 / 250).epsilon(precise));
    CHECK(point.spans[1].limit_mm == doctest::Approx(2 * a * 1000 / 250).epsilon(precise));

    // The same seen in a mirror.
    const auto mirrored = results_of("free,pinned,7.2 m", "B,dead,point,22 kN,,0 m,\n", "B,3.2 m,pinned,,\n");
    check_deflection(mirrored.spans[0], P * a * a * (l + a) / (3 * EI), 0);
    CHECK(mirrored.spans[0].limit_mm == doctest::Approx(2 * a * 1000 / 250).epsilon(precise));
    check_force(mirrored.supports[1], -P * a / l, P);
}

TEST_CASE("a length as limit counts for every span, and one span beyond it decides for the beam") {
    const std::string load = "B,dead,point,22 kN,,7.2 m,\n";
    const double tip = P * 2.2 * 2.2 * 7.2 / (3 * EI) * 1000;
    const auto of = results_of("pinned,free,7.2 m", load, "B,5 m,pinned,,\n", "8 mm");
    for (const auto& span : of.spans) CHECK(span.limit_mm == doctest::Approx(8).epsilon(precise));
    CHECK(tip > 8);
    CHECK(of.ran.status == 1);
    CHECK(of.worst.verdict == "exceeds");
    CHECK(of.worst.greatest_deflection_mm == doctest::Approx(tip).epsilon(precise));
    CHECK(of.spans[0].verdict == "ok");
    CHECK(of.spans[1].verdict == "exceeds");
    CHECK(says(table_line(of.ran.out, "B"), "exceeds"));
    CHECK(says(table_line(of.ran.out, "  1"), "ok"));
    CHECK(says(table_line(of.ran.out, "  2"), "exceeds"));
    CHECK(table_line(of.ran.out, "  2").find("pinned-free") != std::string::npos);
}

TEST_CASE("a hinge: a suspended span on the tip of an overhang") {
    // Statics, derived here: the suspended span b rests with w b / 2 on the tip of the overhang a.
    const double l = 5.0;
    const double a = 1.2;
    const double b = 2.8;
    const auto of =
        results_of("pinned,pinned,9 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,6.2 m,hinge,,\nB,5 m,pinned,,\n");
    REQUIRE(of.supports.size() == 3);
    const double tip = w * b / 2;
    const double moment = -tip * a - w * a * a / 2;
    check_force(of.supports[2], w * b / 2, w * l);
    check_moment(of.supports[1], moment, w * l * l);
    check_force(of.supports[0], w * l / 2 + moment / l, w * l);
    check_force(of.supports[1], w * 9 - w * b / 2 - (w * l / 2 + moment / l), w * l);
    CHECK(of.spans.size() == 2);
    CHECK(of.spans[1].to_m == doctest::Approx(9).epsilon(precise));
}

TEST_CASE("a hinge above a support makes two simple beams of two spans") {
    const auto of =
        results_of("pinned,pinned,7.2 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,3.6 m,pinned,,\nB,3600 mm,hinge,,\n");
    const double l = 3.6;
    check_moment(of.supports[1], 0, w * l * l);
    check_force(of.supports[1], w * l, w * l);
    check_deflection(of.spans[0], 5 * w * std::pow(l, 4) / (384 * EI), l / 2);  // diagram 1
}

TEST_CASE("a spring below the middle, and ground that settles") {
    // Compatibility, derived here from diagrams 1 and 7: what the spring pushes up is R.
    const double L = 7.2;
    const double k = 2e6;  // N/m
    const double loaded = 5 * w * std::pow(L, 4) / (384 * EI);
    const double flexibility = L * L * L / (48 * EI);
    const auto of = results_of("pinned,pinned,7.2 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,3.6 m,spring,2 kN/mm,\n");
    const double R = loaded / (flexibility + 1 / k);
    check_force(of.supports.at(1), R, w * L);
    CHECK(of.supports[1].kind == "spring");
    CHECK(of.supports[1].deflection_mm == doctest::Approx(R / k * 1000).epsilon(precise));
    check_force(of.supports[0], (w * L - R) / 2, w * L);
    check_moment(of.supports[1], w * L * L / 8 - R * L / 4, w * L * L);

    const double s = 0.004;
    const auto settled =
        results_of("pinned,pinned,7.2 m", "B,dead,uniform,4.5 kN/m,,,\n", "B,3.6 m,spring,2 kN/mm,4 mm\n");
    const double less = (loaded - s) / (flexibility + 1 / k);
    check_force(settled.supports.at(1), less, w * L);
    CHECK(settled.supports[1].deflection_mm == doctest::Approx((loaded - flexibility * less) * 1000).epsilon(precise));
}

TEST_CASE("a settlement in supports.csv acts in every combination as it is, cases by their factors") {
    const double l = 3.6;
    const double s = 0.003;
    const project_folder project;
    project.write_rows("B,pinned,pinned,7.2 m,210 GPa,8356 cm4,L/250\n", "B,dead,uniform,4.5 kN/m,,,\n",
                       "none,snow,1\nfull,dead,1.35\nup,dead,-1\n");
    project.write_supports("B,3.6 m,pinned,,3 mm\n");
    const auto ran = project.run();
    CHECK(ran.status == 0);
    const auto supports = project.supports();
    // Three moments: M_B = 3 EI s / l2 by the settlement, and half of that over l is the force at the ends.
    const double by_settlement = 3 * EI * s / (l * l);
    for (const auto& combined : {std::pair("none", 0.0), std::pair("full", 1.35), std::pair("up", -1.0)}) {
        const std::string name = combined.first;
        const double factor = combined.second;
        CAPTURE(name);
        const auto& of = supports.at({"B", name});
        check_moment(of.at(1), by_settlement - factor * w * l * l / 8, w * l * l);
        check_force(of[0], factor * 3 * w * l / 8 + by_settlement / l, w * l);
        check_force(of[1], factor * 10 * w * l / 8 - 2 * by_settlement / l, w * l);
        CHECK(of[1].deflection_mm == doctest::Approx(s * 1000).epsilon(precise));
    }
    // The table has the least and the greatest of all combinations.
    const std::size_t table = ran.out.find("Supports of continuous beams");
    REQUIRE(table != std::string::npos);
    const auto two = [](double x) {
        char text[32];
        std::snprintf(text, sizeof text, "%.2f", x / 1000);
        return std::string(text);
    };
    const std::string line = "3.600" + std::string(ran.out, ran.out.find("pinned   3.600", table) + 14, 60);
    CHECK(says(line, two(-10 * w * l / 8 - 2 * by_settlement / l)));
    CHECK(says(line, two(1.35 * 10 * w * l / 8 - 2 * by_settlement / l)));
    CHECK(says(line, two(by_settlement - 1.35 * w * l * l / 8)));
    CHECK(line.find(two(by_settlement + w * l * l / 8) + "\n") != std::string::npos);
}

TEST_CASE("a support that has settled deflects a beam without loads too") {
    const auto of = results_of("pinned,pinned,7.2 m", "", "B,3.6 m,pinned,,3 mm\n");
    CHECK(of.worst.greatest_deflection_mm == doctest::Approx(3).epsilon(precise));
    CHECK(of.worst.at_m == doctest::Approx(3.6).epsilon(precise));
    CHECK(says(table_line(of.ran.out, "B"), "all"));
    CHECK(of.ran.out.find("(no load)") == std::string::npos);
}

TEST_CASE("elastic ends: between pinned and fixed") {
    const double L = 7.2;
    const double k = 5e6;  // N m/rad
    // Derived here: the ends of a simple beam turn by w L3 / (24 EI) - M L / (2 EI), the springs by M / k.
    const auto both = results_of("elastic 5000 kN*m/rad,elastic 5 MN*m/rad,7.2 m", "B,dead,uniform,4.5 kN/m,,,\n", "");
    const double M = w * L * L * L / (24 * EI) / (L / (2 * EI) + 1 / k);
    CHECK(M < w * L * L / 12);
    REQUIRE(both.supports.size() == 2);
    for (const auto& support : both.supports) {
        CHECK(support.kind == "elastic");
        check_force(support, w * L / 2, w * L);
        check_moment(support, -M, w * L * L);
    }
    REQUIRE(both.spans.size() == 1);
    check_deflection(both.spans[0], 5 * w * std::pow(L, 4) / (384 * EI) - M * L * L / (8 * EI), L / 2);

    // A cantilever, diagram 22, and the turn of its spring.
    const auto tip = results_of("elastic 5000 kN*m/rad,free,7.2 m", "B,dead,point,22 kN,,7.2 m,\n", "");
    check_deflection(tip.spans.at(0), P * L * L * L / (3 * EI) + P * L * L / k, L);
    CHECK(tip.spans[0].limit_mm == doctest::Approx(L * 1000 / 250).epsilon(precise));
    check_moment(tip.supports.at(0), -P * L, P * L);
    CHECK(table_line(tip.ran.out, "B").find("elastic-free") != std::string::npos);
    CHECK(table_line(tip.ran.out, "  1").empty());

    // The support below a spring turns and settles: the cantilever goes along.
    const auto moved = results_of("elastic 5000 kN*m/rad,free,7.2 m",
                                  "B,dead,rotation,2 mrad,,left,\nB,dead,settlement,3 mm,,left,\n", "");
    check_deflection(moved.spans.at(0), 0.003 + 0.002 * L, L);

    // With a support in the middle: a propped cantilever in each half by symmetry, its inner end elastic.
    const double l = 3.6;
    const auto continued = results_of("elastic 5000 kN*m/rad,elastic 5000 kN*m/rad,7.2 m",
                                      "B,dead,uniform,4.5 kN/m,,,\n", "B,3.6 m,pinned,,\n");
    // Compatibility at both ends of a half, derived here: w l3 / 24 - M_A l / 3 - M_B l / 6 = EI M_A / k and
    // w l3 / 24 = M_A l / 6 + M_B l / 3.
    const double M_A = w * l * l * l / 48 / (l / 4 + EI / k);
    const double M_B = (w * l * l * l / 24 - M_A * l / 6) * 3 / l;
    check_moment(continued.supports.at(0), -M_A, w * l * l);
    check_moment(continued.supports.at(1), -M_B, w * l * l);
}

TEST_CASE("a free end on a support of supports.csv is the end that beams.csv could have") {
    const project_folder project;
    project.write_rows("A,fixed,pinned,7.2 m,210 GPa,8356 cm4,L/250\nB,fixed,free,7.2 m,210 GPa,8356 cm4,L/250\n",
                       "A,dead,uniform,4.5 kN/m,,,\nB,dead,uniform,4.5 kN/m,,,\n"
                       "A,dead,settlement,2 mm,,right,\nB,dead,settlement,2 mm,,right,\n",
                       "all,dead,1\n");
    project.write_supports("B,720 cm,pinned,,\n");
    const auto ran = project.run();
    CHECK(ran.status == 0);
    const auto results = project.results();
    const auto& closed = results.at({"A", "all"});
    const auto& continuous = results.at({"B", "all"});
    CHECK(continuous.greatest_deflection_mm == doctest::Approx(closed.greatest_deflection_mm).epsilon(precise));
    CHECK(continuous.at_m == doctest::Approx(closed.at_m).epsilon(1e-7));
    CHECK(continuous.limit_mm == closed.limit_mm);
    CHECK(table_line(ran.out, "B").find("fixed-pinned") != std::string::npos);
}

TEST_CASE("US customary units") {
    const project_folder project;
    project.write_rows("W,pinned,elastic 2000 kip*ft/rad,24 ft,29000 ksi,118 in4,L/360\n",
                       "W,live,uniform,1.5 kip/ft,,,\n", "service,live,1\n");
    project.write_supports("W,12 ft,spring,40 kip/in,0.1 in\n");
    CHECK(project.run().status <= 1);
    // Inches and kips, derived here by compatibility: unknown are the force R of the spring and the end moment M.
    const double L = 288;
    const double K = 29000.0 * 118;
    const double q = 1.5 / 12;
    // Middle: 5 q L4/384 - R L3/48 - M L2/16 = K (s + R/k); end: q L3/24 - R L2/16 - M L/3 = K M/kt.
    const double a11 = L * L * L / 48 + K / 40;
    const double a12 = L * L / 16;
    const double a22 = L / 3 + K / (2000 * 12);
    const double b1 = 5 * q * std::pow(L, 4) / 384 - K * 0.1;
    const double b2 = q * L * L * L / 24;
    const double R = (b1 * a22 - b2 * a12) / (a11 * a22 - a12 * a12);
    const double M = (b2 - a12 * R) / a22;
    constexpr double kip = 4.4482216152605;  // kN
    const auto supports = project.supports().at({"W", "service"});
    REQUIRE(supports.size() == 3);
    CHECK(supports[1].reaction_kN == doctest::Approx(R * kip).epsilon(precise));
    CHECK(supports[2].moment_kNm == doctest::Approx(-M * kip * 0.0254).epsilon(precise));
    CHECK(supports[1].deflection_mm == doctest::Approx((0.1 + R / 40) * 25.4).epsilon(precise));
}

TEST_CASE("a couple on a support: the greater moment of both sides") {
    // Two equal spans, a couple C on the middle: antisymmetric, so that each span takes half of it (derived here).
    const auto of = results_of("pinned,pinned,7.2 m", "B,dead,couple,8 kN*m,,3.6 m,\n", "B,3.6 m,pinned,,\n");
    CHECK(std::abs(of.supports.at(1).moment_kNm) == doctest::Approx(4).epsilon(precise));
    CHECK(of.supports[0].reaction_kN == doctest::Approx(-4 / 3.6).epsilon(precise));
    CHECK(of.supports[2].reaction_kN == doctest::Approx(4 / 3.6).epsilon(precise));
}

TEST_CASE("many continuous beams: in the order of beams.csv, whoever computed them") {
    const project_folder project;
    std::string beams, loads, supports;
    for (int i = 0; i < 1200; ++i) {
        const std::string mark = "B" + std::to_string(i);
        beams += mark + ",pinned,free,9 m,210 GPa,8356 cm4,L/250\n";
        loads += mark + ",dead,uniform,1 kN/m,,,\n";
        supports = mark + ",3 m,pinned,,\n" + supports + mark + ",7 m,spring,9 kN/mm,\n";
    }
    project.write_rows(beams, loads, "all,dead,1\nmore,dead,2\n");
    project.write_supports(supports);
    const auto ran = project.run();
    CHECK(ran.status == 0);
    CHECK(has_line(ran.err, "2400 results are in ./results.csv"));
    CHECK(has_line(ran.err, "7200 results of spans are in ./results_spans.csv"));
    CHECK(has_line(ran.err, "7200 results of supports are in ./results_supports.csv"));
    for (const char* name : {"results_spans.csv", "results_supports.csv"}) {
        const std::string text = text_of(project.path() / name);
        std::size_t at = 0;
        for (int i = 0; i < 1200; ++i) {
            at = text.find("\nB" + std::to_string(i) + ",all,", at);
            REQUIRE(at != std::string::npos);
        }
    }
}
