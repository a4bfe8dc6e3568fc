// What does a cover plate, a taper or the web's shear change? An invented crane girder, simply supported.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

int main() {
    constexpr auto L = 9.0 * m;
    constexpr auto EI = 210.0 * GPa * 33740.0 * cm4;
    constexpr auto girder = simple_beam(L, EI);
    constexpr auto loads = uniform_load(1.8 * kN / m) + point_load(60.0 * kN, at(4.2 * m));

    // A plate along the middle third raises the stiffness by half.
    const auto plated = continuous_beam(L, EI)
                            .support_at(0.0 * m)
                            .support_at(L)
                            .rigidity_from(3.0 * m, 1.5 * EI)
                            .rigidity_from(6.0 * m, EI);
    // A depth that grows to the middle: EI as a function of x, integrated to a tolerance.
    const auto deepened = [&](auto x) {
        const double from_middle = abs(x - L / 2) / (L / 2);
        return EI * (1.6 - 0.6 * from_middle);
    };
    const auto tapered = integrate_moment_area(girder, loads, deepened, {4.5 * m}, 1e-10);

    const auto show = [](const char* what, const auto& line) {
        const auto worst = greatest_deflection(line);
        fmt::print("{:<28}{:>10.2f mm} at {:.3f m}\n", what, worst.value, worst.at);
    };
    show("constant stiffness", girder.under(loads));
    show("plate along middle third", plated.under(loads));
    show("deepened to the middle", tapered);
    show("constant, with web in shear", girder.with_shear_rigidity(395.0 * MN).under(loads));
    fmt::print("Estimated error of the integration: {}\n",
               tapered.error_estimate() < 1e-10 ? "below 1e-10" : "too large");
    fmt::print("Elastic small-deflection theory, service loads; local codes and a licensed engineer decide.\n");
}
