// Published indeterminate beams by the force method, each from a released structure that a book would choose. Labels
// are those of the tests that compare the same values in another way, so that a value counts once.
#include "published/plain.hpp"
#include "support/published.hpp"

#include <cmath>
#include <vector>

using namespace published;
using sagitta::continuous_beam;
using sagitta::force_method;
using sagitta::relative_rotation_at;
using sagitta::rotation_at;
using sagitta::translation_at;

namespace {

/// The list of figures was seen in print; the coefficients are from memory.
const source design_aid{"American Wood Council, Design Aid No. 6 (2007) (coefficients from memory)"};
const source hicks{"T. G. Hicks, Civil Engineering Formulas, Table 2.1"};
const source karnovsky{"I. A. Karnovsky and O. Lebed, Advanced Methods of Structural Analysis, Fig. 10.2, Table 10.1"};
/// Read as recomputed in public companions to the books.
const source levinson{"I. J. Levinson, Statics and Strength of Materials, Ch. 13"};
const source sarkar{"B. K. Sarkar, Strength of Materials"};
const source delft{"TU Delft, Bridging Course Structural Mechanics (open TeachBook), week 7 session 3"};
/// The table as its author publishes it, version 1.0.
const source erochko{"J. Erochko (Carleton University), Fixed End Moment Table v1.0"};

auto simple(double l, double EI = 1) { return sagitta::simple_beam(l * m, stiffness(EI)); }
auto arm(double l, double EI = 1) { return sagitta::cantilever(l * m, stiffness(EI)); }

/// Equal spans of 1 under w = 1, released from their inner supports.
auto equal_spans(int spans) {
    sagitta::release_list<> supports;
    for (int i = 1; i < spans; ++i) supports.add(translation_at(i * 1.0 * m));
    return force_method(simple(spans), supports).under(uniform(1)).line();
}
/// The same as hinged spans.
auto hinged_spans(int spans) {
    continuous_beam beam(spans * 1.0 * m, stiffness(1));
    sagitta::release_list<> hinges;
    for (int i = 0; i <= spans; ++i) beam.support_at(i * 1.0 * m);
    for (int i = 1; i < spans; ++i) {
        beam.hinge_at(i * 1.0 * m);
        hinges.add(relative_rotation_at(i * 1.0 * m));
    }
    return force_method(beam, hinges).under(uniform(1)).line();
}

}  // namespace

TEST_CASE("Design Aid 6, Figures 29 to 31: two spans, released from the middle support") {
    const auto equal = force_method(simple(2), translation_at(1.0 * m)).under(uniform(1));
    row(design_aid, "Figure 29: R2, w l").meets("1.25", equal.reaction<0>() / N);
    row(design_aid, "Figure 29: R1, w l").meets("0.375", reaction(equal.line(), left));
    row(design_aid, "Figure 29: support moment, w l^2").meets("0.125", -moment(equal.line(), 1));
    row(design_aid, "Figure 29: max deflection, w l^4/EI")
        .meets("0.0054", sagitta::greatest_deflection(equal.line()).value / m);
    for (const double l : {1.0, 7.2}) {
        const double P = 22e3;
        const auto pair = force_method(simple(2 * l), translation_at(l * m)).under(point(P, l / 2) + point(P, 1.5 * l));
        const row figure_30(design_aid, "Figure 30: R1, R2 and the support moment");
        figure_30.equals(11 * P / 8, pair.reaction<0>() / N);
        figure_30.equals(5 * P / 16, reaction(pair.line(), left), 11 * P / 8);
        figure_30.equals(-3 * P * l / 16, moment(pair.line(), l));
        for (const double l1 : {0.1 * l, l / 3, 0.8 * l}) {
            const double l2 = l - l1;
            const auto unequal = force_method(simple(l), translation_at(l1 * m)).under(uniform(3)).line();
            row(design_aid, "Figure 31: support moment")
                .equals(-3 * (std::pow(l1, 3) + std::pow(l2, 3)) / (8 * l), moment(unequal, l1));
        }
    }
}

