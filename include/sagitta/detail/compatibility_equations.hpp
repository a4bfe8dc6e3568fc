// The equations of compatibility: a flexibility matrix with the springs on its diagonal, eliminated once, solved for
// as many load cases as there are.
#pragma once

#include <cstddef>
#include <limits>
#include <numeric>
#include <utility>

namespace sagitta::detail {

/// A share of a displacement that is but rounding: some 1e-13 in double, 0 for rational numbers.
template <class T>
constexpr T rounding_share() {
    return T(512) * T(std::numeric_limits<T>::epsilon());
}

/// Gauss elimination along the diagonal. The pivot is that of the release which keeps the greatest share of its own
/// flexibility while those before it are held: a pure number between 1 and 0, so that metres, radians and newtons do
/// not mix. Of a matrix of work (symmetric, no displacement without work) this needs no other exchanges.
///
/// Count has size() and makes the storage: fixed when compiling, or not.
template <class T, class Count>
class compatibility_equations {
    using numbers = decltype(std::declval<const Count&>().template values<T>());
    using table = decltype(std::declval<const Count&>().template table<T>());
    using order = decltype(std::declval<const Count&>().template values<std::size_t>());

public:
    /// coefficients: row by row.
    constexpr compatibility_equations(const Count& count, const table& coefficients)
        : n_(count.size()),
          coefficients_(coefficients),
          factors_(coefficients),
          order_(count.template values<std::size_t>()),
          zeros_(count.template values<T>()) {
        eliminate();
    }

    /// The first unknown that the equations do not determine, or how many there are.
    [[nodiscard]] constexpr std::size_t undetermined() const { return undetermined_; }

    /// The unknowns for a right-hand side. What they leave over is rounding of the sums in it.
    [[nodiscard]] constexpr numbers solve(const numbers& right) const {
        numbers reached = zeros_;
        for (std::size_t k = 0; k < n_; ++k) {
            reached[k] = right[order_[k]];
            for (std::size_t j = 0; j < k; ++j) reached[k] -= factor(k, j) * reached[j];
        }
        numbers unknowns = zeros_;
        for (std::size_t k = n_; k-- > 0;) {
            for (std::size_t j = k + 1; j < n_; ++j) reached[k] -= factor(k, j) * reached[j];
            reached[k] /= factor(k, k);
            unknowns[order_[k]] = reached[k];
        }
        return unknowns;
    }

private:
    constexpr T& factor(std::size_t i, std::size_t j) { return factors_[i * n_ + j]; }
    constexpr const T& factor(std::size_t i, std::size_t j) const { return factors_[i * n_ + j]; }

    constexpr T share_left(std::size_t k) const {
        const std::size_t i = order_[k];
        return factor(k, k) / coefficients_[i * n_ + i];
    }

    constexpr void exchange(std::size_t k, std::size_t with) {
        std::swap(order_[k], order_[with]);
        for (std::size_t j = 0; j < n_; ++j) std::swap(factor(k, j), factor(with, j));
        for (std::size_t i = 0; i < n_; ++i) std::swap(factor(i, k), factor(i, with));
    }

    constexpr void eliminate() {
        undetermined_ = n_;
        std::iota(order_.begin(), order_.end(), std::size_t{0});
        for (std::size_t k = 0; k < n_; ++k) {
            std::size_t pivot = k;
            for (std::size_t i = k + 1; i < n_; ++i) {
                if (share_left(i) > share_left(pivot)) pivot = i;
            }
            if (!(share_left(pivot) > rounding_share<T>())) {
                undetermined_ = order_[pivot];
                return;
            }
            if (pivot != k) exchange(k, pivot);
            for (std::size_t i = k + 1; i < n_; ++i) {
                factor(i, k) /= factor(k, k);
                for (std::size_t j = k + 1; j < n_; ++j) factor(i, j) -= factor(i, k) * factor(k, j);
            }
        }
    }

    std::size_t n_;
    table coefficients_;
    table factors_;
    order order_;
    numbers zeros_;
    std::size_t undetermined_ = 0;
};

}  // namespace sagitta::detail
