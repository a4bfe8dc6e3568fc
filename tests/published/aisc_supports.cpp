// AISC Steel Construction Manual, Table 3-23 (13th to 15th edition): the diagrams of overhanging and continuous
// beams, found by compatibility from single spans (redundants.hpp). From memory, like those in aisc.cpp.
#include "published/redundants.hpp"
#include "support/published.hpp"

#include <algorithm>
#include <cmath>

using namespace published;

namespace {

const source aisc{"AISC Steel Construction Manual, Table 3-23 (from memory)"};

struct values {
    double l, EI, w, P;
};
const values beams[] = {{10, 1000, 2, 7}, {7.2, 17.5e6, 4.5e3, 22e3}};
const double overhangs[] = {1.0 / 9, 0.03, 0.25, 0.5, 0.9};

}  // namespace

TEST_CASE("AISC diagram 25: uniform load on an overhang") {
    for (const auto& [l, EI, w, P] : beams) {
        for (const double f : overhangs) {
            const double a = f * l;
            const overhanging beam(l, a, EI, uniform(w, l, l + a));
            const auto size = sizes_of(beam.line);
            row(aisc, "25a: deflection at the free end")
                .equals(w * std::pow(a, 3) * (4 * l + 3 * a) / (24 * EI), deflection(beam.line, l + a),
                        size.deflection);
            row(aisc, "25b: upward deflection between the supports")
                .equals(-w * a * a * l * l / (18 * std::sqrt(3.0) * EI), deflection(beam.line, l / std::sqrt(3.0)),
                        size.deflection);
            row(aisc, "25b: upward deflection between the supports")
                .equals(0, slope(beam.line, l / std::sqrt(3.0)), size.slope);
            row(aisc, "25d: uplift R1").equals(-w * a * a / (2 * l), reaction(beam.line, left), size.force);
        }
    }
    const overhanging beam(1, 1, 1, uniform(1, 1, 2));
    row(aisc, "25c: upward deflection, w a^2 l^2/EI").meets("0.03208", -deflection(beam.line, 1 / std::sqrt(3.0)));
}

TEST_CASE("AISC diagrams 27 and 28: loads between the supports of an overhanging beam") {
    for (const auto& [l, EI, w, P] : beams) {
        for (const double f : overhangs) {
            const double x1 = f * l;
            const overhanging uniformly(l, x1, EI, uniform(w, 0, l));
            row(aisc, "27a: upward deflection of the overhang")
                .equals(-w * std::pow(l, 3) * x1 / (24 * EI), deflection(uniformly.line, l + x1),
                        sizes_of(uniformly.line).deflection);
            for (const double g : {1.0 / 3, 0.1, 0.5, 0.8, 0.95}) {
                const double a = g * l;
                const double b = l - a;
                const overhanging at_a(l, x1, EI, point(P, a));
                row(aisc, "28a: upward deflection of the overhang")
                    .equals(-P * a * b * x1 * (l + a) / (6 * EI * l), deflection(at_a.line, l + x1),
                            sizes_of(at_a.line).deflection);
            }
        }
    }
}

TEST_CASE("AISC diagram 29: two equal spans, uniform load on the first") {
    for (const auto& [l, EI, w, P] : beams) {
        const auto beam = on_supports(sagitta::simple_beam(2 * l * m, stiffness(EI)), uniform(w, 0, l), {l});
        const auto size = sizes_of(beam.line);
        row(aisc, "29a: R1").equals(7 * w * l / 16, reaction(beam.line, left), size.force);
        row(aisc, "29b: R2").equals(5 * w * l / 8, beam.inner_reactions[0], size.force);
        row(aisc, "29c: R3").equals(-w * l / 16, reaction(beam.line, right), size.force);
        row(aisc, "29d: max moment at 7l/16").equals(49 * w * l * l / 512, moment(beam.line, 7 * l / 16), size.moment);
        row(aisc, "29e: support moment").equals(-w * l * l / 16, moment(beam.line, l), size.moment);
    }
    const auto beam = on_supports(sagitta::simple_beam(2.0 * m, stiffness(1)), uniform(1, 0, 1), {1});
    const auto lowest = greatest_deflection(beam.line);
    row(aisc, "29f: max deflection, w l^4/EI").meets("0.0092", lowest.value / m);
    row(aisc, "29g: location of max deflection, l").meets("0.472", lowest.at / m);
}

