// The moment-area theorems against slopes and deflections of the closed forms, and the integrator with stiffness
// that varies against solutions derived here or published.
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/moment_area.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto rigidity(double newton_square_metres) {
    return quantity<dimension::flexural_rigidity>::from_value(newton_square_metres);
}

}  // namespace

TEST_CASE("the two theorems hold between any two points, in both orders") {
    constexpr std::uint64_t seed = 51;
    CAPTURE(seed);
    scene::chance random(seed);
    const double L = 7.2;
    for (int i = 0; i < 20; ++i) {
        scene::with_each_beam(L, 1.75e7, [&](const std::string& name, const auto& b, auto left, auto right) {
            CAPTURE(name);
            CAPTURE(i);
            const auto loads = scene::list_of(scene::random_loads(random, random.whole(1, 5), L, 1.75e7, left, right));
            const auto line = b.under(loads);
            double size_of_slope = 0;
            double size_of_deflection = 0;
            for (int k = 0; k <= 50; ++k) {
                const auto x = L * k / 50 * m;
                size_of_slope = std::max(size_of_slope, std::abs(line.slope(x).value()));
                size_of_deflection = std::max(size_of_deflection, std::abs(line.deflection(x).value()));
            }
            const double scale = size_of_slope * L + size_of_deflection;
            for (const auto& stretch : {std::pair{0.0, L}, std::pair{L, 0.0}, std::pair{0.3 * L, 0.3 * L},
                                        std::pair{random.in(0, L), random.in(0, L)}}) {
                const double from = stretch.first;
                const double to = stretch.second;
                CAPTURE(from);
                CAPTURE(to);
                const auto a = from * m;
                const auto c = to * m;
                const auto area = moment_area(line, a, c);
                const double change = line.slope(c).value() - line.slope(a).value();
                CHECK(std::abs(area.angle_change.value() - change) <= 1e-12 * size_of_slope);
                // Of the second point from the tangent at the first, and the other way round.
                const double of_second =
                    line.deflection(c).value() - line.deflection(a).value() - line.slope(a).value() * (to - from);
                const double of_first =
                    line.deflection(a).value() - line.deflection(c).value() - line.slope(c).value() * (from - to);
                CHECK(std::abs(area.deviation.value() - of_second) <= 1e-12 * scale);
                CHECK(std::abs(area.deviation_of_first.value() - of_first) <= 1e-12 * scale);
                const auto back = moment_area(line, c, a);
                CHECK(std::abs(back.angle_change.value() + change) <= 1e-12 * size_of_slope);
                CHECK(std::abs(back.deviation.value() - of_first) <= 1e-12 * scale);
                CHECK(std::abs(back.deviation_of_first.value() - of_second) <= 1e-12 * scale);
            }
        });
    }
}

TEST_CASE("the theorems by hand on a cantilever: triangle of M/EI") {
    // M = -P (L - x): area P L^2/2, centroid 2 L/3 from the tip (common practice, no source).
    const auto line = cantilever(3.0 * m, rigidity(9e5)).under(point_load(10.0 * kN, at(3.0 * m)));
    const auto area = moment_area(line, 0.0 * m, 3.0 * m);
    CHECK(relative(area.angle_change.value(), 1e4 * 9 / 2 / 9e5) < 1e-14);
    CHECK(relative(area.deviation.value(), 1e4 * 9 / 2 / 9e5 * 2) < 1e-14);
    // Of the clamped end from the tangent at the tip: the same area about the other end, one third away.
    CHECK(relative(area.deviation_of_first.value(), 1e4 * 9 / 2 / 9e5 * 1) < 1e-14);
}

