// AISC Steel Construction Manual, Table 3-23 (13th to 15th edition), "Shears, moments and deflections": the
// diagrams of single spans. The formulas are from memory, each proved by an exact integration before it was
// written down here. The numbers are those of the diagrams; values are magnitudes unless a remark says
// otherwise. The diagrams of overhangs and continuous beams are in aisc_supports.cpp.
#include "published/plain.hpp"
#include "support/published.hpp"

#include <cmath>

using namespace published;

namespace {

const source aisc{"AISC Steel Construction Manual, Table 3-23 (from memory)"};

struct values {
    double L, EI, w, P, P2;
};
const values beams[] = {{10, 1000, 2, 7, 4}, {7.2, 17.5e6, 4.5e3, 22e3, 9e3}};
const double fractions[] = {1.0 / 3, 0.04, 0.25, 0.5, 0.72, 0.97};

auto simple(const values& b) { return sagitta::simple_beam(b.L * m, stiffness(b.EI)); }
auto fixed(const values& b) { return sagitta::fixed_beam(b.L * m, stiffness(b.EI)); }
/// The manual's propped beam: pinned at x = 0, fixed at x = L.
auto propped(const values& b) { return mirrored(sagitta::propped_cantilever(b.L * m, stiffness(b.EI))); }

const values unit{1, 1, 1, 1, 1};

}  // namespace

TEST_CASE("AISC diagram 2: simple beam, load increasing to one end") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        const auto line = simple(b).under(linear(0, w, 0, L));
        const auto size = sizes_of(line);
        const double W = w * L / 2;
        for (const double f : fractions) {
            const double x = f * L;
            row(aisc, "2a: deflection at x")
                .equals(W * x * (3 * std::pow(x, 4) - 10 * L * L * x * x + 7 * std::pow(L, 4)) / (180 * EI * L * L),
                        deflection(line, x), size.deflection);
        }
        row(aisc, "2b: reaction R1").equals(W / 3, reaction(line, left), size.force);
    }
    const auto line = simple(unit).under(linear(0, 1, 0, 1));
    const double W = 0.5;
    const auto lowest = greatest_deflection(line);
    const auto highest_moment = greatest_moment(line);
    row(aisc, "2c: max deflection, W L^3/EI").meets("0.0130", lowest.value / m / W);
    row(aisc, "2d: location of max deflection, L").meets("0.519", lowest.at / m);
    row(aisc, "2e: max moment, W L").meets("0.1283", highest_moment.value / W);
    row(aisc, "2f: location of max moment, L").meets("0.5774", highest_moment.at);
}

TEST_CASE("AISC diagram 3: simple beam, load increasing to the centre") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        const auto line = simple(b).under(linear(0, w, 0, L / 2) + linear(w, 0, L / 2, L));
        const auto size = sizes_of(line);
        const double W = w * L / 2;
        const auto lowest = greatest_deflection(line);
        row(aisc, "3a: max deflection").equals(W * std::pow(L, 3) / (60 * EI), lowest.value / m);
        row(aisc, "3a: max deflection").equals(w * std::pow(L, 4) / (120 * EI), deflection(line, L / 2));
        row(aisc, "3b: max moment").equals(W * L / 6, moment(line, L / 2));
        for (const double f : fractions) {
            const double x = f * L / 2;
            row(aisc, "3c: deflection at x < L/2")
                .equals(W * x * std::pow(5 * L * L - 4 * x * x, 2) / (480 * EI * L * L), deflection(line, x),
                        size.deflection);
        }
    }
}

TEST_CASE("AISC diagram 4: simple beam, uniform load over a part") {
    for (const auto& v : beams) {
        const auto [L, EI, w, P, P2] = v;
        for (const double f : fractions) {
            const double a = f * L;
            const double b = (1 - f) * L / 9;
            const double c = L - a - b;
            const auto line = simple(v).under(uniform(w, a, a + b));
            const auto size = sizes_of(line);
            const double R1 = w * b * (2 * c + b) / (2 * L);
            row(aisc, "4a: reaction R1").equals(R1, reaction(line, left), size.force);
            const double x = a + R1 / w;
            row(aisc, "4b: max moment").equals(R1 * (a + R1 / (2 * w)), moment(line, x), size.moment);
            row(aisc, "4b: max moment").equals(0, shear(line, x), size.force);
        }
    }
}

