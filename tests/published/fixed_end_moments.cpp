// Fixed-end moments and a few more formulas of public tables. Signs of the tables differ; what is compared is
// the internal moment, sagging positive.
#include "published/plain.hpp"
#include "support/published.hpp"

#include <cmath>

using namespace published;

namespace {

/// The table as its author publishes it, version 1.0.
const source erochko{"J. Erochko (Carleton University), Fixed End Moment Table v1.0"};
const source wikipedia_moments{"Wikipedia, Fixed end moment"};
const source wikipedia_deflection{"Wikipedia, Deflection (engineering) (from memory)"};

struct values {
    double L, EI, w, P, M;
};
const values beams[] = {{10, 1000, 2, 7, 3}, {7.2, 17.5e6, 4.5e3, 22e3, 8e3}};
const double fractions[] = {1.0 / 3, 0.04, 0.2, 0.5, 0.75, 0.96};

auto fixed(const values& b) { return sagitta::fixed_beam(b.L * m, stiffness(b.EI)); }

}  // namespace

TEST_CASE("Erochko: fixed-end moments") {
    for (const auto& v : beams) {
        const auto [L, EI, w, P, M] = v;
        const auto central = fixed(v).under(point(P, L / 2));
        const row e1(erochko, "E1: P at the centre, end moments");
        e1.equals(-P * L / 8, end_moment(central, left));
        e1.equals(-P * L / 8, end_moment(central, right));

        const auto turned = fixed(v).under(couple(M, L / 2));
        const row e3(erochko, "E3: couple M at the centre, end moments");
        e3.equals(M / 4, end_moment(turned, left));
        e3.equals(-M / 4, end_moment(turned, right));

        for (const double f : fractions) {
            const double a = f * L;
            const double b = L - a;
            const auto at_a = fixed(v).under(point(P, a));
            row(erochko, "E2: P at a, left moment")
                .equals(-P * a * b * b / (L * L), end_moment(at_a, left), sizes_of(at_a).moment);
            // The table prints M b (b - 2a)/L^2 with the arrows of its drawing.
            const auto turned_at_a = fixed(v).under(couple(M, a));
            row(erochko, "E4: couple M at a, left moment")
                .equals(M * b * (2 * a - b) / (L * L), end_moment(turned_at_a, left), sizes_of(turned_at_a).moment);
            const auto part = fixed(v).under(uniform(w, 0, a));
            row(erochko, "E5: w from 0 to a, left moment")
                .equals(-w * a * a * (6 * L * L - 8 * a * L + 3 * a * a) / (12 * L * L), end_moment(part, left),
                        sizes_of(part).moment);
            row(erochko, "E6: w from 0 to a, right moment")
                .equals(-w * std::pow(a, 3) * (4 * L - 3 * a) / (12 * L * L), end_moment(part, right),
                        sizes_of(part).moment);
        }

        const auto peak = fixed(v).under(linear(0, w, 0, L / 2) + linear(w, 0, L / 2, L));
        const row e7(erochko, "E7: triangle with its peak at the centre, end moments");
        e7.equals(-5 * w * L * L / 96, end_moment(peak, left));
        e7.equals(-5 * w * L * L / 96, end_moment(peak, right));

        const double Delta = 0.01;
        const auto sunk = fixed(v).under(loads{} + sagitta::settlement(right, Delta * m));
        const row e8(erochko, "E8: settlement Delta, end moments");
        e8.equals(-6 * EI * Delta / (L * L), end_moment(sunk, left));
        e8.equals(6 * EI * Delta / (L * L), end_moment(sunk, right));

        const double theta = 0.01;
        const auto turned_end = fixed(v).under(loads{} + sagitta::support_rotation(left, theta * rad));
        row(erochko, "E10: rotation theta of the left end, far moment")
            .equals(2 * EI * theta / L, std::abs(end_moment(turned_end, right)));
    }
}

TEST_CASE("Wikipedia: fixed-end moments") {
    for (const auto& b : beams) {
        const auto [L, EI, w, P, M] = b;
        const auto even = fixed(b).under(uniform(w));
        const row w1(wikipedia_moments, "uniform q, end moments");
        w1.equals(-w * L * L / 12, end_moment(even, left));
        w1.equals(-w * L * L / 12, end_moment(even, right));
        row(wikipedia_moments, "linear, 0 at the left end to q0, left end moment")
            .equals(-w * L * L / 30, end_moment(fixed(b).under(linear(0, w, 0, L)), left));
    }
}

TEST_CASE("Wikipedia: simple beam, force F at a from the closest support") {
    for (const auto& b : beams) {
        const auto [L, EI, w, F, M] = b;
        for (const double f : {1.0 / 3, 0.02, 0.1, 0.25, 0.45, 0.5}) {
            const double a = f * L;
            const auto lowest = greatest_deflection(sagitta::simple_beam(L * m, stiffness(EI)).under(point(F, a)));
            row(wikipedia_deflection, "max deflection")
                .equals(F * a * std::pow(L * L - a * a, 1.5) / (9 * std::sqrt(3.0) * L * EI), lowest.value / m);
            // The article's x1, measured from the support that is farther from the force.
            row(wikipedia_deflection, "its distance from the far support")
                .equals(std::sqrt((L * L - a * a) / 3), L - lowest.at / m, L);
        }
    }
}
