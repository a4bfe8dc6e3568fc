// The moment-area theorems on continuous beams, by the integrator that finds their redundants by itself.
#include <support/continuous_scene.hpp>
#include <support/relative.hpp>

#include <sagitta/moment_area.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>

using namespace sagitta;
using namespace sagitta::units;

TEST_CASE("the two theorems hold between any two points of a continuous beam without a hinge between them") {
    constexpr std::uint64_t seed = 8201;
    CAPTURE(seed);
    scene::chance random(seed);
    scene::continuous_kind how;
    how.spring_decades = 2;
    how.may_shear = false;
    scene::random_continuous draw(random, how);
    int compared = 0;
    for (int i = 0; i < 200; ++i) {
        CAPTURE(i);
        auto c = draw.draw();
        // So that it bends, even if all the rest goes straight into supports.
        c.loads.push_back({scene::kind::uniform, 0.01 * c.EI / std::pow(c.mean_span, 4)});
        INFO(scene::text(c));
        if (c.hinges.size() > 1) continue;
        try {
            const auto line = scene::beam_of(c).under(scene::list_of(c.loads));
            // On one side of the hinge, which may be one of the points.
            const double low = c.hinges.empty() || random.toss() ? 0 : c.hinges[0];
            const double high = c.hinges.empty() || low > 0 ? c.L : c.hinges[0];
            double slope = 0, deflection = 0;
            for (int k = 0; k <= 200; ++k) {
                slope = std::max(slope, std::abs(line.slope(c.L * k / 200 * m).value()));
                deflection = std::max(deflection, std::abs(line.deflection(c.L * k / 200 * m).value()));
            }
            const double scale = slope * c.L + deflection;
            for (const auto& [from, to] : {std::pair{low, high}, std::pair{random.in(low, high), random.in(low, high)},
                                           std::pair{low, random.in(low, high)}}) {
                const bool rises = from <= to;
                const auto area = moment_area(line, from * m, to * m);
                const double slope_from = line.slope(from * m, rises ? just_right : just_left).value();
                const double slope_to = line.slope(to * m, rises ? just_left : just_right).value();
                const double moved = (line.deflection(to * m, rises ? just_left : just_right) -
                                      line.deflection(from * m, rises ? just_right : just_left))
                                         .value();
                CHECK(std::abs(area.angle_change.value() - (slope_to - slope_from)) <= 1e-11 * slope);
                CHECK(std::abs(area.deviation.value() - (moved - slope_from * (to - from))) <= 1e-11 * scale);
                CHECK(std::abs(area.deviation_of_first.value() - (-moved - slope_to * (from - to))) <= 1e-11 * scale);
                ++compared;
            }
        } catch (const invalid_input&) {
            continue;  // a mechanism
        }
    }
    CHECK(compared > 300);
}

TEST_CASE("by hand on two equal spans: the tangent over the middle support is level") {
    // Each span is a propped cantilever: its free support deviates from that tangent by nothing, and turns by
    // w l^3/48EI against it (common practice, no source).
    const auto line = continuous_beam(8.0 * m, 2e6 * N * m2)
                          .support_at(0.0 * m)
                          .support_at(4.0 * m)
                          .support_at(8.0 * m)
                          .under(uniform_load(3.0 * kN / m));
    const auto area = moment_area(line, 4.0 * m, 8.0 * m);
    CHECK(relative(area.angle_change.value(), -3e3 * 64 / 48 / 2e6) < 1e-13);
    CHECK(std::abs(area.deviation.value()) < 1e-13 * 3e3 * 256 / 2e6);
    const auto across = moment_area(line, 2.0 * m, 6.0 * m);
    // Symmetric points: their slopes are opposite, and each lies as far off the tangent at the other.
    CHECK(relative(across.angle_change.value(), -2 * line.slope(2.0 * m).value()) < 1e-13);
    CHECK(relative(across.deviation.value(), across.deviation_of_first.value()) < 1e-13);
}

TEST_CASE("what the theorems do not hold for is refused") {
    auto b = continuous_beam(12.0 * m, 2e6 * N * m2).support_at(0.0 * m).support_at(5.0 * m).support_at(12.0 * m);
    const auto loads = uniform_load(3.0 * kN / m);
    const auto unbroken = b.under(loads);
    CHECK_THROWS_WITH_AS((void)moment_area(unbroken, 0.0 * m, 12.5 * m),
                         "x = 12.5 m must lie on the beam, from 0 m to 12 m", invalid_input);
    CHECK_THROWS_AS((void)moment_area(unbroken, -0.1 * m, 12.0 * m), invalid_input);
    CHECK_THROWS_AS((void)moment_area(unbroken, std::nan("") * m, 12.0 * m), invalid_input);
    b.hinge_at(7.0 * m);
    const auto line = b.under(loads);
    CHECK_THROWS_WITH_AS((void)moment_area(line, 6.0 * m, 8.0 * m),
                         "moment_area: the hinge = 7 m must not stand between the two points", invalid_input);
    CHECK_THROWS_AS((void)moment_area(line, 8.0 * m, 6.0 * m), invalid_input);
    CHECK_NOTHROW((void)moment_area(line, 0.0 * m, 7.0 * m));
    CHECK_NOTHROW((void)moment_area(line, 12.0 * m, 7.0 * m));
    b.shear_rigidity(50.0 * MN);
    CHECK_THROWS_WITH_AS((void)moment_area(b.under(loads), 8.0 * m, 9.0 * m),
                         "moment_area: kGA = 50000000 N must be infinite: the theorems hold for bending alone",
                         invalid_input);
}