TEST_CASE("AISC diagram 5: simple beam, uniform load at one end") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        for (const double f : fractions) {
            const double a = f * L;
            const auto line = simple(b).under(uniform(w, 0, a));
            const auto size = sizes_of(line);
            const double R1 = w * a * (2 * L - a) / (2 * L);
            row(aisc, "5a: reaction R1").equals(R1, reaction(line, left), size.force);
            for (const double g : {3.0 / 7, 1.0 / 3, 0.1, 0.6, 0.9}) {
                double x = g * a;
                row(aisc, "5b: deflection at x < a")
                    .equals(w * x *
                                (a * a * std::pow(2 * L - a, 2) - 2 * a * x * x * (2 * L - a) + L * std::pow(x, 3)) /
                                (24 * EI * L),
                            deflection(line, x), size.deflection);
                x = a + g * (L - a);
                row(aisc, "5c: deflection at x > a")
                    .equals(w * a * a * (L - x) * (4 * x * L - 2 * x * x - a * a) / (24 * EI * L), deflection(line, x),
                            size.deflection);
            }
            row(aisc, "5d: max moment").equals(R1 * R1 / (2 * w), moment(line, R1 / w), size.moment);
            row(aisc, "5d: max moment").equals(0, shear(line, R1 / w), size.force);
        }
    }
}

TEST_CASE("AISC diagrams 6, 10 and 11: simple beam, two loads") {
    for (const auto& v : beams) {
        const auto [L, EI, w, P, P2] = v;
        for (const double f : fractions) {
            const double a = f * L / 2;
            const double b = (1 - f) * L / 3;
            const double w2 = 3.5 * w;
            const auto two_parts = simple(v).under(uniform(w, 0, a) + uniform(w2, L - b, L));
            row(aisc, "6a: reaction R1, w1 over a, w2 over the last c")
                .equals((w * a * (2 * L - a) + w2 * b * b) / (2 * L), reaction(two_parts, left),
                        sizes_of(two_parts).force);
            const auto equal = simple(v).under(point(P, a) + point(P, L - b));
            row(aisc, "10a: reaction R1").equals(P * (L - a + b) / L, reaction(equal, left), sizes_of(equal).force);
            const auto unequal = simple(v).under(point(P, a) + point(P2, L - b));
            row(aisc, "11a: reaction R1")
                .equals((P * (L - a) + P2 * b) / L, reaction(unequal, left), sizes_of(unequal).force);
        }
    }
}

TEST_CASE("AISC diagram 7: simple beam, load at the centre") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        const auto line = simple(b).under(point(P, L / 2));
        const auto size = sizes_of(line);
        const auto lowest = greatest_deflection(line);
        row(aisc, "7a: max deflection").equals(P * std::pow(L, 3) / (48 * EI), lowest.value / m);
        for (const double f : fractions) {
            const double x = f * L / 2;
            row(aisc, "7b: deflection at x < L/2")
                .equals(P * x * (3 * L * L - 4 * x * x) / (48 * EI), deflection(line, x), size.deflection);
        }
        row(aisc, "7c: end slope").equals(P * L * L / (16 * EI), slope(line, 0));
        row(aisc, "7c: end slope").equals(-P * L * L / (16 * EI), slope(line, L));
    }
}

TEST_CASE("AISC diagram 13: pinned and fixed, load at the centre") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        const auto line = propped(b).under(point(P, L / 2));
        const auto lowest = greatest_deflection(line);
        row(aisc, "13a: reaction R1").equals(5 * P / 16, reaction(line, left));
        row(aisc, "13b: fixed-end moment").equals(-3 * P * L / 16, end_moment(line, right));
        row(aisc, "13c: deflection at the load").equals(7 * P * std::pow(L, 3) / (768 * EI), deflection(line, L / 2));
        row(aisc, "13d: max deflection").equals(P * std::pow(L, 3) / (48 * EI * std::sqrt(5.0)), lowest.value / m);
        row(aisc, "13d: max deflection").equals(L / std::sqrt(5.0), lowest.at / m);
    }
    const auto lowest = greatest_deflection(propped(unit).under(point(1, 0.5)));
    row(aisc, "13e: max deflection, P L^3/EI").meets("0.009317", lowest.value / m);
    row(aisc, "13f: location of max deflection, L").meets("0.4472", lowest.at / m);
}

