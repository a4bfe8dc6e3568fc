// Linear equations whose matrix has a narrow band: Gauss elimination with row exchanges, in time and memory
// proportional to the number of unknowns.
#pragma once

#include <algorithm>
#include <cstddef>
#include <limits>
#include <type_traits>
#include <vector>

namespace sagitta::detail {

/// A power of two, from half of a positive x to x: dividing by it rounds nothing.
template <class T>
T power_of_two_below(const T& x) {
    T power(1);
    while (power < x / T(2)) power *= T(2);
    while (power > x) power /= T(2);
    return power;
}

/// n equations with at most `reach` unknowns on either side of the diagonal.
template <class T, std::size_t reach>
class banded_system {
    // Row exchanges push the upper band out to twice its width.
    static constexpr std::size_t width = 3 * reach + 1;

public:
    explicit banded_system(std::size_t n) : n_(n), rows_(n * width), right_(n) {}

    /// Coefficient of an unknown in an equation.
    T& operator()(std::size_t equation, std::size_t unknown) { return rows_[place(equation, unknown)]; }
    T& right_hand_side(std::size_t equation) { return right_[equation]; }

    /// Solves, with iterative refinement: what a solution leaves over, formed in a wider number type, is solved for
    /// once more. Then the unknowns are good to rounding unless the equations themselves are not. Returns n, or the
    /// first unknown that the equations do not determine. Uses the equations up.
    std::size_t solve(std::vector<T>& unknowns) {
        scale_rows();
        const std::vector<T> given = rows_;
        const std::size_t determined = eliminate();
        if (determined < n_) return determined;
        unknowns = right_;
        substitute(unknowns);
        for (int step = 0; step < 2; ++step) {
            std::vector<T> rest = left_over(given, unknowns);
            substitute(rest);
            for (std::size_t k = 0; k < n_; ++k) unknowns[k] += rest[k];
        }
        return n_;
    }

private:
    static std::size_t place(std::size_t equation, std::size_t unknown) {
        return equation * width + (unknown + reach - equation);
    }
    std::size_t first_of(std::size_t equation) const { return equation > reach ? equation - reach : 0; }
    std::size_t last_of(std::size_t equation) const { return std::min(n_ - 1, equation + reach); }
    std::size_t last_filled(std::size_t equation) const { return std::min(n_ - 1, equation + 2 * reach); }

    /// Every equation is divided so that its greatest coefficient is near 1: a pivot far below 1 is rounding then.
    void scale_rows() {
        for (std::size_t i = 0; i < n_; ++i) {
            T greatest(0);
            for (std::size_t j = first_of(i); j <= last_of(i); ++j) {
                greatest = std::max(greatest, magnitude((*this)(i, j)));
            }
            if (!(greatest > T(0))) continue;
            const T power = power_of_two_below(greatest);
            for (std::size_t j = first_of(i); j <= last_of(i); ++j) (*this)(i, j) /= power;
            right_[i] /= power;
        }
    }

    std::vector<T> left_over(const std::vector<T>& given, const std::vector<T>& unknowns) const {
        using wide = std::conditional_t<std::is_same_v<T, double>, long double,
                                        std::conditional_t<std::is_same_v<T, float>, double, T>>;
        std::vector<T> rest(n_);
        for (std::size_t i = 0; i < n_; ++i) {
            wide sum = static_cast<wide>(right_[i]);
            for (std::size_t j = first_of(i); j <= last_of(i); ++j) {
                sum -= static_cast<wide>(given[place(i, j)]) * static_cast<wide>(unknowns[j]);
            }
            rest[i] = static_cast<T>(sum);
        }
        return rest;
    }

    /// Leaves the upper triangle in rows_ and remembers what was done: the exchanges and the factors.
    std::size_t eliminate() {
        exchanged_.resize(n_);
        factors_.assign(n_ * reach, T(0));
        for (std::size_t k = 0; k < n_; ++k) {
            const std::size_t last = last_of(k);
            std::size_t pivot = k;
            for (std::size_t i = k + 1; i <= last; ++i) {
                if (magnitude((*this)(i, k)) > magnitude((*this)(pivot, k))) pivot = i;
            }
            if (!(magnitude((*this)(pivot, k)) > smallest_pivot())) return k;
            exchanged_[k] = pivot;
            const std::size_t stop = last_filled(k);
            if (pivot != k) {
                for (std::size_t j = k; j <= stop; ++j) std::swap((*this)(k, j), (*this)(pivot, j));
            }
            for (std::size_t i = k + 1; i <= last; ++i) {
                const T factor = (*this)(i, k) / (*this)(k, k);
                // Other types may carry more than their value past a zero (a derivative).
                if (std::is_floating_point_v<T> && factor == T(0)) continue;
                for (std::size_t j = k; j <= stop; ++j) (*this)(i, j) -= factor * (*this)(k, j);
                factors_[k * reach + (i - k - 1)] = factor;
            }
        }
        return n_;
    }

    /// Turns right-hand sides into unknowns.
    void substitute(std::vector<T>& x) {
        for (std::size_t k = 0; k < n_; ++k) {
            std::swap(x[k], x[exchanged_[k]]);
            for (std::size_t i = k + 1; i <= last_of(k); ++i) x[i] -= factors_[k * reach + (i - k - 1)] * x[k];
        }
        for (std::size_t k = n_; k-- > 0;) {
            for (std::size_t j = k + 1; j <= last_filled(k); ++j) x[k] -= (*this)(k, j) * x[j];
            x[k] /= (*this)(k, k);
        }
    }

    static T magnitude(const T& x) { return x < T(0) ? -x : x; }
    /// Some 1e-15 in double: what rounding leaves of a pivot that is none.
    static T smallest_pivot() { return T(8) * std::numeric_limits<T>::epsilon(); }

    std::size_t n_;
    std::vector<T> rows_;
    std::vector<T> right_;
    std::vector<std::size_t> exchanged_;
    std::vector<T> factors_;
};

}  // namespace sagitta::detail
