// Accuracy of the closed forms in double against the exact reference solution: every load case on every beam,
// loads and sections also within a millionth of the span from an end.
#include <support/reference.hpp>
#include <support/scene.hpp>

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <string>
#include <utility>
#include <vector>

namespace {

using boost::multiprecision::cpp_bin_float_100;
using boost::multiprecision::cpp_rational;
using reference::hold;
using reference::quantity;
using scene::kind;
using scene::load;

constexpr double bound = 1e-13;

/// Greatest errors found, relative to the greatest value of the quantity along the same beam.
struct found {
    double deflection = 0, slope = 0, moment = 0, shear = 0, reaction = 0, end_moment = 0;
    long comparisons = 0;
};

/// Loads of every kind over a span, a millionth of it from the ends and a millionth wide among them.
std::vector<load> every_load(double L, double EI, scene::chance& random) {
    const double P = 1.7 * EI / L / L / L;
    const double tiny = 1e-6 * L;
    std::vector<load> all;
    const double places[] = {0, tiny, L - tiny, L, L / 2, random.in(0, L), random.in(0, L)};
    for (const double a : places) {
        all.push_back({kind::point, P, 0, a, 0});
        all.push_back({kind::couple, -P * L, 0, a, 0});
        all.push_back({kind::kink, 0.004, 0, a, 0});
        all.push_back({kind::offset, -0.004 * L, 0, a, 0});
    }
    all.push_back({kind::uniform, P / L});
    all.push_back({kind::linear_whole, P / L, 0.0});
    all.push_back({kind::linear_whole, 0.0, P / L});
    all.push_back({kind::linear_whole, P / L, -0.7 * P / L});
    const double inside = random.in(tiny, L - 2 * tiny);
    const double a = random.in(0, L);
    const double b = random.in(0, L);
    const std::pair<double, double> stretches[] = {{0, tiny},        {L - tiny, L}, {inside, inside + tiny},
                                                   {tiny, 2 * tiny}, {0, 0.37 * L}, {0.4 * L, L},
                                                   {tiny, L - tiny}, {0, L},        {std::min(a, b), std::max(a, b)}};
    for (const auto& [from, to] : stretches) {
        all.push_back({kind::partial_uniform, P / L, 0, from, to});
        all.push_back({kind::linear, P / L, 0, from, to});
        all.push_back({kind::linear, 0, P / L, from, to});
        all.push_back({kind::linear, -P / L, P / L, from, to});
        all.push_back({kind::partial_curvature, 0.003 / L, 0, from, to});
    }
    all.push_back({kind::curvature, 0.003 / L});
    all.push_back({kind::settlement_left, 0.013 * L});
    all.push_back({kind::settlement_right, -0.013 * L});
    all.push_back({kind::rotation_left, 0.0021});
    all.push_back({kind::rotation_right, -0.0021});
    return all;
}

/// Sections at and beside the ends, at and beside the joints, and between.
std::vector<double> sections(double L, const std::vector<double>& joints, scene::chance& random) {
    std::vector<double> places{0, 1e-6 * L, L / 2, L - 1e-6 * L, L, std::nextafter(L, 0.0)};
    for (int i = 0; i < 3; ++i) places.push_back(random.in(0, L));
    for (const double joint : joints) {
        for (const double x : {joint, std::nextafter(joint, 0.0), std::nextafter(joint, L)}) places.push_back(x);
    }
    for (std::size_t i = 1; i < joints.size(); ++i) places.push_back((joints[i] + joints[i - 1]) / 2);
    std::sort(places.begin(), places.end());
    places.erase(std::unique(places.begin(), places.end()), places.end());
    return places;
}

/// The greatest magnitude of each quantity along a beam.
template <class T>
std::array<double, 4> greatest_values(const reference::beam<T>& exact, double L, const std::vector<double>& places) {
    std::vector<double> dense = places;
    for (int i = 1; i < 40; ++i) dense.push_back(L * i / 40);
    std::array<double, 4> greatest{};
    for (const double x : dense) {
        for (const auto which : {reference::from::left, reference::from::right}) {
            for (int q = 0; q < 4; ++q) {
                const double size = std::abs(static_cast<double>(exact.value(static_cast<quantity>(q), T(x), which)));
                auto& slot = greatest[static_cast<std::size_t>(q)];
                slot = std::max(slot, size);
            }
        }
    }
    return greatest;
}

template <class T>
double relative_error(double computed, const T& exact, double greatest) {
    const double error = std::abs(static_cast<double>(T(computed) - exact));
    if (greatest == 0) return error == 0 ? 0 : 1;  // a quantity that vanishes along the beam must be 0 exactly
    return error / greatest;
}

/// T is the number type in which the differences are formed.
template <class T, class Beam>
void compare(const Beam& b, hold left, hold right, const std::vector<load>& loads, scene::chance& random,
             found& worst) {
    using namespace sagitta;
    const double L = b.span().value();
    const auto line = b.under(scene::list_of(loads));
    const auto dense = scene::reference_of<cpp_bin_float_100>(left, right, L, b.EI().value(), loads);
    const auto exact = scene::reference_of<T>(left, right, L, b.EI().value(), loads);
    const auto places = sections(L, scene::joints_of(L, loads), random);
    auto greatest = greatest_values(dense, L, places);
    for (const auto& l : loads) {
        if (l.what != kind::curvature && l.what != kind::partial_curvature) continue;
        // Clamped ends undo an imposed curvature, all of it where it runs from end to end: what is left may vanish
        // along the whole beam, and the size is that of what they undo.
        const double turned = l.size * (l.what == kind::curvature ? L : l.to - l.from);
        const double implied[] = {turned * L, turned, turned * b.EI().value() / L, turned * b.EI().value() / L / L};
        for (std::size_t q = 0; q < 4; ++q) greatest[q] = std::max(greatest[q], implied[q]);
    }
    const auto note = [&](double& slot, double computed, const T& truth, quantity what) {
        slot = std::max(slot, relative_error(computed, truth, greatest[static_cast<std::size_t>(what)]));
        ++worst.comparisons;
    };
    for (const double place : places) {
        const T x(place);
        const auto at_x = place * units::m;
        for (const bool is_left : {true, false}) {
            const auto which = is_left ? just_left : just_right;
            const auto from = is_left ? reference::from::left : reference::from::right;
            note(worst.deflection, line.deflection(at_x, which).value(), exact.value(quantity::deflection, x, from),
                 quantity::deflection);
            note(worst.slope, line.slope(at_x, which).value(), exact.value(quantity::slope, x, from), quantity::slope);
            note(worst.moment, line.moment(at_x, which).value(), exact.value(quantity::moment, x, from),
                 quantity::moment);
            note(worst.shear, line.shear(at_x, which).value(), exact.value(quantity::shear, x, from), quantity::shear);
        }
    }
    note(worst.reaction, line.reaction(end::left).value(), exact.reaction_left(), quantity::shear);
    note(worst.reaction, line.reaction(end::right).value(), exact.reaction_right(), quantity::shear);
    note(worst.end_moment, line.end_moment(end::left).value(), exact.end_moment_left(), quantity::moment);
    note(worst.end_moment, line.end_moment(end::right).value(), exact.end_moment_right(), quantity::moment);
}

void check(const found& worst) {
    MESSAGE("greatest errors of " << worst.comparisons << " values: deflection " << worst.deflection << ", slope "
                                  << worst.slope << ", moment " << worst.moment << ", shear " << worst.shear
                                  << ", reactions " << worst.reaction << ", end moments " << worst.end_moment);
    CHECK(worst.deflection <= bound);
    CHECK(worst.slope <= bound);
    CHECK(worst.moment <= bound);
    CHECK(worst.shear <= bound);
    CHECK(worst.reaction <= bound);
    CHECK(worst.end_moment <= bound);
}

void each_load_on_each_beam(double L, double EI, scene::chance& random, found& worst) {
    scene::with_each_beam_and_guided(L, EI, [&](const std::string& name, const auto& b, hold left, hold right) {
        for (const auto& l : every_load(L, EI, random)) {
            if (!scene::can_act(l, left, right)) continue;
            found of_case;
            compare<cpp_rational>(b, left, right, {l}, random, of_case);
            CAPTURE(name);
            CAPTURE(L);
            CAPTURE(scene::text(l));
            CHECK(of_case.deflection <= bound);
            CHECK(of_case.slope <= bound);
            CHECK(of_case.moment <= bound);
            CHECK(of_case.shear <= bound);
            CHECK(of_case.reaction <= bound);
            CHECK(of_case.end_moment <= bound);
            worst.deflection = std::max(worst.deflection, of_case.deflection);
            worst.slope = std::max(worst.slope, of_case.slope);
            worst.moment = std::max(worst.moment, of_case.moment);
            worst.shear = std::max(worst.shear, of_case.shear);
            worst.reaction = std::max(worst.reaction, of_case.reaction);
            worst.end_moment = std::max(worst.end_moment, of_case.end_moment);
            worst.comparisons += of_case.comparisons;
        }
    });
}

}  // namespace

TEST_CASE("in double every load case on every beam is within 1e-13 of the greatest value") {
    constexpr std::uint64_t seed = 20240607;
    scene::chance random(seed);
    CAPTURE(seed);
    found worst;
    for (const double L : {1e-3, 0.1, 1.0, 7.2, 333.3, 1e4}) each_load_on_each_beam(L, 1.75e7, random, worst);
    for (const double EI : {1.3e-4, 6.1e12}) each_load_on_each_beam(7.2, EI, random, worst);
    check(worst);
}
