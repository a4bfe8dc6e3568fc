// greatest_deflection against the reference solution: sampled at 2000 places, every summit refined there.
#include <support/doctest_quantities.hpp>
#include <support/reference.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/extremes.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;
using boost::multiprecision::cpp_bin_float_50;
using reference::hold;

namespace {

/// A place where the magnitude of the deflection is greater than on both sides.
struct summit {
    cpp_bin_float_50 at, value;
    cpp_bin_float_50 size() const { return value < 0 ? cpp_bin_float_50(-value) : value; }
};

/// Where the slope is zero between two places at which it has different signs, by bisection.
cpp_bin_float_50 level_place(const reference::beam<cpp_bin_float_50>& exact, cpp_bin_float_50 low,
                             cpp_bin_float_50 high) {
    const bool rising = exact.value(reference::quantity::slope, low) > 0;
    for (int i = 0; i < 100; ++i) {
        const cpp_bin_float_50 middle = (low + high) / 2;
        ((exact.value(reference::quantity::slope, middle) > 0) == rising ? low : high) = middle;
    }
    return (low + high) / 2;
}

/// All summits, the greatest first.
std::vector<summit> summits(hold left, hold right, double L, double EI, const std::vector<scene::load>& loads) {
    const auto exact = scene::reference_of<cpp_bin_float_50>(left, right, L, EI, loads);
    std::vector<summit> found;
    const auto consider = [&](const cpp_bin_float_50& x) {
        found.push_back({x, exact.value(reference::quantity::deflection, x)});
    };
    consider(0);
    consider(L);
    for (const auto& l : loads) {
        if (l.what != scene::kind::offset && l.what != scene::kind::kink) continue;
        for (const auto which : {reference::from::left, reference::from::right}) {
            found.push_back({l.from, exact.value(reference::quantity::deflection, l.from, which)});
        }
    }
    constexpr int samples = 2000;
    cpp_bin_float_50 at = 0;
    bool rising = exact.value(reference::quantity::slope, at) > 0;
    for (int i = 1; i <= samples; ++i) {
        const cpp_bin_float_50 next = cpp_bin_float_50(L) * i / samples;
        const bool rises_there = exact.value(reference::quantity::slope, next) > 0;
        if (rising != rises_there) consider(level_place(exact, at, next));
        at = next;
        rising = rises_there;
    }
    std::sort(found.begin(), found.end(), [](const summit& a, const summit& b) { return a.size() > b.size(); });
    return found;
}

struct worst_errors {
    double value = 0, place = 0;
    int beams = 0, places = 0;
};

template <class Beam>
void compare(const Beam& b, hold left, hold right, const std::vector<scene::load>& loads, worst_errors& worst) {
    const double L = b.span().value();
    const double EI = b.EI().value();
    const auto greatest = greatest_deflection(b.under(scene::list_of(loads)));
    const auto expected = summits(left, right, L, EI, loads);
    const auto error_of_value =
        static_cast<double>(abs((cpp_bin_float_50(greatest.value.value()) - expected[0].value) / expected[0].value));
    // Two summits of one size: either may be named, so only the size is compared.
    const bool tie = expected[0].size() - expected[1].size() <= 1e-10 * expected[0].size();
    if (tie) {
        CHECK(std::abs(std::abs(greatest.value.value()) / static_cast<double>(expected[0].size()) - 1) <= 1e-12);
        return;
    }
    CHECK(error_of_value <= 1e-12);
    worst.value = std::max(worst.value, error_of_value);
    ++worst.beams;

    // The line is flat where the moment nearly vanishes: there the place is as ill-defined as the loads make it.
    const auto exact = scene::reference_of<double>(left, right, L, EI, loads);
    double moment = 0;
    for (int i = 0; i <= 100; ++i) {
        moment = std::max(moment, std::abs(exact.value(reference::quantity::moment, L * i / 100)));
    }
    const double here = std::abs(exact.value(reference::quantity::moment, greatest.at.value()));
    const bool at_an_end = expected[0].at == 0 || expected[0].at == L;
    if (!at_an_end && here < 1e-2 * moment) return;
    const auto error_of_place = static_cast<double>(abs(cpp_bin_float_50(greatest.at.value()) - expected[0].at)) / L;
    CHECK(error_of_place <= 1e-12);
    worst.place = std::max(worst.place, error_of_place);
    ++worst.places;
}

}  // namespace

TEST_CASE("the greatest deflection of random superpositions is found, none missed") {
    constexpr std::uint64_t seed = 31;
    CAPTURE(seed);
    scene::chance random(seed);
    worst_errors worst;
    for (int i = 0; i < 60; ++i) {
        const double L = i % 3 == 0 ? 7.2 : random.in(0.01, 1000);
        scene::with_each_beam(L, 1.75e7, [&](const std::string& name, const auto& b, hold left, hold right) {
            CAPTURE(name);
            CAPTURE(i);
            compare(b, left, right, scene::random_loads(random, random.whole(2, 8), L, 1.75e7, left, right), worst);
        });
    }
    MESSAGE("greatest errors: value " << worst.value << " of itself on " << worst.beams << " beams, place "
                                      << worst.place << " of the span on " << worst.places);
    CHECK(worst.beams > 300);
    CHECK(worst.places > 250);
}

