// The moment-area integrator against the closed forms: they agree on every load case on every beam.
// cross_check_misprints.cpp shows that the check is able to fail.
#include <support/scene.hpp>

#include <sagitta/cross_check.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <initializer_list>
#include <limits>
#include <utility>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr double bound = 1e-12;

void take_greater(cross_check_result<double>& worst, const cross_check_result<double>& one) {
    worst.shear = std::max(worst.shear, one.shear);
    worst.moment = std::max(worst.moment, one.moment);
    worst.slope = std::max(worst.slope, one.slope);
    worst.deflection = std::max(worst.deflection, one.deflection);
}

void check(const cross_check_result<double>& result) {
    CHECK(result.shear <= bound);
    CHECK(result.moment <= bound);
    CHECK(result.slope <= bound);
    CHECK(result.deflection <= bound);
}

void report(const cross_check_result<double>& worst) {
    MESSAGE("greatest discrepancies: deflection " << worst.deflection << ", slope " << worst.slope << ", moment "
                                                  << worst.moment << ", shear " << worst.shear);
}

}  // namespace

TEST_CASE("closed forms and integrator agree to 1e-12 for every load case on every beam") {
    constexpr std::uint64_t seed = 71;
    CAPTURE(seed);
    scene::chance random(seed);
    cross_check_result<double> worst;
    for (const double L : {1e-3, 7.2, 1e4}) {
        const double EI = 1.75e7;
        const double tiny = 1e-6 * L;
        const double w = EI / L / L / L / L;
        std::vector<scene::load> cases{{scene::kind::uniform, w},
                                       {scene::kind::curvature, 0.003 / L},
                                       {scene::kind::linear_whole, w, 0},
                                       {scene::kind::linear_whole, 0, w},
                                       {scene::kind::settlement_left, 0.01},
                                       {scene::kind::settlement_right, 0.01},
                                       {scene::kind::rotation_left, 0.01},
                                       {scene::kind::rotation_right, 0.01}};
        for (const double a : {0.0, tiny, L / 3, L / 2, random.in(0, L), L - tiny, L}) {
            cases.push_back({scene::kind::point, w * L, 0, a, 0});
            cases.push_back({scene::kind::couple, w * L * L, 0, a, 0});
            cases.push_back({scene::kind::kink, 0.003, 0, a, 0});
            cases.push_back({scene::kind::offset, 0.003 * L, 0, a, 0});
        }
        const double inside = random.in(tiny, L - tiny);
        for (const auto& [from, to] : std::vector<std::pair<double, double>>{{0, L / 3},
                                                                             {L / 7, L},
                                                                             {0.3 * L, 0.8 * L},
                                                                             {0, L},
                                                                             {0, tiny},
                                                                             {L - tiny, L},
                                                                             {inside, inside + tiny}}) {
            cases.push_back({scene::kind::partial_uniform, w, 0, from, to});
            cases.push_back({scene::kind::linear, w, 0, from, to});
            cases.push_back({scene::kind::linear, 0, w, from, to});
            cases.push_back({scene::kind::partial_curvature, 0.003 / L, 0, from, to});
        }
        scene::with_each_beam_and_guided(L, EI, [&](const std::string& name, const auto& b, auto left, auto right) {
            for (const auto& one : cases) {
                if (!scene::can_act(one, left, right)) continue;
                CAPTURE(name);
                CAPTURE(L);
                CAPTURE(scene::text(one));
                const auto result = cross_check(b.under(scene::list_of({one})));
                check(result);
                take_greater(worst, result);
            }
        });
    }
    report(worst);
}

TEST_CASE("they agree on superpositions of random loads") {
    constexpr std::uint64_t seed = 72;
    CAPTURE(seed);
    scene::chance random(seed);
    cross_check_result<double> worst;
    const double L = 7.2;
    const double EI = 1.75e7;
    for (int i = 0; i < 50; ++i) {
        scene::with_each_beam_and_guided(L, EI, [&](const std::string& name, const auto& b, auto left, auto right) {
            CAPTURE(name);
            CAPTURE(i);
            const auto all = scene::random_loads(random, random.whole(2, 8), L, EI, left, right);
            const auto result = cross_check(b.under(scene::list_of(all)));
            check(result);
            take_greater(worst, result);
        });
    }
    report(worst);
}

TEST_CASE("they agree on what stands right at an end, on both sides of it") {
    const double L = 7.2;
    scene::with_each_beam_and_guided(L, 1.75e7, [&](const std::string& name, const auto& b, auto, auto) {
        CAPTURE(name);
        for (const double x : {0.0, L}) {
            CAPTURE(x);
            const auto here = at(x * m);
            check(cross_check(b.under(imposed_kink(2.0 * mrad, here) + imposed_offset(3.0 * mm, here) +
                                      applied_couple(4.0 * kN * m, here) + point_load(5.0 * kN, here) +
                                      uniform_load(1.0 * kN / m))));
        }
    });
}

