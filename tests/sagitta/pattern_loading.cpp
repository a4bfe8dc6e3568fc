// Pattern loading against trying every pattern.
#include <sagitta/pattern_loading.hpp>

#include <support/continuous_scene.hpp>
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/influence_line.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <cstddef>
#include <string>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

continuous_beam<> equal_spans(int count) {
    continuous_beam<> b(count * 1.0 * m, 1.0 * N * m2);
    for (int i = 0; i <= count; ++i) b.support_at(i * 1.0 * m);
    return b;
}

/// Every pattern of the loads, solved as a beam of its own: no influence line, no superposition.
template <class Answer>
void try_all(const continuous_beam<>& b, const std::vector<load_list<>>& loads, const Answer& answer, double& greatest,
             double& least) {
    greatest = least = 0;
    for (std::size_t pattern = 0; pattern < (std::size_t{1} << loads.size()); ++pattern) {
        load_list<> together;
        for (std::size_t i = 0; i < loads.size(); ++i) {
            if ((pattern >> i & 1) != 0) together += loads[i];
        }
        const double value = answer(b.under(together)).value();
        greatest = std::max(greatest, value);
        least = std::min(least, value);
    }
}

template <class Influence, class Answer>
double compare(const continuous_beam<>& b, const Influence& eta, const std::vector<load_list<>>& loads,
               const Answer& answer) {
    const auto found = governing_patterns(eta, loads);
    double greatest = 0, least = 0;
    try_all(b, loads, answer, greatest, least);
    // The loads of the pattern cause what it says.
    const double size = std::max(greatest, -least);
    const double caused = answer(b.under(found.greatest.loads)).value();
    return std::max({std::abs(found.greatest.value.value() - greatest), std::abs(found.least.value.value() - least),
                     std::abs(caused - greatest)}) /
           size;
}

}  // namespace

TEST_CASE("two and three equal spans: the patterns and coefficients that practice uses") {
    // Coefficients of w L^2 and w L for equal spans, common practice in beam tables, from memory: midspan moments 0.070
    // and 0.096 come to lie off the middle, so that here the support moments and reactions are checked, which are exact
    // fractions derived with the theorem of three moments.
    const auto b = equal_spans(3);
    const auto support = governing_patterns(influence_of_moment(b, 1.0 * m), 1.0 * N / m);
    CHECK(support.least.spans == std::vector<std::size_t>{0, 1});
    CHECK(relative(support.least.value / (N * m), -7.0 / 60) < 1e-13);
    CHECK(support.greatest.spans == std::vector<std::size_t>{2});
    CHECK(relative(support.greatest.value / (N * m), 1.0 / 60) < 1e-13);
    const auto middle = governing_patterns(influence_of_moment(b, 1.5 * m), 1.0 * N / m);
    CHECK(middle.greatest.spans == std::vector<std::size_t>{1});
    CHECK(relative(middle.greatest.value / (N * m), 0.125 - 0.05) < 1e-13);
    CHECK(middle.least.spans == std::vector<std::size_t>{0, 2});
    CHECK(relative(middle.least.value / (N * m), -0.05) < 1e-13);
    const auto end_reaction = governing_patterns(influence_of_reaction(b, end::left), 1.0 * N / m);
    CHECK(end_reaction.greatest.spans == std::vector<std::size_t>{0, 2});
    CHECK(relative(end_reaction.greatest.value / N, 0.45) < 1e-13);
}

TEST_CASE("equal to trying all patterns, up to ten spans") {
    constexpr std::uint64_t seed = 701;
    CAPTURE(seed);
    scene::chance random(seed);
    double worst = 0;
    int patterns = 0;
    for (int spans = 1; spans <= 10; ++spans) {
        const bool left_overhang = spans > 2 && random.toss();
        continuous_beam<> b(spans * 5.0 * m, 1.0e6 * N * m2);
        std::vector<double> supports{left_overhang ? 2.0 : 0.0};
        for (int i = left_overhang ? 2 : 1; i < spans; ++i) supports.push_back(5.0 * i + random.in(-1.5, 1.5));
        supports.push_back(spans * 5.0);
        for (const double x : supports) {
            if (random.in(0, 1) < 0.2) {
                b.spring_at(x * m, random.in(1e5, 1e7) * N / m);
            } else {
                b.support_at(x * m);
            }
        }
        if (random.toss()) b.clamp(end::right);
        if (spans > 3) b.hinge_at((supports[1] + random.in(0.5, 1.5)) * m);
        REQUIRE(b.spans().size() == static_cast<std::size_t>(spans));
        std::vector<load_list<>> loads;
        for (const auto& span : b.spans()) {
            load_list<> on_span(partial_uniform_load(random.in(1, 5) * kN / m, between(span.from, span.to)));
            if (random.toss()) on_span += point_load(random.in(-9, 9) * kN, at((span.from + span.to) / 2.0));
            loads.push_back(on_span);
        }
        const auto x = random.in(0, 5.0 * spans) * m;
        const auto s = supports[static_cast<std::size_t>(random.whole(0, int(supports.size()) - 1))] * m;
        CAPTURE(spans);
        worst = std::max(
            {worst, compare(b, influence_of_moment(b, x), loads, [&](const auto& line) { return line.moment(x); }),
             compare(b, influence_of_shear(b, x), loads, [&](const auto& line) { return line.shear(x); }),
             compare(b, influence_of_deflection(b, x), loads, [&](const auto& line) { return line.deflection(x); }),
             compare(b, influence_of_reaction(b, s), loads, [&](const auto& line) { return line.reaction_at(s); })});
        patterns += 4 << spans;
    }
    MESSAGE(patterns << " patterns tried, greatest difference " << worst);
    CHECK(worst < 1e-12);
}

TEST_CASE("what cannot do better than nothing is empty") {
    const auto b = equal_spans(1);
    const auto found = governing_patterns(influence_of_moment(b, 0.5 * m), 1.0 * N / m);
    CHECK(found.least.spans.empty());
    CHECK(found.least.value == 0.0 * N * m);
    CHECK(found.least.loads.cases().empty());
}

TEST_CASE("a span without any load is in no pattern") {
    const auto b = equal_spans(3);
    std::vector<load_list<>> loads(3);
    loads[1] += uniform_load(1.0 * N / m);
    const auto found = governing_patterns(influence_of_moment(b, 1.5 * m), loads);
    CHECK(found.greatest.spans == std::vector<std::size_t>{1});
    CHECK(found.least.spans.empty());
}

TEST_CASE("what is refused, by name") {
    const auto b = equal_spans(3);
    const auto eta = influence_of_moment(b, 0.5 * m);
    CHECK(refusal([&] {
              (void)governing_patterns(eta, std::vector<load_list<>>(2));
          }).find("governing_patterns: number of loads = 2 must be the number of spans, 3") == 0);
}
