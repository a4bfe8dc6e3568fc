// Linear equations whose matrix has a narrow band: Gauss elimination with row exchanges, in time and memory
// proportional to the number of unknowns.
#pragma once

#include <algorithm>
#include <cstddef>
#include <limits>
#include <type_traits>
#include <vector>

namespace sagitta::detail {

/// n equations with at most `reach` unknowns on either side of the diagonal.
template <class T, std::size_t reach>
class banded_system {
    // Row exchanges push the upper band out to twice its width.
    static constexpr std::size_t width = 3 * reach + 1;

public:
    explicit banded_system(std::size_t n) : n_(n), rows_(n * width), right_(n) {}

    /// Coefficient of an unknown in an equation.
    T& operator()(std::size_t equation, std::size_t unknown) {
        return rows_[equation * width + (unknown + reach - equation)];
    }
    T& right_hand_side(std::size_t equation) { return right_[equation]; }

    /// Solves in place. Returns n, or the first unknown that the equations do not determine.
    std::size_t solve(std::vector<T>& unknowns) {
        for (std::size_t k = 0; k < n_; ++k) {
            const std::size_t last = std::min(n_ - 1, k + reach);
            std::size_t pivot = k;
            for (std::size_t i = k + 1; i <= last; ++i) {
                if (magnitude((*this)(i, k)) > magnitude((*this)(pivot, k))) pivot = i;
            }
            if (!(magnitude((*this)(pivot, k)) > smallest_pivot())) return k;
            const std::size_t stop = std::min(n_ - 1, k + 2 * reach);
            if (pivot != k) {
                for (std::size_t j = k; j <= stop; ++j) std::swap((*this)(k, j), (*this)(pivot, j));
                std::swap(right_[k], right_[pivot]);
            }
            for (std::size_t i = k + 1; i <= last; ++i) {
                const T factor = (*this)(i, k) / (*this)(k, k);
                // Other types may carry more than their value past a zero (a derivative).
                if (std::is_floating_point_v<T> && factor == T(0)) continue;
                for (std::size_t j = k; j <= stop; ++j) (*this)(i, j) -= factor * (*this)(k, j);
                right_[i] -= factor * right_[k];
            }
        }
        unknowns.assign(n_, T(0));
        for (std::size_t k = n_; k-- > 0;) {
            T sum = right_[k];
            const std::size_t stop = std::min(n_ - 1, k + 2 * reach);
            for (std::size_t j = k + 1; j <= stop; ++j) sum -= (*this)(k, j) * unknowns[j];
            unknowns[k] = sum / (*this)(k, k);
        }
        return n_;
    }

private:
    static T magnitude(const T& x) { return x < T(0) ? -x : x; }
    /// The equations are scaled to 1, so that less is rounding: some 1e-13 in double.
    static T smallest_pivot() { return T(512) * std::numeric_limits<T>::epsilon(); }

    std::size_t n_;
    std::vector<T> rows_;
    std::vector<T> right_;
};

}  // namespace sagitta::detail
