#include <sagitta/shear_flexible.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/extremes.hpp>

#include "support/doctest_quantities.hpp"

#include <cmath>
#include <limits>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto L = 7.2 * m;
constexpr auto EI = 17.5e6 * N * m2;
constexpr auto kGA = 3.0e6 * N;

load_list<> everything() {
    return load_list(uniform_load(4.5 * kN / m) + partial_uniform_load(9.0 * kN / m, between(1.2 * m, 4.8 * m)) +
                     linear_load(2.0 * kN / m, 6.0 * kN / m, between(4.0 * m, 7.2 * m)) +
                     point_load(22.0 * kN, at(3.0 * m)) + applied_couple(8.0 * kN * m, at(5.2 * m)) +
                     applied_couple(3.0 * kN * m, at(0.0 * m)) +
                     imposed_curvature(0.001 / m, between(1.0 * m, 3.0 * m)));
}

/// Greatest difference of a response along two lines, of its greatest value.
template <class A, class B, class Response>
double gap(const A& a, const B& b, const Response& response) {
    double difference = 0;
    double greatest = 0;
    for (int i = 1; i < 97; ++i) {
        const auto x = L * (i / 97.0);
        const double one = response(a, x);
        difference = std::max(difference, std::abs(one - response(b, x)));
        greatest = std::max(greatest, std::abs(one));
    }
    return difference / greatest;
}

/// The closed forms against the equations of the nodes of a continuous beam: two derivations of their own.
template <class Closed>
void same(const Closed& closed, continuous_beam<double> described, const load_list<>& loads) {
    const auto solved = described.shear_rigidity(kGA).under(loads);
    const auto line = closed.with_shear_rigidity(kGA).under(loads);
    CHECK(gap(line, solved, [](const auto& l, auto x) { return l.deflection(x).value(); }) < 1e-13);
    CHECK(gap(line, solved, [](const auto& l, auto x) { return l.slope(x, just_left).value(); }) < 1e-13);
    CHECK(gap(line, solved, [](const auto& l, auto x) { return l.moment(x, just_left).value(); }) < 1e-13);
    CHECK(gap(line, solved, [](const auto& l, auto x) { return l.shear(x, just_right).value(); }) < 1e-13);
    // Where couples stand, too.
    for (const auto& x : {5.2 * m, 0.0 * m}) {
        CHECK(abs(line.deflection(x) - solved.deflection(x)) < 1e-13 * greatest_deflection(solved).value);
    }
    CHECK(std::abs(line.reaction(end::left) / N - solved.reaction(end::left) / N) < 1e-13 * 200e3);
    CHECK(std::abs(line.end_moment(end::right) / (N * m) - solved.end_moment(end::right) / (N * m)) < 1e-13 * 400e3);
}

}  // namespace

// Roark's Formulas section 8.10 and Blodgett, Design of Welded Structures: the shear part of the greatest deflection.
TEST_CASE("the shear part of the usual cases") {
    const double w = 4000, P = 9000, l = L / m, k = kGA / N;
    const auto part = [](const auto& beam, const auto& load, auto x) {
        return beam.with_shear_rigidity(kGA).under(load).deflection(x) / m - beam.under(load).deflection(x) / m;
    };
    CHECK(part(simple_beam(L, EI), uniform_load(w * N / m), L / 2) ==
          doctest::Approx(w * l * l / (8 * k)).epsilon(1e-12));
    CHECK(part(simple_beam(L, EI), point_load(P * N, at(L / 2)), L / 2) ==
          doctest::Approx(P * l / (4 * k)).epsilon(1e-12));
    CHECK(part(cantilever(L, EI), uniform_load(w * N / m), L) == doctest::Approx(w * l * l / (2 * k)).epsilon(1e-12));
    CHECK(part(cantilever(L, EI), point_load(P * N, at(L)), L) == doctest::Approx(P * l / k).epsilon(1e-12));
}

TEST_CASE("every beam agrees with its equations") {
    const auto loads = everything();
    const continuous_beam bare(L, EI);
    same(simple_beam(L, EI), continuous_beam(bare).support_at(0.0 * m).support_at(L), loads);
    same(fixed_beam(L, EI), continuous_beam(bare).clamp(end::left).clamp(end::right), loads);
    same(cantilever(L, EI), continuous_beam(bare).clamp(end::left), loads);
    same(mirrored(cantilever(L, EI)), continuous_beam(bare).clamp(end::right), loads);
    auto moved = loads;
    moved += settlement(end::left, 3.0 * mm) + settlement(end::right, 1.0 * mm);
    auto turned = moved;
    turned += support_rotation(end::left, 1.0 * mrad);
    same(propped_cantilever(L, EI), continuous_beam(bare).clamp(end::left).support_at(L), turned);
    same(mirrored(propped_cantilever(L, EI)), continuous_beam(bare).clamp(end::right).support_at(0.0 * m), moved);
}

TEST_CASE("an infinite shear rigidity changes no bit") {
    const auto beam = propped_cantilever(L, EI);
    const auto loads = everything();
    const auto rigid = beam.with_shear_rigidity(std::numeric_limits<double>::infinity() * N).under(loads);
    const auto plain = beam.under(loads);
    for (int i = 0; i <= 64; ++i) {
        const auto x = L * (i / 64.0);
        CHECK(rigid.deflection(x) == plain.deflection(x));
        CHECK(rigid.slope(x) == plain.slope(x));
        CHECK(rigid.moment(x) == plain.moment(x));
        CHECK(rigid.shear(x) == plain.shear(x));
    }
}

TEST_CASE("known while compiling, and found among its extremes") {
    constexpr auto line = simple_beam(L, EI).with_shear_rigidity(kGA).under(point_load(22.0 * kN, at(3.0 * m)));
    constexpr auto worst = greatest_deflection(line);
    static_assert(worst.value >
                  greatest_deflection(simple_beam(L, EI).under(point_load(22.0 * kN, at(3.0 * m)))).value);
    for (int i = 0; i <= 1000; ++i) CHECK(line.deflection(L * (i / 1000.0)) <= worst.value);
}

TEST_CASE("a shear rigidity must be positive") {
    CHECK_THROWS_WITH_AS((void)simple_beam(L, EI).with_shear_rigidity(0.0 * N),
                         "shear rigidity kGA = 0 N must be greater than 0 N", invalid_input);
    CHECK_THROWS_AS((void)simple_beam(L, EI).with_shear_rigidity(std::nan("") * N), invalid_input);
}

TEST_CASE("at an end the response is that inside the beam, not beyond what stands there") {
    const auto beam = simple_beam(L, EI).with_shear_rigidity(kGA);
    const auto line = beam.under(uniform_load(4.5 * kN / m) + point_load(22.0 * kN, at(0.0 * m)) +
                                 point_load(22.0 * kN, at(L)) + applied_couple(8.0 * kN * m, at(L)));
    CHECK(line.slope(L) == line.slope(L, just_left));
    CHECK(line.slope(0.0 * m) == line.slope(0.0 * m, just_right));
    CHECK(line.shear(L) == line.shear(L, just_left));
    CHECK(line.moment(L) == line.moment(L, just_left));
    CHECK(abs(line.shear(L) - line.shear(L, just_right)) > 20.0 * kN);
}
