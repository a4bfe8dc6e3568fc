// Is the deflection within its limit whatever the stiffness turns out to be?
//
// Timber joists of an invented gym hall. Their EI is known to 10 % only, so it enters as an interval; every answer is
// then an interval that is guaranteed to hold the true one, rounding included, and no wider than 1/EI makes it.
// The guarantee needs a compiler that minds the rounding mode: -frounding-math (GCC), -ffp-model=strict (Clang).
#include <sagitta/sagitta.hpp>

#include <boost/numeric/interval.hpp>

#include <fmt/format.h>

#include <array>

namespace {

using namespace sagitta;
using namespace sagitta::units;
using bounds = boost::numeric::interval<double>;

/// Between so much less and so much more than a value.
bounds give_or_take(double share) { return {1 - share, 1 + share}; }

const char* verdict(const bounds& v, double limit) {
    if (v.upper() <= limit) return "guaranteed ok";
    if (v.lower() > limit) return "guaranteed exceeds";
    return "undecided";
}

}  // namespace

int main() {
    constexpr auto L = 5.4 * m;
    constexpr auto middle = L / 2;
    constexpr double limit = L / 300 / mm;
    const auto EI = give_or_take(0.10) * (1450.0 * kN * m2);
    const auto joist = simple_beam(L, EI);
    const bounds dead = joist.under(uniform_load(bounds(0.6) * kN / m)).deflection(middle) / mm;

    struct use {
        const char* name;
        double live;       // kN/m
        double apparatus;  // kN, at midspan
        bounds share;      // of these loads
    };
    const std::array<use, 4> uses{{
        {"storage of mats", 1.0, 0.0, 1.0},
        {"gymnastics", 1.2, 0.8, 1.0},
        {"gymnastics, load to 20 %", 1.2, 0.8, give_or_take(0.20)},
        {"concert", 2.4, 1.0, give_or_take(0.05)},
    }};

    fmt::print("An invented gym floor: simple timber joists, 5.4 m, EI = 1450 kN*m2 give or take 10 %.\n");
    fmt::print("Deflection at midspan against L/300 = {:.2f} mm.\n\n", limit);
    fmt::print("{:<26}{:>13}{:>13}   {}\n", "use", "at least mm", "at most mm", "verdict");
    for (const auto& u : uses) {
        const auto live = uniform_load(bounds(u.live) * kN / m) + point_load(u.apparatus * kN, at(middle));
        // Loads that go up and down together are one uncertain factor, best taken once, of their deflection.
        const bounds v = dead + u.share * (joist.under(live).deflection(middle) / mm);
        fmt::print("{:<26}{:>13.2f}{:>13.2f}   {}\n", u.name, v.lower(), v.upper(), verdict(v, limit));
    }
    fmt::print(
        "\nElastic small-deflection theory under service loads; whether a beam will do is decided by the local code\n"
        "and a licensed engineer.\n");
}
