// What a continuous beam costs by its number of spans: time to solve and time to find the greatest deflection.
// Wall-clock times of one run: their ratios say that cost grows linearly, the seconds say how fast this machine is.
#include <sagitta/continuous_beam.hpp>
#include <sagitta/cross_check.hpp>
#include <sagitta/extremes.hpp>

#include <chrono>
#include <cstdio>

using namespace sagitta;
using namespace sagitta::units;

int main() {
    std::printf("%10s %12s %14s %14s %14s\n", "spans", "solve, s", "us a span", "greatest, s", "cross-check, s");
    for (int spans = 10; spans <= 100000; spans *= 10) {
        continuous_beam<> b(spans * 5.0 * m, 1.0e7 * N * m2);
        for (int i = 0; i <= spans; ++i) b.support_at(i * 5.0 * m);
        const load_list<> loads(uniform_load(1.0 * kN / m));
        const auto seconds = [](const auto& task) {
            const auto start = std::chrono::steady_clock::now();
            task();
            return std::chrono::duration<double>(std::chrono::steady_clock::now() - start).count();
        };
        const double solve = seconds([&] { (void)b.under(loads); });
        const auto line = b.under(loads);
        double check = 0;
        const double greatest = seconds([&] { (void)greatest_deflection(line); });
        const double crossed = seconds([&] { check = cross_check(line).greatest(); });
        std::printf("%10d %12.5f %14.2f %14.5f %14.5f\n", spans, solve, solve / spans * 1e6, greatest, crossed);
        if (!(check < 1e-12)) std::printf("the cross-check finds %g\n", check);
    }
}