TEST_CASE("a composition known when compiling is checked like a list") {
    const auto loads = point_load(22.0 * kN, at(3.0 * m)) + uniform_load(4.5 * kN / m) +
                       settlement(end::right, 5.0 * mm) + linear_load(0.0 * kN / m, 6.0 * kN / m);
    const auto line = propped_cantilever(7.2 * m, 210.0 * GPa * 8356.0 * cm4).under(loads);
    const auto result = cross_check(line);
    check(result);
    load_list list;
    list += loads;
    const auto of_list = cross_check(line.supported().under(list));
    check(of_list);
}

TEST_CASE("an unloaded beam has no discrepancy") {
    CHECK(cross_check(fixed_beam(3.0 * m, 1.0 * kN * m2).under(load_list{})).greatest() == 0);
}

TEST_CASE("the greatest discrepancy is the greatest of the four") {
    using result = cross_check_result<double>;
    CHECK(result{1, 2, 3, 4}.greatest() == 4);
    CHECK(result{4, 1, 2, 3}.greatest() == 4);
    CHECK(result{1, 4, 3, 2}.greatest() == 4);
    CHECK(result{1, 2, 4, 3}.greatest() == 4);
}

TEST_CASE("a discrepancy that is not a number is never small") {
    using result = cross_check_result<double>;
    const double nan = std::numeric_limits<double>::quiet_NaN();
    CHECK_FALSE(result{nan, 0, 0, 0}.greatest() <= bound);
    CHECK_FALSE(result{0, nan, 0, 0}.greatest() <= bound);
    CHECK_FALSE(result{0, 0, nan, 0}.greatest() <= bound);
    CHECK_FALSE(result{0, 0, 0, nan}.greatest() <= bound);

    detail::discrepancy<double> kept;
    kept.compare(1, 1);
    kept.compare(nan, 1);
    kept.compare(1, 1);
    CHECK_FALSE(kept.relative_to(0) <= bound);
}

TEST_CASE("a discrepancy keeps the greatest magnitude and the greatest difference, whatever their signs") {
    const auto after = [](std::initializer_list<std::pair<double, double>> pairs) {
        detail::discrepancy<double> d;
        for (const auto& [closed, integrated] : pairs) d.compare(closed, integrated);
        return std::pair(d.size, d.difference);
    };
    using result = std::pair<double, double>;
    CHECK(after({{0.25, 0.25}}) == result(0.25, 0));
    CHECK(after({{-0.25, -0.25}}) == result(0.25, 0));
    CHECK(after({{0.25, 0.5}}) == result(0.5, 0.25));
    CHECK(after({{0.5, 0.25}}) == result(0.5, 0.25));
    CHECK(after({{-0.5, 0.25}}) == result(0.5, 0.75));
    CHECK(after({{0.25, -0.5}}) == result(0.5, 0.75));
    CHECK(after({{3, 1}, {4, 3.5}, {-2, -1.5}}) == result(4, 2));
    CHECK(after({{4, 3.5}, {1, 3}}) == result(4, 2));
}

TEST_CASE("differences are relative to the greatest value, or to what the other responses imply of one that vanishes") {
    // Over 2 m that turn by 0.01 under a unit moment: the deflection of 0.5 implies a moment of 0.25/0.01.
    const detail::discrepancy<double> shear{4, 1}, moment{10, 2}, slope{0.125, 0.0125}, deflection{0.5, 0.05};
    const auto all = detail::discrepancies<double>{shear, moment, slope, deflection, {}, {}}.relative(2, 0.01);
    CHECK(all.shear == 0.25);
    CHECK(all.moment == 0.2);
    CHECK(all.slope == doctest::Approx(0.1));
    CHECK(all.deflection == doctest::Approx(0.1));

    const detail::discrepancy<double> vanishing{1e-13, 1e-13};
    const auto flat = detail::discrepancies<double>{vanishing, vanishing, slope, deflection, {}, {}}.relative(2, 0.01);
    CHECK(flat.shear == doctest::Approx(1e-13 / 12.5));
    CHECK(flat.moment == doctest::Approx(1e-13 / 25));
    const auto level = detail::discrepancies<double>{shear, moment, vanishing, vanishing, {}, {}}.relative(2, 0.01);
    CHECK(level.slope == doctest::Approx(1e-13 / 0.1));
    CHECK(level.deflection == doctest::Approx(1e-13 / 0.2));

    // Forces at supports measure by themselves and by what is along the beam, whichever is greater.
    const auto held = detail::discrepancies<double>{shear, moment, slope, deflection, {8, 4}, {5, 4}}.relative(2, 0.01);
    CHECK(held.shear == 0.5);
    CHECK(held.moment == 0.4);
}
