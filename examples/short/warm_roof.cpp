// A roof beam whose top is warmer than its bottom: free ends bend, held ends are bent back. Invented.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

int main() {
    constexpr auto L = 20.0 * ft;
    constexpr auto EI = 29000.0 * ksi * 510.0 * in4;
    constexpr auto sun = temperature_gradient(11.7e-6 / K, 25.0 * K, warm_side::top, 18.0 * in);

    const auto show = [](const char* what, const auto& line) {
        const auto worst = greatest_deflection(line);
        fmt::print("{:<20}{:>9.3f in} at {:>6.2f ft}{:>12.2f kip*ft}\n", what, worst.value, worst.at,
                   extremes_of_moment(line).governing().value);
    };
    fmt::print("{:<20}{:>24}{:>19}\n", "", "greatest deflection", "moment");
    show("simple beam", simple_beam(L, EI).under(sun));
    show("cantilever", cantilever(L, EI).under(sun));
    show("propped cantilever", propped_cantilever(L, EI).under(sun));
    show("fixed at both ends", fixed_beam(L, EI).under(sun));
    fmt::print("Elastic small-deflection theory, service loads; local codes and a licensed engineer decide.\n");
}
