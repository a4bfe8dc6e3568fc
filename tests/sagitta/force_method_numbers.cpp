// The force method in other number types: exactly in rational numbers, in long double, with dual numbers.
#include <sagitta/force_method.hpp>

#include <support/differences.hpp>
#include <support/stiffness_reference.hpp>

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <array>
#include <cmath>
#include <limits>
#include <type_traits>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

using rational =
    boost::multiprecision::number<boost::multiprecision::cpp_rational_backend, boost::multiprecision::et_off>;

constexpr double rigid = std::numeric_limits<double>::infinity();

}  // namespace

TEST_CASE("in rational numbers every step is exact") {
    // Clamped at 0, a support at 3 that has sunk, a spring at 8: released to a simple beam and to a cantilever, against
    // direct stiffness in rational numbers.
    reference::continuous<rational> original(8, 512);
    original.add_spring(0, rigid);
    original.hold_turning(true, rigid);
    original.add_spring(3, rigid);
    original.add_settlement(3, 0.125);
    original.add_spring(8, rigid);
    original.add_spring(5, 24);
    original.add_force(10, 2);
    original.add_couple(-6, 4);
    original.add_line(3, 3, 0, 8);
    REQUIRE(original.solve());

    const auto length = [](int x) { return rational(x) * m; };
    const auto EI = rational(512) * N * m2;
    const auto loads = point_load(rational(10) * N, at(length(2))) +
                       applied_couple(rational(-6) * N * m, at(length(4))) + uniform_load(rational(3) * N / m);
    const auto sunk = translation_at(length(3)).prescribed(rational(1, 8) * m);
    const auto spring = translation_at(length(5)).on_spring(rational(24) * N / m);
    const auto compare = [&](const auto& solved) {
        CHECK(solved.reciprocity_residual() == 0);
        CHECK(solved.template reaction<0>().value() == original.reaction(3));
        CHECK(solved.template reaction<1>().value() == original.reaction(5));
        const auto line = solved.line();
        for (const int x : {0, 1, 3, 4, 7, 8}) {
            CAPTURE(x);
            using reference::quantity;
            CHECK(line.deflection(length(x)).value() == original.value(quantity::deflection, rational(x)));
            CHECK(line.slope(length(x)).value() == original.value(quantity::slope, rational(x)));
        }
        CHECK(line.moment(length(0)).value() == original.end_moment(true));
    };
    compare(force_method(simple_beam(length(8), EI), sunk, spring, rotation_at(length(0))).under(loads));
    compare(force_method(cantilever(length(8), EI), sunk, spring, translation_at(length(8))).under(loads));
    compare(force_method(propped_cantilever(length(8), EI), sunk, spring).under(loads));
    // What does not depend on it is independent, however close; what does is refused exactly.
    const auto near = translation_at((rational(3) + rational(1, 1000000000)) * m);
    CHECK_NOTHROW((void)force_method(simple_beam(length(8), EI), sunk, near));
    CHECK_THROWS_AS((void)force_method(simple_beam(length(8), EI), sunk, spring, sunk), invalid_input);
}

TEST_CASE("long double stays long double, and closes to its rounding") {
    const auto solved = force_method(simple_beam(7.25L * m, 1048576.0L * N * m2), translation_at(3.0L * m),
                                     rotation_at(0.0L * m), translation_at(5.0L * m))
                            .under(uniform_load(704.0L * N / m));
    static_assert(std::is_same_v<decltype(solved.redundant<0>())::value_type, long double>);
    static_assert(std::is_same_v<decltype(solved.flexibility<0, 1>())::value_type, long double>);
    constexpr long double ulp = std::numeric_limits<long double>::epsilon();
    const auto line = solved.line();
    const auto size = solved.displacement<0>().value();
    CHECK(std::abs(line.deflection(3.0L * m).value()) < 32 * ulp * size);
    CHECK(std::abs(line.deflection(5.0L * m).value()) < 32 * ulp * size);
    CHECK(std::abs(line.slope(0.0L * m).value()) < 32 * ulp * size);
    CHECK(solved.reciprocity_residual() < 16 * ulp);
    // Also where only a place is a long double.
    const auto third = 1.0L / 3;
    const auto mixed = force_method(simple_beam(1.0 * m, 1.0 * N * m2), translation_at(third * m));
    const long double expected = third * third * (1 - third) * (1 - third) / 3;
    CHECK(std::abs(mixed.flexibility().coefficient<0, 0>().value() - expected) < 8 * ulp * expected);
    static_assert(std::is_same_v<decltype(force_method(simple_beam(7.0F * m, 8.0F * N * m2), translation_at(3.0F * m))
                                              .under(uniform_load(1.0F * N / m))
                                              .redundant<0>())::value_type,
                                 float>);
}

TEST_CASE("dual numbers through every step: a mixed matrix, a spring and a settlement") {
    constexpr std::array names{"L", "EI", "first", "second", "settlement", "spring", "P", "a", "w"};
    constexpr std::array inputs{12.5, 2.0e7, 4.0, 8.25, 0.006, 8.0e6, 31000.0, 6.7, 7200.0};
    differences::compare(names, inputs, [](const auto& given) {
        using T = typename std::decay_t<decltype(given)>::value_type;
        const auto& [L, EI, first, second, sunk, k, P, a, w] = given;
        const auto solved =
            force_method(simple_beam(L * m, EI * N * m2), translation_at(first * m).prescribed(sunk * m),
                         rotation_at(T(0) * m), translation_at(second * m).on_spring(k * N / m))
                .under(point_load(P * N, at(a * m)) + uniform_load(w * N / m));
        const auto line = solved.line();
        return std::vector<differences::answer<T>>{
            {"displacement", solved.template displacement<0>().value()},
            {"flexibility", solved.template flexibility<0, 1>().value()},
            {"redundant force", solved.template redundant<0>().value()},
            {"redundant couple", solved.template redundant<1>().value()},
            {"spring", solved.template reaction<2>().value()},
            {"moment", line.moment(T(4.5) * m).value()},
            {"deflection", line.deflection(T(10.5) * m).value()},
        };
    });
}

TEST_CASE("dual numbers through a hinge that is closed") {
    constexpr std::array names{"first span", "second span", "EI", "w", "joint"};
    constexpr std::array inputs{4.0, 6.5, 1.0e6, 1000.0, 2.0e5};
    differences::compare(names, inputs, [](const auto& given) {
        using T = typename std::decay_t<decltype(given)>::value_type;
        const auto& [l1, l2, EI, w, k] = given;
        const auto spans = continuous_beam((l1 + l2) * m, EI * N * m2)
                               .support_at(T(0) * m)
                               .support_at(l1 * m)
                               .support_at((l1 + l2) * m)
                               .hinge_at(l1 * m);
        release_list<T> list;
        const auto joint = list.add(relative_rotation_at(l1 * m).on_spring(k * N * m / rad));
        const auto solved = force_method(spans, list).under(uniform_load(w * N / m));
        return std::vector<differences::answer<T>>{
            {"kink", solved.displacement(joint).value()},
            {"moment", solved.redundant(joint).value()},
            {"reaction", solved.line().reaction(end::left).value()},
        };
    });
}
