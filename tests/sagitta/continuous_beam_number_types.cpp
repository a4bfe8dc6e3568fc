// The second method at large: random beams of every kind in double, float and long double against direct stiffness,
// errors in units of last place of the greatest value of each quantity, held to declared budgets.
//
// The normal run draws 20,000 beams. SAGITTA_BEAMS=2000000 in the environment asks for as many as one likes, and
// SAGITTA_FIRST_BEAM=12345 begins there: every beam is drawn from the seed and its own number i, which a failure
// prints.
#include <support/continuous_comparison.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <cstdlib>
#include <limits>
#include <string>

namespace {

namespace mp = boost::multiprecision;
using wide = mp::number<mp::cpp_bin_float<40>, mp::et_off>;

int asked_for(const char* name, int otherwise) {
    const char* const asked = std::getenv(name);
    return asked != nullptr ? std::atoi(asked) : otherwise;
}
int beams_wanted() { return asked_for("SAGITTA_BEAMS", 20000); }

/// Every number of a scene as N holds it, so that library and reference are given the same beam.
template <class N>
scene::continuous as_held_by(scene::continuous c) {
    const auto hold = [](double& x) {
        // g++ 12 at -O2 takes two neighbouring conversions to float and back for none.
        const volatile N held = static_cast<N>(x);
        x = static_cast<double>(held);
    };
    for (double* each : {&c.L, &c.EI, &c.kGA, &c.turning[0], &c.turning[1]}) hold(*each);
    for (auto& s : c.supports) {
        for (double* each : {&s.at, &s.stiffness, &s.settled}) hold(*each);
    }
    for (double& at : c.hinges) hold(at);
    for (auto& s : c.steps) {
        hold(s.from);
        hold(s.EI);
    }
    for (auto& l : c.loads) {
        for (double* each : {&l.size, &l.size_to, &l.from, &l.to}) hold(*each);
    }
    return c;
}

/// By how much the answers of the exact method itself change, relative to their greatest value, when every stiffness,
/// load and place of a load changes by a millionth of a millionth: what rounding does to any method. Looked at midway
/// between the places where something stands, so that no jump is seen from two sides.
double change_by_a_nudge(const scene::continuous& c, scene::chance& random) {
    constexpr double nudge = 1e-12;
    auto moved = c;
    const auto change = [&](double& x) { x *= 1 + nudge * random.in(-1, 1); };
    for (double* each : {&moved.EI, &moved.kGA, &moved.turning[0], &moved.turning[1]}) change(*each);
    for (auto& s : moved.supports) {
        change(s.stiffness);
        change(s.settled);
    }
    for (auto& s : moved.steps) change(s.EI);
    for (auto& l : moved.loads) {
        change(l.size);
        change(l.size_to);
        for (double* at : {&l.from, &l.to}) *at = std::clamp(*at + nudge * c.L * random.in(-1, 1), 0.0, c.L);
    }
    auto before = scene::reference_of<wide>(c);
    auto after = scene::reference_of<wide>(moved);
    if (!before.solve() || !after.solve()) return HUGE_VAL;
    double worst = 0;
    for (std::size_t q = 0; q < 4; ++q) {
        double size = 0, difference = 0;
        for (std::size_t i = 1; i < before.places().size(); ++i) {
            const double low = before.places()[i - 1], high = before.places()[i];
            if (high - low < 1e-9 * c.L) continue;
            const double x = (low + high) / 2;
            const auto what = static_cast<reference::quantity>(q);
            const wide a = before.value(what, wide(x)), b = after.value(what, wide(x));
            size = std::max(size, std::abs(static_cast<double>(a)));
            difference = std::max(difference, std::abs(static_cast<double>(wide(a - b))));
        }
        if (difference > 0) worst = std::max(worst, difference / size);
    }
    return worst / nudge;
}
/// The greatest change of ten nudges.
double conditioning(const scene::continuous& c, scene::chance& random) {
    double worst = 0;
    for (int i = 0; i < 10; ++i) worst = std::max(worst, change_by_a_nudge(c, random));
    return worst;
}

/// Draws beams until so many are solved. Errors are within the budget (in ulps), or within as many ulps times what the
/// beam makes of rounding of its input.
template <class N>
void hold_to(double budget, std::uint64_t seed, int count, const scene::continuous_kind& how) {
    CAPTURE(seed);
    const double ulp = static_cast<double>(std::numeric_limits<N>::epsilon());
    scene::found worst;
    int ill_conditioned = 0, refused = 0;
    for (int i = asked_for("SAGITTA_FIRST_BEAM", 0); worst.beams + ill_conditioned + refused < count; ++i) {
        CAPTURE(i);
        scene::chance random((seed << 32U) + static_cast<std::uint64_t>(i));
        const auto c = as_held_by<N>(scene::random_continuous(random, how).draw());
        INFO(scene::text(c));
        scene::found one;
        try {
            if (!scene::compare<N, wide>(c, random, one)) {
                ++worst.mechanisms;
                continue;
            }
        } catch (const sagitta::invalid_input&) {
            // Told to be a mechanism though it is none: a pivot that N cannot tell from rounding.
            ++refused;
            continue;
        }
        if (one.greatest() <= budget * ulp) {
            worst.take(one);
            continue;
        }
        ++ill_conditioned;
        INFO(scene::report(one));
        // A few random nudges do not find the worst one: ten times what they find.
        CHECK(one.greatest() <= budget * ulp * 10 * conditioning(c, random));
    }
    for (double& each : worst.error) each /= ulp;
    worst.reaction /= ulp;
    worst.end_moment /= ulp;
    MESSAGE("in ulps: " << scene::report(worst) << "; " << ill_conditioned
                        << " beyond the budget by what they make of rounded input, " << refused
                        << " taken for mechanisms");
    CHECK(ill_conditioned <= count / 200);
    CHECK(refused <= std::max(1, count / 1000));
}

}  // namespace

TEST_CASE("random beams in double: within 4,500 ulps of the greatest value (1e-12)") {
    scene::continuous_kind how;
    how.spring_decades = 2;
    hold_to<double>(4500, 9001, beams_wanted() * 35 / 100, how);
    hold_to<double>(4500, 9002, beams_wanted() * 35 / 100, {});
}

TEST_CASE("random beams in long double: within 4,500 ulps of the greatest value") {
    scene::continuous_kind how;
    how.spring_decades = 2;
    hold_to<long double>(4500, 9003, beams_wanted() * 15 / 100, how);
}

TEST_CASE("random beams in float: within 4,500 ulps of the greatest value") {
    scene::continuous_kind how;
    how.spring_decades = 1;
    how.shortest_part = 0.05;
    hold_to<float>(4500, 9004, beams_wanted() * 15 / 100, how);
}
