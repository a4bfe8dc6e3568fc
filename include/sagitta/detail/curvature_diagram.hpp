// A curvature diagram in panels, and what it makes of slope and deflection: the moment-area theorems (Mohr, Greene),
// and between two supports the conjugate beam. In plain numbers (coherent SI); how the curvature comes about is not
// known here.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/panel.hpp>
#include <sagitta/ends.hpp>

#include <algorithm>
#include <cstddef>
#include <iterator>
#include <vector>

namespace sagitta::detail {

template <class T>
struct slope_and_deflection {
    T slope{};
    T deflection{};
};

template <class Left, class Right, class T>
class curvature_diagram {
    using deflected = slope_and_deflection<T>;
    static constexpr bool carried_by_both = Left::against_deflection && Right::against_deflection;

public:
    /// A stretch without joints, or a lack of fit: a place (from = to) whose curvature is concentrated there.
    struct panel {
        T from, to;
        panel_moments<T> curvature{};
        T left_of_it{}, right_of_it{};  // moments of the curvature there about the nearer end of the beam
        deflected at_from{}, at_to{};
    };

    explicit curvature_diagram(const T& span) : L_(span) {}

    /// Into panels without curvature yet.
    void divide(const std::vector<T>& bounds) {
        panels_.clear();
        panels_.reserve(bounds.size() - 1);
        for (std::size_t i = 1; i < bounds.size(); ++i) panels_.push_back({bounds[i - 1], bounds[i]});
    }
    /// A lack of fit among the panels.
    void insert(const acting_misfit<T>& misfit) { insert_misfit(panels_, misfit); }

    [[nodiscard]] const std::vector<panel>& panels() const { return panels_; }
    [[nodiscard]] std::vector<panel>& panels() { return panels_; }

    /// The places that bound the panels, ascending: ends, bounds of loads, steps, points between.
    [[nodiscard]] std::vector<T> bounds() const {
        std::vector<T> places;
        places.reserve(panels_.size() + 1);
        for (const auto& p : panels_) places.push_back(p.from);
        places.push_back(L_);
        return places;
    }

    /// By how much the slope falls from end to end.
    T total_angle() const {
        T sum(0);
        for (const auto& p : panels_) sum += p.curvature.area;
        return sum;
    }

    /// Moments of the curvature about both ends of a stretch that may cross panels.
    template <class Bending>
    [[nodiscard]] panel_moments<T> between(const T& a, const T& b, const Bending& bending) const {
        panel_moments<T> sum;
        for (const auto& p : panels_) add_within(sum, a, b, p, bending);
        return sum;
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

    /// Just left or just right of x where a lack of fit makes them jump. bending(from, to) integrates the curvature
    /// between two places of one panel.
    template <class Bending>
    [[nodiscard]] slope_and_deflection<T> state_at(const T& x, side which, const Bending& bending) const {
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

private:
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
    std::vector<panel> panels_;
    struct {
        T left{}, right{};
    } ends_;  // how far the supports have settled
};

}  // namespace sagitta::detail
