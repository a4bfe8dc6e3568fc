// Imposed curvatures and temperature gradients: handbook values, the stiffness reference, the integrator.
#include <support/continuous_scene.hpp>
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>

#include <sagitta/cross_check.hpp>
#include <sagitta/elastic_line.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <string>
#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;

namespace {

namespace mp = boost::multiprecision;
using wide = mp::number<mp::cpp_bin_float<50>, mp::et_off>;

constexpr double L = 10, EI = 1e6, kappa = 2e-3;
constexpr auto span = L * m;
constexpr auto rigidity = EI * N * m2;

}  // namespace

TEST_CASE("curvature imposed from a to the right end") {
    // Roark's Formulas for Stress and Strain, table 8.1 cases 6a, 6c and 6d, from memory. There deflections are
    // upward and slopes counter-clockwise positive, and kappa > 0 where the bottom is warmer: it sags.
    const double a = 3, s = L - a;
    const auto warm = imposed_curvature(kappa / m, between(a * m, L * m));
    const auto arm = mirrored(cantilever(span, rigidity)).under(warm);
    CHECK(relative(arm.slope(0.0 * m) / rad, kappa * s) < 1e-13);
    CHECK(relative(arm.deflection(0.0 * m) / m, -kappa * (L * L - a * a) / 2) < 1e-13);
    const auto propped = mirrored(propped_cantilever(span, rigidity)).under(warm);
    CHECK(relative(propped.reaction(end::left) / N, -3 * EI * kappa * (L * L - a * a) / (2 * L * L * L)) < 1e-13);
    CHECK(std::abs(propped.slope(0.0 * m) / rad + kappa * s * (3 * a - L) / (4 * L)) < 1e-13 * kappa * L);
    CHECK(relative(propped.end_moment(end::right) / (N * m), -3 * EI * kappa * (L * L - a * a) / (2 * L * L)) < 1e-13);
    const auto fixed = fixed_beam(span, rigidity).under(warm);
    CHECK(relative(fixed.reaction(end::left) / N, -6 * EI * a * kappa * s / (L * L * L)) < 1e-13);
    CHECK(std::abs(fixed.end_moment(end::left) / (N * m) - EI * kappa * s * (3 * a - L) / (L * L)) <
          1e-13 * EI * kappa);
    CHECK(relative(fixed.end_moment(end::right) / (N * m), -EI * kappa * s * (3 * a + L) / (L * L)) < 1e-13);
}

TEST_CASE("curvature imposed on the whole beam") {
    constexpr auto all = imposed_curvature(kappa / m);
    // Simple: kappa L^2/8 in the middle, no stress. Common practice.
    constexpr auto simple = simple_beam(span, rigidity).under(all);
    static_assert(abs(simple.deflection(5.0 * m) - kappa * L * L / 8 * m) < 1e-15 * m);
    static_assert(simple.moment(3.0 * m) == 0.0 * N * m);
    static_assert(simple.reaction(end::left) == 0.0 * N);
    static_assert(simple.imposed_curvature(3.0 * m) == kappa / m);
    // Propped: reaction 3 EI kappa/(2 L), greatest deflection kappa L^2/27 at L/3 from the prop. Roark, case 6c.
    const auto propped = mirrored(propped_cantilever(span, rigidity)).under(all);
    CHECK(relative(propped.reaction(end::left) / N, -3 * EI * kappa / (2 * L)) < 1e-13);
    CHECK(relative(propped.deflection(L / 3 * m) / m, kappa * L * L / 27) < 1e-13);
    CHECK(std::abs(propped.slope(L / 3 * m) / rad) < 1e-14 * kappa * L);
    // Fixed: M = -EI kappa everywhere, no deflection. Roark, case 6d.
    const auto fixed = fixed_beam(span, rigidity).under(all);
    CHECK(relative(fixed.moment(3.0 * m) / (N * m), -EI * kappa) < 1e-13);
    CHECK(relative(fixed.end_moment(end::left) / (N * m), -EI * kappa) < 1e-13);
    CHECK(std::abs(fixed.deflection(4.0 * m) / m) < 1e-15 * kappa * L * L);
}

TEST_CASE("a temperature gradient is the curvature alpha dT/h, sagging where the bottom is warmer") {
    // TU Delft, Bridging Course Structural Mechanics (open book), week 7, session 3: L = 6 m, top 20 K warmer,
    // alpha = 1e-5/K, h = 0.2 m, EI = 6000 kN m2: free tip 18 mm down, roller 1.5 kN, clamp 9 kN m.
    const auto hot = temperature_gradient(1e-5 / K, 20.0 * K, warm_side::top, 0.2 * m);
    const auto free_tip = cantilever(6.0 * m, 6000.0 * kN * m2).under(hot);
    CHECK(relative(free_tip.deflection(6.0 * m) / mm, 18) < 1e-13);
    const auto held = propped_cantilever(6.0 * m, 6000.0 * kN * m2).under(hot);
    CHECK(relative(held.reaction(end::right) / kN, 1.5) < 1e-13);
    CHECK(relative(held.end_moment(end::left) / (kN * m), 9) < 1e-13);
    constexpr auto bottom = temperature_gradient(1e-5 / K, 20.0 * K, warm_side::bottom, 0.2 * m);
    constexpr auto top = temperature_gradient(1e-5 / K, 20.0 * K, warm_side::top, 200.0 * mm);
    static_assert(bottom.size() > 0.0 / m);
    static_assert(top.size() == -bottom.size());
    static_assert(abs(bottom.size() - 0.001 / m) < 1e-18 / m);
    // Over a stretch.
    constexpr auto part =
        temperature_gradient(1e-5 / K, 20.0 * K, warm_side::bottom, 0.2 * m, between(1.0 * m, 2.0 * m));
    static_assert(part.where().from == 1.0 * m && part.where().to == 2.0 * m);
    static_assert(part.size() == bottom.size());
}

