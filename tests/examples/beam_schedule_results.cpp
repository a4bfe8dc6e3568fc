// The numbers of results.csv against handbook formulas, worked by hand here. Those without a number are common
// handbook formulas, from memory; diagram numbers are those of AISC Steel Construction Manual table 3-23.
#include "project_folder.hpp"

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <cstdlib>
#include <string>
#include <utility>

namespace {

using namespace examples_test;

constexpr double E = 210e9;       // Pa
constexpr double I = 8356e-8;     // m4
constexpr double EI = E * I;      // N m2
constexpr double L = 7.2;         // m
constexpr double w = 4.5e3;       // N/m
constexpr double P = 22e3;        // N
constexpr double C = 8e3;         // N m
constexpr double precise = 1e-9;  // results.csv has 12 digits

/// One beam of 7.2 m under one load, with the limit L/250.
result_row result_of(const std::string& left, const std::string& right, const std::string& load) {
    const project_folder project;
    project.write_rows("B," + left + "," + right + ",7.2 m,210 GPa,8356 cm4,L/250\n", "B,dead," + load + "\n",
                       "all,dead,1\n");
    const auto ran = project.run();
    CHECK(ran.status <= 1);
    const auto results = project.results();
    REQUIRE(results.count({"B", "all"}) == 1);
    return results.at({"B", "all"});
}

void check_result(const result_row& result, double deflection, double at) {
    CHECK(result.greatest_deflection_mm == doctest::Approx(deflection * 1000).epsilon(precise));
    CHECK(result.at_m == doctest::Approx(at).epsilon(precise));
    CHECK(result.limit_mm == doctest::Approx(L * 1000 / 250).epsilon(precise));
    CHECK(result.utilisation == doctest::Approx(std::abs(deflection) * 250 / L).epsilon(precise));
    CHECK(result.verdict == (std::abs(deflection) * 250 > L ? "exceeds" : "ok"));
    CHECK(result.cross_check >= 0);
    CHECK(result.cross_check < 1e-12);
}

}  // namespace

TEST_CASE("simple beam") {
    const auto of = [](const std::string& load) { return result_of("pinned", "pinned", load); };
    check_result(of("uniform,4.5 kN/m,,,"), 5 * w * std::pow(L, 4) / (384 * EI), L / 2);  // diagram 1
    check_result(of("point,22 kN,,3.6 m,"), P * std::pow(L, 3) / (48 * EI), L / 2);       // diagram 7
    // Diagram 2, a load that grows from zero: greatest where 15 x4 - 30 x2 + 7 = 0.
    const double x = L * std::sqrt(1 - std::sqrt(8.0 / 15));
    const double v = w * x * (3 * std::pow(x, 4) - 10 * L * L * x * x + 7 * std::pow(L, 4)) / (360 * EI * L);
    check_result(of("linear,0 kN/m,4.5 kN/m,,"), v, x);
    // Diagram 8, a point load at a > b: greatest at sqrt(a (a + 2b) / 3).
    const double a = 4.8;
    const double b = 2.4;
    const double at = std::sqrt(a * (a + 2 * b) / 3);
    check_result(of("point,22 kN,,4.8 m,"), P * a * b * (a + 2 * b) * std::sqrt(3 * a * (a + 2 * b)) / (27 * EI * L),
                 at);
    // A couple at the left end: C L2 / (9 sqrt(3) EI), L / sqrt(3) from the other end.
    check_result(of("couple,8 kN*m,,0 m,"), C * L * L / (9 * std::sqrt(3) * EI), L - L / std::sqrt(3));
    check_result(of("settlement,12 mm,,right,"), 0.012, L);
    check_result(of("settlement,-12 mm,,left,"), -0.012, 0);
}

TEST_CASE("cantilever, and the same seen in a mirror") {
    const auto of = [](const std::string& load) { return result_of("fixed", "free", load); };
    check_result(of("point,22 kN,,7.2 m,"), P * std::pow(L, 3) / (3 * EI), L);        // diagram 22
    check_result(of("uniform,4.5 kN/m,,,"), w * std::pow(L, 4) / (8 * EI), L);        // diagram 19
    check_result(of("linear,4.5 kN/m,0 kN/m,,"), w * std::pow(L, 4) / (30 * EI), L);  // falls to zero at the tip
    check_result(of("couple,8 kN*m,,7.2 m,"), C * L * L / (2 * EI), L);
    check_result(of("rotation,2 mrad,,left,"), 0.002 * L, L);
    const double a = 2.7;  // loaded from the clamped end over a
    check_result(of("uniform,4.5 kN/m,,0 m,2700 mm"), w * a * a * a * (4 * L - a) / (24 * EI), L);

    const auto mirrored = [](const std::string& load) { return result_of("free", "fixed", load); };
    check_result(mirrored("point,22 kN,,0 m,"), P * std::pow(L, 3) / (3 * EI), 0);
    check_result(mirrored("uniform,4.5 kN/m,,,"), w * std::pow(L, 4) / (8 * EI), 0);
    check_result(mirrored("couple,8 kN*m,,0 m,"), -C * L * L / (2 * EI), 0);
}

