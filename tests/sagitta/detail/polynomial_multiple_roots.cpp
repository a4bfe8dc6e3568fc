// Roots that are not simple: touching ones, flat passages, roots close together and near the ends.
#include <sagitta/detail/polynomial.hpp>

#include <support/scene.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <cstddef>

using sagitta::detail::polynomial;
using sagitta::detail::roots_between_0_and_1;

namespace {

/// leading (t - r0) (t - r1) ..., multiplied out in long double.
template <std::size_t Degree>
polynomial<double, Degree> with_roots(const std::array<double, Degree>& roots, double leading = 1) {
    std::array<long double, Degree + 1> c{};
    c[0] = leading;
    for (std::size_t known = 0; known < Degree; ++known) {
        for (std::size_t i = known + 1; i > 0; --i) c[i] = c[i - 1] - roots[known] * c[i];
        c[0] *= -roots[known];
    }
    polynomial<double, Degree> p;
    for (std::size_t i = 0; i <= Degree; ++i) p.c[i] = static_cast<double>(c[i]);
    return p;
}

template <std::size_t Degree>
auto roots_of(const polynomial<double, Degree>& p) {
    return roots_between_0_and_1(p, p.noise());
}

}  // namespace

TEST_CASE("a double root anywhere, among simple ones") {
    constexpr std::uint64_t seed = 92;
    CAPTURE(seed);
    scene::chance random(seed);
    int checked = 0;
    for (int i = 0; i < 3000; ++i) {
        const double twice = random.in(0.05, 0.95);
        const double once = random.in(0.05, 0.95);
        const double outside = random.in(1.2, 3);
        if (std::abs(twice - once) < 0.05) continue;
        const auto p = with_roots<5>({twice, twice, once, outside, -outside}, random.toss() ? 2 : -0.3);
        const auto roots = roots_of(p);
        CAPTURE(twice);
        CAPTURE(once);
        REQUIRE(roots.size() == 2);
        const auto& touching = roots[twice < once ? 0 : 1];
        const auto& crossing = roots[twice < once ? 1 : 0];
        CHECK(std::abs(touching.at - twice) < 1e-7);
        CHECK(std::abs(crossing.at - once) < 1e-12);
        CHECK_FALSE(touching.crosses);
        CHECK(crossing.crosses);
        ++checked;
    }
    CHECK(checked > 2000);
}

TEST_CASE("two double roots") {
    const auto roots = roots_of(with_roots<4>({0.25, 0.25, 0.75, 0.75}));
    REQUIRE(roots.size() == 2);
    CHECK_FALSE(roots[0].crosses);
    CHECK_FALSE(roots[1].crosses);
    CHECK(std::abs(roots[0].at - 0.25) < 1e-8);
    CHECK(std::abs(roots[1].at - 0.75) < 1e-8);
}

TEST_CASE("flat passages: threefold and fivefold roots cross, fourfold ones touch") {
    const auto three = roots_of(with_roots<4>({0.5, 0.5, 0.5, 2.0}));
    REQUIRE(three.size() == 1);
    CHECK(three[0].crosses);
    CHECK(std::abs(three[0].at - 0.5) < 1e-4);
    const auto four = roots_of(with_roots<4>({0.5, 0.5, 0.5, 0.5}));
    REQUIRE(four.size() == 1);
    CHECK_FALSE(four[0].crosses);
    CHECK(std::abs(four[0].at - 0.5) < 1e-3);
    const auto five = roots_of(with_roots<5>({0.5, 0.5, 0.5, 0.5, 0.5}));
    REQUIRE(five.size() == 1);
    CHECK(five[0].crosses);
    CHECK(std::abs(five[0].at - 0.5) < 1e-2);
    // One of each kind.
    const auto mixed = roots_of(with_roots<5>({0.25, 0.25, 0.25, 0.75, 0.75}));
    REQUIRE(mixed.size() == 2);
    CHECK(mixed[0].crosses);
    CHECK_FALSE(mixed[1].crosses);
}

