// The moment-area integrator in plain numbers (coherent SI). It knows the loads and the supports of a beam and
// no shape: shear and moment by equilibrium, redundants by numerical flexibility coefficients, slope and
// deflection by integrating M/EI.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/balanced_beam.hpp>
#include <sagitta/detail/panel.hpp>
#include <sagitta/detail/refinement.hpp>
#include <sagitta/ends.hpp>

#include <algorithm>
#include <array>
#include <cstddef>
#include <iterator>
#include <type_traits>
#include <vector>

namespace sagitta::detail {

template <class T>
struct slope_and_deflection {
    T slope{};
    T deflection{};
};

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
        : L_(span), EI_(rigidity), balance_(span, acting) {
        joints_ = acting.joints(span, steps);
        make_panels(panel_places(joints_, panels_between_joints));
        if constexpr (!is_prismatic) refine(tolerance);
        for (const auto& misfit : acting.misfits) insert_misfit(panels_, misfit);
        solve_redundants(acting);
        march(acting);
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
        const panel& p = panel_of(x, which);
        if (x == p.from && (p.from < p.to || which == side::just_left)) return p.at_from;
        if (x == p.to) return p.at_to;
        if constexpr (carried_by_both) {
            return between_supports(x, p.left_of_it + about_left(p.from, bending(p.from, x)),
                                    p.right_of_it + about_right(p.to, bending(x, p.to)));
        } else if constexpr (Left::against_deflection) {
            return forward(p.at_from, x - p.from, bending(p.from, x));
        } else {
            return backward(p.at_to, p.to - x, bending(x, p.to));
        }
    }

    /// Moments of the curvature about both ends of a stretch that may cross panels.
    [[nodiscard]] panel_moments<T> curvature_between(const T& a, const T& b) const {
        panel_moments<T> sum;
        const auto part = [this](const T& from, const T& to) { return bending(from, to); };
        for (const auto& p : panels_) add_within(sum, a, b, p, part);
        return sum;
    }

    /// The places that bound the panels of integration, ascending: ends, bounds of loads, steps, points between.
    [[nodiscard]] std::vector<T> panel_bounds() const {
        std::vector<T> bounds;
        bounds.reserve(panels_.size() + 1);
        for (const auto& p : panels_) bounds.push_back(p.from);
        bounds.push_back(L_);
        return bounds;
    }

private:
    /// The moments of clamped ends are redundant where both ends carry the beam.
    static constexpr bool carried_by_both = Left::against_deflection && Right::against_deflection;
    static constexpr bool left_redundant = carried_by_both && Left::against_rotation;
    static constexpr bool right_redundant = carried_by_both && Right::against_rotation;

    /// Where only one end carries and the other is guided, the same moment may be added everywhere.
    static constexpr bool left_guided = !Left::against_deflection && Left::against_rotation;
    static constexpr bool right_guided = !Right::against_deflection && Right::against_rotation;

    using deflected = slope_and_deflection<T>;

    /// A stretch without joints, or a lack of fit: a place (from = to) whose curvature is concentrated there.
    struct panel {
        T from, to;
        panel_moments<T> curvature{};
        T left_of_it{}, right_of_it{};  // moments of the curvature there about the nearer end of the beam
        deflected at_from{}, at_to{};
    };

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

    void make_panels(const std::vector<T>& bounds) {
        panels_.clear();
        panels_.reserve(bounds.size() - 1);
        for (std::size_t i = 1; i < bounds.size(); ++i) panels_.push_back({bounds[i - 1], bounds[i]});
    }

