// The closed forms of an elastic line against the moment-area integrator.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/integrator.hpp>
#include <sagitta/elastic_line.hpp>

#include <sagitta/units.hpp>

#include <algorithm>
#include <limits>

namespace sagitta {

/// The greatest discrepancy of each response along a beam, relative to the greatest value of that response.
template <class T>
struct cross_check_result {
    T shear{};
    T moment{};
    T slope{};
    T deflection{};

    /// The greatest of the four; not-a-number if one of them is.
    [[nodiscard]] constexpr T greatest() const {
        T most = shear;
        for (const T& each : {moment, slope, deflection}) {
            if (!(each <= most) && most == most) most = each;
        }
        return most;
    }
};

namespace detail {

/// Greatest magnitude of a response and greatest discrepancy between its two values.
template <class T>
struct discrepancy {
    T size{};
    T difference{};

    void compare(const T& closed, const T& integrated) {
        using std::max;
        size = max({size, closed < T(0) ? -closed : closed, integrated < T(0) ? -integrated : integrated});
        const T d = closed - integrated;
        // Written so that a not-a-number is a discrepancy and is kept.
        if (!((d < T(0) ? -d : d) <= difference) && difference == difference) difference = d < T(0) ? -d : d;
    }

    /// Relative to the greatest value, or to what the neighbours imply where rounding is all there is.
    T relative_to(const T& implied) const {
        const T rounding = implied * (T(1000000) * std::numeric_limits<T>::epsilon());
        const T reference = size < rounding ? implied : size;
        return difference == T(0) ? T(0) : difference / reference;
    }
};

}  // namespace detail

/// Compares shear, moment, slope and deflection at every joint of the beam and between joints, on both sides
/// of concentrated loads. About 1e-15 to 1e-13 is rounding; a wrong coefficient shows as its own size.
///
/// A response that vanishes along the whole beam but for rounding (the shear under a constant moment, the
/// deflection of a fixed beam under a constant curvature) is measured against what its neighbours in the chain
/// imply, such as M/L for V.
template <class Left, class Right, class N, class Loads>
[[nodiscard]] auto cross_check(const elastic_line<prismatic_beam<Left, Right, N>, Loads>& line) {
    using T = typename detail::in_order<typename elastic_line<prismatic_beam<Left, Right, N>, Loads>::number>::number;
    const T L = line.supported().span().value();
    const T EI = line.supported().EI().value();
    const detail::acting_loads<T> acting(line.loads(), L);
    const detail::integrator<Left, Right, T, T> integrated(L, acting, EI);
    detail::discrepancy<T> of_shear, of_moment, of_slope, of_deflection;
    for (const T& place : integrated.panel_bounds()) {
        const auto x = quantity<dimension::length, T>::from_value(place);
        for (const side which : {just_left, just_right}) {
            const auto balanced = integrated.balance().statics_at({place}, which);
            of_shear.compare(line.shear(x, which).value(), balanced.shear);
            of_moment.compare(line.moment(x, which).value(), balanced.moment);
            // Slope and deflection have two sides at a lack of fit only.
            if (which == side::just_left && acting.misfits.empty()) continue;
            const auto deflected = integrated.state_at(place, which);
            of_slope.compare(line.slope(x, which).value(), deflected.slope);
            of_deflection.compare(line.deflection(x, which).value(), deflected.deflection);
        }
    }
    const T flexibility = L / EI;
    return cross_check_result<T>{
        of_shear.relative_to(of_moment.size / L),
        of_moment.relative_to(of_slope.size / flexibility),
        of_slope.relative_to(std::max(of_moment.size * flexibility, of_deflection.size / L)),
        of_deflection.relative_to(std::max(of_slope.size, of_moment.size * flexibility) * L),
    };
}

}  // namespace sagitta
