// The closed forms of an elastic line against the moment-area integrator.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/integrator.hpp>
#include <sagitta/elastic_line.hpp>

#include <sagitta/units.hpp>

#include <algorithm>

namespace sagitta {

/// The greatest discrepancy of each response along a beam, relative to the greatest value of that response.
template <class T>
struct cross_check_result {
    T shear{};
    T moment{};
    T slope{};
    T deflection{};

    [[nodiscard]] constexpr T greatest() const { return std::max({shear, moment, slope, deflection}); }
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
        if (!((d < T(0) ? -d : d) <= difference)) difference = d < T(0) ? -d : d;
    }

    T relative_to(const T& floor) const {
        const T reference = size < floor ? floor : size;
        return difference == T(0) ? T(0) : difference / reference;
    }
};

}  // namespace detail

/// Compares shear, moment, slope and deflection at every joint of the beam and between joints, on both sides
/// of concentrated loads. About 1e-15 to 1e-13 is rounding; a wrong coefficient shows as its own size.
///
/// A response that all but vanishes along the whole beam (the shear under a constant moment) is measured
/// against a thousandth of what its neighbours imply (M/L for V), since rounding alone would be all of it.
template <class Left, class Right, class N, class Loads>
[[nodiscard]] auto cross_check(const elastic_line<beam<Left, Right, N>, Loads>& line) {
    using T = typename elastic_line<beam<Left, Right, N>, Loads>::number;
    const T L = line.supported().span().value();
    const T EI = line.supported().EI().value();
    const detail::integrator<Left, Right, T, T> integrated(L, detail::acting_loads<T>(line.loads(), L), EI);
    detail::discrepancy<T> of_shear, of_moment, of_slope, of_deflection;
    for (const T& place : integrated.panel_bounds()) {
        const auto x = quantity<length, T>::from_value(place);
        for (const side which : {just_left, just_right}) {
            const auto balanced = integrated.statics_at({place}, which);
            of_shear.compare(line.shear(x, which).value(), balanced.shear);
            of_moment.compare(line.moment(x, which).value(), balanced.moment);
        }
        const auto deflected = integrated.state_at(place);
        of_slope.compare(line.slope(x).value(), deflected.slope);
        of_deflection.compare(line.deflection(x).value(), deflected.deflection);
    }
    const T flexibility = L / EI;
    const T thousandth = T(1) / T(1000);
    return cross_check_result<T>{
        of_shear.relative_to(of_moment.size / L * thousandth),
        of_moment.relative_to(of_slope.size / flexibility * thousandth),
        of_slope.relative_to(std::max(of_moment.size * flexibility, of_deflection.size / L) * thousandth),
        of_deflection.relative_to(of_slope.size * L * thousandth),
    };
}

}  // namespace sagitta