TEST_CASE("propped cantilever, and the same seen in a mirror") {
    // Diagram 12: about 0.0054 w L4/EI, at L (1 + sqrt(33)) / 16 from the pinned end.
    const double x = L * (1 + std::sqrt(33.0)) / 16;
    const double v = w * x * (L * L * L - 3 * L * x * x + 2 * x * x * x) / (48 * EI);
    CHECK(v == doctest::Approx(0.0054 * w * std::pow(L, 4) / EI).epsilon(0.01));
    check_result(result_of("fixed", "pinned", "uniform,4.5 kN/m,,,"), v, L - x);
    check_result(result_of("pinned", "fixed", "uniform,4.5 kN/m,,,"), v, x);
    // Diagram 13: P L3 / (48 sqrt(5) EI), at L / sqrt(5) from the pinned end.
    const double of_point = P * L * L * L / (48 * std::sqrt(5) * EI);
    check_result(result_of("fixed", "pinned", "point,22 kN,,3.6 m,"), of_point, L - L / std::sqrt(5));
    check_result(result_of("pinned", "fixed", "point,22 kN,,3.6 m,"), of_point, L / std::sqrt(5));
    // The clamped end turned by t: t L / (3 sqrt(3)), L / sqrt(3) from the pinned end.
    check_result(result_of("fixed", "pinned", "rotation,1 mrad,,left,"), 0.001 * L / (3 * std::sqrt(3)),
                 L - L / std::sqrt(3));
}

TEST_CASE("fixed beam") {
    const auto of = [](const std::string& load) { return result_of("fixed", "fixed", load); };
    check_result(of("uniform,4.5 kN/m,,,"), w * std::pow(L, 4) / (384 * EI), L / 2);  // diagram 15
    check_result(of("point,22 kN,,3.6 m,"), P * std::pow(L, 3) / (192 * EI), L / 2);  // diagram 16
    // Diagram 17, a point load at a > b: greatest at 2 a L / (3a + b).
    const double a = 4.8;
    const double b = 2.4;
    check_result(of("point,22 kN,,4.8 m,"), 2 * P * a * a * a * b * b / (3 * EI * (3 * a + b) * (3 * a + b)),
                 2 * a * L / (3 * a + b));
    // One end turned by t: 4 t L / 27, at L / 3 from it.
    check_result(of("rotation,1 mrad,,left,"), 0.001 * 4 * L / 27, L / 3);
    check_result(of("rotation,1 mrad,,right,"), -0.001 * 4 * L / 27, 2 * L / 3);
}

TEST_CASE("US customary units, also feet with inches") {
    const project_folder project;
    project.write_rows(
        "W1,pinned,pinned,24 ft,29000 ksi,510 in4,L/360\n"
        "W2,fixed,free,12 ft 6 in,29000 ksi,510 in4,0.15 in\n",
        "W1,live,uniform,1.5 kip/ft,,,\n"
        "W2,live,point,2 kip,,150 in,\n",
        "service,live,1\n");
    CHECK(project.run().status == 1);
    const auto results = project.results();
    constexpr double in = 25.4;  // mm
    constexpr double ksi_in4 = 29000.0 * 510;
    const double uniform = 5 * 1.5 / 12 * std::pow(288.0, 4) / (384 * ksi_in4) * in;
    CHECK(results.at({"W1", "service"}).greatest_deflection_mm == doctest::Approx(uniform).epsilon(precise));
    CHECK(results.at({"W1", "service"}).limit_mm == doctest::Approx(288.0 / 360 * in).epsilon(precise));
    CHECK(results.at({"W1", "service"}).verdict == "ok");
    const double tip = 2 * std::pow(150.0, 3) / (3 * ksi_in4) * in;
    CHECK(results.at({"W2", "service"}).greatest_deflection_mm == doctest::Approx(tip).epsilon(precise));
    CHECK(results.at({"W2", "service"}).at_m == doctest::Approx(3.81).epsilon(precise));
    CHECK(results.at({"W2", "service"}).verdict == "exceeds");
}

