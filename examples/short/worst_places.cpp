// Where is it worst, when the loads peak in different places? An invented workshop floor beam.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

constexpr auto floor_beam = propped_cantilever(8.4 * m, 210.0 * GPa * 23130.0 * cm4);
constexpr auto hoist = point_load(38.0 * kN, at(5.6 * m)) - point_load(9.0 * kN, at(1.4 * m));
constexpr auto stored = partial_uniform_load(7.5 * kN / m, between(0.6 * m, 4.1 * m));
constexpr auto line = floor_beam.under(uniform_load(2.2 * kN / m) + hoist + stored);

// Known while compiling, so it can be a condition of the build.
static_assert(abs(greatest_deflection(line).value) < floor_beam.span() / 300);

int main() {
    fmt::print("A propped cantilever of {:.1f m}, clamped at the left\n\n", floor_beam.span());
    const auto v = extremes_of_deflection(line);
    const auto turn = extremes_of_slope(line);
    const auto M = extremes_of_moment(line);
    const auto V = extremes_of_shear(line);
    fmt::print("{:<11}{:>24}{:>28}\n", "", "greatest", "least");
    fmt::print("deflection {:>9.3f mm} at {:>6.3f m}  {:>9.3f mm} at {:>6.3f m}\n", v.greatest.value, v.greatest.at,
               v.least.value, v.least.at);
    fmt::print("slope      {:>9.3f mrad} at {:>4.3f m}  {:>9.3f mrad} at {:>4.3f m}\n", turn.greatest.value,
               turn.greatest.at, turn.least.value, turn.least.at);
    fmt::print("moment     {:>9.3f kN*m} at {:>4.3f m}  {:>9.3f kN*m} at {:>4.3f m}\n", M.greatest.value, M.greatest.at,
               M.least.value, M.least.at);
    fmt::print("shear      {:>9.3f kN} at {:>6.3f m}  {:>9.3f kN} at {:>6.3f m}\n", V.greatest.value, V.greatest.at,
               V.least.value, V.least.at);

    fmt::print("\nThe moment changes its sign at");
    for (const auto& place : points_of_contraflexure(line)) fmt::print(" {:.3f m}", place.from);
    fmt::print("; the line is level at");
    for (const auto& place : stationary_points(line)) fmt::print(" {:.3f m}", place.from);

    const auto middle = extremes_of_moment(line, between(2.0 * m, 4.0 * m));
    fmt::print(".\nBetween 2 m and 4 m the moment stays between {:.2f kN*m} and {:.2f kN*m}.\n", middle.least.value,
               middle.greatest.value);
    fmt::print("Cross-check by integration: {}\n", cross_check(line).greatest() < 1e-12 ? "within 1e-12" : "FAILS");
    fmt::print("Elastic small-deflection theory, service loads; local codes and a licensed engineer decide.\n");
}
