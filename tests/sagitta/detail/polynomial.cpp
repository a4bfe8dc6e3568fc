// Roots of polynomials: made from known roots, and found again.
#include <sagitta/detail/polynomial.hpp>

#include <support/scene.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <vector>

using sagitta::detail::polynomial;
using sagitta::detail::roots_between_0_and_1;

namespace {

/// leading (t - r0) (t - r1) ...
template <std::size_t Degree>
polynomial<double, Degree> with_roots(const std::array<double, Degree>& roots, double leading) {
    polynomial<double, Degree> p;
    p.c[0] = leading;
    for (std::size_t known = 0; known < Degree; ++known) {
        for (std::size_t i = known + 1; i > 0; --i) p.c[i] = p.c[i - 1] - roots[known] * p.c[i];
        p.c[0] *= -roots[known];
    }
    return p;
}

}  // namespace

TEST_CASE("a polynomial and its derivative") {
    constexpr polynomial<double, 3> p{{{5, -4, 3, 2}}};
    static_assert(p(0.0) == 5);
    static_assert(p(1.0) == 6);
    static_assert(p(-2.0) == 5 + 8 + 12 - 16);
    static_assert(p.derivative().c == std::array<double, 3>{-4, 6, 6});
}

TEST_CASE("roots that are well apart are all found, each once") {
    constexpr std::uint64_t seed = 91;
    CAPTURE(seed);
    scene::chance random(seed);
    for (int i = 0; i < 2000; ++i) {
        std::array<double, 4> roots;
        for (double& r : roots) r = random.in(-0.5, 1.5);
        std::sort(roots.begin(), roots.end());
        bool apart = true;
        for (std::size_t k = 1; k < 4; ++k) apart = apart && roots[k] - roots[k - 1] > 0.02;
        for (const double r : roots) apart = apart && std::abs(r) > 0.01 && std::abs(r - 1) > 0.01;
        if (!apart) continue;
        const auto p = with_roots(roots, random.toss() ? 3.0 : -0.01);
        std::vector<double> expected;
        for (const double r : roots) {
            if (r > 0 && r < 1) expected.push_back(r);
        }
        const auto found = roots_between_0_and_1(p, p.noise());
        REQUIRE(found.size() == expected.size());
        for (std::size_t k = 0; k < expected.size(); ++k) {
            CHECK(std::abs(found[k].at - expected[k]) < 1e-8);
            // As close as the value of the polynomial can tell.
            CHECK(std::abs(found[k].at - expected[k]) * std::abs(p.derivative()(expected[k])) < 4 * p.noise());
            CHECK(found[k].crosses);
        }
    }
}

TEST_CASE("a double root is one root that does not cross") {
    // (t - 1/2)^2 and (t - 1/4)^2 (t - 3/4): binary fractions, so that the roots are exact.
    const auto touching = roots_between_0_and_1(polynomial<double, 2>{{{0.25, -1, 1}}}, 0.0);
    REQUIRE(touching.size() == 1);
    CHECK(touching[0].at == 0.5);
    CHECK_FALSE(touching[0].crosses);
    const auto p = with_roots<3>({0.25, 0.25, 0.75}, 1);
    const auto both = roots_between_0_and_1(p, p.noise());
    REQUIRE(both.size() == 2);
    CHECK(std::abs(both[0].at - 0.25) < 1e-8);
    CHECK_FALSE(both[0].crosses);
    CHECK(std::abs(both[1].at - 0.75) < 1e-14);
    CHECK(both[1].crosses);
}

TEST_CASE("a triple root crosses") {
    const auto p = with_roots<3>({0.5, 0.5, 0.5}, 1);
    const auto roots = roots_between_0_and_1(p, p.noise());
    REQUIRE(roots.size() == 1);
    CHECK(std::abs(roots[0].at - 0.5) < 1e-5);
    CHECK(roots[0].crosses);
}

TEST_CASE("no root where there is none") {
    CHECK(roots_between_0_and_1(polynomial<double, 2>{{{1, 0, 1}}}, 0.0).empty());
    CHECK(roots_between_0_and_1(polynomial<double, 4>{{{1, 1, 1, 1, 1}}}, 0.0).empty());
    CHECK(roots_between_0_and_1(polynomial<double, 4>{{{-1e-3, 0, 0, 0, -1}}}, 0.0).empty());
    CHECK(roots_between_0_and_1(polynomial<double, 1>{{{1, 0}}}, 0.0).empty());
    CHECK(roots_between_0_and_1(polynomial<double, 1>{{{2, -1}}}, 0.0).empty());
}

TEST_CASE("polynomials of less degree than room for it") {
    const auto roots = roots_between_0_and_1(polynomial<double, 4>{{{-0.25, 1, 0, 0, 0}}}, 0.0);
    REQUIRE(roots.size() == 1);
    CHECK(roots[0].at == 0.25);
}

TEST_CASE("roots are found when compiling") {
    static_assert(roots_between_0_and_1(polynomial<double, 1>{{{-1, 2}}}, 0.0)[0].at == 0.5);
    static_assert(roots_between_0_and_1(polynomial<double, 2>{{{3.0 / 16, -1, 1}}}, 0.0).size() == 2);
}
