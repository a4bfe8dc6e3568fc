// The elastic line as what it is: one polynomial after the other, each taken out with its units.
#pragma once

#include <sagitta/detail/bounded_list.hpp>
#include <sagitta/detail/end_state.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/polynomial.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/units.hpp>

#include <array>
#include <cstddef>
#include <tuple>
#include <utility>
#include <vector>

namespace sagitta {

/// A stretch of an elastic line between two neighbouring joints, where no load begins, ends or stands. Its
/// polynomials run in s = x - from; all follow from the values at its start.
template <class T>
class elastic_segment {
    using per_length = typename boost::units::divide_typeof_helper<dimension::line_load, dimension::length>::type;
    using per_force = typename boost::units::divide_typeof_helper<dimension::dimensionless, dimension::force>::type;

public:
    using number = T;

    constexpr elastic_segment() = default;

    /// The segment of a line between two places that have no joint between them.
    template <class Line>
    constexpr elastic_segment(const Line& whole_line, const quantity<dimension::length, T>& from,
                              const quantity<dimension::length, T>& to)
        : from_(from),
          to_(to),
          EI_(whole_line.rigidity(from)),
          v_(whole_line.deflection(from)),
          slope_(whole_line.slope(from)),
          M_(whole_line.moment(from, just_right)),
          bend_(M_ / EI_ + whole_line.imposed_curvature(from, just_right)),
          V_(whole_line.shear(from, just_right)),
          w_(whole_line.load(from, just_right)),
          growth_((whole_line.load(to, just_left) - w_) / (to - from)) {
        if constexpr (requires { whole_line.shear_flexibility(); }) shear_flexibility_ = whole_line.shear_flexibility();
    }

    [[nodiscard]] constexpr const quantity<dimension::length, T>& from() const { return from_; }
    [[nodiscard]] constexpr const quantity<dimension::length, T>& to() const { return to_; }

    // The coefficients of s^0, s^1, ... as quantities, each with its own dimension.

    /// Deflection: degree 5 (length, 1, 1/length, ...).
    [[nodiscard]] constexpr auto deflection_coefficients() const {
        return std::tuple(v_, detail::as_ratio(slope_), -turning() / T(2), -turning_growth() / T(6), w_ / (T(24) * EI_),
                          growth_ / (T(120) * EI_));
    }
    /// Slope: degree 4, as a ratio (1, 1/length, ...).
    [[nodiscard]] constexpr auto slope_coefficients() const {
        return std::tuple(detail::as_ratio(slope_), -turning(), -turning_growth() / T(2), w_ / (T(6) * EI_),
                          growth_ / (T(24) * EI_));
    }
    /// Moment: degree 3.
    [[nodiscard]] constexpr auto moment_coefficients() const { return std::tuple(M_, V_, -w_ / T(2), -growth_ / T(6)); }
    /// Shear: degree 2.
    [[nodiscard]] constexpr auto shear_coefficients() const { return std::tuple(V_, -w_, -growth_ / T(2)); }
    /// Line load: degree 1.
    [[nodiscard]] constexpr auto load_coefficients() const { return std::tuple(w_, growth_); }

    // Values at a place x (a length from the left end of the beam; the polynomials go on beyond the segment).