TEST_CASE("AISC diagram 14: pinned and fixed, load at any point") {
    for (const auto& v : beams) {
        const auto [L, EI, w, P, P2] = v;
        for (const double f : fractions) {
            const double a = f * L;
            const double b = L - a;
            const auto line = propped(v).under(point(P, a));
            const auto size = sizes_of(line);
            row(aisc, "14a: reaction R1")
                .equals(P * b * b * (a + 2 * L) / (2 * std::pow(L, 3)), reaction(line, left), size.force);
            row(aisc, "14b: reaction R2")
                .equals(P * a * (3 * L * L - a * a) / (2 * std::pow(L, 3)), reaction(line, right), size.force);
            row(aisc, "14c: fixed-end moment")
                .equals(-P * a * b * (a + L) / (2 * L * L), end_moment(line, right), size.moment);
            row(aisc, "14d: deflection at the load")
                .equals(P * a * a * std::pow(b, 3) * (3 * L + a) / (12 * EI * std::pow(L, 3)), deflection(line, a),
                        size.deflection);
        }
        for (const double f : {1.0 / 3, 0.05, 0.1, 0.2, 0.4}) {
            const double a = f * L;
            const auto lowest = greatest_deflection(propped(v).under(point(P, a)));
            const row max(aisc, "14e: max deflection, a < 0.414 L");
            max.equals(P * a * std::pow(L * L - a * a, 3) / (3 * EI * std::pow(3 * L * L - a * a, 2)),
                       lowest.value / m);
            max.equals(L * (L * L + a * a) / (3 * L * L - a * a), lowest.at / m, L);
        }
    }
    for (const auto& v : {values{7, 77, 3, 11, 2}, beams[1]}) {
        const auto [L, EI, w, P, P2] = v;
        for (const double f : {0.5, 0.42, 0.6, 0.75, 0.95}) {
            const double a = f * L;
            const double b = L - a;
            const auto lowest = greatest_deflection(propped(v).under(point(P, a)));
            const row max(aisc, "14f: max deflection, a > 0.414 L");
            max.equals(P * a * b * b / (6 * EI) * std::sqrt(a / (2 * L + a)), lowest.value / m);
            max.equals(L * std::sqrt(a / (2 * L + a)), lowest.at / m, L);
        }
    }
}

TEST_CASE("AISC diagram 16: fixed at both ends, load at the centre") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        const auto line = fixed(b).under(point(P, L / 2));
        const auto size = sizes_of(line);
        row(aisc, "16a: max deflection").equals(P * std::pow(L, 3) / (192 * EI), greatest_deflection(line).value / m);
        row(aisc, "16b: moment at the centre and the ends").equals(P * L / 8, moment(line, L / 2));
        row(aisc, "16b: moment at the centre and the ends").equals(-P * L / 8, end_moment(line, left));
        row(aisc, "16b: moment at the centre and the ends").equals(-P * L / 8, end_moment(line, right));
        for (const double f : fractions) {
            const double x = f * L / 2;
            row(aisc, "16c: deflection at x < L/2")
                .equals(P * x * x * (3 * L - 4 * x) / (48 * EI), deflection(line, x), size.deflection);
        }
    }
}

TEST_CASE("AISC diagram 17: fixed at both ends, load at any point") {
    for (const auto& v : beams) {
        const auto [L, EI, w, P, P2] = v;
        for (const double f : fractions) {
            const double a = f * L;
            const double b = L - a;
            const auto line = fixed(v).under(point(P, a));
            const auto size = sizes_of(line);
            row(aisc, "17a: reaction R1")
                .equals(P * b * b * (3 * a + b) / std::pow(L, 3), reaction(line, left), size.force);
            row(aisc, "17b: fixed-end moment M1").equals(-P * a * b * b / (L * L), end_moment(line, left), size.moment);
            row(aisc, "17c: moment at the load")
                .equals(2 * P * a * a * b * b / std::pow(L, 3), moment(line, a), size.moment);
            row(aisc, "17d: deflection at the load")
                .equals(P * std::pow(a * b, 3) / (3 * EI * std::pow(L, 3)), deflection(line, a), size.deflection);
        }
        for (const double f : {2.0 / 3, 0.52, 0.6, 0.8, 0.95}) {
            const double a = f * L;
            const double b = L - a;
            const auto lowest = greatest_deflection(fixed(v).under(point(P, a)));
            const row max(aisc, "17e: max deflection, a > b");
            max.equals(2 * P * std::pow(a, 3) * b * b / (3 * EI * std::pow(3 * a + b, 2)), lowest.value / m);
            max.equals(2 * a * L / (3 * a + b), lowest.at / m, L);
        }
    }
}

