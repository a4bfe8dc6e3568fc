// Kinks and offsets: the reciprocal theorem, the integrator with a stiffness that varies, sides, shear, refusals.
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/core.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto L = 7.2 * m;
constexpr auto EI = 1.75e7 * N * m2;

// constexpr like every other load case: a simple beam cut at an angle is two straight parts.
constexpr auto bent = simple_beam(8.0 * m, EI).under(imposed_kink(4.0 * mrad, at(2.0 * m)));
static_assert(abs(bent.deflection(2.0 * m) - 6.0 * mm) < 1e-12 * mm);
static_assert(abs(bent.slope(1.0 * m) - 3.0 * mrad) < 1e-12 * mrad);
static_assert(abs(bent.slope(2.0 * m, just_left) - 3.0 * mrad) < 1e-12 * mrad);
static_assert(abs(bent.slope(2.0 * m) + 1.0 * mrad) < 1e-12 * mrad);
static_assert(bent.moment(5.0 * m) == 0.0 * kN * m);

constexpr auto stepped = simple_beam(8.0 * m, EI).under(imposed_offset(4.0 * mm, at(2.0 * m)));
static_assert(abs(stepped.deflection(2.0 * m, just_left) + 1.0 * mm) < 1e-12 * mm);
static_assert(abs(stepped.deflection(2.0 * m) - 3.0 * mm) < 1e-12 * mm);
static_assert(abs(stepped.slope(7.0 * m) + 0.5 * mrad) < 1e-12 * mrad);

}  // namespace

TEST_CASE("a kink at a section deflects as the moment there tells: the reciprocal theorem (Betti), Mueller-Breslau") {
    scene::with_each_beam(7.2, 1.75e7, [](const std::string& name, const auto& b, auto, auto) {
        CAPTURE(name);
        for (const double section : {0.9, 3.1, 7.0}) {
            for (const double x : {0.4, 3.0, 3.2, 6.9}) {
                const auto loaded = b.under(point_load(1.0 * N, at(x * m)));
                const auto kinked = b.under(imposed_kink(1.0 * rad, at(section * m)));
                const auto cut = b.under(imposed_offset(1.0 * m, at(section * m)));
                CHECK(std::abs(kinked.deflection(x * m) / m - loaded.moment(section * m) / (N * m)) < 1e-13 * 7.2);
                CHECK(std::abs(cut.deflection(x * m) / m - loaded.shear(section * m) / N) < 1e-13);
            }
        }
    });
}

TEST_CASE("at the ends the inner side answers for the beam, the outer one for the support") {
    const auto b = fixed_beam(L, EI);
    const auto left = b.under(imposed_kink(2.0 * mrad, at(0.0 * m)) + imposed_offset(3.0 * mm, at(0.0 * m)));
    CHECK(left.slope(0.0 * m, just_left) == 0.0 * rad);
    CHECK(left.deflection(0.0 * m, just_left) == 0.0 * m);
    CHECK(relative(left.slope(0.0 * m) / rad, -0.002) < 1e-13);
    CHECK(relative(left.deflection(0.0 * m) / m, 0.003) < 1e-13);
    const auto right = b.under(imposed_kink(2.0 * mrad, at(L)) + imposed_offset(3.0 * mm, at(L)));
    CHECK(right.slope(L, just_right) == 0.0 * rad);
    CHECK(relative(right.slope(L) / rad, 0.002) < 1e-13);
    CHECK(relative(right.deflection(L) / m, -0.003) < 1e-13);
    // Beside other loads, and in a list.
    const auto mixed = point_load(5.0 * kN, at(2.0 * m)) + imposed_offset(3.0 * mm, at(L));
    CHECK(relative(b.under(mixed).deflection(L) / m, -0.003) < 1e-13);
    CHECK(relative(b.under(load_list(mixed)).deflection(L) / m, -0.003) < 1e-13);
}

TEST_CASE("a kink at a clamped end is a rotation of its support the other way") {
    const auto b = fixed_beam(L, EI);
    const auto kinked = b.under(imposed_kink(2.0 * mrad, at(0.0 * m)));
    const auto turned = b.under(support_rotation(end::left, -2.0 * mrad));
    for (const double x : {0.0, 1.7, 5.0, 7.2}) {
        CHECK(std::abs((kinked.deflection(x * m) - turned.deflection(x * m)) / m) < 1e-16);
        CHECK(std::abs((kinked.moment(x * m) - turned.moment(x * m)) / (N * m)) < 1e-9);
    }
}

TEST_CASE("the greatest deflection beside an offset, the steepest slope beside a kink") {
    const auto b = simple_beam(8.0 * m, EI);
    const auto worst = greatest_deflection(b.under(imposed_offset(4.0 * mm, at(2.0 * m))));
    CHECK(worst.at == 2.0 * m);
    CHECK(relative(worst.value / m, 0.003) < 1e-13);
    const auto slopes = extremes_of_slope(b.under(imposed_kink(4.0 * mrad, at(2.0 * m))));
    CHECK(relative(slopes.greatest.value / rad, 0.003) < 1e-13);
    CHECK(relative(slopes.least.value / rad, -0.001) < 1e-13);
    // The deflection passes through zero by a jump.
    const auto zeros = zeros_of_deflection(b.under(imposed_offset(4.0 * mm, at(2.0 * m))));
    REQUIRE(zeros.size() == 3);
    CHECK(zeros[1].from == 2.0 * m);
    CHECK(zeros[1].changes_sign);
}

