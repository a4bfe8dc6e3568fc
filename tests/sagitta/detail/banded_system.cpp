// Gauss elimination in a band: against known solutions, with row exchanges, and what is not determined.
#include <sagitta/detail/banded_system.hpp>

#include <support/scene.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <cstddef>
#include <vector>

using sagitta::detail::banded_system;

namespace {

/// Random equations with a known solution; a zero diagonal makes row exchanges necessary.
template <std::size_t reach>
double greatest_residual(std::size_t n, scene::chance& random, bool zero_diagonal) {
    banded_system<double, reach> system(n);
    std::vector<std::vector<double>> rows(n, std::vector<double>(n, 0.0));
    std::vector<double> right(n);
    for (std::size_t i = 0; i < n; ++i) {
        const std::size_t first = i > reach ? i - reach : 0;
        const std::size_t last = std::min(n - 1, i + reach);
        for (std::size_t j = first; j <= last; ++j) {
            rows[i][j] = i == j && zero_diagonal ? 0 : random.in(-1, 1);
            system(i, j) = rows[i][j];
        }
        right[i] = random.in(-1, 1);
        system.right_hand_side(i) = right[i];
    }
    std::vector<double> x;
    if (system.solve(x) < n) return HUGE_VAL;
    double worst = 0;
    double size = 0;
    for (const double each : x) size = std::max(size, std::abs(each));
    for (std::size_t i = 0; i < n; ++i) {
        double sum = -right[i];
        for (std::size_t j = 0; j < n; ++j) sum += rows[i][j] * x[j];
        worst = std::max(worst, std::abs(sum) / std::max(1.0, size));
    }
    return worst;
}

}  // namespace

TEST_CASE("random bands are solved to rounding") {
    constexpr std::uint64_t seed = 11;
    CAPTURE(seed);
    scene::chance random(seed);
    double worst = 0;
    for (int i = 0; i < 500; ++i) {
        const auto n = static_cast<std::size_t>(random.whole(1, 40));
        worst = std::max({worst, greatest_residual<1>(n, random, false), greatest_residual<3>(n, random, false)});
        // With a band of one and a zero diagonal an odd number of equations is singular.
        worst = std::max(worst, greatest_residual<3>(n < 2 ? 2 : n, random, true));
    }
    MESSAGE("greatest residual: " << worst);
    CHECK(worst < 1e-13);
}

TEST_CASE("integers with row exchanges, exactly") {
    // x1 = 3 first, then x0 from the second row, and so on: every diagonal entry is zero.
    banded_system<double, 1> system(4);
    system(0, 1) = 2;
    system.right_hand_side(0) = 6;
    system(1, 0) = 4;
    system(1, 2) = 1;
    system.right_hand_side(1) = 9;
    system(2, 1) = 1;
    system(2, 3) = 1;
    system.right_hand_side(2) = 7;
    system(3, 2) = 8;
    system.right_hand_side(3) = 8;
    std::vector<double> x;
    REQUIRE(system.solve(x) == 4);
    CHECK(x == std::vector<double>{2, 3, 1, 4});
}

TEST_CASE("the first unknown that is not determined is named") {
    std::vector<double> x;
    banded_system<double, 1> nothing(3);
    CHECK(nothing.solve(x) == 0);
    banded_system<double, 1> second(3);
    second(0, 0) = 1;
    second(2, 2) = 1;
    CHECK(second.solve(x) == 1);
    // Two rows that say the same.
    banded_system<double, 1> twice(2);
    twice(0, 0) = 1;
    twice(0, 1) = 0.5;
    twice(1, 0) = 2;
    twice(1, 1) = 1;
    CHECK(twice.solve(x) == 1);
    // Not a number is no pivot.
    banded_system<double, 1> not_a_number(1);
    not_a_number(0, 0) = std::nan("");
    CHECK(not_a_number.solve(x) == 0);
}

TEST_CASE("one equation, and a long chain") {
    banded_system<double, 3> one(1);
    one(0, 0) = 4;
    one.right_hand_side(0) = 10;
    std::vector<double> x;
    REQUIRE(one.solve(x) == 1);
    CHECK(x[0] == 2.5);
    // How large its numbers are says nothing of whether an equation determines anything.
    banded_system<double, 3> small(1);
    small(0, 0) = 4e-30;
    small.right_hand_side(0) = 1e-29;
    REQUIRE(small.solve(x) == 1);
    CHECK(x[0] == doctest::Approx(2.5));
    // x(i-1) - 2 x(i) + x(i+1) = -2/(n+1)^2: the parabola t (1 - t) exactly, t = (i+1)/(n+1).
    const std::size_t n = 999;
    banded_system<double, 1> chain(n);
    for (std::size_t i = 0; i < n; ++i) {
        chain(i, i) = 2;
        if (i > 0) chain(i, i - 1) = -1;
        if (i + 1 < n) chain(i, i + 1) = -1;
        chain.right_hand_side(i) = 2e-6;
    }
    REQUIRE(chain.solve(x) == n);
    double worst = 0;
    for (std::size_t i = 0; i < n; ++i) {
        const double t = static_cast<double>(i + 1) / static_cast<double>(n + 1);
        worst = std::max(worst, std::abs(x[i] - t * (1 - t)));
    }
    CHECK(worst < 1e-11);
}

TEST_CASE("a system that elimination alone solves to nine digits is solved to rounding") {
    // Fourth differences of 300 whole numbers: everything given is exact, the condition number is some 1e9.
    constexpr std::size_t n = 300;
    const std::array<double, 3> coefficient{6, -4, 1};
    scene::chance random(77);
    std::vector<double> whole(n);
    for (double& each : whole) each = random.whole(-1000, 1000);
    banded_system<double, 2> system(n);
    for (std::size_t i = 0; i < n; ++i) {
        for (std::size_t j = 0; j < n; ++j) {
            const std::size_t apart = i < j ? j - i : i - j;
            if (apart > 2) continue;
            system(i, j) = coefficient[apart];
            system.right_hand_side(i) += coefficient[apart] * whole[j];
        }
    }
    std::vector<double> x;
    REQUIRE(system.solve(x) == n);
    for (std::size_t i = 0; i < n; ++i) CHECK(std::abs(x[i] - whole[i]) <= 1e-12);
}

TEST_CASE("a row that is taken off as it is, and one that needs none") {
    // x + y = 3, x - y = 1; and below a zero: z = 7.
    banded_system<double, 1> system(3);
    system(0, 0) = system(0, 1) = system(1, 0) = system(2, 2) = 1;
    system(1, 1) = -1;
    system.right_hand_side(0) = 3;
    system.right_hand_side(1) = 1;
    system.right_hand_side(2) = 7;
    std::vector<double> x;
    REQUIRE(system.solve(x) == 3);
    CHECK(x == std::vector<double>{2, 1, 7});
}