TEST_CASE("two roots close together are two, or one that touches when rounding cannot part them") {
    for (const double apart : {1e-2, 1e-3, 1e-4, 1e-5, 1e-6}) {
        CAPTURE(apart);
        const auto roots = roots_of(with_roots<3>({0.4, 0.4 + apart, 2.0}));
        REQUIRE(roots.size() == 2);
        CHECK(roots[0].crosses);
        CHECK(roots[1].crosses);
        CHECK(std::abs(roots[0].at - 0.4) < 1e-2 * apart);
        CHECK(std::abs(roots[1].at - 0.4 - apart) < 1e-2 * apart);
    }
    for (const double apart : {1e-9, 1e-10, 1e-12}) {
        CAPTURE(apart);
        const auto roots = roots_of(with_roots<3>({0.4, 0.4 + apart, 2.0}));
        REQUIRE(roots.size() == 1);
        CHECK_FALSE(roots[0].crosses);
    }
}

TEST_CASE("the count is never odd where the ends have one sign") {
    // Whatever rounding makes of a near-double root, the sign behind it must be right.
    constexpr std::uint64_t seed = 93;
    CAPTURE(seed);
    scene::chance random(seed);
    for (int i = 0; i < 5000; ++i) {
        const double at = random.in(0.1, 0.9);
        const double apart = std::pow(10, random.in(-12, -1));
        const auto p = with_roots<4>({at, std::min(0.95, at + apart), random.in(1.1, 2), -1.0});
        int changes = 0;
        for (const auto& root : roots_of(p)) changes += root.crosses ? 1 : 0;
        CAPTURE(at);
        CAPTURE(apart);
        CHECK(changes % 2 == 0);
    }
}

TEST_CASE("roots at the ends are the caller's") {
    CHECK(roots_of(with_roots<2>({0.0, 1.0})).empty());
    CHECK(roots_of(with_roots<2>({0.0, 0.0})).empty());
    CHECK(roots_of(with_roots<3>({1.0, 1.0, 1.0})).empty());
    const auto inner = roots_of(with_roots<3>({0.0, 0.5, 1.0}));
    REQUIRE(inner.size() == 1);
    CHECK(inner[0].at == doctest::Approx(0.5).epsilon(1e-14));
    CHECK(inner[0].crosses);
}

TEST_CASE("roots a little inside the ends") {
    for (const double inside : {1e-3, 1e-6, 1e-9}) {
        CAPTURE(inside);
        const auto roots = roots_of(with_roots<3>({inside, 1 - inside, 2.0}));
        REQUIRE(roots.size() == 2);
        CHECK(std::abs(roots[0].at - inside) < 1e-14);
        CHECK(std::abs(roots[1].at - (1 - inside)) < 1e-14);
    }
}

TEST_CASE("a polynomial that is zero has no root to name") {
    CHECK(polynomial<double, 3>{}.is_zero());
    CHECK(polynomial<double, 3>{}.noise() == 0);
    CHECK_FALSE((polynomial<double, 1>{{{0, 1e-300}}}.is_zero()));
    CHECK((polynomial<double, 2>{{{1, -2, 3}}}.noise() == doctest::Approx(6 * 4 * 0x1p-52)));
}

TEST_CASE("double roots in high precision") {
    using wide = boost::multiprecision::cpp_bin_float_50;
    polynomial<wide, 3> p;
    // (t - 1/3)^2 (t - 2), with 1/3 as good as it gets.
    const wide third = wide(1) / 3;
    p.c = {wide(-2 * third * third), wide(third * third + 4 * third), wide(-2 - 2 * third), wide(1)};
    const auto roots = roots_between_0_and_1(p, p.noise());
    REQUIRE(roots.size() == 1);
    CHECK_FALSE(roots[0].crosses);
    CHECK(abs(roots[0].at - third) < wide(1e-24));
}
