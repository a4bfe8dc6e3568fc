// Real roots of polynomials of low degree, by walking the chain of derivatives: between two neighbouring roots
// of the derivative a polynomial is monotone and has at most one root, so that none can be missed.
#pragma once

#include <array>
#include <cstddef>
#include <limits>

namespace sagitta::detail {

/// c[0] + c[1] t + ... + c[Degree] t^Degree
template <class T, std::size_t Degree>
struct polynomial {
    std::array<T, Degree + 1> c{};

    constexpr T operator()(const T& t) const {
        T value = c[Degree];
        for (std::size_t i = Degree; i-- > 0;) value = value * t + c[i];
        return value;
    }

    constexpr polynomial<T, Degree - 1> derivative() const requires(Degree > 0) {
        polynomial<T, Degree - 1> d;
        for (std::size_t i = 1; i <= Degree; ++i) d.c[i - 1] = T(static_cast<int>(i)) * c[i];
        return d;
    }
};

/// At most Capacity numbers, ascending.
template <class T, std::size_t Capacity>
struct root_list {
    std::array<T, Capacity> at{};
    std::size_t count = 0;

    constexpr void add(const T& root) { at[count++] = root; }
    constexpr const T* begin() const { return at.data(); }
    constexpr const T* end() const { return at.data() + count; }
};

/// The root in [low, high], where p changes sign and is monotone. Newton steps, kept inside the bracket.
template <class T, std::size_t Degree>
constexpr T bracketed_root(const polynomial<T, Degree>& p, T low, T high) {
    const polynomial<T, Degree - 1> slope = p.derivative();
    const bool rising = p(low) < T(0);
    const T resolution = T(2) * std::numeric_limits<T>::epsilon();
    constexpr int safe_step_count = 4 * std::numeric_limits<T>::digits;  // bisection alone would need a quarter
    T t = (low + high) / T(2);
    for (int i = 0; i < safe_step_count; ++i) {
        const T value = p(t);
        if (value == T(0)) return t;
        ((value < T(0)) == rising ? low : high) = t;
        T next = t - value / slope(t);
        if (!(next > low && next < high)) next = (low + high) / T(2);
        const T step = next < t ? t - next : next - t;
        t = next;
        if (step <= resolution * t) break;
    }
    return t;
}

/// All places in the open interval (0, 1) where p changes sign.
template <class T, std::size_t Degree>
constexpr root_list<T, Degree> sign_changes(const polynomial<T, Degree>& p) {
    root_list<T, Degree> roots;
    T low(0);
    T at_low = p(low);
    const auto examine = [&](const T& high) {
        const T at_high = p(high);
        if (at_low == T(0)) {
            if (low > T(0)) roots.add(low);
        } else if ((at_low < T(0)) != (at_high < T(0)) && at_high != T(0)) {
            roots.add(bracketed_root(p, low, high));
        }
        low = high;
        at_low = at_high;
    };
    if constexpr (Degree > 1) {
        for (const T& turning : sign_changes(p.derivative())) examine(turning);
    }
    examine(T(1));
    return roots;
}

}  // namespace sagitta::detail
