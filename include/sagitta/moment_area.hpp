// The moment-area integrator: slopes and deflections from the loads and supports of a beam alone, by numerical
// integration, independent of every closed form. It proves them, and it serves stiffness that varies along x.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/continuous_integrator.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/integrator.hpp>
#include <sagitta/detail/numeric_profile.hpp>
#include <sagitta/detail/panel.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <initializer_list>
#include <limits>
#include <type_traits>
#include <vector>

namespace sagitta {

/// What the two moment-area theorems (Mohr) say about two points of an elastic line. A kink or an offset between them
/// counts, one that stands right at either of them does not.
template <class T>
struct moment_area_result {
    /// Slope at the second point less the slope at the first.
    quantity<dimension::plane_angle, T> angle_change;
    /// Tangential deviation: of the second point from the tangent at the first, downward positive.
    quantity<dimension::length, T> deviation;
    /// Of the first point from the tangent at the second.
    quantity<dimension::length, T> deviation_of_first;
};

namespace detail {

template <class T>
void require_on_span(const quantity<dimension::length, T>& x, const quantity<dimension::length, T>& span) {
    if (!(x.value() >= T(0) && x <= span)) [[unlikely]]
        refuse("x", x, "must lie on the beam, from 0 m to ", span);
}

/// The two theorems between two places, in either order.
template <class T, class Integrator>
moment_area_result<T> theorems_between(const Integrator& integrated, const T& first, const T& second) {
    const auto result = [](const T& angle, const T& of_second, const T& of_first) -> moment_area_result<T> {
        return {quantity<dimension::plane_angle, T>::from_value(angle),
                quantity<dimension::length, T>::from_value(of_second),
                quantity<dimension::length, T>::from_value(of_first)};
    };
    if (first <= second) {
        const auto sum = integrated.curvature_between(first, second);
        return result(-sum.area, -sum.about_to, -sum.about_from);
    }
    const auto sum = integrated.curvature_between(second, first);
    return result(sum.area, -sum.about_from, -sum.about_to);
}

}  // namespace detail

/// A beam under loads, integrated numerically (integrate_moment_area makes one). Answers as elastic_line does:
/// x is a length on the beam, else invalid_input; side says which value is meant where shear or moment jump.
template <class Left, class Right, class T, class Rigidity>
class integrated_line {
public:
    using number = typename detail::in_order<T>::number;

    /// Deflection and slope are no polynomials: questions bracket their zeros instead.
    static constexpr bool is_numeric = true;

    integrated_line(const prismatic_beam<Left, Right, T>& b, const detail::acting_loads<T>& acting,
                    const Rigidity& rigidity, const std::vector<T>& steps = {}, const T& tolerance = T(0))
        : beam_(b), integrator_(b.span().value(), acting, rigidity, steps, tolerance) {}

