// Extremes of all four responses on random superpositions: never less than a dense sample of the reference, the
// value that stands there, and in the right place.
#include <support/reference.hpp>
#include <support/sampled_line.hpp>
#include <support/scene.hpp>

#include <sagitta/extremes.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <string>
#include <vector>

namespace {

using namespace sagitta;
using namespace sagitta::units;
using reference::hold;
using wide = boost::multiprecision::number<boost::multiprecision::cpp_bin_float<50>, boost::multiprecision::et_off>;

/// Greatest errors: of a sample above the extreme, of the value itself, of its place.
struct found {
    double missed = 0, value = 0, place = 0;
    long beams = 0, places = 0;
};

/// Errors of one response; the greatest is what matters.
struct errors {
    double missed = 0, value = 0, place = 0;
    int places = 0;

    [[nodiscard]] double greatest() const { return std::max({missed, value, place}); }
};

template <class Pair>
errors errors_of(const scene::sampled_line& sampled, std::size_t response, double L, double first, double last,
                 const Pair& extremes) {
    errors worst;
    double size = 0, rate_size = 0, most = -std::numeric_limits<double>::infinity(), least = -most;
    sampled.sample(response, 200, [&](const scene::sampled_segment& s, double x, double value) {
        size = std::max(size, std::abs(value));
        const auto rate = s.rate(response, scene::real(x) - s.from);
        rate_size = std::max(rate_size, std::abs(static_cast<double>(rate)));
        if (x < first || x > last || (x == first && s.to == x) || (x == last && s.from == x)) return;
        most = std::max(most, value);
        least = std::min(least, value);
    });
    if (size == 0) return worst;
    for (const bool up : {true, false}) {
        const auto& found_one = up ? extremes.greatest : extremes.least;
        const double x = found_one.at.value();
        const double value = found_one.value.value();
        if (!(x >= first && x <= last)) return {1, 1, 1, 0};
        worst.missed = std::max(worst.missed, (up ? most - value : value - least) / size);
        // The value of one side of that place.
        double error = std::numeric_limits<double>::infinity();
        for (const bool from_left : {true, false}) {
            const auto& s = sampled.at(x, from_left);
            const auto here = s.value(response, scene::real(x) - s.from);
            error = std::min(error, static_cast<double>(std::abs(value - here)) / size);
        }
        worst.value = std::max(worst.value, error);
        // Inside a segment the rate vanishes.
        const auto& s = sampled.at(x, true);
        const double inside = 1e-9 * L;
        if (x - s.from < inside || s.to - x < inside || x - first < inside || last - x < inside) continue;
        const auto at = scene::real(x) - s.from;
        const double rate = static_cast<double>(s.rate(response, at));
        const double curving = static_cast<double>(s.second_rate(response, at));
        // The closed forms promise 1e-13 of the greatest rate; how fast it changes turns that into a distance.
        if (std::abs(curving) * L < 0.1 * rate_size) continue;
        worst.place = std::max(worst.place, std::abs(rate / curving) / L);
        ++worst.places;
    }
    return worst;
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
            INFO(name);
            CAPTURE(i);
            INFO(scene::text(loads));
            const auto check = [&](std::size_t response, double first, double last, const auto& extremes) {
                auto one = errors_of(sampled, response, L, first, last, extremes);
                if (!(one.greatest() <= 1e-12)) {
                    // Narrow loads on long beams: long double may be what is wrong.
                    const scene::sampled_line exact(scene::reference_of<wide>(left, right, L, EI, loads), L, EI, loads);
                    one = errors_of(exact, response, L, first, last, extremes);
                }
                CAPTURE(response);
                CAPTURE(first);
                CAPTURE(last);
                CHECK(one.missed <= 1e-12);
                CHECK(one.value <= 1e-12);
                CHECK(one.place <= 1e-12);
                worst.missed = std::max(worst.missed, one.missed);
                worst.value = std::max(worst.value, one.value);
                worst.place = std::max(worst.place, one.place);
                worst.places += one.places;
            };
            check(0, 0, L, extremes_of_deflection(line));
            check(1, 0, L, extremes_of_slope(line));
            check(2, 0, L, extremes_of_moment(line));
            check(3, 0, L, extremes_of_shear(line));
            // Over a stretch that may begin or end at a joint.
            const auto joints = scene::joints_of(L, loads);
            double first = random.in(0, 0.5 * L);
            double last = random.in(0.5 * L, L);
            const double joint = joints[static_cast<std::size_t>(random.whole(0, static_cast<int>(joints.size()) - 1))];
            if (random.toss()) (joint < last ? first : last) = joint;
            if (!(first < last)) return;
            const auto stretch = between(first * m, last * m);
            check(2, first, last, extremes_of_moment(line, stretch));
            check(0, first, last, extremes_of_deflection(line, stretch));
            ++worst.beams;
        });
    }
    MESSAGE(worst.beams << " beams: greatest errors: a sample above the extreme " << worst.missed << ", value "
                        << worst.value << " of the greatest; place " << worst.place << " of the span (" << worst.places
                        << " well conditioned)");
}

}  // namespace

TEST_CASE("no extreme is missed on random superpositions") { random_superpositions(82, scene::rounds(5000)); }
