// A crane drives over a track on four supports, and stored goods lie on any span: which position and which pattern is
// worst for the moment over the second support and in the second span? Invented.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

int main() {
    const auto track = continuous_beam(24.0 * m, 210.0 * GPa * 23130.0 * cm4)
                           .support_at(0.0 * m)
                           .support_at(7.0 * m)
                           .support_at(16.0 * m)
                           .support_at(24.0 * m);
    const auto over_support = influence_of_moment(track, 7.0 * m);
    const auto in_span = influence_of_moment(track, 11.5 * m);
    const auto reaction = influence_of_reaction(track, 7.0 * m);

    fmt::print("Influence ordinates\n{:>8}{:>18}{:>18}{:>16}\n", "load at", "moment at 7.0 m", "moment at 11.5 m",
               "reaction at 7.0");
    for (const auto& x : {3.5 * m, 7.0 * m, 11.5 * m, 16.0 * m, 20.0 * m}) {
        fmt::print("{:>6.1f m}{:>16.4f m}{:>16.4f m}{:>16.4f}\n", x, over_support.ordinate(x), in_span.ordinate(x),
                   reaction.ordinate(x).value());
    }

    const load_train<> crane{{74.0 * kN, 0.0 * m}, {74.0 * kN, 3.2 * m}, {52.0 * kN, 5.0 * m}, {52.0 * kN, 8.2 * m}};
    fmt::print("\nCrane of four wheels, first wheel at\n");
    const auto support = extremes_of_train(over_support, crane).least;
    const auto span = extremes_of_train(in_span, crane).greatest;
    const auto shear = extremes_of_train(influence_of_shear(track, 7.0 * m, just_right), crane).greatest;
    fmt::print("{:>8.3f m}: least moment at 7.0 m {:>20.2f kN*m}\n", support.at, support.value);
    fmt::print("{:>8.3f m}: greatest moment at 11.5 m {:>16.2f kN*m}\n", span.at, span.value);
    fmt::print("{:>8.3f m}: greatest shear right of 7.0 m {:>10.2f kN}\n", shear.at, shear.value);

    fmt::print("\nGoods, 12 kN/m on any span\n");
    const auto print = [](const char* what, const auto& pattern) {
        fmt::print("  {:<26}{:>10.2f kN*m} with spans", what, pattern.value);
        for (const auto i : pattern.spans) fmt::print(" {}", i + 1);
        fmt::print(" loaded\n");
    };
    print("least moment at 7.0 m", governing_patterns(over_support, 12.0 * kN / m).least);
    print("greatest moment at 11.5 m", governing_patterns(in_span, 12.0 * kN / m).greatest);
    print("least moment at 11.5 m", governing_patterns(in_span, 12.0 * kN / m).least);
    fmt::print("\nElastic small-deflection theory, service loads; local codes and a licensed engineer decide.\n");
}
