// Published values of continuous beams, and redundants found by compatibility from single spans.
#include "published/redundants.hpp"
#include "support/published.hpp"

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <vector>

using namespace published;

namespace {

/// The list of figures was seen in print; the coefficients are from memory.
const source design_aid{"American Wood Council, Design Aid No. 6 (2007) (coefficients from memory)"};
const source hicks{"T. G. Hicks, Civil Engineering Formulas, Table 2.1"};
const source clapeyron{"Wikipedia, Theorem of three moments (from memory)"};
const source karnovsky{"I. A. Karnovsky and O. Lebed, Advanced Methods of Structural Analysis, Fig. 10.2, Table 10.1"};
/// Read as recomputed in a public companion to the book.
const source levinson{"I. J. Levinson, Statics and Strength of Materials, Ch. 13"};
const source delft{"TU Delft, Bridging Course Structural Mechanics (open TeachBook), week 7 session 3"};

auto simple(double l, double EI) { return sagitta::simple_beam(l * m, stiffness(EI)); }

struct values {
    double l, EI, w, P;
};
const values beams[] = {{10, 1000, 2, 7}, {7.2, 17.5e6, 4.5e3, 22e3}};

/// Equal spans of 1 under w = 1.
auto equal_spans(int spans) {
    std::vector<double> supports;
    for (int i = 1; i < spans; ++i) supports.push_back(i);
    return on_supports(simple(spans, 1), uniform(1), supports);
}

}  // namespace

TEST_CASE("Design Aid 6, Figure 29: two equal spans, uniform load") {
    const auto beam = equal_spans(2);
    const auto lowest = greatest_deflection(beam.line);
    row(design_aid, "Figure 29: R1, w l").meets("0.375", reaction(beam.line, left));
    row(design_aid, "Figure 29: R2, w l").meets("1.25", beam.inner_reactions[0]);
    row(design_aid, "Figure 29: support moment, w l^2").meets("0.125", -moment(beam.line, 1));
    row(design_aid, "Figure 29: moment at 3l/8, w l^2").meets("0.0703", moment(beam.line, 0.375));
    row(design_aid, "Figure 29: max deflection, w l^4/EI").meets("0.0054", lowest.value / m);
    row(design_aid, "Figure 29: its location, l").meets("0.4215", std::min(lowest.at / m, 2 - lowest.at / m));

    // By symmetry the middle support neither turns nor deflects the beam: each span is a propped cantilever.
    const auto half = mirrored(sagitta::propped_cantilever(1.0 * m, stiffness(1))).under(uniform(1));
    const auto lowest_of_half = greatest_deflection(half);
    row(design_aid, "Figure 29: R1, w l").meets("0.375", reaction(half, left));
    row(design_aid, "Figure 29: R2, w l").meets("1.25", 2 * reaction(half, right));
    row(design_aid, "Figure 29: support moment, w l^2").meets("0.125", -end_moment(half, right));
    row(design_aid, "Figure 29: max deflection, w l^4/EI").meets("0.0054", lowest_of_half.value / m);
    row(design_aid, "Figure 29: its location, l").meets("0.4215", lowest_of_half.at / m);
}

TEST_CASE("Design Aid 6, Figure 30: two equal spans, a load in the middle of each") {
    for (const auto& [l, EI, w, P] : beams) {
        const auto beam = on_supports(simple(2 * l, EI), point(P, l / 2) + point(P, 3 * l / 2), {l});
        const auto size = sizes_of(beam.line);
        const row figure_30(design_aid, "Figure 30: R1, R2 and the support moment");
        figure_30.equals(5 * P / 16, reaction(beam.line, left), size.force);
        figure_30.equals(11 * P / 8, beam.inner_reactions[0], size.force);
        figure_30.equals(-3 * P * l / 16, moment(beam.line, l), size.moment);
    }
}

TEST_CASE("Two unequal spans, uniform load: Design Aid 6, Figure 31, and the equation of three moments") {
    for (const auto& [l, EI, w, P] : beams) {
        for (const double f : {1.0 / 3, 0.1, 0.25, 0.5, 0.8}) {
            const double l1 = f * l;
            const double l2 = l - l1;
            const auto beam = on_supports(simple(l, EI), uniform(w), {l1});
            const double at_support = moment(beam.line, l1);
            const double size = sizes_of(beam.line).moment;
            row(design_aid, "Figure 31: support moment")
                .equals(-w * (std::pow(l1, 3) + std::pow(l2, 3)) / (8 * (l1 + l2)), at_support, size);
            // M_A l + 2 M_B (l + l') + M_C l' = w l^3/4 + w l'^3/4 with hogging moments positive, M_A = M_C = 0.
            row(clapeyron, "moment at the middle support")
                .equals((w * std::pow(l1, 3) / 4 + w * std::pow(l2, 3) / 4) / (2 * (l1 + l2)), -at_support, size);
        }
    }
}

