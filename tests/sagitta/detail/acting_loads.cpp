// Loads as plain numbers: what the integrator is told.
#include <sagitta/detail/acting_loads.hpp>

#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>

#include <doctest/doctest.h>

using namespace sagitta;
using namespace sagitta::units;
using detail::acting_kind;

namespace {

constexpr auto all =
    point_load(2.0 * kN, at(1.0 * m)) + applied_couple(-3.0 * kN * m, at(2.0 * m)) + uniform_load(4.0 * kN / m) +
    partial_uniform_load(5.0 * kN / m, between(1.0 * m, 3.0 * m)) + linear_load(6.0 * kN / m, 7.0 * kN / m) +
    linear_load(8.0 * kN / m, 0.0 * kN / m, between(2.0 * m, 4.0 * m)) + settlement(end::left, 1.0 * mm) +
    settlement(end::left, 2.0 * mm) + settlement(end::right, -5.0 * mm) + support_rotation(end::left, 1.0 * mrad) +
    support_rotation(end::right, -2.0 * mrad);

void check(const detail::acting_loads<double>& acting) {
    REQUIRE(acting.loads.size() == 6);
    const auto is = [&](std::size_t i, acting_kind kind, double from, double to, double size_from, double size_to) {
        CAPTURE(i);
        const auto& load = acting.loads[i];
        CHECK(load.kind == kind);
        CHECK(load.from == from);
        CHECK(load.to == to);
        CHECK(load.size_from == size_from);
        CHECK(load.size_to == size_to);
    };
    is(0, acting_kind::point_force, 1, 1, 2e3, 2e3);
    is(1, acting_kind::couple, 2, 2, -3e3, -3e3);
    is(2, acting_kind::line, 0, 6, 4e3, 4e3);
    is(3, acting_kind::line, 1, 3, 5e3, 5e3);
    is(4, acting_kind::line, 0, 6, 6e3, 7e3);
    is(5, acting_kind::line, 2, 4, 8e3, 0);
    CHECK(acting.settlement_left == 0.001 + 0.002);
    CHECK(acting.settlement_right == -0.005);
    CHECK(acting.rotation_left == 0.001);
    CHECK(acting.rotation_right == -0.002);
    CHECK(acting.loads[5].intensity(0.5) == 6e3);
    CHECK(acting.loads[5].centre() == 3);
}

}  // namespace

TEST_CASE("the loads of a composition and of a list are the same numbers") {
    check(detail::acting_loads<double>(all, 6.0));
    load_list list;
    list += all;
    check(detail::acting_loads<double>(list, 6.0));
}
