// The nodes and weights of Gauss-Legendre quadrature on [-1, 1], positive half.
#pragma once

#include <boost/math/quadrature/gauss.hpp>

#include <array>
#include <cstddef>
#include <type_traits>

namespace sagitta::detail {

/// The square root of a small fraction in any number type: Newton's iteration from its double, each step of which
/// doubles the digits.
template <class T>
T root_of(const T& square, double near) {
    T root = static_cast<T>(near);
    if constexpr (!std::is_same_v<T, double> && !std::is_same_v<T, float>) {
        for (int i = 0; i < 4; ++i) root = (root + square / root) / T(2);
    }
    return root;
}

/// Rules of many points come from Boost.Math; those of two and three, exact for cubics and quintics, need no more of a
/// number than arithmetic.
template <class T, std::size_t points>
struct gauss_rule {
    static const auto& abscissa() { return boost::math::quadrature::gauss<T, points>::abscissa(); }
    static const auto& weights() { return boost::math::quadrature::gauss<T, points>::weights(); }
};

template <class T>
struct gauss_rule<T, 2> {
    static const std::array<T, 1>& abscissa() {
        static const std::array<T, 1> nodes{root_of(T(1) / T(3), 0.57735026918962576)};
        return nodes;
    }
    static const std::array<T, 1>& weights() {
        static const std::array<T, 1> all{T(1)};
        return all;
    }
};

template <class T>
struct gauss_rule<T, 3> {
    static const std::array<T, 2>& abscissa() {
        static const std::array<T, 2> nodes{T(0), root_of(T(3) / T(5), 0.77459666924148338)};
        return nodes;
    }
    static const std::array<T, 2>& weights() {
        static const std::array<T, 2> all{T(8) / T(9), T(5) / T(9)};
        return all;
    }
};

}  // namespace sagitta::detail
