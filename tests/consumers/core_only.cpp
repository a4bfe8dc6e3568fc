// The library embedded without fmt.
#include <sagitta/core.hpp>

#include <cstdio>

#ifdef FMT_VERSION
#error "core.hpp brings fmt along"
#endif

using namespace sagitta;
using namespace sagitta::units;

int main() {
    constexpr auto joist = simple_beam(7.2 * m, 210.0 * GPa * 8356.0 * cm4);
    std::printf("%.2f mm\n", joist.under(uniform_load(4.5 * kN / m)).deflection(3.6 * m) / mm);
}
