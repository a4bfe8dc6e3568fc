// The conditions of nodes: the law of a spring at any stiffness, equations that determine everything or not.
#include <sagitta/detail/node_equations.hpp>

#include <support/relative.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <limits>

using namespace sagitta::detail;

TEST_CASE("a spring of any stiffness: force = k movement") {
    using law = spring_law<double>;
    for (const double k : {0.0, 1e-300, 1e-6, 0.5, 1.0, 2.0, 1e6, 1e300}) {
        CAPTURE(k);
        const auto spring = law::of(k / 4, 4);
        CHECK(spring.movement <= 1);
        CHECK(spring.force <= 1);
        CHECK(relative(spring.movement, k * spring.force) < 1e-15);
    }
    const auto rigid = law::of(std::numeric_limits<double>::infinity(), 1e-9);
    CHECK(rigid.movement == 1);
    CHECK(rigid.force == 0);
    // The stiffest of all that are not.
    CHECK(law::of(std::numeric_limits<double>::max(), 1).force > 0);
    const auto none = law::of(0, 1e9);
    CHECK(none.movement == 0);
    CHECK(none.force == 1);
}

TEST_CASE("two parts of which every state is known") {
    node_equations<double> equations(2);
    const auto entry = [](std::size_t part, std::size_t k) {
        state_entry<double> e{part};
        e.of[k] = 2;
        e.constant = 0.5;
        return e;
    };
    // Twice the unknown and a half makes as much as is known.
    for (std::size_t i = 0; i < 2; ++i) {
        for (std::size_t k = 0; k < entries_of_state; ++k) {
            equations.add(3.0, entry(i, k)).add(-3.0 * (7.0 + static_cast<double>(4 * i + k))).next();
        }
    }
    const auto found = equations.solve();
    REQUIRE(found.size() == 2);
    for (std::size_t i = 0; i < 2; ++i) {
        for (std::size_t k = 0; k < entries_of_state; ++k) {
            CHECK(relative(found[i][k], (6.5 + static_cast<double>(4 * i + k)) / 2) < 1e-15);
        }
    }
}

TEST_CASE("what the equations do not determine is not a number") {
    node_equations<double> equations(1);
    state_entry<double> e{0, {1, 1, 0, 0}};
    equations.add(1.0, e).add(-1.0).next();
    for (const auto& unknowns : equations.solve()) {
        for (const double each : unknowns) CHECK(std::isnan(each));
    }
}
