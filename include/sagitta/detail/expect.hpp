// Arguments of the public functions take any type, so that a wrong one is answered by one sentence for humans
// instead of a list of candidates. One function a dimension: a static_assert wants its sentence spelled out.
#pragma once

#include <sagitta/ends.hpp>
#include <sagitta/units.hpp>

#include <type_traits>

namespace sagitta::detail {

template <class End>
constexpr void expect_end() {
    constexpr bool right = std::is_same_v<End, end::left_end> || std::is_same_v<End, end::right_end>;
    static_assert(right, "sagitta: an end is expected here: end::left or end::right");
}

template <class T, class Q>
constexpr quantity<length, T> expect_length(const Q& q) {
    constexpr bool right = has_dimension<Q, length>;
    static_assert(right, "sagitta: a length is expected here, such as 7.2*m or 24.0*ft");
    return coherent<length, T>(q);
}

template <class T, class Q>
constexpr quantity<force, T> expect_force(const Q& q) {
    constexpr bool right = has_dimension<Q, force>;
    static_assert(right, "sagitta: a force is expected here, such as 22.0*kN or 5.0*kip");
    return coherent<force, T>(q);
}

template <class T, class Q>
constexpr quantity<moment, T> expect_moment(const Q& q) {
    constexpr bool right = has_dimension<Q, moment>;
    static_assert(right, "sagitta: a couple (force times length) is expected here, such as 8.0*kN*m or 6.0*kip*ft");
    return coherent<moment, T>(q);
}

template <class T, class Q>
constexpr quantity<line_load, T> expect_line_load(const Q& q) {
    constexpr bool right = has_dimension<Q, line_load>;
    static_assert(right, "sagitta: a load per length is expected here, such as 4.5*kN/m or 1.5*kip/ft");
    return coherent<line_load, T>(q);
}

template <class T, class Q>
constexpr quantity<plane_angle, T> expect_angle(const Q& q) {
    constexpr bool right = has_dimension<Q, plane_angle>;
    static_assert(right, "sagitta: a plane angle is expected here, such as 0.5*mrad or 1.0*deg");
    return coherent<plane_angle, T>(q);
}

template <class T, class Q>
constexpr quantity<curvature, T> expect_curvature(const Q& q) {
    constexpr bool right = has_dimension<Q, curvature>;
    static_assert(right, "sagitta: a curvature (1 per length) is expected here, such as 0.001/m");
    return coherent<curvature, T>(q);
}

template <class T, class Q>
constexpr quantity<temperature, T> expect_temperature(const Q& q) {
    constexpr bool right = has_dimension<Q, temperature>;
    static_assert(right, "sagitta: a temperature difference is expected here, such as 20.0*K");
    return coherent<temperature, T>(q);
}

template <class T, class Q>
constexpr quantity<expansion_coefficient, T> expect_expansion(const Q& q) {
    constexpr bool right = has_dimension<Q, expansion_coefficient>;
    static_assert(right, "sagitta: a coefficient of thermal expansion is expected here, such as 12e-6/K");
    return coherent<expansion_coefficient, T>(q);
}

template <class T, class Q>
constexpr quantity<flexural_rigidity, T> expect_rigidity(const Q& q) {
    constexpr bool right = has_dimension<Q, flexural_rigidity>;
    static_assert(right, "sagitta: a flexural rigidity EI is expected here, such as 210.0*GPa * 8356.0*cm4");
    return coherent<flexural_rigidity, T>(q);
}

template <class T, class Q>
constexpr quantity<spring_stiffness, T> expect_spring_stiffness(const Q& q) {
    constexpr bool right = has_dimension<Q, spring_stiffness>;
    static_assert(right, "sagitta: a spring stiffness (force per length) is expected here, such as 8.0*kN/mm");
    return coherent<spring_stiffness, T>(q);
}

template <class T, class Q>
constexpr quantity<rotational_stiffness, T> expect_rotational_stiffness(const Q& q) {
    constexpr bool right = has_dimension<Q, rotational_stiffness>;
    static_assert(right, "sagitta: a rotational stiffness (moment per angle) is expected here, such as 500.0*kN*m/rad");
    return coherent<rotational_stiffness, T>(q);
}

}  // namespace sagitta::detail
