// Runs each counted function over the same sections of the same beam. By itself it checks that all of them
// agree; run.sh has callgrind count the instructions of each.
#include "counted.hpp"

#include <cmath>
#include <cstdio>

extern "C" {

[[gnu::noinline]] double library_evaluates_one_load(const one_load& line, double x) {
    return line.deflection(x * sagitta::units::m).value();
}
[[gnu::noinline]] double library_evaluates_three_loads(const three_loads& line, double x) {
    return line.deflection(x * sagitta::units::m).value();
}
[[gnu::noinline]] double library_composes_and_evaluates(const floor_beam& f, double x) {
    using namespace sagitta::units;
    const auto line =
        sagitta::simple_beam(f.L * m, f.EI * N * m2)
            .under(sagitta::uniform_load(f.w * N / m) + sagitta::point_load(f.P * N, sagitta::at(f.a * m)) +
                   sagitta::partial_uniform_load(f.q * N / m, sagitta::between(f.b * m, f.c * m)));
    return line.deflection(x * m).value();
}
}

int main() {
    const floor_beam f{7.2, 1.75e7, 4500, 22000, 3.0, 9000, 1.2, 4.8};
    const auto one = one_load_line(f.L, f.EI, f.P, f.a);
    const auto three = three_load_line(f);
    double greatest = 0;
    double gap = 0;
    const auto compare = [&](double library, double by_hand) {
        greatest = std::fmax(greatest, std::fabs(library));
        gap = std::fmax(gap, std::fabs(library - by_hand));
    };
    constexpr int sections = 1000;  // run.sh divides by this
    for (int i = 0; i < sections; ++i) {
        const double x = f.L * (i + 0.5) / sections;
        compare(library_evaluates_one_load(one, x), textbook_evaluates_one_load(f.L, f.EI, f.P, f.a, x));
        const double composed = library_composes_and_evaluates(f, x);
        compare(composed, library_evaluates_three_loads(three, x));
        compare(composed, textbook_evaluates_three_loads(f, x));
        compare(composed, same_formulas_unchecked(f, x));
        compare(composed, same_formulas_checked(f, x));
    }
    std::printf("greatest difference between library and hand: %.1e of the greatest deflection\n", gap / greatest);
    return gap <= 1e-13 * greatest ? 0 : 1;
}
