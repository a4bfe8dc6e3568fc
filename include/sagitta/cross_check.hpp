// The closed forms of an elastic line, and the answers of a continuous beam, against the moment-area integrator.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/continuous_integrator.hpp>
#include <sagitta/detail/integrated_part.hpp>
#include <sagitta/detail/integrator.hpp>
#include <sagitta/elastic_line.hpp>

#include <sagitta/units.hpp>

#include <algorithm>
#include <cstddef>
#include <initializer_list>
#include <limits>

namespace sagitta {

namespace detail {

/// The greatest; not-a-number if one of them is.
template <class T>
constexpr T worst_of(std::initializer_list<T> all) {
    T most = *all.begin();
    for (const T& each : all) {
        if (!(each <= most) && most == most) most = each;
    }
    return most;
}

}  // namespace detail

/// The greatest discrepancy of each response along a beam, relative to the greatest value of that response.
template <class T>
struct cross_check_result {
    T shear{};
    T moment{};
    T slope{};
    T deflection{};

    /// The greatest of the four; not-a-number if one of them is.
    [[nodiscard]] constexpr T greatest() const { return detail::worst_of({shear, moment, slope, deflection}); }
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

/// The discrepancies of all responses along a beam. Those of its supports may be kept apart: what a load that goes
/// straight into a support makes there is no size for what bends the beam.
template <class T>
struct discrepancies {
    discrepancy<T> shear, moment, slope, deflection;
    discrepancy<T> reaction, end_moment;

    /// With a length of the beam, and what this length turns by under a unit moment.
    cross_check_result<T> relative(const T& length, const T& flexibility) const {
        using std::max;
        const T force = max(reaction.size, shear.size);
        const T bending = max(end_moment.size, moment.size);
        const T moved = max(slope.size, deflection.size / length) / flexibility;
        const T implied = max({bending, force * length, moved});
        const discrepancy<T> of_reaction{force, reaction.difference}, of_end_moment{bending, end_moment.difference};
        return {
            worst_of({shear.relative_to(implied / length), of_reaction.relative_to(implied / length)}),
            worst_of({moment.relative_to(implied), of_end_moment.relative_to(implied)}),
            slope.relative_to(implied * flexibility),
            deflection.relative_to(implied * flexibility * length),
        };
    }
};

}  // namespace detail

/// Compares shear, moment, slope and deflection at every joint of the beam and between joints, on both sides
/// of concentrated loads. About 1e-15 to 1e-13 is rounding; a wrong coefficient shows as its own size.
///
/// A response that vanishes along the whole beam but for rounding (the shear under a constant moment, the
/// deflection of a fixed beam under a constant curvature) is measured against what the others imply, such as M/L
/// for V: so is any that is less than some 1e-10 of that.
template <class Left, class Right, class N, class Loads>
[[nodiscard]] auto cross_check(const elastic_line<prismatic_beam<Left, Right, N>, Loads>& line) {
    using T = typename elastic_line<prismatic_beam<Left, Right, N>, Loads>::number;
    detail::expect_order<T>();
    if constexpr (is_ordered<T>) {
        const T L = line.supported().span().value();
        const T EI = line.supported().EI().value();
        const detail::acting_loads<T> acting(line.loads(), L);
        const detail::integrator<Left, Right, T, T> integrated(L, acting, EI);
        detail::discrepancies<T> found;
        for (const T& place : integrated.panel_bounds()) {
            const auto x = quantity<dimension::length, T>::from_value(place);
            for (const side which : {just_left, just_right}) {
                const auto balanced = integrated.balance().statics_at({place}, which);
                found.shear.compare(line.shear(x, which).value(), balanced.shear);
                found.moment.compare(line.moment(x, which).value(), balanced.moment);
                // Slope and deflection have two sides at a lack of fit only.
                if (which == side::just_left && acting.misfits.empty()) continue;
                const auto deflected = integrated.state_at(place, which);
                found.slope.compare(line.slope(x, which).value(), deflected.slope);
                found.deflection.compare(line.deflection(x, which).value(), deflected.deflection);
            }
        }
        return found.relative(L, L / EI);
    } else {
        return detail::no_answer{};
    }
}

/// The same for a continuous beam: the integrator knows its description (supports, springs, settlements, hinges,
/// steps of stiffness, shear rigidity) and its loads, and finds by itself what its supports do. Reactions count as
/// shears, moments of the ends as moments; slopes are compared on both sides too.
///
/// Rounding is up to 1e-11, of slopes 1e-10; of shears on springs a million times softer than the beam 1e-9, since they
/// may be a millionth of the forces that they are the difference of. It grows by the square of how much shorter than a
/// fiftieth of the mean span the shortest part is. Not-a-number where the beam cannot be told from a mechanism.
template <detail::line_on_nodes Line>
[[nodiscard]] auto cross_check(const Line& line) {
    using T = typename Line::number;
    const detail::continuous_integrator<T> integrated(line.supported(), line.loads());
    const T flexibility = line.supported().shear_flexibility().value();
    detail::discrepancies<T> found;
    const auto compare_at = [&](const T& place, side which, const detail::line_state<T>& state) {
        const auto x = quantity<dimension::length, T>::from_value(place);
        found.shear.compare(line.shear(x, which).value(), state.shear);
        found.moment.compare(line.moment(x, which).value(), state.moment);
        found.slope.compare(line.slope(x, which).value(), state.turn + state.shear * flexibility);
        found.deflection.compare(line.deflection(x, which).value(), state.deflection);
    };
    for (const auto& part : integrated.parts()) {
        for (const auto& p : part.panels()) {
            if (p.from == p.to) continue;  // a lack of fit: its neighbours have its two sides
            compare_at(p.from, just_right, p.at_from);
            compare_at(p.to, just_left, p.at_to);
        }
    }
    const auto& nodes = line.supported().nodes();
    for (std::size_t i = 0; i < nodes.size(); ++i) {
        if (nodes[i].is_support) found.reaction.compare(line.reaction_at(nodes[i].at).value(), integrated.reaction(i));
    }
    found.end_moment.compare(line.end_moment(end::left).value(), integrated.left_end_moment());
    found.end_moment.compare(line.end_moment(end::right).value(), integrated.right_end_moment());
    return found.relative(integrated.mean_span(), integrated.mean_flexibility());
}

}  // namespace sagitta