TEST_CASE("one load of each kind, anywhere, on every beam") {
    constexpr std::uint64_t seed = 32;
    CAPTURE(seed);
    scene::chance random(seed);
    worst_errors worst;
    const double L = 7.2;
    for (int i = 0; i < 60; ++i) {
        const auto one = scene::random_load(random, L, 1.75e7);
        scene::with_each_beam(L, 1.75e7, [&](const std::string& name, const auto& b, hold left, hold right) {
            if (!scene::can_act(one, left, right)) return;
            CAPTURE(name);
            CAPTURE(scene::text(one));
            compare(b, left, right, {one}, worst);
        });
    }
    MESSAGE("greatest errors: value " << worst.value << ", place " << worst.place);
}

TEST_CASE("two opposite peaks in different places: the greater in magnitude, its sign kept") {
    constexpr auto b = simple_beam(10.0 * m, 1.0e4 * kN * m2);
    // Antisymmetric but for one percent.
    constexpr auto down =
        greatest_deflection(b.under(point_load(10.1 * kN, at(2.5 * m)) + point_load(-10.0 * kN, at(7.5 * m))));
    constexpr auto up =
        greatest_deflection(b.under(point_load(10.0 * kN, at(2.5 * m)) + point_load(-10.1 * kN, at(7.5 * m))));
    static_assert(down.value > 0.0 * m && down.at < 5.0 * m);
    static_assert(up.value < 0.0 * m && up.at > 5.0 * m);
    CHECK(std::abs(down.value.value() + up.value.value()) < 1e-12 * down.value.value());
    CHECK(std::abs(down.at.value() + up.at.value() - 10) < 1e-11);
}

TEST_CASE("of equal peaks the leftmost") {
    // Ends both sink: the same deflection along the whole beam.
    constexpr auto level = greatest_deflection(
        simple_beam(4.0 * m, 1.0 * kN * m2).under(settlement(end::left, 3.0 * mm) + settlement(end::right, 3.0 * mm)));
    static_assert(level.value == 3.0 * mm);
    static_assert(level.at == 0.0 * m);
    // Two summits of one size by symmetry, up in the middle; a long double keeps the tie no better than rounding.
    const auto pair =
        greatest_deflection(simple_beam(8.0 * m, 1.0 * kN * m2).under(applied_couple(1.0 * kN * m, at(4.0 * m))));
    CHECK(std::abs(std::abs(pair.at.value() - 4) - (4 - 4 / std::sqrt(3.0))) < 1e-11);
}

TEST_CASE("a beam that does not deflect") {
    constexpr auto b = simple_beam(4.0 * m, 1.0 * kN * m2);
    constexpr auto nothing = greatest_deflection(b.under(point_load(0.0 * kN, at(1.0 * m))));
    static_assert(nothing.value == 0.0 * m && nothing.at == 0.0 * m);
    const auto empty = greatest_deflection(b.under(load_list{}));
    CHECK(empty.value == 0.0 * m);
    CHECK(empty.at == 0.0 * m);
}

TEST_CASE("a load right at a support does not deflect the beam") {
    constexpr auto b = propped_cantilever(4.0 * m, 1.0 * kN * m2);
    static_assert(greatest_deflection(b.under(point_load(5.0 * kN, at(0.0 * m)))).value == 0.0 * m);
    static_assert(greatest_deflection(b.under(point_load(5.0 * kN, at(4.0 * m)))).value == 0.0 * m);
}

TEST_CASE("the greatest deflection at a free end") {
    // P L^3/(3 EI), w L^4/(8 EI): AISC Steel Construction Manual table 3-23 cases 22 and 19, from memory.
    constexpr auto arm = cantilever(3.0 * m, 900.0 * kN * m2);
    constexpr auto tip = greatest_deflection(arm.under(point_load(10.0 * kN, at(3.0 * m))));
    static_assert(tip.at == 3.0 * m);
    static_assert(abs(tip.value - 0.1 * m) < 1e-15 * m);
    constexpr auto other = greatest_deflection(mirrored(arm).under(uniform_load(10.0 * kN / m)));
    static_assert(other.at == 0.0 * m);
    static_assert(abs(other.value - 0.1125 * m) < 1e-15 * m);
}