TEST_CASE("the integrated line of a prismatic beam answers as the elastic line does") {
    constexpr std::uint64_t seed = 52;
    CAPTURE(seed);
    scene::chance random(seed);
    const double L = 5.5;
    scene::with_each_beam(L, 2e6, [&](const std::string& name, const auto& b, auto left, auto right) {
        CAPTURE(name);
        const auto loads = scene::list_of(scene::random_loads(random, 5, L, 2e6, left, right));
        const auto line = b.under(loads);
        const auto integrated = integrate_moment_area(b, loads);
        for (int i = 0; i <= 40; ++i) {
            const auto x = L * i / 40 * m;
            CAPTURE(x.value());
            // Sizes of the responses are about 1 m, 1 rad, 2e6 N*m and 2e6 N here.
            CHECK(std::abs((integrated.deflection(x) - line.deflection(x)).value()) < 1e-12 * L);
            CHECK(std::abs((integrated.slope(x) - line.slope(x)).value()) < 1e-12);
            CHECK(std::abs((integrated.moment(x) - line.moment(x)).value()) < 1e-12 * 2e6 * L);
            CHECK(std::abs((integrated.shear(x) - line.shear(x)).value()) < 1e-12 * 2e6 * L);
            for (const auto which : {just_left, just_right}) {
                CHECK(std::abs((integrated.moment(x, which) - line.moment(x, which)).value()) < 1e-12 * 2e6 * L);
                CHECK(std::abs((integrated.shear(x, which) - line.shear(x, which)).value()) < 1e-12 * 2e6 * L);
            }
        }
    });
}

TEST_CASE("a stiffness function that is constant agrees with the prismatic beam") {
    constexpr std::uint64_t seed = 53;
    CAPTURE(seed);
    scene::chance random(seed);
    const double L = 5.5;
    scene::with_each_beam(L, 2e6, [&](const std::string& name, const auto& b, auto left, auto right) {
        CAPTURE(name);
        const auto loads = scene::list_of(scene::random_loads(random, 4, L, 2e6, left, right));
        const auto line = b.under(loads);
        const auto varying = integrate_moment_area(b, loads, [](quantity<dimension::length>) { return rigidity(2e6); },
                                                   {2.0 * m, 3.0 * m});
        for (int i = 0; i <= 20; ++i) {
            const auto x = L * i / 20 * m;
            CHECK(std::abs((varying.deflection(x) - line.deflection(x)).value()) < 1e-12 * L);
            CHECK(std::abs((varying.slope(x) - line.slope(x)).value()) < 1e-12);
            CHECK(std::abs((varying.moment(x) - line.moment(x)).value()) < 1e-12 * 2e6 * L);
        }
    });
}

TEST_CASE("a tapered cantilever whose EI falls linearly, under a load at its tip") {
    // EI(x) = K (1 - c x/L), M = -P (L - x), with s = x/L:
    //   EI v'' = P (L - x)  =>  v''(s) = P L/K (1 - s)/(1 - c s)
    // and (1 - s)/(1 - c s) = 1/c - (1/c - 1)/(1 - c s), so with q = 1/c - 1:
    //   slope(s)      = P L^2/K [ s/c + q/c ln(1 - c s) ]
    //   deflection(s) = P L^3/K [ s^2/(2c) - q/c^2 ((1 - c s) ln(1 - c s) + c s) ]
    // (integral of ln(1 - c s) from 0 is -((1 - c s) ln(1 - c s) + c s)/c). Derived for this test.
    const double P = 1.2e4;
    const double L = 4;
    const double base_EI = 3e6;  // K
    for (const double c : {0.2, 0.5, 0.8}) {
        CAPTURE(c);
        const auto EI = [=](const quantity<dimension::length>& x) {
            return rigidity(base_EI * (1 - c * x.value() / L));
        };
        const auto load = point_load(P * N, at(L * m));
        const auto line = integrate_moment_area(cantilever(L * m, rigidity(base_EI)), load, EI);
        const auto other =
            integrate_moment_area(mirrored(cantilever(L * m, rigidity(base_EI))), point_load(P * N, at(0.0 * m)),
                                  [=](const quantity<dimension::length>& x) { return EI((L - x.value()) * m); });
        for (const double s : {0.25, 0.5, 0.9, 1.0}) {
            CAPTURE(s);
            const double q = 1 / c - 1;
            const double log = std::log(1 - c * s);
            const double slope = P * L * L / base_EI * (s / c + q / c * log);
            const double deflection =
                P * L * L * L / base_EI * (s * s / (2 * c) - q / (c * c) * ((1 - c * s) * log + c * s));
            // The closed form itself loses digits where s is small: 1e-11.
            CHECK(relative(line.slope(s * L * m).value(), slope) < 1e-11);
            CHECK(relative(line.deflection(s * L * m).value(), deflection) < 1e-11);
            CHECK(relative(-other.slope((1 - s) * L * m).value(), slope) < 1e-11);
            CHECK(relative(other.deflection((1 - s) * L * m).value(), deflection) < 1e-11);
        }
    }
}

