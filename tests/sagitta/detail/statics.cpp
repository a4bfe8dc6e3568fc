// Fields that balance one load on a released structure: V = dM/dx, jumps by the load, and the ends that the
// released structure leaves free are unstressed.
#include <sagitta/detail/statics.hpp>

#include <doctest/doctest.h>

#include <cmath>

using namespace sagitta;
using namespace sagitta::detail;

namespace {

constexpr double L = 4;
constexpr acting_load<double> each_kind[] = {{acting_kind::point_force, 1.5, 1.5, 3, 3},
                                             {acting_kind::couple, 2.5, 2.5, 5, 5},
                                             {acting_kind::line, 1, 3, 2, 2},
                                             {acting_kind::line, 0.5, 3.5, -1, 4},
                                             {acting_kind::line, 0, 4, 0, 3}};

double all_of(const acting_load<double>& load) {
    switch (load.kind) {
        case acting_kind::point_force:
            return load.size_from;
        case acting_kind::couple:
            return 0;
        case acting_kind::line:
            return (load.size_from + load.size_to) / 2 * (load.to - load.from);
    }
    return 0;
}

}  // namespace

TEST_CASE("each released structure balances each load") {
    for (const auto how : {carried::from_left, carried::from_right, carried::by_both}) {
        for (const auto& load : each_kind) {
            CAPTURE(static_cast<int>(how));
            CAPTURE(static_cast<int>(load.kind));
            const balanced_load<double> field(load, how, L);
            const auto at = [&](double x, side which) { return field.at({x, 0}, which); };
            // From the outside of one end to the outside of the other the shear falls by the whole load.
            CHECK(std::abs(at(0, just_left).shear - at(L, just_right).shear - all_of(load)) < 1e-13);
            if (how == carried::from_left) CHECK(at(L, just_right).shear == 0);
            if (how == carried::from_right) CHECK(at(0, just_left).shear == 0);
            if (how != carried::from_left) CHECK(at(0, just_left).moment == 0);
            if (how != carried::from_right) CHECK(std::abs(at(L, just_right).moment) < 1e-14);
            for (const double x : {0.25, 0.75, 1.25, 2.25, 3.25, 3.75}) {
                CAPTURE(x);
                // Moments are cubics at most: central differences leave h^2 M'''/6, and M''' = -w' = 5/3 at most.
                const double h = 1e-3;
                const double slope = (at(x + h, just_right).moment - at(x - h, just_right).moment) / (2 * h);
                CHECK(std::abs(slope - at(x, just_right).shear) < 1e-6);
            }
            if (load.kind != acting_kind::line) {
                const auto before = at(load.from, just_left);
                const auto after = at(load.from, just_right);
                const bool is_force = load.kind == acting_kind::point_force;
                CHECK(std::abs(before.shear - after.shear - (is_force ? load.size_from : 0)) < 1e-14);
                CHECK(std::abs(after.moment - before.moment - (is_force ? 0 : load.size_from)) < 1e-14);
            }
        }
    }
}

TEST_CASE("a line load acts between its ends, each seen from inside") {
    const balanced_load<double> field({acting_kind::line, 1, 3, 2, 4}, carried::by_both, L);
    CHECK(field.intensity(1, just_left) == 0);
    CHECK(field.intensity(1, just_right) == 2);
    CHECK(field.intensity(2, just_left) == 3);
    CHECK(field.intensity(2, just_right) == 3);
    CHECK(field.intensity(3, just_left) == 4);
    CHECK(field.intensity(3, just_right) == 0);
    const balanced_load<double> force({acting_kind::point_force, 1, 1, 2, 2}, carried::by_both, L);
    CHECK(force.intensity(1, just_right) == 0);
}

TEST_CASE("the nearer clamped end carries a load") {
    const acting_load<double> left{acting_kind::point_force, 1, 1, 1, 1};
    const acting_load<double> right{acting_kind::point_force, 3, 3, 1, 1};
    using held::fixed;
    using held::pinned;
    CHECK(carrier_of<pinned, pinned>(left, L) == carried::by_both);
    CHECK(carrier_of<fixed, fixed>(left, L) == carried::from_left);
    CHECK(carrier_of<fixed, fixed>(right, L) == carried::from_right);
    CHECK(carrier_of<fixed, pinned>(right, L) == carried::by_both);
    CHECK(carrier_of<fixed, held::free>(right, L) == carried::from_left);
    CHECK(carrier_of<held::free, fixed>(left, L) == carried::from_right);
}
