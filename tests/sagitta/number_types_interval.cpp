// Intervals: inputs that are known between bounds give bounds on the answers.
#include <support/reference.hpp>

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <boost/numeric/interval.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cstddef>
#include <random>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

using bounds = boost::numeric::interval<double>;
using exact = boost::multiprecision::number<boost::multiprecision::cpp_bin_float<50>, boost::multiprecision::et_off>;
using reference::hold;

constexpr double L = 7.2, a = 3.1, from = 1.25, to = 6.5;

struct inputs {
    bounds EI, P, w;
};

/// The reference solution of one member.
reference::beam<exact> member(hold left, hold right, double EI, double P, double w) {
    reference::beam<exact> b(left, right, L, EI);
    b.add_force(P, a);
    b.add_line(w, w, 0, L);
    b.add_line(0, w, from, to);
    b.solve();
    return b;
}

/// The reference has its own rounding, some 1e-46 of the loads, where an answer is 0.
exact settled(const exact& value) { return value < 1e-35 && value > -1e-35 ? exact(0) : value; }

bool encloses(const bounds& outer, const exact& value) {
    const exact inner = settled(value);
    return outer.lower() <= inner && inner <= outer.upper();
}

/// Calls f(line, left, right) for each way to hold the beam.
template <class F>
void with_each_line(const inputs& given, const F& f) {
    const auto loads = point_load(given.P * N, at(a * m)) + uniform_load(given.w * N / m) +
                       linear_load(bounds(0) * N / m, given.w * N / m, between(from * m, to * m));
    const auto EI = given.EI * N * m2;
    f(simple_beam(L * m, EI).under(loads), hold::pinned, hold::pinned);
    f(propped_cantilever(L * m, EI).under(loads), hold::fixed, hold::pinned);
    f(fixed_beam(L * m, EI).under(loads), hold::fixed, hold::fixed);
    f(mirrored(cantilever(L * m, EI)).under(loads), hold::free, hold::fixed);
}

constexpr std::array sections{0.0, 1.0, 2.5, 3.1, 3.6, 4.8, 6.9, 7.2};

}  // namespace

TEST_CASE("a thousand members lie within the bounds: rigidity and loads known to 10 %") {
    const inputs given{{0.9 * 1.75e7, 1.1 * 1.75e7}, {19800, 24200}, {4050, 4950}};
    std::mt19937_64 engine(20240611);
    const auto within = [&](const bounds& b) {
        return b.lower() + (b.upper() - b.lower()) * (static_cast<double>(engine() >> 11U) * 0x1p-53);
    };
    with_each_line(given, [&](const auto& line, hold left, hold right) {
        std::vector<std::array<bounds, 4>> answers;
        for (const double x : sections) {
            answers.push_back({line.deflection(x * m).value(), line.slope(x * m).value(),
                               line.moment(x * m, just_right).value(), line.shear(x * m, just_right).value()});
        }
        const bounds reaction_left = line.reaction(end::left).value();
        const bounds reaction_right = line.reaction(end::right).value();
        const bounds end_moment = line.end_moment(end::right).value();
        int outside = 0;
        for (int i = 0; i < 1000; ++i) {
            const auto b = member(left, right, within(given.EI), within(given.P), within(given.w));
            for (std::size_t k = 0; k < sections.size(); ++k) {
                using reference::quantity;
                std::size_t which = 0;
                for (const auto what : {quantity::deflection, quantity::slope, quantity::moment, quantity::shear}) {
                    if (!encloses(answers[k][which++], b.value(what, sections[k]))) ++outside;
                }
            }
            if (!encloses(reaction_left, b.reaction_left())) ++outside;
            if (!encloses(reaction_right, b.reaction_right())) ++outside;
            if (!encloses(end_moment, b.end_moment_right())) ++outside;
        }
        CHECK(outside == 0);
    });
}

