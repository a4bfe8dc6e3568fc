// A part of a continuous beam between two neighbouring nodes, by the moment-area theorems: what its start and its
// loads make of its end, and of every place between, by quadrature. In plain numbers (coherent SI); no shape is known.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/panel.hpp>
#include <sagitta/detail/statics.hpp>
#include <sagitta/ends.hpp>

#include <algorithm>
#include <vector>

namespace sagitta::detail {

/// What the line and the forces in it are at one place. Turn is that of the section; the slope differs by V/kGA.
template <class T>
struct line_state {
    T deflection{}, turn{}, moment{}, shear{};
};

template <class T>
class integrated_part {
    static constexpr int panels_between_joints = 3;

public:
    /// A stretch without joints, or a lack of fit (from = to).
    struct panel {
        T from, to;
        panel_moments<T> curvature{};
        line_state<T> at_from{}, at_to{};
    };

    integrated_part(const T& from, const T& to, const T& rigidity, const T& shear_flexibility)
        : from_(from), to_(to), EI_(rigidity), shear_flexibility_(shear_flexibility), joints_{from, to} {}

    [[nodiscard]] const T& from() const { return from_; }
    [[nodiscard]] const T& to() const { return to_; }
    [[nodiscard]] T length() const { return to_ - from_; }
    [[nodiscard]] const T& EI() const { return EI_; }
    [[nodiscard]] const std::vector<panel>& panels() const { return panels_; }

    // What acts between the ends of the part, in coordinates of the whole beam; stretches are cut to the part.

    void add(const acting_load<T>& load) {
        acting_load<T> here = load;
        if (load.kind == acting_kind::line) {
            here.from = std::max(load.from, from_);
            here.to = std::min(load.to, to_);
            if (!(here.from < here.to)) return;
            if (load.from < from_) here.size_from = load.intensity(from_ - load.from);
            if (load.to > to_) here.size_to = load.intensity(to_ - load.from);
        }
        loads_.emplace_back(here, carried::from_right, length());
        joints_.insert(joints_.end(), {here.from, here.to});
    }
    void add(const acting_curvature<T>& imposed) {
        const acting_curvature<T> here{std::max(imposed.from, from_), std::min(imposed.to, to_), imposed.size};
        if (!(here.from < here.to)) return;
        curvatures_.push_back(here);
        joints_.insert(joints_.end(), {here.from, here.to});
    }

    void add(const acting_misfit<T>& misfit) {
        misfits_.push_back(misfit);
        joints_.push_back(misfit.at);
    }

    /// To be called once all loads are there.
    void divide_into_panels() {
        std::sort(joints_.begin(), joints_.end());
        joints_.erase(std::unique(joints_.begin(), joints_.end()), joints_.end());
        const auto bounds = panel_places(joints_, panels_between_joints);
        panels_.reserve(bounds.size() - 1);
        for (std::size_t i = 1; i < bounds.size(); ++i) panels_.push_back({bounds[i - 1], bounds[i]});
        for (const auto& misfit : misfits_) insert_misfit(panels_, misfit);
    }

    /// What the end becomes if the start is this, with or without the loads and curvatures of the part.
    [[nodiscard]] line_state<T> end_from(const line_state<T>& start, bool is_loaded) const {
        line_state<T> here = start;
        for (const auto& p : panels_) {
            here = passed(here, p, curvature_of(p, start, is_loaded), slid(start, p.from, p.to, is_loaded));
        }
        return with_statics(here, start, {to_}, just_left, is_loaded);
    }

    /// Fixes the part in the whole beam.
    void place(const line_state<T>& start) {
        start_ = start;
        line_state<T> here = start;
        for (auto& p : panels_) {
            p.curvature = curvature_of(p, start, true);
            p.at_from = with_statics(here, start, {p.from}, just_right, true);
            here = passed(here, p, p.curvature, slid(start, p.from, p.to, true));
            p.at_to = with_statics(here, start, {p.to}, just_left, true);
        }
    }
    [[nodiscard]] const line_state<T>& start() const { return start_; }
    [[nodiscard]] const line_state<T>& end() const { return panels_.back().at_to; }

    /// Adds what the placed part bends within a stretch from a to b to its moments about a and b.
    void add_curvature_within(panel_moments<T>& sum, const T& a, const T& b) const {
        const auto part = [this](const T& from, const T& to) { return bending(start_, from, to, true); };
        for (const auto& p : panels_) add_within(sum, a, b, p, part);
    }

private:
    /// Everything left of a section hangs on what is right of it: so a march from the start needs it.
    shear_and_moment<T> statics_at(const line_state<T>& start, const section<T>& x, side which, bool is_loaded) const {
        shear_and_moment<T> sum{start.shear, start.moment + start.shear * x.behind(from_)};
        if (!is_loaded) return sum;
        for (const auto& load : loads_) {
            const auto part = load.at(x, which);
            sum.shear += part.shear;
            sum.moment += part.moment;
        }
        return sum;
    }
    line_state<T> with_statics(const line_state<T>& moved, const line_state<T>& start, const section<T>& x, side which,
                               bool is_loaded) const {
        const auto balanced = statics_at(start, x, which, is_loaded);
        return {moved.deflection, moved.turn, balanced.moment, balanced.shear};
    }

    panel_moments<T> curvature_of(const panel& p, const line_state<T>& start, bool is_loaded) const {
        if (p.from < p.to) return bending(start, p.from, p.to, is_loaded);
        return is_loaded ? p.curvature : panel_moments<T>{};
    }
    panel_moments<T> bending(const line_state<T>& start, const T& from, const T& to, bool is_loaded) const {
        T imposed(0);
        for (const auto& each : curvatures_) {
            if (is_loaded && each.from < to && each.to > from) imposed += each.size;
        }
        return integrate_panel<T, 3>(from, to, [&](const section<T>& x) {
            return statics_at(start, x, just_right, is_loaded).moment / EI_ + imposed;
        });
    }

    /// How far the line slides down over a panel.
    T slid(const line_state<T>& start, const T& from, const T& to, bool is_loaded) const {
        if (!(shear_flexibility_ > T(0))) return T(0);
        const auto shear = [&](const section<T>& x) { return statics_at(start, x, just_right, is_loaded).shear; };
        return integrate_panel<T, 2>(from, to, shear).area * shear_flexibility_;
    }

    /// The two theorems over one panel.
    static line_state<T> passed(const line_state<T>& here, const panel& p, const panel_moments<T>& c, const T& slid) {
        return {here.deflection + here.turn * (p.to - p.from) - c.about_to + slid, here.turn - c.area};
    }

    T from_, to_, EI_, shear_flexibility_;
    std::vector<balanced_load<T>> loads_;
    std::vector<acting_curvature<T>> curvatures_;
    std::vector<acting_misfit<T>> misfits_;
    std::vector<T> joints_;
    std::vector<panel> panels_;
    line_state<T> start_{};
};

}  // namespace sagitta::detail