TEST_CASE("Hicks, Table 2.1: equal spans, from a beam without inner supports and from hinged spans") {
    const auto compare = [](const auto& spans) {
        const auto three = spans(3);
        row(hicks, "3 spans: M over support 2, w l^2").equals(-1.0 / 10, moment(three, 1));
        row(hicks, "3 spans: end reaction, w l").equals(4.0 / 10, reaction(three, left));
        const auto five = spans(5);
        row(hicks, "5 spans: end reaction, w l").equals(15.0 / 38, reaction(five, left));
        row(hicks, "5 spans: shear right of support 2, w l").equals(20.0 / 38, shear(five, 1));
        row(hicks, "5 spans: M over support 2, w l^2").equals(-4.0 / 38, moment(five, 1), 0.125);
        row(hicks, "5 spans: M over support 3, w l^2").equals(-3.0 / 38, moment(five, 2), 0.125);
    };
    compare(equal_spans);
    compare(hinged_spans);
    const auto seven = hinged_spans(7);
    row(hicks, "7 spans: end reaction, w l").equals(56.0 / 142, reaction(seven, left));
    row(hicks, "7 spans: shear right of support 2, w l").equals(75.0 / 142, shear(seven, 1));
    row(hicks, "7 spans: shear right of support 3, w l").equals(70.0 / 142, shear(seven, 2));
    row(hicks, "7 spans: shear right of support 4, w l").equals(71.0 / 142, shear(seven, 3));
}

TEST_CASE("Karnovsky and Lebed: two equal spans as two hinged ones") {
    const auto spans = continuous_beam(2.0 * m, stiffness(1))
                           .support_at(0.0 * m)
                           .support_at(1.0 * m)
                           .support_at(2.0 * m)
                           .hinge_at(1.0 * m);
    const auto method = force_method(spans, relative_rotation_at(1.0 * m));
    const auto redundant = [&](double u) { return -method.under(point(1, u)).template redundant<0>() / (N * m); };
    row(karnovsky, "Fig. 10.2: ordinate at u = 2/5, l").meets("0.084", redundant(0.4));
    row(karnovsky, "Fig. 10.2: ordinate at u = 3/5, l").meets("0.096", redundant(0.6));
    row(karnovsky, "Fig. 10.2: ordinate at u = 4/5, l").meets("0.072", redundant(0.8));
    // The rotation that the support moment undoes, in the released span.
    row(karnovsky, "Table 10.1: end rotation at u = 2/5, l^2/EI")
        .meets("0.056", method.under(point(1, 0.4)).displacement<0>() / rad);
}

TEST_CASE("Levinson, examples 13.7 and 13.8: an inner support, and a tip on a spring") {
    // kip and ft
    const auto two = force_method(simple(12), translation_at(6.0 * m)).under(point(4, 3) + point(8, 9));
    row(levinson, "example 13.7: R1, kip").meets("0.875", reaction(two.line(), left));
    row(levinson, "example 13.7: R2, kip").meets("8.25", two.reaction<0>() / N);
    row(levinson, "example 13.7: R3, kip").meets("2.875", reaction(two.line(), right));
    // lb and in
    const auto tip = translation_at(72.0 * m).on_spring(1000.0 * N / m);
    const auto propped = force_method(arm(72, 30e6 * 1.728), tip).under(point(680, 72));
    row(levinson, "example 13.8: force of the spring, lb").meets("480", propped.reaction<0>() / N);
    CHECK(deflection(propped.line(), 72) == doctest::Approx(0.48).epsilon(1e-12));
}

TEST_CASE("Sarkar: propped cantilevers, released from the prop") {
    const auto method = force_method(arm(6), translation_at(6.0 * m));
    row(sarkar, "problem 12.1: prop reaction, kN").meets("7.407", method.under(uniform(10, 0, 4)).reaction<0>() / N);
    const auto both = method.under(uniform(30) + point(160, 3));
    row(sarkar, "problem 12.3: prop reaction, kN").meets("117.5", both.reaction<0>() / N);
    row(sarkar, "problem 12.3: fixed-end moment, kN m").meets("-315", end_moment(both.line(), left));
}

