// The moment-area integrator in plain numbers (coherent SI). It knows the loads and the supports of a beam and
// no shape: shear and moment by equilibrium, redundants by numerical flexibility coefficients, slope and
// deflection by integrating M/EI.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/balanced_beam.hpp>
#include <sagitta/detail/curvature_diagram.hpp>
#include <sagitta/detail/panel.hpp>
#include <sagitta/detail/refinement.hpp>
#include <sagitta/ends.hpp>

#include <array>
#include <cstddef>
#include <type_traits>
#include <vector>

namespace sagitta::detail {

/// A beam of span L under loads. Rigidity is EI: a number of type T, or a function from x to one.
/// Prismatic beams are exact up to rounding, since the Gauss rule integrates their polynomials exactly; others
/// where EI is smooth between the given steps and varies gently over an eighth of the way between joints.
template <class Left, class Right, class T, class Rigidity>
class integrator {
    static constexpr bool is_prismatic = std::is_same_v<Rigidity, T>;
    static constexpr std::size_t points = is_prismatic ? 3 : 20;
    static constexpr int panels_between_joints = is_prismatic ? 3 : 4;

public:
    using section = detail::section<T>;

    integrator(const T& span, const acting_loads<T>& acting, const Rigidity& rigidity, const std::vector<T>& steps = {},
               const T& tolerance = T(0))
        : L_(span), EI_(rigidity), balance_(span, acting), diagram_(span) {
        joints_ = acting.joints(span, steps);
        diagram_.divide(panel_places(joints_, panels_between_joints));
        if constexpr (!is_prismatic) refine(tolerance);
        for (const auto& misfit : acting.misfits) diagram_.insert(misfit);
        solve_redundants(acting);
        diagram_.march(acting);
    }

    [[nodiscard]] const T& span() const { return L_; }

    /// Estimated relative error of the integrals of curvature; 0 for a prismatic beam, whose integration is exact.
    [[nodiscard]] const T& error_estimate() const { return error_estimate_; }

    [[nodiscard]] T rigidity_at(const T& x) const { return EI_at(x); }

    /// The bounds of loads, imposed curvatures and steps, and the ends, ascending.
    [[nodiscard]] const std::vector<T>& joints() const { return joints_; }

    /// The equilibrium side of it: shear, moment, loads.
    [[nodiscard]] const balanced_beam<Left, Right, T>& balance() const { return balance_; }

    /// Just left or just right of x where a lack of fit makes them jump.
    [[nodiscard]] slope_and_deflection<T> state_at(const T& x, side which) const {
        return diagram_.state_at(x, which, [this](const T& from, const T& to) { return bending(from, to); });
    }

    /// Moments of the curvature about both ends of a stretch that may cross panels.
    [[nodiscard]] panel_moments<T> curvature_between(const T& a, const T& b) const {
        return diagram_.between(a, b, [this](const T& from, const T& to) { return bending(from, to); });
    }

    /// The places that bound the panels of integration, ascending: ends, bounds of loads, steps, points between.
    [[nodiscard]] std::vector<T> panel_bounds() const { return diagram_.bounds(); }

private:
    /// The moments of clamped ends are redundant where both ends carry the beam.
    static constexpr bool carried_by_both = Left::against_deflection && Right::against_deflection;
    static constexpr bool left_redundant = carried_by_both && Left::against_rotation;
    static constexpr bool right_redundant = carried_by_both && Right::against_rotation;

    /// Where only one end carries and the other is guided, the same moment may be added everywhere.
    static constexpr bool left_guided = !Left::against_deflection && Left::against_rotation;
    static constexpr bool right_guided = !Right::against_deflection && Right::against_rotation;

    using diagram = curvature_diagram<Left, Right, T>;
    using panel = typename diagram::panel;

    T EI_at(const T& x) const {
        if constexpr (is_prismatic) {
            return EI_;
        } else {
            return EI_(x);
        }
    }

    template <class Curvature>
    static panel_moments<T> integrate(const T& from, const T& to, const Curvature& curvature) {
        return integrate_panel<T, points>(from, to, curvature);
    }

    /// The curvature between two places of one panel: M/EI and what is imposed.
    panel_moments<T> bending(const T& from, const T& to) const {
        const T imposed = balance_.imposed_between(from, to);
        return integrate(from, to, [&](const section& x) {
            return balance_.statics_at(x, just_right).moment / EI_at(x.x()) + imposed;
        });
    }

