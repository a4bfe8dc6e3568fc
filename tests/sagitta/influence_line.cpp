// Influence lines against what they stand for: the response at the section, load by load, of random beams.
#include <sagitta/influence_line.hpp>

#include <support/continuous_scene.hpp>
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/extremes.hpp>
#include <sagitta/shear_flexible.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <array>
#include <cmath>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

// Known when compiling, like everything of a single span: a load at 4 m of 10 m brings 2.4 m of moment there.
constexpr auto simple = simple_beam(10.0 * m, 1.0e6 * N * m2);
static_assert(abs(influence_of_moment(simple, 4.0 * m).ordinate(4.0 * m) - 2.4 * m) < 1e-12 * m);
static_assert(abs(influence_of_reaction(simple, end::left).ordinate(2.0 * m) - 0.8) < 1e-13);
static_assert(abs(influence_of_shear(simple, 4.0 * m).ordinate(3.0 * m) + 0.3) < 1e-13);
static_assert(abs(influence_of_shear(simple, 4.0 * m).ordinate(5.0 * m) - 0.5) < 1e-13);
static_assert(std::is_same_v<decltype(influence_of_deflection(simple, 4.0 * m).ordinate(1.0 * m) * (1.0 * N)),
                             quantity<dimension::length>>);
// Area of the triangle of the midspan moment: L^2/8.
static_assert(abs(influence_of_moment(simple, 5.0 * m).area(between(0.0 * m, 10.0 * m)) - 12.5 * m2) < 1e-11 * m2);

/// The greatest differences between ordinates and responses to a unit load, relative to the greatest ordinate. Where
/// that is less than 1e-6 of the size that the beam implies (a moment in a hinge, the deflection of a support), only
/// rounding is left, and the implied size counts.
struct differences {
    double worst = 0;
    int compared = 0;

    template <class Influence, class Response>
    void take(const Influence& eta, double L, double implied, const std::vector<double>& places,
              const Response& response) {
        double size = 1e-6 * implied, gap = 0;
        for (const double x : places) {
            const double direct = response(x);
            size = std::max(size, std::abs(direct));
            gap = std::max(gap, std::abs(eta.ordinate(x * m).value() - direct));
            ++compared;
        }
        for (int i = 0; i <= 20; ++i)
            size = std::max(size, std::abs(eta.ordinate(std::min(L * i / 20, L) * m).value()));
        // Loads left and right of the section: a part that hangs on a hinge may have ordinates there alone.
        for (const side which : {just_left, just_right})
            size = std::max(size, std::abs(eta.deflected().deflection(eta.section(), which).value()));
        worst = std::max(worst, gap / size);
    }
};

/// All influence lines of a beam for one section, against responses to unit loads at the places.
template <class Beam>
void compare(const Beam& b, double section, const std::vector<double>& places, differences& found) {
    const double L = b.span().value();
    const auto x = section * m;
    const double soft = L * L * L / b.under(load_list<>{}).rigidity(x).value();
    const auto under = [&](double at_x) { return b.under(load_list<>(point_load(1.0 * N, at(at_x * m)))); };
    found.take(influence_of_moment(b, x), L, L, places, [&](double p) { return under(p).moment(x).value(); });
    found.take(influence_of_deflection(b, x), L, soft, places,
               [&](double p) { return under(p).deflection(x).value(); });
    for (const side which : {just_left, just_right}) {
        if (section == 0 && which == just_left) continue;
        if (section == L && which == just_right) continue;
        found.take(influence_of_shear(b, x, which), L, 1, places,
                   [&](double p) { return under(p).shear(x, which).value(); });
    }
}

/// What a load case causes, by its influence line and by the response itself.
template <class Beam>
void compare_effects(const Beam& b, double section, const load_list<>& loads, double bound) {
    const auto line = b.under(loads);
    const auto x = section * m;
    const auto M = extremes_of_moment(line).governing().value;
    CHECK(abs(influence_of_moment(b, x).effect_of(loads) - line.moment(x)).value() <= bound * abs(M).value());
    const auto V = extremes_of_shear(line).governing().value;
    CHECK(abs(influence_of_shear(b, x).effect_of(loads) - line.shear(x)).value() <= bound * abs(V).value());
    const auto v = greatest_deflection(line).value;
    CHECK(abs(influence_of_deflection(b, x).effect_of(loads) - line.deflection(x)).value() <= bound * abs(v).value());
}

}  // namespace

TEST_CASE("single spans: ordinates are responses to a unit load") {
    constexpr std::uint64_t seed = 501;
    CAPTURE(seed);
    scene::chance random(seed);
    differences found;
    for (int i = 0; i < 20; ++i) {
        const double L = std::pow(10, random.in(-2, 3));
        scene::with_each_beam(L, 1e5, [&](const std::string& name, const auto& b, auto, auto) {
            CAPTURE(name);
            const double section = random.in(0, L);
            const std::vector<double> places{0, random.in(0, section), section, random.in(section, L), L};
            compare(b, section, places, found);
            compare(b, 0, places, found);
            compare(b, L, places, found);
        });
    }
    MESSAGE("greatest difference of " << found.compared << " ordinates: " << found.worst);
    CHECK(found.worst < 1e-13);
}