TEST_CASE("a factor on a curvature is a factor on what it does") {
    const auto beam = simple_beam(span, rigidity);
    for (const auto& part : {between(0.0 * m, 4.0 * m), between(3.0 * m, span)}) {
        const auto once = imposed_curvature(kappa / m, part);
        const auto thrice = beam.under(-3.0 * once);
        CHECK(relative(thrice.deflection(5.0 * m) / m, -3.0 * (beam.under(once).deflection(5.0 * m) / m)) < 1e-15);
        CHECK(thrice.imposed_curvature(3.5 * m) == -3.0 * (kappa / m));
    }
}

TEST_CASE("wrong values are refused") {
    const double not_a_number = std::numeric_limits<double>::quiet_NaN();
    const auto has = [](const std::string& said, const char* part) { return said.find(part) != std::string::npos; };
    CHECK(has(refusal([&] { (void)imposed_curvature(not_a_number / m); }), "imposed_curvature: size = nan 1/m"));
    CHECK(has(refusal([&] { (void)imposed_curvature(1.0 / (0.0 * m)); }), "imposed_curvature: size = inf 1/m"));
    for (const double depth : {0.0, -0.2, not_a_number}) {
        CHECK(has(refusal([&] { (void)temperature_gradient(1e-5 / K, 20.0 * K, warm_side::top, depth * m); }),
                  "temperature_gradient: depth = "));
    }
    const auto beyond = imposed_curvature(0.001 / m, between(5.0 * m, 11.0 * m));
    CHECK(has(refusal([&] { (void)simple_beam(span, rigidity).under(beyond); }), "between: to = 11 m"));
}

TEST_CASE("static beams against the stiffness reference, to 1e-13, and the integrator, to 1e-12") {
    constexpr std::uint64_t seed = 41;
    CAPTURE(seed);
    scene::chance random(seed);
    std::array<double, 4> worst{};
    double worst_check = 0;
    for (int i = 0; i < 200; ++i) {
        const double l = i % 2 == 0 ? 7.2 : std::pow(10, random.in(-2, 3));
        scene::with_each_beam(l, 1.75e7, [&](const std::string& name, const auto& b, auto, auto) {
            using beam = std::decay_t<decltype(b)>;
            scene::continuous c;
            c.L = l;
            c.EI = 1.75e7;
            if (beam::left_type::against_deflection) c.supports.push_back({0, scene::rigid});
            if (beam::right_type::against_deflection) c.supports.push_back({l, scene::rigid});
            c.turning = {beam::left_type::against_rotation ? scene::rigid : 0,
                         beam::right_type::against_rotation ? scene::rigid : 0};
            double from = random.in(0, l), to = random.in(0, l);
            if (from > to) std::swap(from, to);
            // Now and then a narrow one, or up to an end.
            if (i % 5 == 0) to = std::min(l, from + 1e-6 * l);
            if (i % 7 == 0) from = 0;
            if (!(from < to)) return;
            c.loads = {{scene::kind::partial_curvature, random.in(-0.1, 0.1) / l, 0, from, to}};
            if (i % 9 == 0) c.loads = {{scene::kind::curvature, random.in(-0.1, 0.1) / l}};
            auto exact = scene::reference_of<wide>(c);
            REQUIRE(exact.solve());
            const auto line = b.under(scene::list_of(c.loads));
            std::array<double, 4> size{}, off{};
            std::vector<double> places = exact.places();
            for (int k = 0; k <= 20; ++k) places.push_back(std::min(l, l * k / 20));
            for (const double x : places) {
                for (std::size_t q = 0; q < 4; ++q) {
                    const wide truth = exact.value(static_cast<reference::quantity>(q), wide(x));
                    const double computed = q == 0   ? line.deflection(x * m).value()
                                            : q == 1 ? line.slope(x * m).value()
                                            : q == 2 ? line.moment(x * m).value()
                                                     : line.shear(x * m).value();
                    size[q] = std::max(size[q], std::abs(static_cast<double>(truth)));
                    off[q] = std::max(off[q], std::abs(static_cast<double>(wide(wide(computed) - truth))));
                }
            }
            CAPTURE(name);
            CAPTURE(i);
            INFO(scene::text(c));
            const double curve = std::abs(c.loads[0].size);
            const std::array<double, 4> implied{curve * l * l, curve * l, curve * c.EI, curve * c.EI / l};
            for (std::size_t q = 0; q < 4; ++q) {
                // What vanishes (but for rounding of the reference too) is measured by what the curvature implies.
                const double error = off[q] / (size[q] < 1e-12 * implied[q] ? implied[q] : size[q]);
                CAPTURE(q);
                CHECK(error <= 1e-13);
                worst[q] = std::max(worst[q], error);
            }
            const double checked = cross_check(line).greatest();
            CHECK(checked <= 1e-12);
            worst_check = std::max(worst_check, checked);
        });
    }
    MESSAGE("greatest errors: deflection " << worst[0] << ", slope " << worst[1] << ", moment " << worst[2]
                                           << ", shear " << worst[3] << "; integrator " << worst_check);
}
