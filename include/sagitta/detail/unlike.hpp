// What is no quantity of the same dimension is neither added to a quantity nor compared with it. Boost.Units has no
// such operators, which compilers report by listing all the others; these answer with a sentence. They stand beside
// the system of units, where argument-dependent lookup finds them for every quantity of the library.
#pragma once

#include <sagitta/detail/dimension.hpp>
#include <sagitta/detail/scale.hpp>

#include <compare>
#include <type_traits>

namespace sagitta {

template <class Dimension, detail::scale Scale>
struct unit_constant;

namespace detail {

template <class X>
inline constexpr bool is_unit_constant = false;
template <class D, detail::scale S>
inline constexpr bool is_unit_constant<unit_constant<D, S>> = true;

template <class X, class D>
inline constexpr bool is_of_another_dimension = false;
template <class E, class T, class D>
inline constexpr bool is_of_another_dimension<quantity<dimension::si_unit<E>, T>, D> = !std::is_same_v<D, E>;

/// A number, or a unit without one. (Quantities without a dimension are numbers: those may be added.)
template <class X, class D>
concept no_quantity_beside =
    (number_type<X> && !std::is_same_v<D, boost::units::dimensionless_type>) || is_unit_constant<X>;
template <class X, class D>
concept unlike = no_quantity_beside<X, D> || is_of_another_dimension<X, D>;

template <class X, class D>
constexpr void expect_like() {
    constexpr bool is_plain_number = number_type<X>;
    static_assert(!is_plain_number,
                  "sagitta: a plain number is not added to a quantity or compared with it; give it a unit: 5.0*mm");
    constexpr bool is_unit = is_unit_constant<X>;
    static_assert(!is_unit, "sagitta: a unit alone is not added to a quantity or compared with it; write 1.0*mm");
    constexpr bool is_another_dimension = is_of_another_dimension<X, D>;
    static_assert(!is_another_dimension, "sagitta: only quantities of the same dimension are added or compared");
}

}  // namespace detail

namespace dimension {

template <class D, class T, detail::unlike<D> X>
constexpr quantity<si_unit<D>, T> operator+(const quantity<si_unit<D>, T>& q, const X&) {
    detail::expect_like<X, D>();
    return q;
}
template <class D, class T, detail::unlike<D> X>
constexpr quantity<si_unit<D>, T> operator-(const quantity<si_unit<D>, T>& q, const X&) {
    detail::expect_like<X, D>();
    return q;
}
template <class D, class T, detail::no_quantity_beside<D> X>
constexpr quantity<si_unit<D>, T> operator+(const X&, const quantity<si_unit<D>, T>& q) {
    detail::expect_like<X, D>();
    return q;
}
template <class D, class T, detail::no_quantity_beside<D> X>
constexpr quantity<si_unit<D>, T> operator-(const X&, const quantity<si_unit<D>, T>& q) {
    detail::expect_like<X, D>();
    return q;
}
template <class D, class T, detail::unlike<D> X>
constexpr bool operator==(const quantity<si_unit<D>, T>&, const X&) {
    detail::expect_like<X, D>();
    return false;
}
template <class D, class T, detail::unlike<D> X>
constexpr std::partial_ordering operator<=>(const quantity<si_unit<D>, T>&, const X&) {
    detail::expect_like<X, D>();
    return std::partial_ordering::unordered;
}

}  // namespace dimension
}  // namespace sagitta
