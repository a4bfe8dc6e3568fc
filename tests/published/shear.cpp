// What shear deformation adds: the published part of the deflection, and a published share of it.
#include "published/plain.hpp"
#include "support/published.hpp"

using namespace published;

namespace {

const source roark_blodgett{"Roark's Formulas, sec. 8.10; Blodgett, Design of Welded Structures"};
const source boresi{"Boresi and Schmidt, Advanced Mechanics of Materials, Ch. 5 (as recomputed in a companion)"};

struct values {
    double l, EI, w, P, kGA;
};
const values beams[] = {{10, 1000, 2, 7, 300}, {7.2, 17.5e6, 4.5e3, 22e3, 4e6}};

/// The deflection at x with shear deformation less that without.
template <class Beam>
double shear_part(const Beam& b, const loads& acting, double kGA, double x) {
    return deflection(b.with_shear_rigidity(kGA * N).under(acting), x) - deflection(b.under(acting), x);
}

}  // namespace

TEST_CASE("the shear part of the greatest deflection") {
    for (const auto& [l, EI, w, P, kGA] : beams) {
        const auto simple = sagitta::simple_beam(l * m, stiffness(EI));
        const auto arm = sagitta::cantilever(l * m, stiffness(EI));
        row(roark_blodgett, "simple span, uniform load")
            .equals(w * l * l / (8 * kGA), shear_part(simple, uniform(w), kGA, l / 2));
        row(roark_blodgett, "simple span, load at centre")
            .equals(P * l / (4 * kGA), shear_part(simple, point(P, l / 2), kGA, l / 2));
        row(roark_blodgett, "cantilever, uniform load")
            .equals(w * l * l / (2 * kGA), shear_part(arm, uniform(w), kGA, l));
        row(roark_blodgett, "cantilever, load at tip").equals(P * l / kGA, shear_part(arm, point(P, l), kGA, l));
    }
}

TEST_CASE("Boresi and Schmidt, example 6: the share of shear in the deflection of a tip") {
    // Rectangular section, span five times the depth h, E = 200 GPa, G = 77.5 GPa, a load at the tip and one at
    // midspan; the shear area is 5/6 of the section.
    const double h = 0.2, width = 0.1, l = 5 * h, E = 200e9, G = 77.5e9, P = 1000;
    const auto arm = sagitta::cantilever(l * m, stiffness(E * width * h * h * h / 12));
    const auto both = point(P, l) + point(P, l / 2);
    const double kGA = 5.0 / 6 * G * width * h;
    const double whole = deflection(arm.with_shear_rigidity(kGA * N).under(both), l);
    row(boresi, "example 6: share of shear, %").meets("3.42", 100 * shear_part(arm, both, kGA, l) / whole);
}
