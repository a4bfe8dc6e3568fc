// The matrix of the flexibility coefficients f_ij: the displacement of release i for each unit of redundant j.
#pragma once

#include <sagitta/detail/refuse.hpp>
#include <sagitta/release.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <cstddef>
#include <utility>

namespace sagitta {
namespace detail {

template <class Releases, std::size_t... i>
constexpr void expect_release() {
    constexpr bool right = Releases::is_fixed && (... && (i < Releases::size()));
    static_assert(right, "sagitta: there is no such release: they are counted from 0, in the order they were named");
}

/// The root of a b, of two positive numbers, to a thousandth: with no more than arithmetic, for any number type.
template <class T>
constexpr T geometric_mean(T a, T b) {
    // Bounded, since the least numbers have no thousandth to come near to.
    for (int i = 0; i < 2000 && (a > b ? a - b > b / T(1000) : b - a > a / T(1000)); ++i) {
        const T mean = (a + b) / T(2);
        b = a / mean * b;
        a = mean;
    }
    return a;
}

}  // namespace detail

/// Every coefficient has a dimension of its own, that of its row's displacement over that of its column's redundant:
/// m/N, 1/N (m/(N m)), rad/N, rad/(N m). Releases are counted from 0 in the order they were named, or given by the
/// index that release_list::add returned.
template <class Releases, class T>
class flexibility_matrix {
    template <release_types::kind I, release_types::kind J>
    using coefficient_of = quantity<release_types::flexibility<I, J>, T>;

public:
    constexpr explicit flexibility_matrix(const Releases& releases)
        : releases_(releases), f_(releases.template table<T>()) {}

    /// f_ij.
    template <std::size_t i, std::size_t j>
    [[nodiscard]] constexpr auto coefficient() const {
        detail::expect_release<Releases, i, j>();
        return coefficient_of<Releases::template kind_of<i>, Releases::template kind_of<j>>::from_value(number(i, j));
    }
    template <release_types::kind I, release_types::kind J>
    [[nodiscard]] coefficient_of<I, J> coefficient(const release_index<I>& i, const release_index<J>& j) const {
        require(i, j);
        return coefficient_of<I, J>::from_value(number(i.value, j.value));
    }

    /// The same matrix with another f_ij, say one computed by hand, to see what the residual makes of it. Throws
    /// invalid_input unless it is finite, and greater than 0 on the diagonal.
    template <std::size_t i, std::size_t j, class Q>
    [[nodiscard]] constexpr flexibility_matrix with(const Q& value) const {
        using dimension = typename decltype(coefficient<i, j>())::unit_type;
        return replaced(i, j, expect_coefficient<dimension>(value));
    }
    template <release_types::kind I, release_types::kind J, class Q>
    [[nodiscard]] flexibility_matrix with(const release_index<I>& i, const release_index<J>& j, const Q& value) const {
        require(i, j);
        return replaced(i.value, j.value, expect_coefficient<release_types::flexibility<I, J>>(value));
    }

    /// The check of reciprocal displacements (Maxwell, Betti): the greatest |f_ij - f_ji| relative to the root of
    /// f_ii f_jj, which a true f_ij cannot exceed. Rounding is 1e-16 to 1e-13; a wrong coefficient shows as its error.
    [[nodiscard]] constexpr T reciprocity_residual() const {
        T greatest(0);
        for (std::size_t i = 0; i < releases_.size(); ++i) {
            for (std::size_t j = 0; j < i; ++j) {
                const T apart = number(i, j) - number(j, i);
                const T relative =
                    (apart < T(0) ? -apart : apart) / detail::geometric_mean<T>(number(i, i), number(j, j));
                // Written so that a not-a-number is kept.
                if (!(relative <= greatest) && greatest == greatest) greatest = relative;
            }
        }
        return greatest;
    }

    [[nodiscard]] constexpr const Releases& releases() const { return releases_; }

    /// As a plain number in coherent SI, by row and column.
    [[nodiscard]] constexpr const T& number(std::size_t i, std::size_t j) const { return f_[i * releases_.size() + j]; }
    [[nodiscard]] constexpr T& number(std::size_t i, std::size_t j) { return f_[i * releases_.size() + j]; }

private:
    template <class I, class J>
    void require(const I& i, const J& j) const {
        static_cast<void>(releases_.get(i));
        static_cast<void>(releases_.get(j));
    }
    template <class Dimension, class Q>
    static constexpr quantity<Dimension, T> expect_coefficient(const Q& value) {
        constexpr bool right = detail::has_dimension<Q, Dimension>;
        static_assert(right,
                      "sagitta: this flexibility coefficient has the dimension of its row's displacement over its "
                      "column's redundant: m/N, 1/N, rad/N or rad/(N*m)");
        return detail::coherent<Dimension, T>(value);
    }
    template <class Q>
    constexpr flexibility_matrix replaced(std::size_t i, std::size_t j, const Q& value) const {
        detail::require_finite("flexibility coefficient", value);
        if (i == j && !(value.value() > T(0))) [[unlikely]]
            detail::refuse("flexibility coefficient", value, "must be greater than 0 on the diagonal");
        flexibility_matrix other = *this;
        other.number(i, j) = value.value();
        return other;
    }

    Releases releases_;
    decltype(std::declval<const Releases&>().template table<T>()) f_;
};

}  // namespace sagitta