TEST_CASE("a combination is the sum of factor times all loads of its cases") {
    const project_folder project;
    project.write_rows("B,pinned,pinned,7.2 m,210 GPa,8356 cm4,25 mm\nidle,fixed,free,1 m,210 GPa,8356 cm4,1 mm\n",
                       "B,dead,uniform,4.5 kN/m,,,\nB,live,point,15 kN,,3.6 m,\nB,live,point,7 kN,,3600 mm,\n",
                       "full,dead,1.35\nfull,live,+1.5\nhalf,live,.5\nup,dead,-1\nnone,snow,1\n");
    const auto ran = project.run();
    CHECK(ran.status == 1);
    const auto results = project.results();
    CHECK(results.size() == 8);
    const double dead = 5 * w * std::pow(L, 4) / (384 * EI) * 1000;
    const double live = P * std::pow(L, 3) / (48 * EI) * 1000;
    const auto deflection = [&](const char* name) { return results.at({"B", name}).greatest_deflection_mm; };
    CHECK(deflection("full") == doctest::Approx(1.35 * dead + 1.5 * live).epsilon(precise));
    CHECK(deflection("half") == doctest::Approx(0.5 * live).epsilon(precise));
    CHECK(deflection("up") == doctest::Approx(-dead).epsilon(precise));
    CHECK(results.at({"B", "full"}).utilisation == doctest::Approx((1.35 * dead + 1.5 * live) / 25).epsilon(precise));
    CHECK(results.at({"B", "up"}).utilisation == doctest::Approx(dead / 25).epsilon(precise));
    CHECK(results.at({"B", "full"}).verdict == "exceeds");
    CHECK(results.at({"B", "half"}).verdict == "ok");
    for (const char* name : {"full", "half", "up", "none"}) {
        CHECK(results.at({"idle", name}).greatest_deflection_mm == 0);
        CHECK(results.at({"idle", name}).verdict == "ok");
    }
    CHECK(deflection("none") == 0);
    CHECK(has_line(ran.err, "note: combinations.csv: line 6, column 2 (case): no load has the case 'snow'"));
    CHECK(has_line(ran.err, "note: beams.csv: line 3, column 1 (mark): the beam 'idle' has no load"));
    // The governing combination is the one with the greatest utilisation.
    CHECK(ran.out.find("B     pinned-pinned  7.200  full ") != std::string::npos);
}

TEST_CASE("the head and the digits of results.csv") {
    const project_folder project;
    project.write_rows("B,pinned,pinned,7 m,210 GPa,8356 cm4,L/300\n", "B,dead,uniform,3 kN/m,,,\n", "all,dead,1\n");
    CHECK(project.run().status == 0);
    const std::string text = project.results_text();
    CHECK(text.starts_with(
        "mark,combination,greatest_deflection_mm,at_m,limit_mm,utilisation,verdict,cross_check\nB,all,"));
    CHECK(text.find(",3.5,23.3333333333,") != std::string::npos);
    CHECK(std::count(text.begin(), text.end(), '\n') == 2);
}

TEST_CASE("a place spelled in another unit than the span is still the end of the beam") {
    const std::pair<const char*, const char*> same[]{
        {"12 ft 6 in", "150 in"}, {"7.3 ft", "87.6 in"},   {"17 ft 11 in", "215 in"}, {"0.1 km", "100 m"},
        {"5.7 m", "570 cm"},      {"23.9 ft", "286.8 in"}, {"150 in", "12 ft 6 in"},  {"110.3 in", "9 ft 2.3 in"}};
    std::string beams, loads;
    int number = 0;
    for (const auto& [span, place] : same) {
        const std::string mark = "B" + std::to_string(++number);
        beams += mark + ",fixed,free," + span + ",210 GPa,8356 cm4,L/100\n";
        loads += mark + ",dead,point,1 N,," + place + ",\n";
    }
    const project_folder project;
    project.write_rows(beams, loads, "all,dead,1\n");
    const auto ran = project.run();
    CHECK(ran.err == "8 results are in ./results.csv\n");
    CHECK(ran.status == 0);
}

TEST_CASE("a large project: every beam has a row in every combination, and the statuses agree") {
    const project_folder project;
    const std::string make =
        "sh '" SAGITTA_SOURCE_FOLDER "/tests/examples/make_large_project.sh' '" + project.path().string() + "' 2000";
    REQUIRE(std::system(make.c_str()) == 0);
    const auto ran = project.run();
    CHECK(ran.err == "6000 results are in ./results.csv\n");
    const auto results = project.results();
    CHECK(results.size() == 6000);
    bool exceeds = false;
    for (const auto& [key, result] : results) {
        CHECK(result.cross_check < 1e-9);
        CHECK((result.verdict == "exceeds") == (result.utilisation > 1));
        exceeds = exceeds || result.utilisation > 1;
    }
    CHECK(ran.status == (exceeds ? 1 : 0));
    // In the order of beams.csv, however many threads worked on it.
    const std::string text = project.results_text();
    std::size_t at = 0;
    for (int i = 1; i <= 2000; ++i) {
        at = text.find("\nB" + std::to_string(i) + ",dead + live,", at);
        REQUIRE(at != std::string::npos);
    }
    CHECK(project.run().status == ran.status);
    CHECK(project.results_text() == text);
}