    /// Deflection, downward positive.
    template <class X>
    [[nodiscard]] quantity<dimension::length, T> deflection(const X& x) const {
        return deflection(x, inner_side(on_beam(x)));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::length, T> deflection(const X& x, side which) const {
        return quantity<dimension::length, T>::from_value(integrator_.state_at(on_beam(x), which).deflection);
    }
    /// Slope, clockwise positive.
    template <class X>
    [[nodiscard]] quantity<dimension::plane_angle, T> slope(const X& x) const {
        return slope(x, inner_side(on_beam(x)));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::plane_angle, T> slope(const X& x, side which) const {
        return quantity<dimension::plane_angle, T>::from_value(integrator_.state_at(on_beam(x), which).slope);
    }
    /// Bending moment, sagging positive.
    template <class X>
    [[nodiscard]] quantity<dimension::moment, T> moment(const X& x, side which) const {
        return quantity<dimension::moment, T>::from_value(integrator_.balance().statics_at({on_beam(x)}, which).moment);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::moment, T> moment(const X& x) const {
        return moment(x, inner_side(on_beam(x)));
    }
    /// Shear force V = dM/dx.
    template <class X>
    [[nodiscard]] quantity<dimension::force, T> shear(const X& x, side which) const {
        return quantity<dimension::force, T>::from_value(integrator_.balance().statics_at({on_beam(x)}, which).shear);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::force, T> shear(const X& x) const {
        return shear(x, inner_side(on_beam(x)));
    }

    template <class X>
    [[nodiscard]] quantity<dimension::line_load, T> load(const X& x) const {
        return load(x, inner_side(on_beam(x)));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::curvature, T> imposed_curvature(const X& x) const {
        return imposed_curvature(x, inner_side(on_beam(x)));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::line_load, T> load(const X& x, side which) const {
        return quantity<dimension::line_load, T>::from_value(integrator_.balance().load_at(on_beam(x), which));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::curvature, T> imposed_curvature(const X& x, side which) const {
        return quantity<dimension::curvature, T>::from_value(integrator_.balance().imposed_at(on_beam(x), which));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::flexural_rigidity, T> rigidity(const X& x) const {
        return quantity<dimension::flexural_rigidity, T>::from_value(integrator_.rigidity_at(on_beam(x)));
    }

    /// The estimated error of the integration, relative to the integral of the magnitude of M/EI; 0 where it is but
    /// rounding. The deflection of a clamped beam, a small difference of such integrals, may be off by ten times that.
    [[nodiscard]] const T& error_estimate() const { return integrator_.error_estimate(); }

    /// The beam whose supports these are; its constant EI is not what was integrated.
    [[nodiscard]] const prismatic_beam<Left, Right, T>& supported() const { return beam_; }
    [[nodiscard]] std::vector<quantity<dimension::length, T>> joints() const { return lengths(integrator_.joints()); }
    [[nodiscard]] std::vector<quantity<dimension::length, T>> panel_bounds() const {
        return lengths(integrator_.panel_bounds());
    }

    /// The moment-area theorems between two points, in either order.
    template <class From, class To>
    [[nodiscard]] moment_area_result<T> between(const From& first, const To& second) const {
        return detail::theorems_between<T>(integrator_, on_beam(first), on_beam(second));
    }

private:
    template <class X>
    T on_beam(const X& x) const {
        const auto place = detail::expect_length<T>(x);
        detail::require_on_span(place, quantity<dimension::length, T>::from_value(integrator_.span()));
        return place.value();
    }
    side inner_side(const T& x) const { return x < integrator_.span() ? just_right : just_left; }

    static std::vector<quantity<dimension::length, T>> lengths(const std::vector<T>& numbers) {
        std::vector<quantity<dimension::length, T>> places;
        for (const T& number : numbers) places.push_back(quantity<dimension::length, T>::from_value(number));
        return places;
    }

    prismatic_beam<Left, Right, T> beam_;
    detail::integrator<Left, Right, T, Rigidity> integrator_;
};

/// Integrates a prismatic beam under loads.
template <class Left, class Right, class T, class Loads>
[[nodiscard]] auto integrate_moment_area(const prismatic_beam<Left, Right, T>& b, const Loads& loads) {
    static_cast<void>(b.under(loads));  // refuses loads that this beam cannot take
    const detail::acting_loads<T> acting(loads, b.span().value());
    return integrated_line<Left, Right, T, T>(b, acting, b.EI().value());
}

/// The same with a stiffness that varies: EI is a function from a length x to a flexural rigidity, which replaces the
/// beam's own. The places where it jumps should be given, as lengths on the beam. The tolerance is the relative error
/// allowed to the integrals of M/EI; the line tells its estimate.
/// Throws invalid_input where EI is not greater than 0 or a step is not on the beam, tolerance_not_reached where the
/// estimate stays above the tolerance.
template <class Left, class Right, class T, class Loads, class Stiffness>
[[nodiscard]] auto integrate_moment_area(const prismatic_beam<Left, Right, T>& b, const Loads& loads,
                                         const Stiffness& EI,
                                         std::initializer_list<quantity<dimension::length, T>> steps = {},
                                         const T& tolerance = T(1000) * std::numeric_limits<T>::epsilon()) {
    std::vector<T> places;
    for (const auto& step : steps) {
        if (!(step.value() > T(0) && step < b.span())) [[unlikely]]
            detail::refuse("step of EI", step, "must lie between the ends of the beam, 0 m and ", b.span());
        places.push_back(step.value());
    }
    if (!detail::is_positive(tolerance)) [[unlikely]]
        detail::refuse("tolerance", tolerance, "must be greater than 0 and finite");
    const auto rigidity_at = [EI](const T& x) {
        const auto place = quantity<dimension::length, T>::from_value(x);
        const auto here = detail::expect_rigidity<T>(EI(place));
        if (!detail::is_positive(here.value())) [[unlikely]]
            detail::refuse("EI", here, "must be greater than 0 N*m^2 and finite, also at x = ", place);
        return here.value();
    };
    static_cast<void>(b.under(loads));  // refuses loads that this beam cannot take
    const detail::acting_loads<T> acting(loads, b.span().value());
    return integrated_line<Left, Right, T, std::remove_const_t<decltype(rigidity_at)>>(b, acting, rigidity_at, places,
                                                                                       tolerance);
}

/// Angle change and tangential deviations between two points of an elastic line, by the moment-area
/// integrator: from its loads and supports alone, no closed form.
template <class Beam, class Loads, class From, class To>
[[nodiscard]] auto moment_area(const elastic_line<Beam, Loads>& line, const From& first, const To& second) {
    return integrate_moment_area(line.supported(), line.loads()).between(first, second);
}

/// The same on a continuous beam: the integrator finds what the supports do by itself. The theorems hold for an
/// unbroken line that only bends: throws invalid_input where a hinge stands between the two points (a point may stand
/// at one), or the beam deforms in shear.
template <detail::line_on_nodes Line, class From, class To>
[[nodiscard]] auto moment_area(const Line& line, const From& first, const To& second) {
    using T = typename Line::number;
    const auto& beam = line.supported();
    const auto from = detail::expect_length<T>(first);
    const auto to = detail::expect_length<T>(second);
    detail::require_on_span(from, beam.span());
    detail::require_on_span(to, beam.span());
    if (beam.shear_flexibility().value() > T(0)) [[unlikely]]
        detail::refuse("moment_area: kGA", T(1) / beam.shear_flexibility(),
                       "must be infinite: the theorems hold for bending alone");
    for (const auto& node : beam.nodes()) {
        if (node.is_hinge && std::min(from, to) < node.at && node.at < std::max(from, to)) [[unlikely]]
            detail::refuse("moment_area: the hinge", node.at, "must not stand between the two points");
    }
    const detail::continuous_integrator<T> integrated(beam, line.loads());
    return detail::theorems_between<T>(integrated, from.value(), to.value());
}

}  // namespace sagitta
