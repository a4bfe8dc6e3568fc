// A walkway on piles that give way: overhang, springs, a settling support, a hinge, a guided end. Invented.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

int main() {
    constexpr auto EI = 11.0 * GPa * 52000.0 * cm4;
    const auto jetty = continuous_beam(17.0 * m, EI)
                           .turning_spring(end::left, 4.0 * MN * m / rad)  // an abutment that yields a little
                           .support_at(0.0 * m)
                           .spring_at(5.0 * m, 9.0 * kN / mm)
                           .spring_at(10.0 * m, 9.0 * kN / mm)
                           .support_at(15.0 * m)
                           .settle_at(15.0 * m, 6.0 * mm)
                           .hinge_at(12.0 * m);
    const auto line = jetty.under(uniform_load(3.0 * kN / m) + point_load(6.0 * kN, at(17.0 * m)));

    fmt::print("{:>8}{:>12}{:>13}{:>13}\n", "x", "deflection", "moment", "support");
    for (const auto& x : {0.0 * m, 5.0 * m, 10.0 * m, 15.0 * m}) {
        fmt::print("{:>6.1f m}{:>9.2f mm}{:>8.2f kN*m}{:>10.2f kN}\n", x, line.deflection(x), line.moment(x),
                   line.reaction_at(x));
    }
    const auto v = extremes_of_deflection(line);
    fmt::print("\nGreatest deflection {:.2f mm} at {:.3f m}; at the hinge the slope jumps by {:.2f mrad}.\n",
               v.governing().value, v.governing().at,
               line.slope(12.0 * m, just_right) - line.slope(12.0 * m, just_left));

    const auto gate = beam_with_ends<held::guided, held::pinned>(3.0 * m, 0.2 * EI).under(uniform_load(1.2 * kN / m));
    fmt::print("The lifting gate, guided at its left end: {:.2f mm} there.\n", gate.deflection(0.0 * m));
    fmt::print("Elastic small-deflection theory, service loads; local codes and a licensed engineer decide.\n");
}
