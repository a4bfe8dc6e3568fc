// Every coefficient and every divisor of the influence functions of pinned and free ends is misprinted in turn,
// and cross_check must notice.
#include <support/misprints.hpp>

#include <sagitta/cross_check.hpp>

#include <doctest/doctest.h>

using namespace misprints;
using held::fixed;
using held::pinned;

TEST_CASE("every misprinted coefficient is noticed: pinned end, pinned far end") {
    misprint_all_rows<pinned, pinned>();
}
TEST_CASE("every misprinted coefficient is noticed: pinned end, clamped far end") {
    misprint_all_rows<pinned, fixed>();
}
TEST_CASE("every misprinted coefficient is noticed: free end, clamped far end") {
    misprint_all_rows<held::free, fixed>();
}

TEST_CASE("a misprint shows under couples, whole-beam loads and imposed movements too") {
    using wrong_shear = misprinted<fixed, row::shear, 2>;
    using wrong_moment = misprinted<fixed, row::moment, 1>;
    using wrong_slope = misprinted<pinned, row::slope, 1>;
    const auto couple = applied_couple(8.0 * kN * m, at(3.1 * m));
    CHECK(discrepancy<wrong_shear, pinned>(couple) > noticed);
    CHECK(discrepancy<wrong_moment, pinned>(couple) > noticed);
    CHECK(discrepancy<wrong_slope, pinned>(couple) > noticed);
    const auto uniform = uniform_load(4.5 * kN / m);
    CHECK(discrepancy<wrong_shear, pinned>(uniform) > noticed);
    CHECK(discrepancy<wrong_moment, pinned>(uniform) > noticed);
    CHECK(discrepancy<wrong_slope, pinned>(uniform) > noticed);
    // The shape of a settlement is the shear's row, that of a rotation the moment's.
    CHECK(discrepancy<wrong_shear, pinned>(settlement(end::left, 5.0 * mm)) > noticed);
    CHECK(discrepancy<wrong_moment, pinned>(support_rotation(end::left, 0.5 * mrad)) > noticed);
    CHECK(discrepancy<pinned, misprinted<fixed, row::shear, 2>>(settlement(end::right, 5.0 * mm)) > noticed);
}
