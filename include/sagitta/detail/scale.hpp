// How many coherent SI units one unit is, held as powers of a few exact numbers so that nothing is rounded
// until a value is converted, and then once.
#pragma once

#include <limits>
#include <numbers>
#include <type_traits>

namespace sagitta {

/// True for numbers of which two can be compared. Bounds between which a number lies (an interval type, known by its
/// lower() and upper()) cannot: which of two is greater may be open. Specialize it for other types of that sort.
template <class T>
inline constexpr bool is_ordered = !requires(const T& x) {
    x.lower();
    x.upper();
};

/// True for whatever may stand in front of a unit: the built-in numbers, bounds, and every type that describes itself
/// through std::numeric_limits (multiprecision does). Specialize it for a number type of your own that does not.
template <class T>
inline constexpr bool is_number = std::is_arithmetic_v<T> || std::numeric_limits<T>::is_specialized || !is_ordered<T>;

}  // namespace sagitta

namespace sagitta::detail {

/// The number type T of a question that has to put numbers in order.
template <class T>
struct in_order {
    static_assert(is_ordered<T>,
                  "sagitta: this question puts numbers in order, which bounds (intervals) do not allow: ask for "
                  "deflection, slope, moment, shear or reaction of a single-span beam instead");
    using number = T;
};
/// What a function returns that has said why it does not go on: one sentence is enough.
struct no_answer {};

/// The same for functions, which go on only if is_ordered<T>.
template <class T>
constexpr void expect_order() {
    [[maybe_unused]] const typename in_order<T>::number* said = nullptr;
}

template <class T>
concept number_type = is_number<T>;

/// The number type that quantities are kept in: integers become double, so that nothing is ever truncated.
template <class T>
using real_number = std::conditional_t<std::is_integral_v<T>, double, T>;

/// The number type of a product: integers take the other's.
template <class T, class N>
using common_real =
    std::conditional_t<std::is_integral_v<N>, real_number<T>, std::common_type_t<real_number<T>, real_number<N>>>;

template <class T>
constexpr T integer_power(T base, int exponent) {
    T result(1);
    for (int i = 0; i < exponent; ++i) result *= base;
    return result;
}

/// pi in the precision of T. The parts are doubles whose exact sum agrees with pi to 64 decimal digits.
template <class T>
constexpr T pi() {
    if constexpr (std::is_floating_point_v<T>) {
        return std::numbers::pi_v<T>;
    } else {
        return T(0x1.921fb54442d18p+1) + T(0x1.1a62633145c07p-53) + T(-0x1.f1976b7ed8fbcp-109) +
               T(0x1.4cf98e804177dp-163);
    }
}

/// 10^tens 12^twelves inch^inches pound^pounds degree^degrees, where
/// inch = 254/10^4 m and pound-force = 44482216152605/10^13 N are exact by definition (international yard and
/// pound agreement of 1959 with standard gravity 9.80665 m/s2) and degree = pi/180.
struct scale {
    int tens = 0;
    int twelves = 0;
    int inches = 0;
    int pounds = 0;
    int degrees = 0;

    friend constexpr bool operator==(const scale&, const scale&) = default;

    friend constexpr scale operator*(scale a, scale b) {
        return {a.tens + b.tens, a.twelves + b.twelves, a.inches + b.inches, a.pounds + b.pounds,
                a.degrees + b.degrees};
    }

    constexpr scale inverse() const { return {-tens, -twelves, -inches, -pounds, -degrees}; }

    friend constexpr scale operator/(scale a, scale b) { return a * b.inverse(); }

    /// The integers above the fraction line (the number itself is numerator() / inverse().numerator()).
    template <class T>
    constexpr T numerator() const {
        const int ten = tens - 4 * inches - 13 * pounds - degrees;
        const int eighteen = -degrees;
        return integer_power(T(10), ten) * integer_power(T(12), twelves) * integer_power(T(254), inches) *
               integer_power(T(44482216152605), pounds) * integer_power(T(18), eighteen) *
               integer_power(pi<T>(), degrees);
    }
};

/// value in units of S, as a number of coherent SI units.
template <scale S, class T>
constexpr T to_coherent(const T& value) {
    if constexpr (S == scale{}) {
        return value;
    } else if constexpr (std::is_floating_point_v<T>) {
        constexpr T numerator = S.template numerator<T>();
        constexpr T denominator = S.inverse().template numerator<T>();
        return value * numerator / denominator;
    } else {
        return value * S.template numerator<T>() / S.inverse().template numerator<T>();
    }
}

/// The same for a scale known at run time only (text).
template <class T>
constexpr T to_coherent(const T& value, scale s) {
    return value * s.numerator<T>() / s.inverse().numerator<T>();
}

}  // namespace sagitta::detail
