// The equations of compatibility: a flexibility matrix with the springs on its diagonal, eliminated once, solved for
// as many load cases as there are.
#pragma once

#include <cstddef>
#include <limits>
#include <utility>

namespace sagitta::detail {

/// A share of a displacement that is but rounding: some 1e-13 in double, 0 for rational numbers.
template <class T>
constexpr T rounding_share() {
    return T(512) * T(std::numeric_limits<T>::epsilon());
}

/// Gauss elimination along the diagonal, without exchanges: a matrix of work (symmetric, no displacement without work)
/// needs none (Higham, Accuracy and Stability of Numerical Algorithms, chapter 10, from memory). A release is
/// determined if it keeps more than rounding of its own flexibility while those before it are held: a share is a pure
/// number between 1 and 0, so that metres, radians and newtons do not mix.
///
/// Count has size() and makes the storage: fixed when compiling, or not.
template <class T, class Count>
class compatibility_equations {
    using numbers = decltype(std::declval<const Count&>().template values<T>());
    using table = decltype(std::declval<const Count&>().template table<T>());

public:
    /// coefficients: row by row.
    constexpr compatibility_equations(const Count& count, const table& coefficients)
        : n_(count.size()), coefficients_(coefficients), factors_(coefficients) {
        eliminate();
    }

    /// The first unknown that the equations do not determine, or how many there are.
    [[nodiscard]] constexpr std::size_t undetermined() const { return undetermined_; }

    /// The unknowns for a right-hand side. What they leave over is rounding of the sums in it.
    [[nodiscard]] constexpr numbers solve(const numbers& right) const {
        numbers x = right;
        for (std::size_t k = 0; k < n_; ++k) {
            for (std::size_t j = 0; j < k; ++j) x[k] -= factor(k, j) * x[j];
        }
        for (std::size_t k = n_; k-- > 0;) {
            for (std::size_t j = k + 1; j < n_; ++j) x[k] -= factor(k, j) * x[j];
            x[k] /= factor(k, k);
        }
        return x;
    }

private:
    constexpr T& factor(std::size_t i, std::size_t j) { return factors_[i * n_ + j]; }
    constexpr const T& factor(std::size_t i, std::size_t j) const { return factors_[i * n_ + j]; }

    constexpr void eliminate() {
        for (std::size_t k = 0; k < n_; ++k) {
            const T share_left = factor(k, k) / coefficients_[k * n_ + k];
            if (!(share_left > rounding_share<T>())) {
                undetermined_ = k;
                return;
            }
            for (std::size_t i = k + 1; i < n_; ++i) {
                factor(i, k) /= factor(k, k);
                for (std::size_t j = k + 1; j < n_; ++j) factor(i, j) -= factor(i, k) * factor(k, j);
            }
        }
        undetermined_ = n_;
    }

    std::size_t n_;
    table coefficients_;
    table factors_;
    std::size_t undetermined_{};
};

}  // namespace sagitta::detail