TEST_CASE("AISC diagram 35: three equal spans, the outer two loaded") {
    const auto beam =
        on_supports(sagitta::simple_beam(3.0 * m, stiffness(1)), uniform(1, 0, 1) + uniform(1, 2, 3), {1, 2});
    const auto lowest = greatest_deflection(beam.line);
    row(aisc, "35a: RA, w l").meets("0.450", reaction(beam.line, left));
    row(aisc, "35b: RB, w l").meets("0.550", beam.inner_reactions[0]);
    row(aisc, "35c: moment in span AB, w l^2").meets("0.1013", moment(beam.line, 0.45));
    row(aisc, "35d: moment at B, w l^2").meets("-0.050", moment(beam.line, 1));
    row(aisc, "35e: max deflection, w l^4/EI").meets("0.0099", lowest.value / m);
    // The line is symmetric, so the greatest deflection may be found in either outer span.
    row(aisc, "35f: location of max deflection from A or D, l")
        .meets("0.479", std::min(lowest.at / m, 3 - lowest.at / m));
}

TEST_CASE("AISC diagram 37: four equal spans, the third unloaded") {
    const auto beam =
        on_supports(sagitta::simple_beam(4.0 * m, stiffness(1)), uniform(1, 0, 2) + uniform(1, 3, 4), {1, 2, 3});
    const auto& line = beam.line;
    // 0.37946: the source gives three digits rounded up.
    row(aisc, "37a: RA, w l").meets(raised("0.380"), reaction(line, left));
    row(aisc, "37b: RB, w l").meets("1.223", beam.inner_reactions[0]);
    row(aisc, "37c: RC, w l").meets("0.357", beam.inner_reactions[1]);
    row(aisc, "37d: RD, w l").meets("0.598", beam.inner_reactions[2]);
    row(aisc, "37e: RE, w l").meets("0.442", reaction(line, right));
    row(aisc, "37f: moment at B, w l^2").meets("-0.1205", moment(line, 1));
    row(aisc, "37g: moment at C, w l^2").meets("-0.0179", moment(line, 2));
    row(aisc, "37h: moment at D, w l^2").meets("-0.0580", moment(line, 3));
    // Greatest in a span where the shear is zero: R/w from the outer support, or the shear behind it over w.
    const double in_BC = 1 + shear(line, 1);
    row(aisc, "37i: moment in span AB, w l^2").meets("0.0720", moment(line, reaction(line, left)));
    row(aisc, "37j: moment in span BC, w l^2").meets("0.0611", moment(line, in_BC));
    row(aisc, "37k: moment in span DE, w l^2").meets("0.0977", moment(line, 4 - reaction(line, right)));
    const auto lowest = greatest_deflection(line);
    row(aisc, "37l: max deflection, w l^4/EI").meets("0.0094", lowest.value / m);
    row(aisc, "37m: location of max deflection from E, l").meets("0.475", 4 - lowest.at / m);
}

TEST_CASE("AISC diagram 39: four equal spans, all loaded") {
    const auto beam = on_supports(sagitta::simple_beam(4.0 * m, stiffness(1)), uniform(1), {1, 2, 3});
    const auto& line = beam.line;
    row(aisc, "39a: RA, w l").meets("0.393", reaction(line, left));
    row(aisc, "39b: RB, w l").meets("1.143", beam.inner_reactions[0]);
    // 0.92857: the source drops the digits behind the third.
    row(aisc, "39c: RC, w l").meets(truncated("0.928"), beam.inner_reactions[1]);
    row(aisc, "39d: moment at B, w l^2").meets("-0.1071", moment(line, 1));
    row(aisc, "39e: moment at C, w l^2").meets("-0.0714", moment(line, 2));
    row(aisc, "39f: moment in span AB, w l^2").meets("0.0772", moment(line, reaction(line, left)));
    row(aisc, "39g: moment in span BC, w l^2").meets("0.0364", moment(line, 1 + shear(line, 1)));
    const auto lowest = greatest_deflection(line);
    row(aisc, "39h: max deflection, w l^4/EI").meets("0.0065", lowest.value / m);
    row(aisc, "39i: location of max deflection from A or E, l")
        .meets("0.440", std::min(lowest.at / m, 4 - lowest.at / m));
}
