// Load trains: published rules for moving loads, and random trains on random beams against dense stepping.
#include <sagitta/load_train.hpp>

#include <support/continuous_scene.hpp>
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/influence_line.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <string>
#include <variant>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto simple = simple_beam(10.0 * m, 1.0e6 * N * m2);

struct tally {
    double missed = 0;     // by how much stepping found more, relative to the greatest ordinate times the loads
    double misplaced = 0;  // how far the effect at the place found is from the value found
    int trains = 0;
};

/// Steps the train over the beam, both sides of every joint included, and compares.
template <class Influence>
void compare(const Influence& eta, const load_train<>& train, double L, tally& found) {
    const auto exact = extremes_of_train(eta, train);
    double load = 0, first = std::numeric_limits<double>::infinity(), last = -first;
    for (const auto& axle : train.axles()) {
        load += std::abs(axle.force.value());
        first = std::min(first, axle.place.value());
        last = std::max(last, axle.place.value());
    }
    double ordinate = 0;
    for (int i = 0; i <= 200; ++i) {
        ordinate = std::max(ordinate, std::abs(eta.ordinate(std::min(L * i / 200, L) * m).value()));
    }
    const double size = ordinate * load;
    if (size == 0) return;  // nothing to find: the deflection at a rigid support
    const auto step_to = [&](double x) {
        const double value = effect_of_train(eta, train, x * m).value();
        found.missed = std::max(found.missed, (value - exact.greatest.value.value()) / size);
        found.missed = std::max(found.missed, (exact.least.value.value() - value) / size);
    };
    const double start = -last, stop = L - first;
    for (int i = 0; i <= 400; ++i) step_to(start + (stop - start) * i / 400);
    for (const auto& joint : eta.deflected().joints()) {
        for (const auto& axle : train.axles()) {
            const double x = (joint - axle.place).value();
            for (const double beside : {x - 1e-9 * L, x, x + 1e-9 * L}) step_to(beside);
        }
    }
    // The value found is that of the place found, however the place was rounded.
    for (const auto& one : {exact.greatest, exact.least}) {
        const double value = effect_of_train(eta, train, one.at, one.beside).value();
        found.misplaced = std::max(found.misplaced, std::abs(value - one.value.value()) / size);
    }
    ++found.trains;
}

}  // namespace

TEST_CASE("one load, two loads: the places of the published rules") {
    // AISC Steel Construction Manual, Table 3-23 diagrams 40 to 42, from memory: one load is worst at midspan; of two
    // loads P1 >= P2 at a distance a the moment under P1 is greatest where P1 and the resultant are as far from
    // midspan.
    const double l = 10, P1 = 7, P2 = 4, a = 3;
    const auto one = extremes_of_train(influence_of_moment(simple, 5.0 * m), load_train<>{{P1 * N, 0.0 * m}});
    CHECK(relative(one.greatest.value / (N * m), P1 * l / 4) < 1e-14);
    CHECK(one.greatest.at == 5.0 * m);
    CHECK(one.least.value == 0.0 * N * m);
    const double x = (l - P2 * a / (P1 + P2)) / 2;
    const auto two =
        extremes_of_train(influence_of_moment(simple, x * m), load_train<>{{P1 * N, 0.0 * m}, {P2 * N, a * m}});
    CHECK(relative(two.greatest.value / (N * m), (P1 + P2) * x * x / l) < 1e-14);
    CHECK(relative(two.greatest.at / m, x) < 1e-14);
}

TEST_CASE("shear beside a section: the jump belongs to the load just past it") {
    const auto train = load_train<>{{6.0 * N, 0.0 * m}};
    const auto worst = extremes_of_train(influence_of_shear(simple, 4.0 * m), train);
    CHECK(relative(worst.greatest.value / N, 3.6) < 1e-14);
    CHECK(worst.greatest.at == 4.0 * m);
    CHECK(worst.greatest.beside == just_right);
    CHECK(relative(worst.least.value / N, -2.4) < 1e-14);
    CHECK(worst.least.beside == just_left);
    CHECK(worst.governing().value == worst.greatest.value);
}