TEST_CASE("a tapered fixed beam: the redundants come from the flexibility of the taper") {
    // EI(x) = K/(1 + x/L), uniform load w, clamped at both ends. With s = x/L, M = M0 + V0 x - w x^2/2:
    //   integral of M (1 + s) ds = 0 and integral of M (1 + s) s ds = 0 (no turn, no offset between the ends)
    //   3/2 M0 + 5/6 V0 L - 7/24 w L^2 = 0  and  5/6 M0 + 7/12 V0 L - 9/40 w L^2 = 0
    // Derived for this test, solved by determinants below.
    const double w = 1e4;
    const double L = 6;
    const double determinant = 3.0 / 2 * 7 / 12 - 5.0 / 6 * 5 / 6;
    const double M0 = (7.0 / 24 * 7 / 12 - 5.0 / 6 * 9 / 40) / determinant * w * L * L;
    const double V0 = (3.0 / 2 * 9 / 40 - 5.0 / 6 * 7 / 24) / determinant * w * L;
    const auto line = integrate_moment_area(
        fixed_beam(L * m, rigidity(2e6)), uniform_load(w * N / m),
        [=](const quantity<dimension::length>& x) { return rigidity(2e6 / (1 + x.value() / L)); });
    CHECK(relative(line.moment(0.0 * m).value(), M0) < 1e-12);
    CHECK(relative(line.shear(0.0 * m).value(), V0) < 1e-12);
    CHECK(std::abs(line.deflection(L * m).value()) < 1e-14);
    CHECK(std::abs(line.slope(L * m).value()) < 1e-14);
}

TEST_CASE("a stepped cantilever") {
    // EI is 2K from the clamped end to a, K from there to the tip under P: M = -P (L - x), so
    //   tip deflection = integral of P (L - x)^2/EI dx = P/(3K) [ (L^3 - (L - a)^3)/2 + (L - a)^3 ]
    //   tip slope      = P/(2K) [ (L^2 - (L - a)^2)/2 + (L - a)^2 ]. Derived for this test.
    const double P = 5e3;
    const double L = 3;
    const double base_EI = 8e5;  // K
    for (const double a : {0.4, 1.3}) {
        CAPTURE(a);
        const auto EI = [=](const quantity<dimension::length>& x) {
            return rigidity(x.value() < a ? 2 * base_EI : base_EI);
        };
        const auto line =
            integrate_moment_area(cantilever(L * m, rigidity(base_EI)), point_load(P * N, at(L * m)), EI, {a * m});
        const double rest = L - a;
        CHECK(relative(line.deflection(L * m).value(),
                       P / (3 * base_EI) * ((L * L * L - rest * rest * rest) / 2 + rest * rest * rest)) < 1e-13);
        CHECK(relative(line.slope(L * m).value(), P / (2 * base_EI) * ((L * L - rest * rest) / 2 + rest * rest)) <
              1e-13);
        // A step is no place without memory: between the points left of it only 2K counts.
        CHECK(relative(line.between(0.0 * m, a * m).angle_change.value(), P / (4 * base_EI) * (L * L - rest * rest)) <
              1e-13);
    }
}

