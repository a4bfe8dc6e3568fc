// The equations of compatibility: badly mixed units, dependent releases, both kinds of storage.
#include <sagitta/detail/compatibility_equations.hpp>

#include <support/scene.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <array>
#include <cmath>
#include <cstddef>
#include <limits>
#include <vector>

using sagitta::detail::compatibility_equations;

namespace {

template <std::size_t n>
struct fixed_count {
    static constexpr std::size_t size() { return n; }
    template <class Value>
    static constexpr auto values() {
        return std::array<Value, n>{};
    }
    template <class Value>
    static constexpr auto table() {
        return std::array<Value, n * n>{};
    }
};

struct listed_count {
    std::size_t n;
    std::size_t size() const { return n; }
    template <class Value>
    auto values() const {
        return std::vector<Value>(n);
    }
    template <class Value>
    auto table() const {
        return std::vector<Value>(n * n);
    }
};

using system_of_two = compatibility_equations<double, fixed_count<2>>;
using any_system = compatibility_equations<double, listed_count>;

}  // namespace

TEST_CASE("two equations, when compiling") {
    constexpr system_of_two equations({}, {4, 2, 2, 5});
    static_assert(equations.undetermined() == 2);
    static_assert(equations.solve({16, 24}) == std::array<double, 2>{2, 4});
}

TEST_CASE("a matrix of work in any units is solved to rounding") {
    constexpr std::uint64_t seed = 5;
    CAPTURE(seed);
    scene::chance random(seed);
    double worst = 0;
    for (int run = 0; run < 300; ++run) {
        const auto n = static_cast<std::size_t>(random.whole(1, 12));
        // B B^T + 1 is symmetric and positive; each unknown then gets a unit between 1e-8 and 1e8.
        std::vector<std::vector<double>> B(n, std::vector<double>(n));
        for (auto& row : B) {
            for (double& each : row) each = random.in(-1, 1);
        }
        std::vector<double> unit(n), x(n), right(n, 0.0), f(n * n);
        for (std::size_t i = 0; i < n; ++i) {
            unit[i] = std::pow(10, random.in(-8, 8));
            x[i] = random.in(-1, 1) / unit[i];
        }
        for (std::size_t i = 0; i < n; ++i) {
            for (std::size_t j = 0; j < n; ++j) {
                double sum = i == j ? 1 : 0;
                for (std::size_t k = 0; k < n; ++k) sum += B[i][k] * B[j][k];
                f[i * n + j] = sum * unit[i] * unit[j];
                right[i] += f[i * n + j] * x[j];
            }
        }
        const any_system equations({n}, f);
        REQUIRE(equations.undetermined() == n);
        const auto solved = equations.solve(right);
        for (std::size_t i = 0; i < n; ++i) worst = std::max(worst, std::abs(solved[i] - x[i]) * unit[i]);
    }
    MESSAGE("greatest error: " << worst);
    CHECK(worst < 1e-13);
}

TEST_CASE("the first unknown that depends on others is named, whatever its unit") {
    for (const double u : {1e-9, 1.0, 1e9}) {
        CAPTURE(u);
        // The third says the same as the first.
        const any_system twice({3}, {2, u, 2, u, 3 * u * u, u, 2, u, 2});
        CHECK(twice.undetermined() == 2);
        // The second is the sum of the first and the third.
        const any_system sum({3}, {2, 2 * u, 0, 2 * u, 5 * u * u, 3 * u, 0, 3 * u, 3});
        CHECK(sum.undetermined() < 3);
        const any_system independent({3}, {2, 2 * u, 0, 2 * u, 5.001 * u * u, 3 * u, 0, 3 * u, 3});
        CHECK(independent.undetermined() == 3);
    }
    // Of rational numbers nothing is rounding: a share that is left is one, however small.
    using exact =
        boost::multiprecision::number<boost::multiprecision::cpp_rational_backend, boost::multiprecision::et_off>;
    using exact_system = compatibility_equations<exact, listed_count>;
    CHECK(exact_system({2}, {1, 2, 2, 4}).undetermined() == 1);
    const exact little = exact(1) / exact("1000000000000000000000000000000");
    const exact_system near({2}, {1, 1, 1, 1 + little});
    REQUIRE(near.undetermined() == 2);
    CHECK(near.solve({exact(2), exact(2 + little)}) == std::vector<exact>{1, 1});
    const any_system nothing({0}, {});
    CHECK(nothing.undetermined() == 0);
    CHECK(nothing.solve({}).empty());
    // Not a number is no pivot.
    const any_system no_number({1}, {std::numeric_limits<double>::quiet_NaN()});
    CHECK(no_number.undetermined() == 0);
}
