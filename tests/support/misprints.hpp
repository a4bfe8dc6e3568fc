// Misprinted influence functions: a new way to hold an end states the facts of a real one, and takes over its
// rows but for one coefficient. What a check notices of them tells whether it is able to fail.
#pragma once

#include <sagitta/cross_check.hpp>

#include <doctest/doctest.h>

#include <cstddef>
#include <utility>

namespace misprints {

enum class row { deflection, slope, moment, shear };

/// Held like Real, but for one row of its influence functions.
template <class Real, row Which, std::size_t coefficient>
struct misprinted {
    static constexpr bool against_deflection = Real::against_deflection;
    static constexpr bool against_rotation = Real::against_rotation;
};

/// The shape with one coefficient greater by one; behind the last of them with another divisor.
template <class Shape, std::size_t wrong, class Index = std::make_index_sequence<Shape::count>>
struct misprint_of;
template <class Shape, std::size_t wrong, std::size_t... i>
struct misprint_of<Shape, wrong, std::index_sequence<i...>> {
    static constexpr int wrong_divisor = Shape::divisor + (Shape::divisor < 0 ? -1 : 1);
    using type = sagitta::detail::shape<wrong == Shape::count ? wrong_divisor : Shape::divisor,
                                        Shape::coefficient[i] + (i == wrong ? 1 : 0)...>;
};
template <class Shape, std::size_t wrong>
using misprint = typename misprint_of<Shape, wrong>::type;

}  // namespace misprints

namespace sagitta::detail {

template <class Real, std::size_t wrong, class There>
struct influence<misprints::misprinted<Real, misprints::row::deflection, wrong>, There> : influence<Real, There> {
    using deflection = misprints::misprint<typename influence<Real, There>::deflection, wrong>;
};
template <class Real, std::size_t wrong, class There>
struct influence<misprints::misprinted<Real, misprints::row::slope, wrong>, There> : influence<Real, There> {
    using slope = misprints::misprint<typename influence<Real, There>::slope, wrong>;
};
template <class Real, std::size_t wrong, class There>
struct influence<misprints::misprinted<Real, misprints::row::moment, wrong>, There> : influence<Real, There> {
    using moment = misprints::misprint<typename influence<Real, There>::moment, wrong>;
};
template <class Real, std::size_t wrong, class There>
struct influence<misprints::misprinted<Real, misprints::row::shear, wrong>, There> : influence<Real, There> {
    using shear = misprints::misprint<typename influence<Real, There>::shear, wrong>;
};
/// Seen from the other end, which stays as it was printed.
template <class Here, class Real, misprints::row Which, std::size_t wrong>
struct influence<Here, misprints::misprinted<Real, Which, wrong>> : influence<Here, Real> {};

}  // namespace sagitta::detail

namespace misprints {

using namespace sagitta;
using namespace sagitta::units;

inline constexpr auto L = 7.2 * m;
inline constexpr auto EI = 210.0 * GPa * 8356.0 * cm4;
inline constexpr double noticed = 1e-3;
inline constexpr double rounding = 1e-12;

template <class Left, class Right, class Loads>
double discrepancy(const Loads& loads) {
    return cross_check(beam_with_ends<Left, Right>(L, EI).under(loads)).greatest();
}

/// A line load as good as any other: not symmetric, and in one stretch of the beam.
inline constexpr auto trapezium = linear_load(9.0 * kN / m, 3.0 * kN / m, between(1.1 * m, 4.9 * m));
inline constexpr auto weight = point_load(22.0 * kN, at(2.9 * m));

template <class Here, class There, row Which, std::size_t... wrong>
void misprint_each(std::index_sequence<wrong...>) {
    const auto one = [](std::size_t coefficient, double by_force, double by_trapezium) {
        CAPTURE(coefficient);
        CHECK(by_force > noticed);
        CHECK(by_trapezium > noticed);
    };
    (one(wrong, discrepancy<misprinted<Here, Which, wrong>, There>(weight),
         discrepancy<misprinted<Here, Which, wrong>, There>(trapezium)),
     ...);
}

/// The last index misprints the divisor.
template <class Here, class There, row Which, class Row>
void misprint_row() {
    misprint_each<Here, There, Which>(std::make_index_sequence<Row::count + 1>{});
}

template <class Here, class There>
void misprint_all_rows() {
    using rows = detail::influence<Here, There>;
    if constexpr (requires { typename rows::deflection; }) {
        misprint_row<Here, There, row::deflection, typename rows::deflection>();
    }
    if constexpr (requires { typename rows::slope; }) misprint_row<Here, There, row::slope, typename rows::slope>();
    if constexpr (requires { typename rows::moment; }) misprint_row<Here, There, row::moment, typename rows::moment>();
    if constexpr (requires { typename rows::shear; }) misprint_row<Here, There, row::shear, typename rows::shear>();
}

}  // namespace misprints
