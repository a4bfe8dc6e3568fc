// Load cases and their vector space, as far as it shows without a beam and on one.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/elastic_line.hpp>
#include <sagitta/load.hpp>

#include <doctest/doctest.h>

#include <tuple>
#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto joist = fixed_beam(7.2 * m, 210.0 * GPa * 8356.0 * cm4);

/// Two compositions have the same effect: compared at places on and between the joints of the cases below.
template <class A, class B>
void check_same_effect(const A& a, const B& b, double of_greatest) {
    const auto first = joist.under(a);
    const auto second = joist.under(b);
    for (const double x : {0.0, 0.7, 1.2, 2.0, 3.0, 4.1, 4.8, 6.3, 7.2}) {
        CAPTURE(x);
        // Sizes under the cases below: 1e-2 m, 1e-2 rad, 1e5 N*m, 1e5 N.
        CHECK(abs(first.deflection(x * m) - second.deflection(x * m)) <= of_greatest * 1e-2 * m);
        CHECK(abs(first.slope(x * m) - second.slope(x * m)) <= of_greatest * 1e-2 * rad);
        CHECK(abs(first.moment(x * m) - second.moment(x * m)) <= of_greatest * 1e5 * N * m);
        CHECK(abs(first.shear(x * m) - second.shear(x * m)) <= of_greatest * 1e5 * N);
        CHECK(abs(first.load(x * m) - second.load(x * m)) <= of_greatest * 1e5 * N / m);
    }
}

constexpr auto a = point_load(22.0 * kN, at(3.0 * m)) + partial_uniform_load(9.0 * kN / m, between(1.2 * m, 4.8 * m));
constexpr auto b = applied_couple(8.0 * kN * m, at(4.1 * m)) + uniform_load(3.0 * kN / m) +
                   linear_load(0.0 * kN / m, 6.0 * kN / m, between(1.2 * m, 4.8 * m)) +
                   linear_load(2.0 * kN / m, 1.0 * kN / m) + settlement(end::left, 5.0 * mm) +
                   support_rotation(end::right, 0.5 * mrad) + imposed_curvature(0.001 / m, between(1.2 * m, 4.8 * m)) +
                   imposed_curvature(-0.0005 / m) + imposed_kink(0.4 * mrad, at(2.0 * m)) +
                   imposed_offset(1.0 * mm, at(3.0 * m));
constexpr auto c = point_load(-7.0 * kN, at(6.3 * m));

}  // namespace

TEST_CASE("superposition is a vector space") {
    constexpr double rounding = 1e-14;
    check_same_effect(a + b, b + a, rounding);
    check_same_effect((a + b) + c, a + (b + c), rounding);
    check_same_effect(a + b - b, a, rounding);
    check_same_effect(a - a + c, c, rounding);
    check_same_effect(2 * a, a + a, rounding);
    check_same_effect(a * 2.0, 2.0 * a, 0);
    check_same_effect(a / 2, 0.5 * a, 0);
    check_same_effect(2 * a / 2, a, 0);
    check_same_effect(-a, -1.0 * a, 0);
    check_same_effect(-(a + b), -a - b, 0);
    check_same_effect(3.0 * (a + b), 3.0 * a + 3.0 * b, 0);
    check_same_effect(0.1 * (0.7 * b), 0.07 * b, rounding);
    check_same_effect((0.3 + 0.7) * b, 0.3 * b + 0.7 * b, rounding);
    check_same_effect(0 * a + b, b, 0);
}

TEST_CASE("a load knows its size and place") {
    constexpr auto force_there = point_load(22.0 * kN, at(3.0 * m));
    static_assert(force_there.size() == 22.0 * kN);
    static_assert(force_there.at() == 3.0 * m);
    static_assert((2 * force_there).size() == 44.0 * kN);
    static_assert((force_there / 4).size() == 5.5 * kN);
    static_assert((-force_there).size() == -22.0 * kN);
    static_assert(applied_couple(8.0 * kN * m, at(7.2 * m)).size() == 8.0 * kN * m);
    static_assert(uniform_load(4.5 * kN / m).size_from() == 4.5 * kN / m);
    constexpr auto ramp = linear_load(1.0 * kN / m, 6.0 * kN / m, between(4.8 * m, 7.2 * m));
    static_assert(ramp.size_from() == 1.0 * kN / m && ramp.size_to() == 6.0 * kN / m);
    static_assert(ramp.where().from == 4.8 * m && ramp.where().to == 7.2 * m);
    static_assert((3 * ramp).size_to() == 18.0 * kN / m);
    static_assert(settlement(end::right, 5.0 * mm).size() == 5.0 * mm);
    static_assert((2 * support_rotation(end::left, 0.5 * mrad)).size() == 1.0 * mrad);
    // alpha dT/h, sagging where the bottom is warmer.
    constexpr auto warm = temperature_gradient(12e-6 / K, 20.0 * K, warm_side::bottom, 0.4 * m);
    static_assert(abs(warm.size() - 6e-4 / m) < 1e-18 / m);
    static_assert(temperature_gradient(12e-6 / K, 20.0 * K, warm_side::top, 0.4 * m).size() == -warm.size());
}

