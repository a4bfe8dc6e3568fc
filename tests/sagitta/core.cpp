// A consumer that embeds the library without fmt.
#include <sagitta/core.hpp>

#ifdef FMT_VERSION
#error "core.hpp must not bring in fmt"
#endif

#include <doctest/doctest.h>

#include <cmath>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

struct roof_beam {
    double span_in_m;
    double load_in_kN_per_m;
};

}  // namespace

TEST_CASE("core.hpp alone answers questions about beams") {
    // 5 w L^4/(384 EI): AISC Steel Construction Manual table 3-23 case 1, from memory.
    constexpr auto EI = 210.0 * GPa * 8356.0 * cm4;
    std::vector<double> used;
    for (const auto& each : std::vector<roof_beam>{{5, 4}, {6, 4}, {7.2, 3.5}}) {
        load_list loads;
        loads += uniform_load(each.load_in_kN_per_m * kN / m);
        const auto line = simple_beam(each.span_in_m * m, EI).under(loads);
        const auto worst = greatest_deflection(line);
        CHECK(cross_check(line).greatest() < 1e-12);
        used.push_back(worst.value / m);
    }
    const double rigidity = 210e9 * 8356e-8;
    CHECK(std::abs(used[1] / (5 * 4e3 * 6 * 6 * 6 * 6 / (384 * rigidity)) - 1) < 1e-14);
    CHECK(used[0] < used[1]);
}