    void integrate_curvature() {
        for (auto& p : panels_) {
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
        make_panels(refined.bounds);
    }

    /// The integral over the beam of a curvature times a moment that varies linearly from end to end: the
    /// virtual work of one in the other.
    template <class Moments>
    T work(const Moments& moments_of, const T& left, const T& right) const {
        T sum(0);
        for (const auto& p : panels_) {
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
                for (const auto& p : panels_) {
                    flexibility += integrate(p.from, p.to, [&](const section& x) { return T(1) / EI_at(x.x()); }).area;
                }
                balance_everywhere((acting.rotation_left - acting.rotation_right - total_angle()) / flexibility);
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

    /// Deflection and slope at the panel bounds. Between two supports by both of them; else slopes from the end that
    /// is held against rotation and deflections from the one that is held against deflection, which are one but for
    /// guided beams: no slope is the difference of greater ones.
    void march(const acting_loads<T>& acting) {
        if constexpr (carried_by_both) {
            ends_ = {acting.settlement_left, acting.settlement_right};
            T sum(0);
            for (auto& p : panels_) {
                p.left_of_it = sum;
                sum += about_left(p.from, p.curvature);
            }
            sum = T(0);
            for (std::size_t i = panels_.size(); i-- > 0;) {
                panels_[i].right_of_it = sum;
                sum += about_right(panels_[i].to, panels_[i].curvature);
            }
            for (auto& p : panels_) {
                p.at_from = between_supports(p.from, p.left_of_it, p.right_of_it + about_right(p.to, p.curvature));
                p.at_to = between_supports(p.to, p.left_of_it + about_left(p.from, p.curvature), p.right_of_it);
            }
        } else {
            march_slopes(acting);
            march_deflections(acting);
        }
    }

    /// By how much the slope falls from end to end.
    T total_angle() const {
        T sum(0);
        for (const auto& p : panels_) sum += p.curvature.area;
        return sum;
    }

    void march_slopes(const acting_loads<T>& acting) {
        if constexpr (Left::against_rotation) {
            T slope = acting.rotation_left;
            for (auto& p : panels_) {
                p.at_from.slope = slope;
                slope -= p.curvature.area;
                p.at_to.slope = slope;
            }
        } else {
            T slope = acting.rotation_right;
            for (std::size_t i = panels_.size(); i-- > 0;) {
                auto& p = panels_[i];
                p.at_to.slope = slope;
                slope += p.curvature.area;
                p.at_from.slope = slope;
            }
        }
    }

    void march_deflections(const acting_loads<T>& acting) {
        if constexpr (Left::against_deflection) {
            T deflection = acting.settlement_left;
            for (auto& p : panels_) {
                p.at_from.deflection = deflection;
                deflection = forward(p.at_from, p.to - p.from, p.curvature).deflection;
                p.at_to.deflection = deflection;
            }
        } else {
            T deflection = acting.settlement_right;
            for (std::size_t i = panels_.size(); i-- > 0;) {
                auto& p = panels_[i];
                p.at_to.deflection = deflection;
                deflection = backward(p.at_to, p.to - p.from, p.curvature).deflection;
                p.at_from.deflection = deflection;
            }
        }
    }

    static T about_left(const T& from, const panel_moments<T>& c) { return c.area * from + c.about_from; }
    T about_right(const T& to, const panel_moments<T>& c) const { return c.area * (L_ - to) + c.about_to; }

    /// The conjugate beam (Mohr) on its two supports: what bends left of x and right of it, each seen from its own
    /// side, so that nothing cancels. Clamped ends are level because the redundants make them so.
    deflected between_supports(const T& x, const T& left_of_x, const T& right_of_x) const {
        const T xi = x / L_;
        const T eta = (L_ - x) / L_;
        return {(ends_.right - ends_.left + right_of_x - left_of_x) / L_,
                eta * (ends_.left + left_of_x) + xi * (ends_.right + right_of_x)};
    }

    static deflected forward(const deflected& start, const T& width, const panel_moments<T>& c) {
        return {start.slope - c.area, start.deflection + start.slope * width - c.about_to};
    }
    static deflected backward(const deflected& stop, const T& width, const panel_moments<T>& c) {
        return {stop.slope + c.area, stop.deflection - stop.slope * width - c.about_from};
    }

    /// The panel that x lies in; where one panel ends and another begins, what lies on that side of all that is there.
    const panel& panel_of(const T& x, side which) const {
        if (which == side::just_left) {
            return *std::lower_bound(panels_.begin(), panels_.end(), x,
                                     [](const panel& p, const T& place) { return p.to < place; });
        }
        const auto after = std::upper_bound(panels_.begin(), panels_.end(), x,
                                            [](const T& place, const panel& p) { return place < p.from; });
        return *std::prev(after);
    }

    T L_;
    Rigidity EI_;
    balanced_beam<Left, Right, T> balance_;
    std::vector<T> joints_;
    std::vector<panel> panels_;
    T error_estimate_{};
    struct {
        T left{}, right{};
    } ends_;  // how far the supports have settled
};

}  // namespace sagitta::detail