TEST_CASE("compositions are flat and hold their cases in order") {
    static_assert(std::tuple_size_v<std::remove_cvref_t<decltype((a + b).cases())>> == 12);
    static_assert(std::tuple_size_v<std::remove_cvref_t<decltype((c + c).cases())>> == 2);
    static_assert(std::get<1>((c + 2 * c).cases()).size() == -14.0 * kN);
}

TEST_CASE("the number type of a composition is the widest") {
    constexpr auto single = point_load(1.0F * kN, at(1.0F * m));
    static_assert(std::is_same_v<decltype(single)::number, float>);
    static_assert(std::is_same_v<decltype(point_load(1.0F * kN, at(1.0 * m)))::number, double>);
    static_assert(std::is_same_v<decltype(single + c)::number, double>);
    static_assert(std::is_same_v<decltype(2.0 * single)::number, float>);
    static_assert(std::is_same_v<decltype(joist.under(single))::number, double>);
    static_assert(std::is_same_v<decltype(point_load(1 * kN, at(1 * m)))::number, double>);
}

TEST_CASE("a linear load of one size is a uniform load") {
    check_same_effect(linear_load(3.0 * kN / m, 3.0 * kN / m), uniform_load(3.0 * kN / m), 1e-14);
    check_same_effect(linear_load(3.0 * kN / m, 3.0 * kN / m, between(1.2 * m, 4.8 * m)),
                      partial_uniform_load(3.0 * kN / m, between(1.2 * m, 4.8 * m)), 1e-14);
    check_same_effect(partial_uniform_load(3.0 * kN / m, between(0.0 * m, 7.2 * m)), uniform_load(3.0 * kN / m), 1e-14);
    check_same_effect(linear_load(3.0 * kN / m, 5.0 * kN / m, between(0.0 * m, 7.2 * m)),
                      linear_load(3.0 * kN / m, 5.0 * kN / m), 1e-14);
}

TEST_CASE("a line load is the sum of its parts") {
    check_same_effect(partial_uniform_load(3.0 * kN / m, between(1.2 * m, 4.8 * m)),
                      partial_uniform_load(3.0 * kN / m, between(1.2 * m, 2.0 * m)) +
                          partial_uniform_load(3.0 * kN / m, between(2.0 * m, 4.8 * m)),
                      1e-14);
    check_same_effect(linear_load(1.0 * kN / m, 7.0 * kN / m, between(1.2 * m, 4.2 * m)),
                      linear_load(1.0 * kN / m, 3.0 * kN / m, between(1.2 * m, 2.2 * m)) +
                          linear_load(3.0 * kN / m, 7.0 * kN / m, between(2.2 * m, 4.2 * m)),
                      1e-14);
}

TEST_CASE("a couple is the limit of two opposite forces") {
    // d = 1e-3 m apart the third derivative of the influence function leaves about (d/L)^2.
    const double d = 1e-3;
    const auto pair =
        point_load(-8.0 / d * kN, at((3.0 - d / 2) * m)) + point_load(8.0 / d * kN, at((3.0 + d / 2) * m));
    const auto of_pair = joist.under(pair);
    const auto of_couple = joist.under(applied_couple(8.0 * kN * m, at(3.0 * m)));
    for (const double x : {1.0, 2.0, 4.0, 5.0, 6.5}) {
        CHECK(relative(of_pair.deflection(x * m).value(), of_couple.deflection(x * m).value()) < 1e-6);
        CHECK(relative(of_pair.moment(x * m).value(), of_couple.moment(x * m).value()) < 1e-6);
    }
}
