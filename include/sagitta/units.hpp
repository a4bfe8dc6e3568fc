// Quantities and the units in which an engineer writes them.
//
// A quantity is a Boost.Units quantity in coherent SI. The unit constants turn a number into one at once:
// 7.2*m, 24*ft, 4.5*kN/m, 210.0*GPa * 8356.0*cm4. Dividing a quantity by a unit gives the plain number back.
#pragma once

#include <sagitta/detail/dimension.hpp>
#include <sagitta/detail/scale.hpp>
#include <sagitta/detail/unlike.hpp>

#include <boost/units/get_dimension.hpp>
#include <boost/units/quantity.hpp>

#include <type_traits>

namespace sagitta {

namespace detail {

using namespace dimension;

template <class Q>
inline constexpr bool is_quantity = false;
template <class Unit, class T>
inline constexpr bool is_quantity<boost::units::quantity<Unit, T>> = true;

/// The number type of a quantity (double for integers and for whatever is no quantity).
template <class Q>
struct number_of_quantity {
    using type = double;
};
template <class Unit, class T>
struct number_of_quantity<boost::units::quantity<Unit, T>> {
    using type = real_number<T>;
};
template <class... Q>
using common_number = std::common_type_t<typename number_of_quantity<Q>::type...>;

/// True when Q is a quantity of the given dimension, whatever its unit.
template <class Q, class Dimension>
inline constexpr bool has_dimension = false;
template <class D, class System, class T, class Dimension>
inline constexpr bool has_dimension<boost::units::quantity<boost::units::unit<D, System>, T>, Dimension> =
    std::is_same_v<D, typename boost::units::get_dimension<Dimension>::type>;

/// q in coherent SI with number type T. Callers have said what is wrong with q before they come here, so a q
/// of another dimension only must not add errors of its own.
template <class Dimension, class T, class Q>
constexpr quantity<Dimension, T> coherent([[maybe_unused]] const Q& q) {
    if constexpr (!has_dimension<Q, Dimension>) {
        return quantity<Dimension, T>::from_value(T(1));
    } else if constexpr (std::is_same_v<typename Q::unit_type, Dimension>) {
        return quantity<Dimension, T>::from_value(static_cast<T>(q.value()));
    } else {
        using number = typename number_of_quantity<Q>::type;
        const auto same_number =
            boost::units::quantity<typename Q::unit_type, number>::from_value(static_cast<number>(q.value()));
        return quantity<Dimension, T>::from_value(static_cast<T>(quantity<Dimension, number>(same_number).value()));
    }
}

}  // namespace detail

/// A unit to multiply numbers with. Its product with a number is a quantity in coherent SI; products and
/// quotients of unit constants are unit constants.
template <class Dimension, detail::scale Scale = detail::scale{}>
struct unit_constant {
    using dimension = Dimension;
    static constexpr detail::scale size = Scale;
};

template <detail::number_type N, class D, detail::scale S>
[[nodiscard]] constexpr auto operator*(const N& number, unit_constant<D, S>) {
    using T = detail::real_number<N>;
    return quantity<D, T>::from_value(detail::to_coherent<S>(static_cast<T>(number)));
}

template <class D1, class N, class D2, detail::scale S>
[[nodiscard]] constexpr auto operator*(const boost::units::quantity<D1, N>& q, unit_constant<D2, S>) {
    using T = detail::real_number<N>;
    using product = typename boost::units::multiply_typeof_helper<D1, D2>::type;
    return quantity<product, T>::from_value(detail::to_coherent<S>(static_cast<T>(q.value())));
}

/// A quantity over a unit. Where the dimensions are the same this is the plain number of those units.
template <class D1, class N, class D2, detail::scale S>
[[nodiscard]] constexpr auto operator/(const boost::units::quantity<D1, N>& q, unit_constant<D2, S>) {
    using T = detail::real_number<N>;
    using quotient = typename boost::units::divide_typeof_helper<D1, D2>::type;
    const T value = detail::to_coherent<S.inverse()>(static_cast<T>(q.value()));
    if constexpr (std::is_same_v<D1, D2>) {
        return value;
    } else {
        return quantity<quotient, T>::from_value(value);
    }
}

template <detail::number_type N, class D, detail::scale S>
[[nodiscard]] constexpr auto operator/(const N& number, unit_constant<D, S>) {
    using T = detail::real_number<N>;
    using inverse = typename boost::units::divide_typeof_helper<dimension::dimensionless, D>::type;
    return quantity<inverse, T>::from_value(detail::to_coherent<S.inverse()>(static_cast<T>(number)));
}

template <class D1, detail::scale S1, class D2, detail::scale S2>
[[nodiscard]] constexpr auto operator*(unit_constant<D1, S1>, unit_constant<D2, S2>) {
    return unit_constant<typename boost::units::multiply_typeof_helper<D1, D2>::type, S1 * S2>{};
}

template <class D1, detail::scale S1, class D2, detail::scale S2>
[[nodiscard]] constexpr auto operator/(unit_constant<D1, S1>, unit_constant<D2, S2>) {
    return unit_constant<typename boost::units::divide_typeof_helper<D1, D2>::type, S1 / S2>{};
}

/// Numbers of another type than the quantity's, as in 7.2*m / 250; Boost.Units takes its own type only.
template <class D, class T, detail::number_type N>
requires(!std::is_same_v<T, N>) [[nodiscard]] constexpr auto operator*(const boost::units::quantity<D, T>& q,
                                                                       const N& number) {
    using R = detail::common_real<T, N>;
    return quantity<D, R>::from_value(static_cast<R>(q.value()) * static_cast<R>(number));
}
template <class D, class T, detail::number_type N>
requires(!std::is_same_v<T, N>) [[nodiscard]] constexpr auto operator*(const N& number,
                                                                       const boost::units::quantity<D, T>& q) {
    return q * number;
}
template <class D, class T, detail::number_type N>
requires(!std::is_same_v<T, N>) [[nodiscard]] constexpr auto operator/(const boost::units::quantity<D, T>& q,
                                                                       const N& number) {
    using R = detail::common_real<T, N>;
    return quantity<D, R>::from_value(static_cast<R>(q.value()) / static_cast<R>(number));
}

/// The magnitude of a quantity.
template <class Dimension, class T>
requires(detail::is_quantity<boost::units::quantity<Dimension, T>>)
    [[nodiscard]] constexpr boost::units::quantity<Dimension, T> abs(const boost::units::quantity<Dimension, T>& q) {
    return q.value() < T(0) ? -q : q;
}

/// The unit constants. Import them where you write numbers: using namespace sagitta::units.
namespace units {

inline constexpr unit_constant<dimension::length> m{};
inline constexpr unit_constant<dimension::length, detail::scale{.tens = -2}> cm{};
inline constexpr unit_constant<dimension::length, detail::scale{.tens = -3}> mm{};
inline constexpr unit_constant<dimension::length, detail::scale{.tens = 3}> km{};
inline constexpr unit_constant<dimension::length, detail::scale{.inches = 1}> in{};
inline constexpr unit_constant<dimension::length, detail::scale{.twelves = 1, .inches = 1}> ft{};

inline constexpr unit_constant<dimension::force> N{};
inline constexpr unit_constant<dimension::force, detail::scale{.tens = 3}> kN{};
inline constexpr unit_constant<dimension::force, detail::scale{.tens = 6}> MN{};
inline constexpr unit_constant<dimension::force, detail::scale{.pounds = 1}> lbf{};
inline constexpr unit_constant<dimension::force, detail::scale{.tens = 3, .pounds = 1}> kip{};

inline constexpr unit_constant<dimension::stress> Pa{};
inline constexpr unit_constant<dimension::stress, detail::scale{.tens = 3}> kPa{};
inline constexpr unit_constant<dimension::stress, detail::scale{.tens = 6}> MPa{};
inline constexpr unit_constant<dimension::stress, detail::scale{.tens = 9}> GPa{};
inline constexpr unit_constant<dimension::stress, detail::scale{.inches = -2, .pounds = 1}> psi{};
inline constexpr unit_constant<dimension::stress, detail::scale{.tens = 3, .inches = -2, .pounds = 1}> ksi{};

inline constexpr unit_constant<dimension::plane_angle> rad{};
inline constexpr unit_constant<dimension::plane_angle, detail::scale{.tens = -3}> mrad{};
inline constexpr unit_constant<dimension::plane_angle, detail::scale{.degrees = 1}> deg{};

inline constexpr unit_constant<dimension::temperature> K{};

inline constexpr auto m2 = m * m;
inline constexpr auto cm2 = cm * cm;
inline constexpr auto mm2 = mm * mm;
inline constexpr auto in2 = in * in;

inline constexpr auto m4 = m2 * m2;
inline constexpr auto cm4 = cm2 * cm2;
inline constexpr auto mm4 = mm2 * mm2;
inline constexpr auto in4 = in2 * in2;

}  // namespace units
}  // namespace sagitta
