// Arguments of the public functions take any type, so that a wrong one is answered by one sentence for humans
// instead of a list of candidates. One function a dimension: a static_assert wants its sentence spelled out.
#pragma once

#include <sagitta/units.hpp>

namespace sagitta::detail {

template <class T, class Q>
constexpr quantity<length, T> expect_length(const Q& q) {
    static_assert(has_dimension<Q, length>, "sagitta: a length is expected here, such as 7.2*m or 24.0*ft");
    return coherent<length, T>(q);
}

template <class T, class Q>
constexpr quantity<force, T> expect_force(const Q& q) {
    static_assert(has_dimension<Q, force>, "sagitta: a force is expected here, such as 22.0*kN or 5.0*kip");
    return coherent<force, T>(q);
}

template <class T, class Q>
constexpr quantity<moment, T> expect_moment(const Q& q) {
    static_assert(has_dimension<Q, moment>,
                  "sagitta: a couple (force times length) is expected here, such as 8.0*kN*m or 6.0*kip*ft");
    return coherent<moment, T>(q);
}

template <class T, class Q>
constexpr quantity<line_load, T> expect_line_load(const Q& q) {
    static_assert(has_dimension<Q, line_load>,
                  "sagitta: a load per length is expected here, such as 4.5*kN/m or 1.5*kip/ft");
    return coherent<line_load, T>(q);
}

template <class T, class Q>
constexpr quantity<plane_angle, T> expect_angle(const Q& q) {
    static_assert(has_dimension<Q, plane_angle>,
                  "sagitta: a plane angle is expected here, such as 0.5*mrad or 1.0*deg");
    return coherent<plane_angle, T>(q);
}

template <class T, class Q>
constexpr quantity<curvature, T> expect_curvature(const Q& q) {
    static_assert(has_dimension<Q, curvature>, "sagitta: a curvature (1 per length) is expected here, such as 0.001/m");
    return coherent<curvature, T>(q);
}

template <class T, class Q>
constexpr quantity<temperature, T> expect_temperature(const Q& q) {
    static_assert(has_dimension<Q, temperature>, "sagitta: a temperature difference is expected here, such as 20.0*K");
    return coherent<temperature, T>(q);
}

template <class T, class Q>
constexpr quantity<expansion_coefficient, T> expect_expansion(const Q& q) {
    static_assert(has_dimension<Q, expansion_coefficient>,
                  "sagitta: a coefficient of thermal expansion is expected here, such as 12e-6/K");
    return coherent<expansion_coefficient, T>(q);
}

template <class T, class Q>
constexpr quantity<flexural_rigidity, T> expect_rigidity(const Q& q) {
    static_assert(has_dimension<Q, flexural_rigidity>,
                  "sagitta: a flexural rigidity EI is expected here, such as 210.0*GPa * 8356.0*cm4");
    return coherent<flexural_rigidity, T>(q);
}

}  // namespace sagitta::detail