    void integrate_curvature() {
        for (auto& p : diagram_.panels()) {
            if (p.from < p.to) p.curvature = bending(p.from, p.to);
        }
    }

    /// Stiffness that varies: panels narrow enough for the curvatures of the loads and of the unit redundants.
    void refine(const T& tolerance) {
        // The unit redundants matter only where there are any: a beam tapered to a point may have none.
        constexpr std::size_t count = left_redundant || right_redundant || left_guided || right_guided ? 3 : 1;
        const auto fields = [&](const T& from, const T& to) {
            std::array<panel_moments<T>, count> moments;
            moments[0] = bending(from, to);
            if constexpr (count > 1) {
                moments[1] = integrate(from, to, [&](const section& x) { return x.ahead_of(L_) / L_ / EI_at(x.x()); });
                moments[2] = integrate(from, to, [&](const section& x) { return x.x() / L_ / EI_at(x.x()); });
            }
            return moments;
        };
        const auto refined = refine_panels<T, count>(panel_bounds(), fields, tolerance);
        error_estimate_ = refined.error_estimate;
        diagram_.divide(refined.bounds);
    }

    /// The integral over the beam of a curvature times a moment that varies linearly from end to end: the
    /// virtual work of one in the other.
    template <class Moments>
    T work(const Moments& moments_of, const T& left, const T& right) const {
        T sum(0);
        for (const auto& p : diagram_.panels()) {
            const auto& c = moments_of(p);
            sum +=
                c.area * (left * ((L_ - p.from) / L_) + right * (p.from / L_)) + c.about_from * ((right - left) / L_);
        }
        return sum;
    }

    /// Compatibility at clamped ends. The virtual moment that falls linearly from 1 at one end to 0 at the
    /// other does on the curvature the work (slope of that end) - (slope of the chord).
    void solve_redundants(const acting_loads<T>& acting) {
        integrate_curvature();
        if constexpr (left_guided || right_guided) {
            const auto balance_everywhere = [&](const T& moment) { balance_.set_redundants(moment, moment); };
            if constexpr (Left::against_rotation && Right::against_rotation) {
                // The angle between the ends is imposed.
                T flexibility(0);
                for (const auto& p : diagram_.panels()) {
                    flexibility += integrate(p.from, p.to, [&](const section& x) { return T(1) / EI_at(x.x()); }).area;
                }
                balance_everywhere((acting.rotation_left - acting.rotation_right - diagram_.total_angle()) /
                                   flexibility);
            } else {
                // The pinned end passes no moment on.
                const section pinned{left_guided ? L_ : T(0)};
                balance_everywhere(-balance_.statics_at(pinned, left_guided ? just_right : just_left).moment);
            }
            integrate_curvature();
        }
        if constexpr (left_redundant || right_redundant) {
            const auto of_panel = [](const panel& p) -> const panel_moments<T>& { return p.curvature; };
            const auto unit_left = [&](const panel& p) {
                return integrate(p.from, p.to, [&](const section& x) { return x.ahead_of(L_) / L_ / EI_at(x.x()); });
            };
            const auto unit_right = [&](const panel& p) {
                return integrate(p.from, p.to, [&](const section& x) { return x.x() / L_ / EI_at(x.x()); });
            };
            const T chord = (acting.settlement_right - acting.settlement_left) / L_;
            const T gap_left = acting.rotation_left - chord - work(of_panel, T(1), T(0));
            const T gap_right = chord - acting.rotation_right - work(of_panel, T(0), T(1));
            if constexpr (left_redundant && right_redundant) {
                const T f_11 = work(unit_left, T(1), T(0));
                const T f_12 = work(unit_left, T(0), T(1));
                const T f_22 = work(unit_right, T(0), T(1));
                const T determinant = f_11 * f_22 - f_12 * f_12;
                balance_.set_redundants((gap_left * f_22 - gap_right * f_12) / determinant,
                                        (gap_right * f_11 - gap_left * f_12) / determinant);
            } else if constexpr (left_redundant) {
                balance_.set_redundants(gap_left / work(unit_left, T(1), T(0)), T(0));
            } else {
                balance_.set_redundants(T(0), gap_right / work(unit_right, T(0), T(1)));
            }
            integrate_curvature();
        }
    }

    T L_;
    Rigidity EI_;
    balanced_beam<Left, Right, T> balance_;
    std::vector<T> joints_;
    diagram diagram_;
    T error_estimate_{};
};

}  // namespace sagitta::detail
