// The pure-number half of every closed form: a polynomial in the two distances of a point from the ends.
#pragma once

#include <array>
#include <cstddef>
#include <numeric>
#include <utility>

namespace sagitta::detail {

/// (c0 f^N + c1 n f^(N-1) + ... + cN n^N) / Divisor, where n (near) and f (far) are the distances of a point
/// from the two ends as fractions of the span, so that n + f = 1.
///
/// Both distances are given: then 1 - n is never formed and no digit is lost near either end. Coefficients
/// that are zero cost nothing.
template <int Divisor, int... c>
struct shape {
    static constexpr int divisor = Divisor;
    static constexpr std::size_t count = sizeof...(c);
    static constexpr std::array<int, count> coefficient{c...};

    /// What divisor and coefficients have in common is cancelled before anything is computed.
    static constexpr int common = [] {
        int g = Divisor;
        for (const int k : coefficient) g = std::gcd(g, k);
        return g;
    }();
    static constexpr bool is_zero = ((c == 0) && ...);

    template <class T>
    static constexpr T value(const T& near, const T& far) {
        return scaled(evaluate<first, last>(near, far) * outer_factor(near, far));
    }

private:
    /// Leading and trailing zeros are common factors n and f; only what is between them is a polynomial.
    static constexpr std::size_t first = [] {
        std::size_t i = 0;
        while (i + 1 < count && coefficient[i] == 0) ++i;
        return i;
    }();
    static constexpr std::size_t last = [] {
        std::size_t i = count - 1;
        while (i > first && coefficient[i] == 0) --i;
        return i;
    }();

    template <std::size_t from, std::size_t to, class T>
    static constexpr T evaluate(const T& near, const T& far) {
        if constexpr (from == to) {
            return T(coefficient[from] / common);
        } else {
            return evaluate<from, to - 1>(near, far) * far + term<to - from, coefficient[to] / common>(near);
        }
    }

    template <std::size_t exponent, int factor, class T>
    static constexpr T term(const T& near) {
        if constexpr (factor == 0) {
            return T(0);
        } else {
            return T(factor) * power<exponent>(near);
        }
    }

    template <class T>
    static constexpr T outer_factor(const T& near, const T& far) {
        return power<first>(near) * power<count - 1 - last>(far);
    }

    template <class T>
    static constexpr T scaled(const T& x) {
        if constexpr (Divisor == common) {
            return x;
        } else {
            return x / T(Divisor / common);
        }
    }

    template <std::size_t exponent, class T>
    static constexpr T power(const T& x) {
        if constexpr (exponent == 0) {
            return T(1);
        } else {
            return power<exponent - 1>(x) * x;
        }
    }
};

template <class Shape, class Index = std::make_index_sequence<(Shape::count > 1 ? Shape::count - 1 : 1)>>
struct derivative_of;
template <class Shape, std::size_t... i>
struct derivative_of<Shape, std::index_sequence<i...>> {
    static constexpr int degree = static_cast<int>(Shape::count) - 1;
    static constexpr int coefficient(std::size_t k) {
        if constexpr (degree == 0) {
            return 0;
        } else {
            const int rank = static_cast<int>(k);
            return (rank + 1) * Shape::coefficient[k + 1] - (degree - rank) * Shape::coefficient[k];
        }
    }
    using type = shape<Shape::divisor, coefficient(i)...>;
};

/// The derivative of a shape with respect to near (far = 1 - near falls while near grows).
template <class Shape, int order>
struct derivative {
    using type = typename derivative_of<typename derivative<Shape, order - 1>::type>::type;
};
template <class Shape>
struct derivative<Shape, 0> {
    using type = Shape;
};
template <class Shape, int order>
using derivative_t = typename derivative<Shape, order>::type;

/// A stretch of the beam as fractions of the span: the distances of its middle from the two ends of the beam,
/// and its width, each formed from lengths so that narrow stretches keep all their digits.
template <class T>
struct fractions {
    T near;
    T far;
    T width;

    constexpr fractions mirrored() const { return {far, near, width}; }
};

// Both means below are Taylor series about the middle of the stretch that end by themselves for cubic shapes.

/// The mean of a shape over a stretch.
template <class Shape, class T>
constexpr T mean_over(const fractions<T>& s) {
    static_assert(Shape::count <= 4, "the series ends with the second derivative");
    const T middle = Shape::value(s.near, s.far);
    using second = derivative_t<Shape, 2>;
    if constexpr (second::is_zero) {
        return middle;
    } else {
        return middle + second::value(s.near, s.far) * (s.width * s.width / T(24));
    }
}

/// The mean of shape times t over a stretch, where t runs from -1 at its start to 1 at its end: what a line
/// load adds by growing along the stretch.
template <class Shape, class T>
constexpr T tilted_mean_over(const fractions<T>& s) {
    static_assert(Shape::count <= 4, "the series ends with the third derivative");
    const T first = derivative_t<Shape, 1>::value(s.near, s.far);
    const T third = derivative_t<Shape, 3>::value(s.near, s.far);
    return s.width / T(6) * (first + third * s.width * s.width / T(40));
}

}  // namespace sagitta::detail