    template <class X>
    [[nodiscard]] constexpr quantity<dimension::length, T> deflection(const X& x) const {
        return value(deflection_coefficients(), x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::plane_angle, T> slope(const X& x) const {
        return detail::as_angle(value(slope_coefficients(), x));
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::moment, T> moment(const X& x) const {
        return value(moment_coefficients(), x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::force, T> shear(const X& x) const {
        return value(shear_coefficients(), x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::line_load, T> load(const X& x) const {
        return value(load_coefficients(), x);
    }

private:
    /// Minus the second and third derivative of v at the start: bending, and where the beam deforms in shear the
    /// change of V/kGA.
    constexpr quantity<dimension::curvature, T> turning() const { return bend_ + w_ * shear_flexibility_; }
    constexpr auto turning_growth() const { return V_ / EI_ + growth_ * shear_flexibility_; }

    template <std::size_t i = 0, class... C>
    static constexpr auto horner(const std::tuple<C...>& c, const quantity<dimension::length, T>& s) {
        if constexpr (i + 1 == sizeof...(C)) {
            return std::get<i>(c);
        } else {
            return std::get<i>(c) + s * horner<i + 1>(c, s);
        }
    }
    template <class Coefficients, class X>
    constexpr auto value(const Coefficients& c, const X& x) const {
        return horner(c, detail::expect_length<T>(x) - from_);
    }

    quantity<dimension::length, T> from_{}, to_{};
    quantity<dimension::flexural_rigidity, T> EI_{};
    quantity<dimension::length, T> v_{};
    quantity<dimension::plane_angle, T> slope_{};
    quantity<dimension::moment, T> M_{};
    quantity<dimension::curvature, T> bend_{};  // of load and imposed
    quantity<dimension::force, T> V_{};
    quantity<dimension::line_load, T> w_{};
    quantity<per_length, T> growth_{};
    quantity<per_force, T> shear_flexibility_{};
};

namespace detail {

/// Whether the questions can be put to it.
template <class Line>
inline constexpr bool is_line = requires(const Line& line) {
    line.joints();
};

/// Whether they can be answered.
template <class Line>
inline constexpr bool is_line_in_order = false;
template <class Line>
requires(is_line<Line>) inline constexpr bool is_line_in_order<Line> = is_ordered<typename Line::number>;

/// Says why they cannot. Questions go on only where they can.
template <class Line>
constexpr void expect_line() {
    constexpr bool right = is_line<Line>;
    static_assert(right, "sagitta: an elastic line is expected here: beam.under(loads)");
    if constexpr (right) expect_order<typename Line::number>();
}

/// A list with room for so many values a segment: bounded where the line's joints are, else a vector.
template <class Value, std::size_t a_segment, class Joints>
struct list_by_segment {
    using type = std::vector<Value>;
};
template <class Value, std::size_t a_segment, class X, std::size_t count>
struct list_by_segment<Value, a_segment, std::array<X, count>> {
    using type = bounded_list<Value, a_segment * count>;
};
template <class Value, std::size_t a_segment, class Line>
using list_along = typename list_by_segment<Value, a_segment, decltype(std::declval<const Line&>().joints())>::type;

/// Calls visit(from, to) for every stretch without joints between two places, in order.
template <class Line, class Visit>
constexpr void for_each_stretch(const Line& line, const quantity<dimension::length, typename Line::number>& first,
                                const quantity<dimension::length, typename Line::number>& last, const Visit& visit) {
    auto from = first;
    const auto joints = line.joints();
    for (const auto& joint : joints) {
        const auto to = joint < last ? joint : last;
        if (from < to) {
            visit(from, to);
            from = to;
        }
    }
}

/// The polynomial of one response over a segment, in t = (x - from)/(to - from) from 0 to 1, in coherent SI.
template <response R, class T>
constexpr auto normalized(const elastic_segment<T>& segment) {
    const auto coefficients = [&] {
        if constexpr (R == response::deflection) {
            return segment.deflection_coefficients();
        } else if constexpr (R == response::slope) {
            return segment.slope_coefficients();
        } else if constexpr (R == response::moment) {
            return segment.moment_coefficients();
        } else {
            return segment.shear_coefficients();
        }
    }();
    const T h = (segment.to() - segment.from()).value();
    return std::apply(
        [&](const auto&... c) {
            polynomial<T, sizeof...(c) - 1> p;
            std::size_t i = 0;
            T power(1);
            ((p.c[i++] = c.value() * power, power *= h), ...);
            return p;
        },
        coefficients);
}

template <response R, class Line>
class numeric_profile;

/// A response between two joints as a function of t from 0 to 1: a polynomial, but for the deflection and slope of
/// a line whose stiffness varies (detail/numeric_profile.hpp).
template <response R, class Line>
constexpr auto profile_between(const Line& line, const quantity<dimension::length, typename Line::number>& from,
                               const quantity<dimension::length, typename Line::number>& to) {
    constexpr bool bends = R == response::deflection || R == response::slope;
    if constexpr (bends && requires { requires Line::is_numeric; }) {
        return numeric_profile<R, Line>(line, from, to);
    } else {
        return normalized<R>(elastic_segment<typename Line::number>(line, from, to));
    }
}

}  // namespace detail

/// The segments of an elastic line from left to right, without gaps. An array-like list without allocation
/// where the loads are known when compiling, a vector for a load_list.
template <class Line>
[[nodiscard]] constexpr auto piecewise_form(const Line& line) {
    using T = typename Line::number;
    detail::list_along<elastic_segment<T>, 1, Line> segments;
    detail::for_each_stretch(line, {}, line.supported().span(), [&](const auto& from, const auto& to) {
        segments.push_back(elastic_segment<T>(line, from, to));
    });
    return segments;
}

}  // namespace sagitta
