// Continuous beams in double against the stiffness reference: random beams on every kind of supports.
#include <support/continuous_comparison.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <string>
#include <vector>

namespace {

using namespace sagitta;
using namespace sagitta::units;
namespace mp = boost::multiprecision;
using exact = mp::number<mp::cpp_rational_backend, mp::et_off>;
using wide = mp::number<mp::cpp_bin_float<100>, mp::et_off>;
using scene::compare;
using scene::found;
using scene::report;

template <class T>
found random_beams(std::uint64_t seed, int count, const scene::continuous_kind& how, double bound) {
    CAPTURE(seed);
    scene::chance random(seed);
    scene::random_continuous draw(random, how);
    found worst;
    for (int i = 0; i < count; ++i) {
        CAPTURE(i);
        const auto c = draw.draw();
        INFO(scene::text(c));
        found one;
        if (!compare<double, T>(c, random, one)) {
            ++worst.mechanisms;
            continue;
        }
        INFO(report(one));
        CHECK(one.greatest() <= bound);
        worst.take(one);
    }
    return worst;
}

}  // namespace

TEST_CASE("random continuous beams on springs within 1e-12 of the greatest value") {
    scene::continuous_kind how;
    how.spring_decades = 2;  // springs from a hundredth to a hundred times as stiff as the beam
    const auto worst = random_beams<wide>(4711, 2400, how, 1e-12);
    MESSAGE("greatest errors: " << report(worst));
    CHECK(worst.beams > 2000);
    CHECK(worst.mechanisms > 20);
}

// A beam that hangs on springs a millionth as stiff as itself moves a million times as far as it bends.
TEST_CASE("random continuous beams on the softest and stiffest springs within 1e-12") {
    const auto worst = random_beams<wide>(4715, 1200, {}, 1e-12);
    MESSAGE("greatest errors, stiffnesses from 1e-6 to 1e6 of the beam's: " << report(worst));
}

TEST_CASE("random continuous beams on rigid supports") {
    scene::continuous_kind how;
    how.rigid_share = 1;
    how.spans_most = 12;
    const auto worst = random_beams<wide>(4713, 600, how, 1e-12);
    MESSAGE("greatest errors: " << report(worst));
}

TEST_CASE("random continuous beams, the reference in rational numbers") {
    scene::continuous_kind small;
    small.spans_most = 3;
    small.spring_decades = 2;
    const auto worst = random_beams<exact>(4712, 60, small, 1e-12);
    MESSAGE("greatest errors: " << report(worst));
}

// A part turns by its moments times its length and tilts by its movements over its length: rounding grows by the
// square of how short it is.
TEST_CASE("random continuous beams with parts shorter than a fiftieth of the mean span") {
    for (const double shortest : {1e-2, 1e-3, 1e-4, 1e-6}) {
        scene::continuous_kind how;
        how.rigid_share = 1;
        how.shortest_part = shortest;
        const auto worst = random_beams<wide>(4714, 300, how, 1e-15 / shortest / shortest);
        MESSAGE("shortest part " << shortest << " of the mean span, greatest errors: " << report(worst));
    }
}