TEST_CASE("random continuous beams: ordinates are responses to a unit load, also at supports and hinges") {
    constexpr std::uint64_t seed = 502;
    CAPTURE(seed);
    scene::chance random(seed);
    scene::continuous_kind how;
    how.spring_decades = 2;
    differences found;
    double worst_reaction = 0;
    int beams = 0;
    while (beams < 60) {
        auto c = scene::random_continuous(random, how).draw();
        for (auto& s : c.supports) s.settled = 0;  // the response to a unit load is asked for
        const auto b = scene::beam_of(c);
        if (refusal([&] { (void)b.under(load_list<>{}); }) != "") continue;
        ++beams;
        CAPTURE(scene::text(c));
        std::vector<double> places{0, c.L};
        for (int i = 0; i < 4; ++i) places.push_back(random.in(0, c.L));
        for (const auto& n : b.nodes()) places.push_back(n.at.value());
        const double section = places[static_cast<std::size_t>(random.whole(0, int(places.size()) - 1))];
        compare(b, section, places, found);
        for (const auto& s : c.supports) {
            const auto eta = influence_of_reaction(b, s.at * m);
            for (const double x : places) {
                const auto line = b.under(point_load(1.0 * N, at(x * m)));
                worst_reaction =
                    std::max(worst_reaction, std::abs(eta.ordinate(x * m).value() - (line.reaction_at(s.at * m) / N)));
            }
        }
    }
    MESSAGE("greatest difference of " << found.compared << " ordinates: " << found.worst << ", of reactions "
                                      << worst_reaction);
    CHECK(found.worst < 1e-11);
    CHECK(worst_reaction < 1e-10);
}

TEST_CASE("ordinates, effects of trains and patterns against direct stiffness in rational numbers") {
    using exact = boost::multiprecision::cpp_rational;
    constexpr std::uint64_t seed = 503;
    CAPTURE(seed);
    scene::chance random(seed);
    scene::continuous_kind small;
    small.spans_most = 4;
    small.spring_decades = 2;
    small.may_move = false;
    double worst = 0;
    int compared = 0;
    while (compared < 400) {
        auto c = scene::random_continuous(random, small).draw();
        const auto b = scene::beam_of(c);
        if (refusal([&] { (void)b.under(load_list<>{}); }) != "") continue;
        CAPTURE(scene::text(c));
        const double section = random.in(0, c.L);
        const auto eta = influence_of_moment(b, section * m);
        const auto eta_v = influence_of_shear(b, section * m);
        // Two loads, as of a train or a pattern, then each of them alone.
        const scene::load first{scene::kind::point, random.in(1, 9), 0, random.in(0, c.L), 0};
        const scene::load second{scene::kind::partial_uniform, random.in(1, 9) / c.mean_span, 0, 0.1 * c.L, 0.6 * c.L};
        for (const auto& loads : {std::vector{first, second}, std::vector{first}, std::vector{second}}) {
            c.loads = loads;
            auto reference = scene::reference_of<exact>(c);
            REQUIRE(reference.solve());
            const auto list = scene::list_of(loads);
            const auto line = b.under(list);
            const auto note = [&](double computed, reference::quantity what, double size) {
                const exact truth = reference.value(what, exact(section));
                worst = std::max(worst, std::abs(static_cast<double>(exact(exact(computed) - truth))) / size);
                ++compared;
            };
            note(eta.effect_of(list).value(), reference::quantity::moment,
                 std::abs(extremes_of_moment(line).governing().value.value()));
            note(eta_v.effect_of(list).value(), reference::quantity::shear,
                 std::abs(extremes_of_shear(line).governing().value.value()));
        }
    }
    MESSAGE("greatest difference of " << compared << " effects, of the greatest of the response: " << worst);
    CHECK(worst < 1e-12);
}

TEST_CASE("the effect of a load case is the response to it") {
    load_list<> loads;
    loads += point_load(3.0 * kN, at(1.0 * m)) + applied_couple(2.0 * kN * m, at(5.5 * m)) +
             uniform_load(1.5 * kN / m) + partial_uniform_load(4.0 * kN / m, between(2.0 * m, 7.0 * m)) +
             linear_load(1.0 * kN / m, -2.0 * kN / m, between(0.5 * m, 8.0 * m));
    const auto EI = 1.0e6 * N * m2;
    continuous_beam bridge(10.0 * m, EI);
    bridge.support_at(0.0 * m).support_at(4.0 * m).spring_at(10.0 * m, 3.0e5 * N / m).rigidity_from(6.0 * m, 2.0 * EI);
    auto sliding = bridge;
    sliding.shear_rigidity(5.0e5 * N);
    for (const double section : {0.7, 3.3, 4.0, 6.1, 9.5}) {
        compare_effects(simple, section, loads, 1e-13);
        compare_effects(propped_cantilever(10.0 * m, EI), section, loads, 1e-13);
        compare_effects(fixed_beam(10.0 * m, EI).with_shear_rigidity(5.0e5 * N), section, loads, 1e-13);
        compare_effects(bridge, section, loads, 1e-12);
        compare_effects(sliding, section, loads, 1e-12);
    }
}

