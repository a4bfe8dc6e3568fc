// A footbridge of three spans by the force method, step by step as on paper: clamped at one abutment, one pier sunk,
// the other yielding. Invented.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

// Released: a simple beam from abutment to abutment. X0 and X1 are the piers, X2 is the moment at the clamp.
constexpr auto EI = 210.0 * GPa * 48200.0 * cm4;
constexpr auto method = force_method(simple_beam(30.0 * m, EI), translation_at(9.0 * m).prescribed(8.0 * mm),
                                     translation_at(21.0 * m).on_spring(40.0 * kN / mm), rotation_at(0.0 * m));
constexpr auto crowded = uniform_load(3.2 * kN / m) + partial_uniform_load(7.5 * kN / m, between(9.0 * m, 21.0 * m)) +
                         point_load(12.0 * kN, at(26.0 * m));
constexpr auto solved = method.under(crowded);
constexpr auto line = solved.line();

// Known while compiling, so they can be conditions of the build.
static_assert(solved.reciprocity_residual() < 1e-12);
static_assert(abs(greatest_deflection(line).value) < 12.0 * m / 250);

int main() {
    fmt::print("Displacements of the released beam, and what the redundants have to close\n");
    fmt::print("  at  9 m  {:>9.2f mm}    {:>9.2f mm}\n", solved.displacement<0>(), solved.required<0>());
    fmt::print("  at 21 m  {:>9.2f mm}    {:>9.2f mm}\n", solved.displacement<1>(), solved.required<1>());
    fmt::print("  at  0 m  {:>9.2f mrad}  {:>9.2f mrad}\n", solved.displacement<2>(), solved.required<2>());

    fmt::print("\nFlexibility coefficients, a column for each redundant\n");
    fmt::print("  {:>8.4f mm/kN}    {:>8.4f mm/kN}    {:>8.4f mm/kN/m}\n", solved.flexibility<0, 0>(),
               solved.flexibility<0, 1>(), solved.flexibility<0, 2>());
    fmt::print("  {:>8.4f mm/kN}    {:>8.4f mm/kN}    {:>8.4f mm/kN/m}\n", solved.flexibility<1, 0>(),
               solved.flexibility<1, 1>(), solved.flexibility<1, 2>());
    fmt::print("  {:>8.4f mrad/kN}  {:>8.4f mrad/kN}  {:>8.4f mrad/kN/m}\n", solved.flexibility<2, 0>(),
               solved.flexibility<2, 1>(), solved.flexibility<2, 2>());
    fmt::print("Reciprocal displacements agree within 1e-12: {}\n", solved.reciprocity_residual() < 1e-12);

    fmt::print("\nRedundants: piers {:.2f kN} and {:.2f kN} upward, clamp {:.2f kN*m}\n", solved.reaction<0>(),
               solved.reaction<1>(), solved.redundant<2>());

    fmt::print("\n{:>8}{:>14}{:>15}\n", "x", "deflection", "moment");
    for (const auto& x : {0.0 * m, 4.5 * m, 9.0 * m, 15.0 * m, 21.0 * m, 26.0 * m, 30.0 * m}) {
        fmt::print("{:>6.1f m}{:>11.2f mm}{:>10.2f kN*m}\n", x, line.deflection(x), line.moment(x));
    }
    const auto worst = greatest_deflection(line);
    fmt::print("Greatest deflection {:.2f mm} at {:.3f m}\n", worst.value, worst.at);
    fmt::print("Elastic small-deflection theory, service loads; local codes and a licensed engineer decide.\n");
}
