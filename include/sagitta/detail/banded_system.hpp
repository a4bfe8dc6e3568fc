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

    /// Solves, with one step of iterative refinement: what the first solution leaves over is solved for once more.
    /// Returns n, or the first unknown that the equations do not determine. Uses the equations up.
    std::size_t solve(std::vector<T>& unknowns) {
        scale_rows();
        banded_system again = *this;
        const std::size_t determined = eliminate(unknowns);
        if (determined < n_) return determined;
        again.right_ = again.left_over(unknowns);
        std::vector<T> correction;
        if (again.eliminate(correction) == n_) {
            for (std::size_t k = 0; k < n_; ++k) unknowns[k] += correction[k];
        }
        return n_;
    }

private:
    /// Every equation is divided by its greatest coefficient, so that a pivot far below 1 is rounding.
    void scale_rows() {
        for (std::size_t i = 0; i < n_; ++i) {
            T greatest(0);
            for (std::size_t j = first_of(i); j <= last_of(i); ++j) {
                greatest = std::max(greatest, magnitude((*this)(i, j)));
            }
            if (!(greatest > T(0))) continue;
            for (std::size_t j = first_of(i); j <= last_of(i); ++j) (*this)(i, j) /= greatest;
            right_[i] /= greatest;
        }
    }

    std::vector<T> left_over(const std::vector<T>& unknowns) {
        std::vector<T> rest = right_;
        for (std::size_t i = 0; i < n_; ++i) {
            for (std::size_t j = first_of(i); j <= last_of(i); ++j) rest[i] -= (*this)(i, j) * unknowns[j];
        }
        return rest;
    }

    std::size_t first_of(std::size_t equation) const { return equation > reach ? equation - reach : 0; }
    std::size_t last_of(std::size_t equation) const { return std::min(n_ - 1, equation + reach); }

    std::size_t eliminate(std::vector<T>& unknowns) {
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

    static T magnitude(const T& x) { return x < T(0) ? -x : x; }
    /// Some 1e-13 in double.
    static T smallest_pivot() { return T(512) * std::numeric_limits<T>::epsilon(); }

    std::size_t n_;
    std::vector<T> rows_;
    std::vector<T> right_;
};

}  // namespace sagitta::detail
