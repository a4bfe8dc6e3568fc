// The flexibility matrix: typed coefficients and the check of reciprocal displacements.
#include <sagitta/detail/flexibility_matrix.hpp>

#include <support/doctest_quantities.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <limits>
#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr release_types::release_pack two(translation_at(4.0 * m), rotation_at(0.0 * m));
using matrix = flexibility_matrix<std::remove_const_t<decltype(two)>, double>;
constexpr auto f = matrix(two)
                       .with<0, 0>(2.0 * mm / kN)
                       .with<0, 1>(0.0005 / kN)
                       .with<1, 0>(0.5 * mrad / kN)
                       .with<1, 1>(0.8 * mrad / (kN * m));

}  // namespace

TEST_CASE("coefficients have dimensions of their own") {
    static_assert(f.coefficient<0, 0>() == 2.0 * mm / kN);
    static_assert(f.coefficient<0, 1>() == 0.0005 / kN);
    static_assert(f.coefficient<1, 0>() == 0.5 * mrad / kN);
    static_assert(f.coefficient<1, 1>() == 0.8 * mrad / (kN * m));
    static_assert(!std::is_same_v<decltype(f.coefficient<0, 1>()), decltype(f.coefficient<1, 0>())>);
    // Times the redundants of their columns they add up to the displacement of their row.
    static_assert(f.coefficient<0, 0>() * (3.0 * kN) + f.coefficient<0, 1>() * (4.0 * kN * m) == 8.0 * mm);
}

TEST_CASE("a wrong coefficient shows in the residual as its own size, in any unit") {
    static_assert(f.reciprocity_residual() < 1e-15);
    const double size = std::sqrt(2e-6 * 0.8e-6);  // the root of f_00 f_11
    for (const double error : {1e-12, 1e-6, 0.01, -1.0}) {
        const auto wrong = f.with<0, 1>(0.0005 / kN * (1 + error));
        CHECK(wrong.reciprocity_residual() == doctest::Approx(std::abs(error) * 5e-7 / size).epsilon(2e-3));
    }
    // The same with a force of other size for the unit: the residual is a pure number.
    const auto mixed = f.with<0, 1>(0.0006 / kN);
    const auto other = matrix(two)
                           .with<0, 0>(2e9 * mm / kN)
                           .with<0, 1>(600.0 / kN)
                           .with<1, 0>(5e5 * mrad / kN)
                           .with<1, 1>(8e2 * mrad / (kN * m));
    CHECK(other.reciprocity_residual() == doctest::Approx(mixed.reciprocity_residual()).epsilon(2e-3));
}

TEST_CASE("coefficients that cannot be are refused") {
    CHECK_THROWS_WITH_AS((void)(f.with<0, 0>(0.0 * mm / kN)),
                         "flexibility coefficient = 0 must be greater than 0 on the diagonal", invalid_input);
    CHECK_THROWS_WITH_AS((void)(f.with<0, 1>(std::numeric_limits<double>::quiet_NaN() / kN)),
                         "flexibility coefficient = nan must be a finite number", invalid_input);
}

TEST_CASE("geometric means of numbers far apart") {
    for (const double a : {1e-150, 1e-9, 1.0, 3.0, 1e140}) {
        for (const double b : {1e-140, 1e-3, 1.0, 1e12, 1e150}) {
            CHECK(detail::geometric_mean(a, b) == doctest::Approx(std::sqrt(a) * std::sqrt(b)).epsilon(1e-3));
        }
    }
    const double least = std::numeric_limits<double>::denorm_min();
    CHECK(detail::geometric_mean(least, 2 * least) <= 2 * least);  // and ends
}
