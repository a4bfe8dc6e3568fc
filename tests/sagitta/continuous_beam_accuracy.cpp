// Continuous beams in double against the stiffness reference: random beams on every kind of supports.
#include <support/continuous_scene.hpp>

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
using answer = reference::quantity;
using reference::from;

/// Greatest errors, relative to the greatest value of the quantity along the same beam.
struct found {
    std::array<double, 4> error{};  // deflection, slope, moment, shear
    double reaction = 0, end_moment = 0;
    int beams = 0, mechanisms = 0;

    [[nodiscard]] double greatest() const {
        return std::max({error[0], error[1], error[2], error[3], reaction, end_moment});
    }
    void take(const found& one) {
        for (std::size_t q = 0; q < 4; ++q) error[q] = std::max(error[q], one.error[q]);
        reaction = std::max(reaction, one.reaction);
        end_moment = std::max(end_moment, one.end_moment);
        ++beams;
    }
};

std::string report(const found& worst) {
    const auto number = [](double x) { return std::string(doctest::toString(x).c_str()); };
    return "deflection " + number(worst.error[0]) + ", slope " + number(worst.error[1]) + ", moment " +
           number(worst.error[2]) + ", shear " + number(worst.error[3]) + ", reactions " + number(worst.reaction) +
           ", end moments " + number(worst.end_moment) + " on " + std::to_string(worst.beams) + " beams; " +
           std::to_string(worst.mechanisms) + " mechanisms refused";
}

double value_of(const continuous_line<double>& line, answer what, double x, side which) {
    switch (what) {
        case answer::deflection:
            return line.deflection(x * m, which).value();
        case answer::slope:
            return line.slope(x * m, which).value();
        case answer::moment:
            return line.moment(x * m, which).value();
        case answer::shear:
            return line.shear(x * m, which).value();
    }
    return 0;
}

/// False where the beam is a mechanism, which both sides must say.
template <class T>
bool compare(const scene::continuous& c, scene::chance& random, found& one) {
    const auto described = scene::beam_of(c);
    const auto loads = scene::list_of(c.loads);
    auto reference = scene::reference_of<T>(c);
    if (!reference.solve()) {
        CHECK_THROWS_AS((void)described.under(loads), invalid_input);
        return false;
    }
    REQUIRE(reference.misfit() < 1e-25);
    const auto line = described.under(loads);
    std::vector<double> places = reference.places();
    for (std::size_t i = 1; i < reference.places().size(); ++i) {
        const double low = places[i - 1];
        places.push_back(low + (places[i] - low) * random.in(0, 1));
        places.push_back((low + places[i]) / 2);
    }
    std::array<double, 4> greatest{}, error{};
    for (const double x : places) {
        for (const bool is_left : {true, false}) {
            // Beyond an end the line answers for the support, which reactions and end moments below are about.
            if ((is_left && x == 0) || (!is_left && x == c.L)) continue;
            const auto which = is_left ? just_left : just_right;
            for (std::size_t q = 0; q < 4; ++q) {
                const auto what = static_cast<answer>(q);
                const T truth = reference.value(what, T(x), is_left ? from::left : from::right);
                const double computed = value_of(line, what, x, which);
                greatest[q] = std::max(greatest[q], std::abs(static_cast<double>(truth)));
                error[q] = std::max(error[q], std::abs(static_cast<double>(T(T(computed) - truth))));
            }
        }
    }
    // At the supports: their forces are jumps of the shear, and may carry a point load besides.
    double force = greatest[3], force_error = 0;
    for (const auto& s : c.supports) {
        const T truth = reference.reaction(s.at);
        force = std::max(force, std::abs(static_cast<double>(truth)));
        force_error =
            std::max(force_error, std::abs(static_cast<double>(T(T(line.reaction_at(s.at * m).value()) - truth))));
    }
    double moment = greatest[2], moment_error = 0;
    for (const bool at_left : {true, false}) {
        const T truth = reference.end_moment(at_left);
        const double computed = (at_left ? line.end_moment(end::left) : line.end_moment(end::right)).value();
        moment = std::max(moment, std::abs(static_cast<double>(truth)));
        moment_error = std::max(moment_error, std::abs(static_cast<double>(T(T(computed) - truth))));
    }
    // A slope is a difference of deflections and turns, a shear one of moments: where it is less than a thousandth
    // of them it cannot be better than their rounding. A quantity that vanishes but for rounding is measured by
    // what the others imply.
    const double span = c.mean_span;
    const double stiff = c.EI / span;
    const double implied = std::max({greatest[0] / span * stiff, greatest[1] * stiff, moment, force * span});
    const auto relative = [](double e, double size, double implied_size) {
        const double rounding = implied_size * (1e6 * std::numeric_limits<double>::epsilon());
        return e == 0 ? 0 : e / (size < rounding ? implied_size : size);
    };
    const double slope = std::max(greatest[1], 1e-3 * std::max(greatest[0] / span, moment / stiff));
    const double shear = std::max(greatest[3], 1e-3 * moment / span);
    one.error = {relative(error[0], greatest[0], implied * span / stiff), relative(error[1], slope, implied / stiff),
                 relative(error[2], greatest[2], implied), relative(error[3], shear, implied / span)};
    one.reaction = relative(force_error, std::max(force, shear), implied / span);
    one.end_moment = relative(moment_error, moment, implied);
    return true;
}

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
        if (!compare<T>(c, random, one)) {
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