TEST_CASE("a train longer than the beam, driving either way") {
    std::vector<axle<>> axles;
    for (int i = 0; i < 12; ++i) axles.push_back({(10.0 + i) * kN, -1.7 * i * m});
    const load_train<> train(axles);
    const auto there = extremes_of_train(influence_of_moment(simple, 3.0 * m), train);
    const auto back = extremes_of_train(influence_of_moment(simple, 7.0 * m), train.turned_round());
    CHECK(relative(back.greatest.value / (N * m), there.greatest.value / (N * m)) < 1e-13);
    CHECK(relative(back.greatest.at / m, 10.0 - there.greatest.at / m) < 1e-12);
    CHECK(train.standing_at(5.0 * m, simple.span()).cases().size() < axles.size());
}

TEST_CASE("random trains on random beams: stepping finds nothing greater, and the place found has the value found") {
    constexpr std::uint64_t seed = 601;
    CAPTURE(seed);
    scene::chance random(seed);
    scene::continuous_kind how;
    how.spring_decades = 2;
    tally found;
    while (found.trains < 300) {
        const auto c = scene::random_continuous(random, how).draw();
        const auto b = scene::beam_of(c);
        if (refusal([&] { (void)b.under(load_list<>{}); }) != "") continue;
        CAPTURE(scene::text(c));
        std::vector<axle<>> axles;
        for (int i = random.whole(1, 6); i > 0; --i) {
            const double P = random.in(1, 10) * (random.in(0, 1) < 0.15 ? -1 : 1);
            axles.push_back({P * N, random.in(-0.6, 0.6) * c.L * m});
        }
        const load_train<> train(axles);
        const auto x = (random.in(0, 1) < 0.3 ? c.supports.back().at : random.in(0, c.L)) * m;
        compare(influence_of_moment(b, x), train, c.L, found);
        // A load right over the end of the beam is beside no section there: its shear is a limit that no step reaches.
        if (x > 0.0 * m && x < b.span()) compare(influence_of_shear(b, x), train, c.L, found);
        compare(influence_of_deflection(b, x), train, c.L, found);
        compare(influence_of_reaction(b, c.supports.front().at * m), train, c.L, found);
    }
    MESSAGE(found.trains << " trains: stepping found at most " << found.missed << " more; values off their places by "
                         << found.misplaced);
    CHECK(found.missed < 1e-12);
    CHECK(found.misplaced < 1e-12);
}

TEST_CASE("a load that is beyond an end by rounding only stands over it") {
    // A wheel of 100 kN at the free end of an arm of 3 m, its origin 2.3 m ahead: 8.3 m in decimals, not in binary.
    continuous_beam arm(6.0 * m, 1.0e6 * N * m2);
    arm.support_at(0.0 * m).support_at(3.0 * m);
    const load_train<> train{{40.0 * kN, 0.0 * m}, {100.0 * kN, -2.3 * m}};
    const auto eta = influence_of_moment(arm, 3.0 * m);
    const auto worst = extremes_of_train(eta, train).least;
    CHECK(relative(worst.value / (kN * m), -300) < 1e-13);
    CHECK(relative(effect_of_train(eta, train, worst.at) / (kN * m), -300) < 1e-13);
    CHECK(relative(arm.under(train.standing_at(worst.at, arm.span())).moment(3.0 * m) / (kN * m), -300) < 1e-13);
    for (int i = 1; i < 200; ++i) {
        const auto spacing = i * 0.1 * m;
        const load_train<> wheels{{1.0 * kN, 0.0 * m}, {1.0 * kN, -spacing}, {1.0 * kN, spacing}};
        for (const auto& over : {0.0 * m, 6.0 * m}) {
            for (const double way : {1.0, -1.0}) {
                const auto standing = wheels.standing_at(over + way * spacing, 6.0 * m);
                int count = 0;
                for (const auto& any : standing.cases()) {
                    std::visit(
                        [&](const auto& single) {
                            if constexpr (requires { single.at(); }) count += single.at() == over ? 1 : 0;
                        },
                        any);
                }
                CAPTURE(i);
                CHECK(count == 1);
            }
        }
    }
}

TEST_CASE("what is refused, by name") {
    CHECK(refusal([] { (void)load_train<>(std::vector<axle<>>{}); }).find("load_train: number of axles = 0") == 0);
    CHECK(refusal([] { (void)load_train<>{{std::nan("") * N, 0.0 * m}}; }).find("load_train: force") == 0);
    CHECK(refusal([] { (void)load_train<>{{1.0 * N, INFINITY * m}}; }).find("load_train: place") == 0);
}
