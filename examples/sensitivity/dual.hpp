// A dual number: a value, and its derivative with respect to one input (forward-mode differentiation).
//
// Every operation carries the derivative along by the rules of calculus, so that any answer of the library, computed
// with dual numbers, comes with its exact derivative. Comparisons look at the value alone: they decide which branch
// is taken, and a branch has one derivative.
#pragma once

#include <compare>
#include <limits>
#include <type_traits>

template <class T = double>
struct dual {
    T value{};
    T derivative{};

    constexpr dual() = default;
    constexpr dual(const T& v, const T& d) : value(v), derivative(d) {}

    /// A constant: the input does not move it.
    constexpr dual(const T& v) : value(v) {}  // NOLINT(google-explicit-constructor): numbers are constants
    template <class N>
    requires(std::is_arithmetic_v<N> &&
             !std::is_same_v<N, T>) constexpr dual(N v)  // NOLINT(google-explicit-constructor)
        : value(static_cast<T>(v)) {}

    template <class N>
    requires std::is_arithmetic_v<N>
    explicit constexpr operator N() const { return static_cast<N>(value); }

    constexpr dual& operator+=(const dual& b) { return *this = *this + b; }
    constexpr dual& operator-=(const dual& b) { return *this = *this - b; }
    constexpr dual& operator*=(const dual& b) { return *this = *this * b; }
    constexpr dual& operator/=(const dual& b) { return *this = *this / b; }

    friend constexpr dual operator+(const dual& a) { return a; }
    friend constexpr dual operator-(const dual& a) { return {-a.value, -a.derivative}; }
    friend constexpr dual operator+(const dual& a, const dual& b) {
        return {a.value + b.value, a.derivative + b.derivative};
    }
    friend constexpr dual operator-(const dual& a, const dual& b) {
        return {a.value - b.value, a.derivative - b.derivative};
    }
    friend constexpr dual operator*(const dual& a, const dual& b) {
        return {a.value * b.value, a.derivative * b.value + a.value * b.derivative};
    }
    friend constexpr dual operator/(const dual& a, const dual& b) {
        const T quotient = a.value / b.value;
        return {quotient, (a.derivative - quotient * b.derivative) / b.value};
    }

    friend constexpr bool operator==(const dual& a, const dual& b) { return a.value == b.value; }
    friend constexpr std::partial_ordering operator<=>(const dual& a, const dual& b) {
        if (a.value < b.value) return std::partial_ordering::less;
        if (a.value > b.value) return std::partial_ordering::greater;
        return a.value == b.value ? std::partial_ordering::equivalent : std::partial_ordering::unordered;
    }
};

/// The input with respect to which everything is differentiated.
template <class T>
constexpr dual<T> varied(const T& value) {
    return {value, T(1)};
}

/// Its limits are those of its value. This is also what makes it a number for the library.
template <class T>
class std::numeric_limits<dual<T>> : public std::numeric_limits<T> {
    using of_value = std::numeric_limits<T>;

public:
    static constexpr dual<T> min() noexcept { return of_value::min(); }
    static constexpr dual<T> max() noexcept { return of_value::max(); }
    static constexpr dual<T> lowest() noexcept { return of_value::lowest(); }
    static constexpr dual<T> epsilon() noexcept { return of_value::epsilon(); }
    static constexpr dual<T> infinity() noexcept { return of_value::infinity(); }
    static constexpr dual<T> quiet_NaN() noexcept { return of_value::quiet_NaN(); }
};