TEST_CASE("Hicks, Table 2.1: equal spans, uniform load on all") {
    const auto two = equal_spans(2);
    row(hicks, "2 spans: M over support 2, w l^2").equals(-1.0 / 8, moment(two.line, 1));
    row(hicks, "2 spans: end reaction, w l").equals(3.0 / 8, reaction(two.line, left));

    const auto three = equal_spans(3);
    row(hicks, "3 spans: M over support 2, w l^2").equals(-1.0 / 10, moment(three.line, 1));
    row(hicks, "3 spans: end reaction, w l").equals(4.0 / 10, reaction(three.line, left));

    const auto five = equal_spans(5);
    row(hicks, "5 spans: end reaction, w l").equals(15.0 / 38, reaction(five.line, left));
    row(hicks, "5 spans: shear right of support 2, w l").equals(20.0 / 38, shear(five.line, 1));
    row(hicks, "5 spans: M over support 2, w l^2").equals(-4.0 / 38, moment(five.line, 1));
    row(hicks, "5 spans: M over support 3, w l^2").equals(-3.0 / 38, moment(five.line, 2));

    const auto seven = equal_spans(7);
    row(hicks, "7 spans: end reaction, w l").equals(56.0 / 142, reaction(seven.line, left));
    row(hicks, "7 spans: shear right of support 2, w l").equals(75.0 / 142, shear(seven.line, 1));
    row(hicks, "7 spans: shear right of support 3, w l").equals(70.0 / 142, shear(seven.line, 2));
    row(hicks, "7 spans: shear right of support 4, w l").equals(71.0 / 142, shear(seven.line, 3));
}

TEST_CASE("Karnovsky and Lebed: influence line of a support moment, two equal spans") {
    sagitta::continuous_beam two_spans(2.0 * m, stiffness(1));
    two_spans.support_at(0.0 * m).support_at(1.0 * m).support_at(2.0 * m);
    const auto eta = sagitta::influence_of_moment(two_spans, 1.0 * m);
    // Printed as the size of a moment that hogs.
    const auto ordinate = [&](double u) { return -(eta.ordinate(u * m) / m); };
    row(karnovsky, "Fig. 10.2: ordinate at u = 2/5, l").meets("0.084", ordinate(0.4));
    row(karnovsky, "Fig. 10.2: ordinate at u = 3/5, l").meets("0.096", ordinate(0.6));
    row(karnovsky, "Fig. 10.2: ordinate at u = 4/5, l").meets("0.072", ordinate(0.8));
    // The rotation that the support moment undoes, in the released span.
    row(karnovsky, "Table 10.1: end rotation at u = 2/5, l^2/EI")
        .meets("0.056", -slope(simple(1, 1).under(point(1, 0.4)), 1));
}

TEST_CASE("Levinson, example 13.7: two equal spans by the force method") {
    // kip and ft
    const auto beam = on_supports(simple(12, 1), point(4, 3) + point(8, 9), {6});
    row(levinson, "example 13.7: R1, kip").meets("0.875", reaction(beam.line, left));
    row(levinson, "example 13.7: R2, kip").meets("8.25", beam.inner_reactions[0]);
    row(levinson, "example 13.7: R3, kip").meets("2.875", reaction(beam.line, right));
}

TEST_CASE("Levinson, example 13.8: cantilever whose tip rests on a spring") {
    // lb and in. The spring takes S, the beam P - S, and both give way alike: S/k = (P - S) f.
    const double P = 680;
    const double k = 1000;
    const auto beam = sagitta::cantilever(72.0 * m, stiffness(30e6 * 1.728));
    const double f = deflection(beam.under(point(1, 72)), 72);
    const double S = P * f / (f + 1 / k);
    row(levinson, "example 13.8: force of the spring, lb").meets("480", S);
    CHECK(deflection(beam.under(point(P - S, 72)), 72) == doctest::Approx(S / k).epsilon(1e-12));
}

TEST_CASE("TU Delft: temperature, settlement, different stiffness of two spans") {
    // kN and m
    {
        // 20 K over 0.2 m with 1e-5/K: a curvature of 0.001/m, hogging. Imposed, it bends the beam as a pair of
        // couples EI kappa at its ends does; the moment at the support is then the true one.
        const double EI = 6000;
        const double kappa = -20 * 1e-5 / 0.2;
        const auto imposed = couple(EI * kappa, 0) + couple(-EI * kappa, 6);
        const auto line = sagitta::propped_cantilever(6.0 * m, stiffness(EI)).under(imposed);
        row(delft, "temperature: reaction at B, kN").meets("1.5", std::abs(reaction(line, right)));
        row(delft, "temperature: fixed-end moment at A, kNm").meets("9", std::abs(end_moment(line, left)));
        // The free tip drops by 18 mm.
        const auto released = sagitta::cantilever(6.0 * m, stiffness(EI)).under(imposed);
        CHECK(deflection(released, 6) == doctest::Approx(0.018).epsilon(1e-12));
        CHECK(reaction(line, right) > 0);
    }
    {
        // Pinned at A, fixed at C, released from B, which settles by 24 mm. The source counts hogging positive
        // and prints -128.
        const auto released = mirrored(sagitta::propped_cantilever(10.0 * m, stiffness(34000)));
        const auto beam = on_supports(released, uniform(17, 0, 4), {4}, {0.024});
        row(delft, "settlement: M_B, kNm").meets("128", moment(beam.line, 4));
        CHECK(deflection(beam.line, 4) == doctest::Approx(0.024).epsilon(1e-12));
    }
    {
        const row support_moment(delft, "stiffness EI and n EI: support moment, F L");
        const double L = 1;
        for (const double n : {1.0, 0.2, 0.5, 2.0, 5.0, 20.0}) {
            const auto EI = [n](const auto& x) { return stiffness(x < 1.0 * m ? 1.0 : n); };
            const auto line_under = [&](const loads& list) {
                return integrate_moment_area(simple(2 * L, 1), list, EI, {L * m});
            };
            const auto load = point(1, L / 2);
            const double R = redundant_reactions(line_under, load, {L})[0];
            const double at_support = moment(line_under(load + point(-R, L)), L);
            support_moment.equals(n / (n + 1) * 3 / 16, -at_support);
            if (n == 1) support_moment.meets("0.09375", -at_support);
        }
    }
}