TEST_CASE("a notch that is narrow beside the panels: they are halved until the default tolerance is met") {
    // A couple C at the tip turns it by the integral of C/EI. EI = K (w^2 + (s - c)^2) with s = x/L:
    //   C L/(K w) [ atan((1 - c)/w) + atan(c/w) ]
    const double w = 0.01, c = 0.37, C = 2e3, L = 4, base_EI = 3e7;  // K
    const auto EI = [=](const quantity<dimension::length>& x) {
        const double s = x.value() / L;
        return rigidity(base_EI * (w * w + (s - c) * (s - c)));
    };
    const auto line =
        integrate_moment_area(cantilever(L * m, rigidity(base_EI)), applied_couple(C * N * m, at(L * m)), EI);
    const double turn = C * L / (base_EI * w) * (std::atan((1 - c) / w) + std::atan(c / w));
    CHECK(relative(std::abs(line.slope(L * m).value()), turn) < 1e-12);
    CHECK(line.error_estimate() <= 1000 * std::numeric_limits<double>::epsilon());
}

TEST_CASE("a stepped simple beam, published") {
    // E. P. Popov, Engineering Mechanics of Solids, example 10.7: 20 kN at 4 m of a 5 m span, four times the
    // stiffness in the first 4 m. The printed elastic curve has EI v' = 4.8 kN*m2 at the left support, with EI that
    // of the last metre. As recomputed in a public textbook companion; two figures, hence the bound.
    const auto EI = [](const quantity<dimension::length>& x) { return x < 4.0 * m ? 4.0 * kN * m2 : 1.0 * kN * m2; };
    const auto line =
        integrate_moment_area(simple_beam(5.0 * m, 1.0 * kN * m2), point_load(20.0 * kN, at(4.0 * m)), EI, {4.0 * m});
    CHECK(std::abs(line.slope(0.0 * m).value() - 4.8) < 0.05);
    // By hand from M = 4 x, then 16 (5 - x): (1/5) integral of M (5 - x)/EI = (1/5) (56/3 + 16/3) = 24/5.
    CHECK(relative(line.slope(0.0 * m).value(), 4.8) < 1e-13);
}

TEST_CASE("settlements bend no beam that can follow, whatever its stiffness") {
    const auto EI = [](const quantity<dimension::length>& x) { return rigidity(1e6 + 1e5 * x.value()); };
    const auto line = integrate_moment_area(simple_beam(4.0 * m, rigidity(1e6)), settlement(end::right, 8.0 * mm), EI);
    CHECK(relative(line.deflection(1.0 * m).value(), 0.002) < 1e-14);
    CHECK(line.moment(1.0 * m).value() == 0);
}

TEST_CASE("a stiffness that is not greater than zero, and steps that are not on the beam, are refused") {
    const auto b = simple_beam(4.0 * m, rigidity(1e6));
    const auto load = uniform_load(1.0 * kN / m);
    const auto with = [&](auto EI) { return integrate_moment_area(b, load, EI); };
    CHECK_THROWS_AS((void)with([](quantity<dimension::length> x) { return rigidity(1.0 - x.value()); }), invalid_input);
    CHECK_THROWS_AS((void)with([](quantity<dimension::length>) { return rigidity(0.0); }), invalid_input);
    CHECK_THROWS_AS((void)with([](quantity<dimension::length>) { return rigidity(std::nan("")); }), invalid_input);
    CHECK_THROWS_AS((void)with([](quantity<dimension::length>) { return rigidity(HUGE_VAL); }), invalid_input);
    CHECK_NOTHROW((void)with([](quantity<dimension::length>) { return rigidity(1.0); }));

    const auto constant = [](quantity<dimension::length>) { return rigidity(1e6); };
    CHECK_THROWS_AS((void)integrate_moment_area(b, load, constant, {4.0 * m}), invalid_input);
    CHECK_THROWS_AS((void)integrate_moment_area(b, load, constant, {1.0 * m, 4.1 * m}), invalid_input);
    CHECK_THROWS_AS((void)integrate_moment_area(b, load, constant, {0.0 * m}), invalid_input);
    CHECK_THROWS_AS((void)integrate_moment_area(b, load, constant, {-1.0 * m}), invalid_input);
    CHECK_THROWS_AS((void)integrate_moment_area(b, load, constant, {std::nan("") * m}), invalid_input);
    CHECK_THROWS_WITH((void)integrate_moment_area(b, load, constant, {4.5 * m}),
                      "step of EI = 4.5 m must lie between the ends of the beam, 0 m and 4 m");
}