TEST_CASE("where only the rigidity is uncertain the bounds are the exact range to 1e-9") {
    const inputs given{{0.9 * 1.75e7, 1.1 * 1.75e7}, 22000, 4500};
    with_each_line(given, [&](const auto& line, hold left, hold right) {
        const auto soft = member(left, right, given.EI.lower(), 22000, 4500);
        const auto stiff = member(left, right, given.EI.upper(), 22000, 4500);
        for (const double x : {1.0, 2.5, 3.1, 3.6, 4.8, 6.5}) {
            CAPTURE(x);
            for (const auto what : {reference::quantity::deflection, reference::quantity::slope}) {
                const bounds found =
                    what == reference::quantity::slope ? line.slope(x * m).value() : line.deflection(x * m).value();
                const exact low = std::min(soft.value(what, x), stiff.value(what, x));
                const exact high = std::max(soft.value(what, x), stiff.value(what, x));
                CHECK(found.lower() <= low);
                CHECK(found.upper() >= high);
                CHECK(found.lower() >= low - 1e-9 * (high - low));
                CHECK(found.upper() <= high + 1e-9 * (high - low));
            }
            // What equilibrium and symmetry of stiffness decide is as certain as the loads.
            const bounds M = line.moment(x * m, just_right).value();
            CHECK(M.upper() - M.lower() <= 1e-9 * 22000 * L);
            CHECK(encloses(M, soft.value(reference::quantity::moment, x)));
        }
    });
}

TEST_CASE("a load known as one factor widens the deflection by that factor and no more") {
    const auto EI = bounds(1.75e7) * N * m2;
    const auto certain = simple_beam(L * m, EI).under(point_load(bounds(22000) * N, at(a * m)));
    const auto uncertain = certain.deflection(3.6 * m) * bounds(0.9, 1.1);
    const exact v = member(hold::pinned, hold::pinned, 1.75e7, 22000, 0).value(reference::quantity::deflection, 3.6);
    CHECK(encloses(uncertain.value(), v * exact(0.9)));
    CHECK(encloses(uncertain.value(), v * exact(1.1)));
    CHECK(uncertain.value().upper() <= v * exact(1.1) * (1 + 1e-9));
    CHECK(uncertain.value().lower() >= v * exact(0.9) * (1 - 1e-9));
}

TEST_CASE("a settlement bends a beam the same whatever its rigidity, and its moments in proportion") {
    const auto EI = bounds(0.9 * 1.75e7, 1.1 * 1.75e7) * N * m2;
    const auto line = fixed_beam(L * m, EI).under(settlement(end::right, bounds(0.01) * m));
    const bounds v = line.deflection(3.6 * m).value();
    CHECK(v.upper() - v.lower() < 1e-15);
    CHECK(encloses(v, exact(0.005)));
    // 12 EI s / L^3: the end that stays is pressed up by the end that sinks.
    const bounds R = line.reaction(end::left).value();
    const exact least = exact(EI.value().lower()) * 12 * exact(0.01) / (exact(L) * L * L);
    const exact most = exact(EI.value().upper()) * 12 * exact(0.01) / (exact(L) * L * L);
    CHECK(encloses(R, least));
    CHECK(encloses(R, most));
    CHECK(R.upper() - R.lower() <= (most - least) * (1 + 1e-9));
}

TEST_CASE("bounds that are certainly wrong are refused, by their middle") {
    CHECK_THROWS_WITH_AS(static_cast<void>(simple_beam(L * m, bounds(-2, -1) * N * m2)),
                         "EI = -1.5 N*m^2 must be greater than 0 N*m^2 and finite", invalid_input);
    const auto line = simple_beam(L * m, bounds(1, 2) * N * m2).under(uniform_load(bounds(1) * N / m));
    CHECK_THROWS_AS(static_cast<void>(line.deflection(bounds(8, 9) * m)), invalid_input);
    // Bounds that may or may not be wrong are refused by the interval type itself.
    CHECK_THROWS(static_cast<void>(simple_beam(L * m, bounds(-1, 1) * N * m2)));
}

TEST_CASE("numbers that have no order are known as such") {
    static_assert(is_number<bounds> && !is_ordered<bounds>);
    static_assert(is_ordered<double> && is_ordered<exact>);
}
