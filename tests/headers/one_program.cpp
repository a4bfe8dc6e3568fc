// Links two translation units that include all public headers in opposite orders, and compares what they see.
#include <sagitta/sagitta.hpp>

#include <fmt/format.h>

#include <one_program.hpp>

int main() {
    const answers first = answers_in_order();
    const answers second = answers_in_reverse();
    fmt::print("deflection {} mm and {} mm\n", first.deflection, second.deflection);
    // 5 w L^4/(384 EI) of the line load alone; the point load must add to it.
    const bool sensible = first.deflection > 8.97 && first.discrepancy < 1e-12 && first.text.ends_with(" mm");
    if (!sensible) fmt::print("the answers make no sense\n");
    if (!(first == second)) fmt::print("the two translation units disagree\n");
    return sensible && first == second ? 0 : 1;
}