TEST_CASE("the integrator refuses what the closed forms refuse") {
    const auto b = simple_beam(4.0 * m, rigidity(1e6));
    const auto line = integrate_moment_area(b, uniform_load(1.0 * kN / m));
    CHECK_THROWS_AS((void)line.deflection(4.1 * m), invalid_input);
    CHECK_THROWS_AS((void)line.slope(-0.1 * m), invalid_input);
    CHECK_THROWS_AS((void)line.moment(std::nan("") * m), invalid_input);
    CHECK_THROWS_AS((void)line.between(0.0 * m, 5.0 * m), invalid_input);
    CHECK_THROWS_AS((void)integrate_moment_area(b, point_load(1.0 * kN, at(4.1 * m))), invalid_input);
    CHECK_THROWS_AS((void)integrate_moment_area(b, partial_uniform_load(1.0 * kN / m, between(1.0 * m, 4.1 * m))),
                    invalid_input);
    load_list turned;
    turned += support_rotation(end::left, 1.0 * mrad);
    CHECK_THROWS_AS((void)integrate_moment_area(b, turned), invalid_input);
    load_list sunk;
    sunk += settlement(end::right, 1.0 * mm);
    CHECK_THROWS_AS((void)integrate_moment_area(cantilever(4.0 * m, rigidity(1e6)), sunk), invalid_input);
}

TEST_CASE("an integrated line tells what acts at a place, on both sides of a bound") {
    const auto b = propped_cantilever(4.0 * m, 1.0e7 * N * m2);
    const auto loads = partial_uniform_load(3.0 * kN / m, between(1.0 * m, 2.0 * m)) +
                       linear_load(0.0 * kN / m, 6.0 * kN / m, between(2.0 * m, 3.0 * m)) +
                       imposed_curvature(0.002 / m, between(1.0 * m, 3.0 * m)) +
                       imposed_curvature(0.001 / m, between(2.0 * m, 4.0 * m));
    const auto integrated = integrate_moment_area(b, loads);
    const auto curvature_at = [&](double x, side which) {
        return integrated.imposed_curvature(x * m, which) / (0.001 / (1.0 * m));
    };
    const auto load_at = [&](double x, side which) { return integrated.load(x * m, which) / (kN / m); };
    struct place {
        double x, curvature_left, curvature_right, load_left, load_right;
    };
    for (const auto& at : {place{0, 0, 0, 0, 0}, place{0.5, 0, 0, 0, 0}, place{1, 0, 2, 0, 3}, place{1.5, 2, 2, 3, 3},
                           place{2, 2, 3, 3, 0}, place{2.5, 3, 3, 3, 3}, place{3, 3, 1, 6, 0}, place{4, 1, 0, 0, 0}}) {
        CAPTURE(at.x);
        CHECK(curvature_at(at.x, just_left) == doctest::Approx(at.curvature_left).epsilon(1e-14));
        CHECK(curvature_at(at.x, just_right) == doctest::Approx(at.curvature_right).epsilon(1e-14));
        CHECK(load_at(at.x, just_left) == doctest::Approx(at.load_left).epsilon(1e-14));
        CHECK(load_at(at.x, just_right) == doctest::Approx(at.load_right).epsilon(1e-14));
    }
    CHECK(integrated.imposed_curvature(1.0 * m) == integrated.imposed_curvature(1.0 * m, just_right));
    CHECK(integrated.imposed_curvature(4.0 * m) == integrated.imposed_curvature(4.0 * m, just_left));
}