TEST_CASE("AISC diagram 20: one end guided, the other fixed, uniform load") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, P2] = b;
        // By symmetry the guided end is the middle of a fixed beam twice as long.
        const auto line = sagitta::fixed_beam(2 * L * m, stiffness(EI)).under(uniform(w));
        const auto size = sizes_of(line);
        row(aisc, "20a: max deflection").equals(w * std::pow(L, 4) / (24 * EI), greatest_deflection(line).value / m);
        row(aisc, "20b: moment at the deflected end").equals(w * L * L / 6, moment(line, L), size.moment);
        row(aisc, "20c: moment at the fixed end").equals(-w * L * L / 3, end_moment(line, right), size.moment);
        for (const double f : fractions) {
            const double x = f * L;
            row(aisc, "20d: deflection at x")
                .equals(w * std::pow(L * L - x * x, 2) / (24 * EI), deflection(line, L + x), size.deflection);
        }
    }
}

TEST_CASE("AISC diagram 32: simple span with end moments, uniform load") {
    for (const auto& b : beams) {
        const auto [l, EI, w, P, P2] = b;
        for (const double f : {0.015, 0.04, 0.1, -0.03, 0.0}) {
            const double M1 = f * w * l * l;
            const double M2 = 0.025 * w * l * l;
            // Hogging end moments: counterclockwise at the left end, clockwise at the right one.
            const auto line = simple(b).under(uniform(w) + couple(-M1, 0) + couple(M2, l));
            const auto size = sizes_of(line);
            const double place = l / 2 + (M1 - M2) / (w * l);
            row(aisc, "32a: max moment M3")
                .equals(w * l * l / 8 - (M1 + M2) / 2 + std::pow(M1 - M2, 2) / (2 * w * l * l), moment(line, place),
                        size.moment);
            row(aisc, "32a: max moment M3").equals(0, shear(line, place), size.force);
            for (const double g : fractions) {
                const double x = g * l;
                const double bracket = std::pow(x, 3) - (2 * l + 4 * M1 / (w * l) - 4 * M2 / (w * l)) * x * x +
                                       12 * M1 * x / w + std::pow(l, 3) - 8 * M1 * l / w - 4 * M2 * l / w;
                row(aisc, "32b: deflection at x")
                    .equals(w * x / (24 * EI) * bracket, deflection(line, x), size.deflection);
            }
        }
    }
}

TEST_CASE("AISC diagrams 40 to 42: moving loads on a simple beam, at their worst place") {
    for (const auto& b : beams) {
        const double l = b.L, P = b.P, P2 = b.P2;
        // The greatest moment under a load while the train moves: at the section at x, of all positions.
        const auto worst_at = [&](double x, const sagitta::load_train<>& train) {
            return sagitta::extremes_of_train(sagitta::influence_of_moment(simple(b), x * m), train).greatest;
        };
        const sagitta::load_train<> one{{P * N, 0.0 * m}};
        row(aisc, "40a: max moment under one load").equals(P * l / 4, worst_at(l / 2, one).value / (N * m));
        CHECK(worst_at(0.49 * l, one).value < worst_at(l / 2, one).value);
        CHECK(worst_at(0.51 * l, one).value < worst_at(l / 2, one).value);

        for (const double f : {1.0 / 3, 0.05, 0.2, 0.4, 0.55}) {
            const double a = f * l;
            const auto check = [&](const row& published, double second, double value) {
                const sagitta::load_train<> two{{P * N, 0.0 * m}, {second * N, a * m}};
                // The published section is the worst one within reach, and the first load stands right over it.
                const double x = (l - second * a / (P + second)) / 2;
                const auto worst = worst_at(x, two);
                published.equals(value, worst.value / (N * m));
                CHECK(worst.at / m == doctest::Approx(x).epsilon(1e-12));
                CHECK(worst_at(x - l / 100, two).value < worst.value);
                CHECK(worst_at(x + l / 100, two).value < worst.value);
            };
            const double x = (l - P2 * a / (P + P2)) / 2;
            check(row(aisc, "41a: max moment under two equal loads, a < 0.586 l"), P,
                  P * std::pow(l - a / 2, 2) / (2 * l));
            check(row(aisc, "42a: moment under the larger of two loads"), P2, (P + P2) * x * x / l);
        }
    }
}