TEST_CASE("settlements alone") {
    // A simple beam tilts; a fixed one bends, and stays between its supports.
    static_assert(greatest_deflection(simple_beam(6.0 * m, 1.0 * kN * m2).under(settlement(end::right, 5.0 * mm))).at ==
                  6.0 * m);
    static_assert(
        greatest_deflection(fixed_beam(6.0 * m, 1.0 * kN * m2).under(settlement(end::left, -5.0 * mm))).value ==
        -5.0 * mm);
    // A clamped end turned by r on a propped beam: v = r x (1-x/L)(2-x/L)/2, whose slope 3 s^2 - 6 s + 2 vanishes
    // at s = 1 - 1/sqrt(3); solved from EI v'''' = 0 for this test.
    const auto turned =
        greatest_deflection(propped_cantilever(6.0 * m, 1.0 * kN * m2).under(support_rotation(end::left, 2.0 * mrad)));
    const double s = 1 - 1 / std::sqrt(3.0);
    CHECK(std::abs(turned.at.value() - 6 * s) < 6e-12);
    CHECK(std::abs(turned.value.value() - 0.002 * 6 * s * (1 - s) * (2 - s) / 2) < 1e-12 * turned.value.value());
}

TEST_CASE("known summits of the beam tables") {
    // AISC Steel Construction Manual table 3-23, from memory; cases named as in its 13th to 15th editions.
    constexpr auto EI = 2.0e4 * kN * m2;
    constexpr auto w = 12.0 * kN / m;
    constexpr double wL4_over_EI = 12e3 * 6 * 6 * 6 * 6 / 2e7;
    // Case 1: 5 w L^4/(384 EI) at midspan.
    constexpr auto simple = greatest_deflection(simple_beam(6.0 * m, EI).under(uniform_load(w)));
    static_assert(simple.at == 3.0 * m);
    static_assert(abs(simple.value - 5 * wL4_over_EI / 384 * m) < 1e-14 * m);
    // Case 12: w L^4/(185 EI) at 0.4215 L from the support; exact value for x = L (1 + sqrt 33)/16.
    constexpr auto propped = greatest_deflection(mirrored(propped_cantilever(6.0 * m, EI)).under(uniform_load(w)));
    CHECK(relative(propped.at.value() / 6, (1 + std::sqrt(33.0)) / 16) < 1e-12);
    CHECK(relative(wL4_over_EI / propped.value.value(), 185) < 0.002);
    // Case 15: w L^4/(384 EI) at midspan.
    constexpr auto fixed = greatest_deflection(fixed_beam(6.0 * m, EI).under(uniform_load(w)));
    static_assert(abs(fixed.value - wL4_over_EI / 384 * m) < 1e-14 * m);
    // Case 2: triangle on a simple beam, 0.01304 W L^3/EI at 0.519 L, where W is the whole load.
    constexpr auto triangle = greatest_deflection(simple_beam(6.0 * m, EI).under(linear_load(0.0 * kN / m, w)));
    CHECK(relative(triangle.at.value() / 6, 0.519) < 0.001);
    CHECK(relative(2 * triangle.value.value() / wL4_over_EI, 0.01304) < 0.0005);
}

TEST_CASE("the summit of a narrow load lies under or beside it, also within a millionth of the span") {
    const double L = 7.2;
    worst_errors worst;
    for (const double a : {1e-6 * L, 0.3 * L, L - 2e-6 * L}) {
        const scene::load narrow{scene::kind::linear, 1e6, -3e5, a, a + 1e-6 * L};
        scene::with_each_beam(L, 1.75e7, [&](const std::string& name, const auto& b, hold left, hold right) {
            CAPTURE(name);
            CAPTURE(a);
            compare(b, left, right, {narrow}, worst);
        });
    }
}

TEST_CASE("a joint beside the summit does not stand in for it") {
    // The value at the joint differs from the summit's by less than rounding, its place by up to 1e-8 L.
    const double L = 7.2;
    worst_errors worst;
    for (const double beside : {-1e-8, -3e-9, -1e-9, -1e-10, 1e-10, 1e-9, 3e-9, 1e-8}) {
        CAPTURE(beside);
        const double a = (0.5 + beside) * L;
        compare(simple_beam(L * m, 1.75e4 * kN * m2), hold::pinned, hold::pinned,
                {{scene::kind::uniform, 1e4}, {scene::kind::point, 10, 0, a, 0}}, worst);
        compare(fixed_beam(L * m, 1.75e4 * kN * m2), hold::fixed, hold::fixed,
                {{scene::kind::uniform, 1e4}, {scene::kind::partial_uniform, 10, 0, L / 3, a}}, worst);
    }
}

TEST_CASE("joints close together do not hide a summit") {
    const double L = 7.2;
    worst_errors worst;
    std::vector<scene::load> rake;
    for (int i = 0; i <= 40; ++i) {
        const double a = L / 2 + (i - 20) * 1e-9 * L;
        rake.push_back({scene::kind::point, (i % 2 == 0 ? 1.0 : -1.0) * 1e3 * (i + 1), 0, a, 0});
    }
    scene::with_each_beam(L, 1.75e7, [&](const std::string& name, const auto& b, hold left, hold right) {
        CAPTURE(name);
        compare(b, left, right, rake, worst);
    });
}
