// No zero of deflection, slope or moment is missed on random superpositions: against dense sampling of the
// reference, disputed cases settled in high precision.
#include <support/reference.hpp>
#include <support/sampled_line.hpp>
#include <support/scene.hpp>

#include <sagitta/zeros.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

namespace {

using namespace sagitta;
using reference::hold;
using wide = boost::multiprecision::cpp_bin_float_50;

struct found {
    double place = 0, value = 0;
    long beams = 0, zeros = 0, changes = 0, places = 0, disputes = 0;
};

struct scene_of_beam {
    hold left, right;
    double L, EI;
    const std::vector<scene::load>& loads;
};

/// The sign of the exact answer at a place.
int exact_sign(const scene_of_beam& b, std::size_t response, double x, bool from_left) {
    const auto exact = scene::reference_of<wide>(b.left, b.right, b.L, b.EI, b.loads);
    const wide value = exact.value(static_cast<reference::quantity>(response), wide(x),
                                   from_left ? reference::from::left : reference::from::right);
    return value > 0 ? 1 : value < 0 ? -1 : 0;
}

/// only_changes: the list holds sign changes only (contraflexure).
template <class Places>
void check_zeros(const scene_of_beam& b, const scene::sampled_line& sampled, std::size_t response, const Places& zeros,
                 bool only_changes, found& worst) {
    constexpr int places = 200;
    double size = 0;
    sampled.sample(response, places,
                   [&](const auto&, double, double value) { size = std::max(size, std::abs(value)); });
    if (size == 0) return;

    // Ordered, and on the beam.
    for (std::size_t i = 0; i < zeros.size(); ++i) {
        CHECK(zeros[i].from.value() >= 0);
        CHECK(zeros[i].from.value() <= zeros[i].to.value());
        CHECK(zeros[i].to.value() <= b.L);
        if (i > 0) CHECK(zeros[i - 1].to.value() <= zeros[i].from.value());
    }

    // Every change of sign between samples has its zero, and every zero that changes the sign its change.
    const double noise = 1e-12 * size;
    int before = 0;
    double last = 0;
    bool last_from_left = false;
    std::size_t next_zero = 0;
    sampled.sample(response, places, [&](const scene::sampled_segment& segment, double x, double value) {
        const int sign = value > noise ? 1 : value < -noise ? -1 : 0;
        if (sign == 0) return;
        int changes = 0;
        int seen = 0;
        while (next_zero < zeros.size() && zeros[next_zero].from.value() <= x) {
            // At a joint the response may jump: what stands there lies between its two sides.
            if (zeros[next_zero].from.value() == x && x == segment.to && x != b.L) break;
            changes += zeros[next_zero].changes_sign ? 1 : 0;
            ++seen;
            ++next_zero;
        }
        worst.zeros += seen;
        if (before != 0) {
            const bool differs = before != sign;
            worst.changes += differs ? 1 : 0;
            if (differs != (changes % 2 == 1)) {
                // The sample may be wrong where the response hardly differs from zero.
                ++worst.disputes;
                const bool truly =
                    exact_sign(b, response, last, last_from_left) != exact_sign(b, response, x, x == segment.to);
                CAPTURE(response);
                CAPTURE(last);
                CAPTURE(x);
                CAPTURE(changes);
                CHECK(truly == (changes % 2 == 1));
            }
        }
        before = sign;
        last = x;
        last_from_left = x == segment.to;
    });

    // What is called a zero is one, and stands where the reference has it.
    for (std::size_t i = 0; i < zeros.size(); ++i) {
        const double x = zeros[i].from.value();
        if (zeros[i].to.value() != x) continue;
        bool jumps = false;
        double value = size;
        double product = 1;
        for (const bool from_left : {true, false}) {
            const auto& s = sampled.at(x, from_left);
            const double here = static_cast<double>(s.value(response, scene::real(x) - s.from));
            value = std::min(value, std::abs(here));
            product *= here / size;
            jumps = jumps || (x == s.from || x == s.to);
        }
        // At a joint the response may jump through zero.
        if (jumps && (only_changes || product < 0)) continue;
        worst.value = std::max(worst.value, value / size);
        CAPTURE(response);
        CAPTURE(x);
        CHECK(value <= 1e-12 * size);
        const auto& s = sampled.at(x, true);
        const double rate = std::abs(static_cast<double>(s.rate(response, scene::real(x) - s.from)));
        // The closed forms promise 1e-13 of the greatest value; the rate turns that into a distance.
        if (rate * b.L < 0.1 * size || jumps) continue;
        const double off = value / rate / b.L;
        CHECK(off <= 1e-12);
        worst.place = std::max(worst.place, off);
        ++worst.places;
    }
}

void random_superpositions(std::uint64_t seed, int count) {
    CAPTURE(seed);
    scene::chance random(seed);
    found worst;
    for (int i = 0; i < count; ++i) {
        const double L = i % 2 == 0 ? 7.2 : std::pow(10, random.in(-2, 3));
        const double EI = 1.75e7;
        scene::with_each_beam(L, EI, [&](const std::string& name, const auto& beam, hold left, hold right) {
            const auto loads = scene::random_loads(random, random.whole(2, 6), L, EI, left, right);
            const auto line = beam.under(scene::list_of(loads));
            const scene::sampled_line sampled(left, right, L, EI, loads);
            const scene_of_beam b{left, right, L, EI, loads};
            INFO(name);
            CAPTURE(i);
            INFO(scene::text(loads));
            check_zeros(b, sampled, 0, zeros_of_deflection(line), false, worst);
            check_zeros(b, sampled, 1, stationary_points(line), false, worst);
            check_zeros(b, sampled, 2, points_of_contraflexure(line), true, worst);
            ++worst.beams;
        });
    }
    MESSAGE(worst.beams << " beams: " << worst.changes << " changes of sign sampled, " << worst.zeros
                        << " zeros found, " << worst.disputes << " disputes; greatest errors: value " << worst.value
                        << " of the greatest, place " << worst.place << " of the span (" << worst.places
                        << " well conditioned)");
    CHECK(worst.changes > worst.beams);
}

}  // namespace

TEST_CASE("no zero is missed on random superpositions") { random_superpositions(81, scene::rounds(5000)); }