TEST_CASE("a settled support does not move the influence line") {
    continuous_beam bridge(10.0 * m, 1.0e6 * N * m2);
    bridge.support_at(0.0 * m).support_at(4.0 * m).support_at(10.0 * m);
    auto settled = bridge;
    settled.settle_at(4.0 * m, 30.0 * mm);
    CHECK(influence_of_moment(settled, 4.0 * m).ordinate(2.0 * m) ==
          influence_of_moment(bridge, 4.0 * m).ordinate(2.0 * m));
    CHECK(influence_of_reaction(settled, 10.0 * m).ordinate(2.0 * m) ==
          influence_of_reaction(bridge, 10.0 * m).ordinate(2.0 * m));
    CHECK(influence_of_reaction(bridge, end::right).ordinate(2.0 * m) ==
          influence_of_reaction(bridge, 10.0 * m).ordinate(2.0 * m));
}

TEST_CASE("they are cubics between the joints") {
    continuous_beam bridge(10.0 * m, 1.0e6 * N * m2);
    bridge.support_at(0.0 * m).support_at(4.0 * m).support_at(10.0 * m);
    const auto eta = influence_of_moment(bridge, 2.0 * m);
    const auto pieces = piecewise_form(eta.deflected());
    REQUIRE(pieces.size() == 3);
    CHECK(pieces[1].from() == 2.0 * m);
    for (const auto& piece : pieces) {
        CHECK(std::get<4>(piece.deflection_coefficients()).value() == 0);
        CHECK(std::get<5>(piece.deflection_coefficients()).value() == 0);
    }
}

TEST_CASE("what is refused, by name") {
    continuous_beam bridge(10.0 * m, 1.0e6 * N * m2);
    bridge.support_at(0.0 * m).support_at(10.0 * m);
    CHECK(refusal([&] {
              (void)influence_of_moment(bridge, 10.5 * m);
          }).find("influence line: section x = 10.5 m must lie on the beam, from 0 m to 10 m") == 0);
    CHECK(refusal([&] { (void)influence_of_reaction(bridge, 5.0 * m); }).find("influence_of_reaction: x = 5 m") == 0);
    const auto eta = influence_of_moment(bridge, 5.0 * m);
    CHECK(refusal([&] { (void)eta.ordinate(11.0 * m); }).find("x = 11 m must lie on the beam") == 0);
    CHECK(refusal([&] { (void)eta.effect_of(point_load(1.0 * N, at(11.0 * m))); }).find("at = 11 m") == 0);
    CHECK(refusal([&] {
              (void)eta.effect_of(partial_uniform_load(1.0 * N / m, between(1.0 * m, 11.0 * m)));
          }).find("between: to = 11 m") == 0);
    CHECK(refusal([&] { (void)eta.area(between(1.0 * m, 11.0 * m)); }).find("between: to = 11 m") == 0);
    CHECK(refusal([&] { (void)eta.effect_of(settlement(end::left, 1.0 * mm)); }).find("is no force") !=
          std::string::npos);
    CHECK(refusal([&] { (void)eta.effect_of(imposed_curvature(0.001 / m)); }).find("is no force") != std::string::npos);
    CHECK(refusal([&] { (void)eta.effect_of(imposed_kink(1.0 * mrad, at(1.0 * m))); }).find("is no force") !=
          std::string::npos);
}

TEST_CASE("a couple at a hinge turns the part right of it") {
    const auto b = continuous_beam(12.0 * m, 1.0e6 * N * m2)
                       .clamp(end::left)
                       .hinge_at(3.0 * m)
                       .support_at(5.0 * m)
                       .hinge_at(5.0 * m)
                       .support_at(12.0 * m);
    for (const double x : {3.0, 5.0}) {
        CAPTURE(x);
        const auto couple = applied_couple(7.0e3 * N * m, at(x * m));
        const auto line = b.under(couple);
        CHECK(std::abs((influence_of_moment(b, 4.0 * m).effect_of(couple) - line.moment(4.0 * m)) / (N * m)) < 1e-9);
        CHECK(std::abs((influence_of_shear(b, 8.0 * m).effect_of(couple) - line.shear(8.0 * m)) / N) < 1e-9);
        CHECK(std::abs((influence_of_reaction(b, 5.0 * m).effect_of(couple) - line.reaction_at(5.0 * m)) / N) < 1e-9);
    }
}
