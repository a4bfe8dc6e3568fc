// The nodes and weights of Gauss-Legendre quadrature on [-1, 1], positive half, in any number type.
#pragma once

#include <boost/math/quadrature/gauss.hpp>

#include <array>
#include <cstddef>
#include <limits>
#include <type_traits>
#include <utility>

namespace sagitta::detail {

/// The rule of so many points. float and double take it from Boost.Math; any other type needs no more than arithmetic:
/// each node is a root of the Legendre polynomial, found by Newton's iteration from the double.
template <class T, std::size_t points>
struct gauss_rule {
    static const auto& abscissa() { return halves().nodes; }
    static const auto& weights() { return halves().weights; }

private:
    using known = boost::math::quadrature::gauss<double, points>;
    static constexpr bool is_known = std::is_same_v<T, double> || std::is_same_v<T, float>;
    static constexpr std::size_t count = (points + 1) / 2;

    struct table {
        std::array<T, count> nodes{};
        std::array<T, count> weights{};
    };

    /// The Legendre polynomial of degree `points` and its derivative at x, by the three-term recurrence (Bonnet).
    static std::pair<T, T> legendre(const T& x) {
        T before(1), value = x;
        for (int n = 1; n < static_cast<int>(points); ++n) {
            const T next = (T(2 * n + 1) * x * value - T(n) * before) / T(n + 1);
            before = value;
            value = next;
        }
        const T slope = T(static_cast<int>(points)) * (before - x * value) / (T(1) - x * x);
        return {value, slope};
    }

    static const table& halves() {
        static const table made = [] {
            table t;
            for (std::size_t i = 0; i < count; ++i) {
                const double near = known::abscissa()[i];
                t.nodes[i] = static_cast<T>(near);
                if constexpr (is_known) {
                    t.weights[i] = static_cast<T>(known::weights()[i]);
                } else {
                    // Every step doubles the digits. The node in the middle is 0 and stays so.
                    for (int digits = 16; near != 0.0 && digits < 4 * std::numeric_limits<T>::digits10; digits *= 2) {
                        const auto [value, slope] = legendre(t.nodes[i]);
                        t.nodes[i] -= value / slope;
                    }
                    const T slope = legendre(t.nodes[i]).second;
                    t.weights[i] = T(2) / ((T(1) - t.nodes[i] * t.nodes[i]) * slope * slope);
                }
            }
            return t;
        }();
        return made;
    }
};

}  // namespace sagitta::detail