TEST_CASE("TU Delft: temperature, settlement, different stiffness of two spans") {
    // kN and m. 20 K over 0.2 m, the top warmer.
    const auto warm = sagitta::temperature_gradient(1e-5 / K, 20.0 * K, sagitta::warm_side::top, 0.2 * m);
    const auto heated = force_method(arm(6, 6000), translation_at(6.0 * m)).under(warm);
    CHECK(heated.displacement<0>() / m == doctest::Approx(0.018).epsilon(1e-12));  // the free tip drops by 18 mm
    row(delft, "temperature: reaction at B, kN").meets("1.5", heated.reaction<0>() / N);
    row(delft, "temperature: fixed-end moment at A, kNm").meets("9", std::abs(end_moment(heated.line(), left)));

    // Pinned at A, fixed at C, released from B, which settles by 24 mm; and as a simple beam, released from the clamp
    // too.
    const auto pier = translation_at(4.0 * m).prescribed(24.0 * mm);
    const auto load = uniform(17, 0, 4);
    const auto one = force_method(mirrored(sagitta::propped_cantilever(10.0 * m, stiffness(34000))), pier).under(load);
    const auto both = force_method(simple(10, 34000), pier, rotation_at(10.0 * m)).under(load);
    row(delft, "settlement: M_B, kNm").meets("128", moment(one.line(), 4));
    row(delft, "settlement: M_B, kNm").meets("128", moment(both.line(), 4));
    CHECK(deflection(both.line(), 4) == doctest::Approx(0.024).epsilon(1e-12));

    const row support_moment(delft, "stiffness EI and n EI: support moment, F L");
    for (const double n : {1.0, 0.2, 0.5, 2.0, 5.0, 20.0}) {
        const auto spans = continuous_beam(2.0 * m, stiffness(1))
                               .support_at(0.0 * m)
                               .support_at(1.0 * m)
                               .support_at(2.0 * m)
                               .rigidity_from(1.0 * m, stiffness(n))
                               .hinge_at(1.0 * m);
        const auto M = force_method(spans, relative_rotation_at(1.0 * m)).under(point(1, 0.5)).redundant<0>();
        support_moment.equals(n / (n + 1) * 3 / 16, -M / (N * m));
        if (n == 1) support_moment.meets("0.09375", -M / (N * m));
    }
}

TEST_CASE("Erochko: fixed-end moments, of a simple beam and of a cantilever") {
    const double L = 7.5, a = 2.5, b = L - a, EI = 3;
    const auto by_rotations = force_method(simple(L, EI), rotation_at(0.0 * m), rotation_at(L * m));
    const auto by_tip = force_method(arm(L, EI), translation_at(L * m), rotation_at(L * m));
    const auto compare = [&](const char* label, double M_left, const loads& acting) {
        const row moments(erochko, label);
        // A clockwise couple at the left end is the sagging moment there.
        moments.equals(-M_left, by_rotations.under(acting).redundant<0>() / (N * m));
        moments.equals(-M_left, end_moment(by_tip.under(acting).line(), left));
    };
    compare("E1: P at the centre, end moments", 7 * L / 8, point(7, L / 2));
    compare("E2: P at a, left moment", 7 * a * b * b / (L * L), point(7, a));
    compare("E5: w from 0 to a, left moment", 5 * a * a * (6 * L * L - 8 * a * L + 3 * a * a) / (12 * L * L),
            uniform(5, 0, a));
    compare("E7: triangle with its peak at the centre, end moments", 5 * 4 * L * L / 96,
            linear(0, 4, 0, L / 2) + linear(4, 0, L / 2, L));
    // The right end sinks, or is turned: hogging at the left for the first, the far moment for the second (which the
    // table gives for the left end turned).
    const auto moved = force_method(arm(L, EI), translation_at(L * m).prescribed(0.01 * m), rotation_at(L * m));
    row(erochko, "E8: settlement Delta, end moments")
        .equals(-6 * EI * 0.01 / (L * L), end_moment(moved.under(loads()).line(), left));
    const auto turned = force_method(arm(L, EI), translation_at(L * m), rotation_at(L * m).prescribed(0.01 * rad));
    row(erochko, "E10: rotation theta of the left end, far moment")
        .equals(2 * EI * 0.01 / L, std::abs(end_moment(turned.under(loads()).line(), left)));
}
