// Building the sentence of an invalid_input. Kept out of line and cold: the checks stay cheap.
#pragma once

#include <sagitta/invalid_input.hpp>
#include <sagitta/units.hpp>

#include <array>
#include <charconv>
#include <limits>
#include <string>
#include <system_error>
#include <type_traits>

#if !defined(__cpp_exceptions)
#error "sagitta: wrong input is refused by an exception, which -fno-exceptions would turn into something else"
#endif
#if defined(__FINITE_MATH_ONLY__) && __FINITE_MATH_ONLY__
#error "sagitta: -ffast-math (-ffinite-math-only) would drop the refusal of numbers that are not finite"
#endif

namespace sagitta::detail {

template <class Dimension>
inline constexpr const char* coherent_symbol = "";
template <>
inline constexpr const char* coherent_symbol<length> = " m";
template <>
inline constexpr const char* coherent_symbol<plane_angle> = " rad";
template <>
inline constexpr const char* coherent_symbol<force> = " N";
template <>
inline constexpr const char* coherent_symbol<moment> = " N*m";
template <>
inline constexpr const char* coherent_symbol<line_load> = " N/m";
template <>
inline constexpr const char* coherent_symbol<curvature> = " 1/m";
template <>
inline constexpr const char* coherent_symbol<flexural_rigidity> = " N*m^2";
template <>
inline constexpr const char* coherent_symbol<rotational_stiffness> = " N*m/rad";

/// Nine digits, or as many as it takes to see that a value is not the bound it is beyond.
inline std::string number_text(double number) {
    std::array<char, 40> text{};
    char* const first = text.data();
    char* const last = first + text.size();
    auto written = std::to_chars(first, last, number, std::chars_format::general, 9).ptr;
    double read = 0;
    if (std::from_chars(first, written, read).ec == std::errc{} && read != number) {
        written = std::to_chars(first, last, number, std::chars_format::general, 17).ptr;
    }
    return {first, written};
}

[[noreturn, gnu::cold, gnu::noinline]] inline void throw_invalid_input(const char* argument, double value,
                                                                       const char* unit, const char* bound) {
    throw invalid_input(std::string(argument) + " = " + number_text(value) + unit + " " + bound);
}
[[noreturn, gnu::cold, gnu::noinline]] inline void throw_invalid_input(const char* argument, double value,
                                                                       const char* unit, const char* bound,
                                                                       double limit, const char* limit_unit) {
    throw invalid_input(std::string(argument) + " = " + number_text(value) + unit + " " + bound + number_text(limit) +
                        limit_unit);
}

/// For messages only: bounds by their middle; a number type without a conversion to double is shown as nan.
template <class T>
constexpr double as_double(const T& x) {
    if constexpr (requires { static_cast<double>(x); }) {
        return static_cast<double>(x);
    } else if constexpr (!is_ordered<T>) {
        return (as_double(x.lower()) + as_double(x.upper())) / 2;
    } else {
        return std::numeric_limits<double>::quiet_NaN();
    }
}

// Values are handed over as plain numbers: a reference to them would keep the whole computation in memory.

/// Throws "<argument> = <value> <bound>", for instance "span = -1 m must be greater than 0 m and finite".
template <class D, class T>
[[noreturn, gnu::always_inline]] inline void refuse(const char* argument, const quantity<D, T>& value,
                                                    const char* bound) {
    throw_invalid_input(argument, as_double(value.value()), coherent_symbol<D>, bound);
}
template <number_type T>
[[noreturn, gnu::always_inline]] inline void refuse(const char* argument, const T& value, const char* bound) {
    throw_invalid_input(argument, as_double(value), "", bound);
}
/// Throws "<argument> = <value> <bound><limit>".
template <class D, class T, class E, class U>
[[noreturn, gnu::always_inline]] inline void refuse(const char* argument, const quantity<D, T>& value,
                                                    const char* bound, const quantity<E, U>& limit) {
    throw_invalid_input(argument, as_double(value.value()), coherent_symbol<D>, bound, as_double(limit.value()),
                        coherent_symbol<E>);
}

/// Neither infinite nor not-a-number: 0 x is 0 then, and not-a-number otherwise. (One comparison, one jump.)
template <class T>
constexpr bool is_finite(const T& x) {
    return x * T(0) >= T(0);
}

/// Greater than 0 and finite.
template <class T>
constexpr bool is_positive(const T& x) {
    if constexpr (std::is_floating_point_v<T>) {
        return x > T(0) && x <= std::numeric_limits<T>::max();
    } else {
        return x > T(0) && is_finite(x);
    }
}

template <class Dimension, class T>
constexpr void require_finite(const char* argument, const quantity<Dimension, T>& q) {
    if (!is_finite(q.value())) [[unlikely]]
        refuse(argument, q, "must be a finite number");
}

}  // namespace sagitta::detail