TEST_CASE("the integrator takes them where the stiffness varies") {
    // With a constant EI given as a function, the closed forms are the reference.
    const auto constant = [](const auto&) { return EI; };
    load_list<> loads;
    loads += imposed_kink(2.0 * mrad, at(2.0 * m)) + imposed_offset(-3.0 * mm, at(2.0 * m));
    loads += imposed_offset(1.0 * mm, at(0.0 * m)) + imposed_kink(-1.0 * mrad, at(L)) +
             imposed_kink(0.5 * mrad, at(5.0 * m)) + point_load(3.0 * kN, at(5.0 * m));
    const auto check = [&](const auto& b) {
        const auto closed = b.under(loads);
        const auto integrated = integrate_moment_area(b, loads, constant);
        for (const double x : {0.0, 1.0, 2.0, 3.3, 5.0, 7.2}) {
            for (const side which : {just_left, just_right}) {
                CAPTURE(x);
                CHECK(std::abs((closed.deflection(x * m, which) - integrated.deflection(x * m, which)) / m) < 1e-15);
                CHECK(std::abs((closed.slope(x * m, which) - integrated.slope(x * m, which)) / rad) < 1e-15);
                CHECK(std::abs((closed.moment(x * m, which) - integrated.moment(x * m, which)) / (N * m)) < 1e-8);
            }
            CHECK(closed.deflection(x * m) / m == doctest::Approx(integrated.deflection(x * m) / m).epsilon(1e-12));
        }
        CHECK(relative(greatest_deflection(integrated).value / m, greatest_deflection(closed).value / m) < 1e-12);
        // The moment-area theorems between two sections: what lies between them counts, not what stands right there.
        for (const auto& [from, to] : {std::pair(0.0, 7.2), std::pair(1.0, 2.0), std::pair(2.0, 6.0)}) {
            const auto area = integrated.between(from * m, to * m);
            const auto turn = closed.slope(to * m, just_left) - closed.slope(from * m, just_right);
            CHECK(std::abs((area.angle_change - turn) / rad) < 1e-15);
            const auto deviation =
                closed.deflection(to * m, just_left) - tangent_at(closed, from * m).deflection(to * m);
            CHECK(std::abs((area.deviation - deviation) / m) < 1e-15);
        }
    };
    check(simple_beam(L, EI));
    check(propped_cantilever(L, EI));
    check(fixed_beam(L, EI));
    check(cantilever(L, EI));
    check(mirrored(cantilever(L, EI)));
}

TEST_CASE("shear deformation: stiff in shear it is the same, soft in shear the clamps give way") {
    const auto loads = imposed_kink(2.0 * mrad, at(2.0 * m)) + imposed_offset(3.0 * mm, at(4.0 * m));
    const auto stiff = fixed_beam(L, EI).under(loads);
    const auto rigid = fixed_beam(L, EI).with_shear_rigidity(std::numeric_limits<double>::infinity() * kN).under(loads);
    const auto soft = fixed_beam(L, EI).with_shear_rigidity(4.0e4 * kN).under(loads);
    continuous_beam same(L, EI);
    same.clamp(end::left).clamp(end::right).shear_rigidity(4.0e4 * kN);
    const auto reference = same.under(loads);
    for (const double x : {0.0, 1.0, 2.0, 3.0, 4.0, 5.5, 7.2}) {
        for (const side which : {just_left, just_right}) {
            CHECK(rigid.deflection(x * m, which) == stiff.deflection(x * m, which));
            CHECK(std::abs((soft.deflection(x * m) - reference.deflection(x * m)) / m) < 1e-15);
            CHECK(std::abs((soft.slope(x * m) - reference.slope(x * m)) / rad) < 1e-15);
        }
    }
    CHECK(std::abs(soft.end_moment(end::left) / (N * m)) < std::abs(stiff.end_moment(end::left) / (N * m)));
}

TEST_CASE("what is refused, by name") {
    CHECK(refusal([] { (void)imposed_kink(std::nan("") * rad, at(1.0 * m)); }).find("imposed_kink: size") == 0);
    CHECK(refusal([] { (void)imposed_offset(INFINITY * m, at(1.0 * m)); }).find("imposed_offset: size") == 0);
    CHECK(refusal([] {
              (void)simple_beam(L, EI).under(imposed_kink(1.0 * rad, at(8.0 * m)));
          }).find("imposed_kink: at = 8 m") == 0);
    CHECK(refusal([] {
              (void)simple_beam(L, EI).under(imposed_offset(1.0 * m, at(8.0 * m)));
          }).find("imposed_offset: at = 8 m") == 0);
}
