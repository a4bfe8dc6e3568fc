// The moment-area integrator of continuous beams, in plain numbers (coherent SI). It knows the description of a beam
// and its loads, no shape and no answer of the library.
//
// Unknown is the state (deflection, turn, moment, shear) at the start of every part between nodes. Quadrature makes of
// it the state at the end of the part (the field matrix of the method of transfer matrices, Pestel and Leckie 1963);
// the conditions at the nodes join the parts in one system of equations. No state is carried across a whole beam,
// which is where transfer matrices lose their digits.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/integrated_part.hpp>
#include <sagitta/detail/node_equations.hpp>
#include <sagitta/detail/panel.hpp>

#include <algorithm>
#include <array>
#include <cstddef>
#include <vector>

namespace sagitta::detail {

/// A line on a beam that is described by its nodes, whatever answers it gives.
template <class Line>
concept line_on_nodes = requires(const Line& line) {
    line.supported().nodes();
    line.supported().rigidity_after(line.supported().span());
    line.supported().shear_flexibility();
    line.loads();
};

template <class T>
class continuous_integrator {
public:
    /// Every state is not-a-number where the beam cannot be told from a mechanism.
    template <class Beam, class Loads>
    continuous_integrator(const Beam& beam, const Loads& loads) {
        const acting_loads<T> acting(loads, beam.span().value());
        describe(beam, acting);
        for (const auto& load : acting.loads) distribute(load);
        for (const auto& imposed : acting.curvatures) spread(imposed);
        // Right at a node it is the part right of it that does not fit.
        for (const auto& misfit : acting.misfits) parts_[part_at(misfit.at)].add(misfit);
        T flexibility(0);
        for (auto& p : parts_) {
            p.divide_into_panels();
            flexibility += p.length() / p.EI();
        }
        L0_ = beam.span().value() / T(static_cast<double>(parts_.size()));
        EI0_ = beam.span().value() / flexibility;
        solve();
    }

    /// The mean length of a part, and what it turns by under a unit moment.
    [[nodiscard]] const T& mean_span() const { return L0_; }
    [[nodiscard]] T mean_flexibility() const { return L0_ / EI0_; }

    [[nodiscard]] const std::vector<integrated_part<T>>& parts() const { return parts_; }

    /// Upward force of what holds the beam at a node.
    [[nodiscard]] T reaction(std::size_t node) const {
        T up = held_[node].force;
        if (node < parts_.size()) up += parts_[node].start().shear;
        if (node > 0) up -= parts_[node - 1].end().shear;
        return up;
    }
    /// Sagging moments that what holds the ends passes on.
    [[nodiscard]] T left_end_moment() const { return parts_.front().start().moment - held_.front().couple; }
    [[nodiscard]] T right_end_moment() const { return parts_.back().end().moment + held_.back().couple; }

    /// Moments of the curvature about both ends of a stretch, whatever nodes it crosses.
    [[nodiscard]] panel_moments<T> curvature_between(const T& a, const T& b) const {
        panel_moments<T> sum;
        for (std::size_t i = part_at(a); i < parts_.size() && parts_[i].from() < b; ++i) {
            parts_[i].add_curvature_within(sum, a, b);
        }
        return sum;
    }

private:
    /// What stands at a node.
    struct held_place {
        T at;
        T transverse, turning;  // stiffnesses, infinite: rigid
        T settled, turned;
        bool is_hinge;
        T passed;                       // by the hinge
        T force = T(0), couple = T(0);  // of the loads
    };

    template <class Beam>
    void describe(const Beam& beam, const acting_loads<T>& acting) {
        for (const auto& n : beam.nodes()) {
            held_.push_back({n.at.value(), n.transverse, n.turning, n.settled, n.turned, n.is_hinge, n.passed});
            if (held_.size() == beam.nodes().size()) break;
            const T& to = beam.nodes()[held_.size()].at.value();
            parts_.emplace_back(n.at.value(), to, beam.rigidity_after(n.at).value(), beam.shear_flexibility().value());
        }
        held_.front().settled += acting.settlement_left;
        held_.front().turned += acting.rotation_left;
        held_.back().settled += acting.settlement_right;
        held_.back().turned += acting.rotation_right;
    }

    std::size_t part_at(const T& x) const {
        const auto after = std::upper_bound(parts_.begin(), parts_.end(), x,
                                            [](const T& place, const auto& p) { return place < p.from(); });
        return static_cast<std::size_t>(after - parts_.begin()) - 1;
    }

    void distribute(const acting_load<T>& load) {
        if (load.kind == acting_kind::line) return spread(load);
        const std::size_t i = part_at(load.from);
        const bool at_start = load.from == held_[i].at;
        if (!at_start && load.from < held_[i + 1].at) return parts_[i].add(load);
        auto& node = held_[at_start ? i : i + 1];
        (load.kind == acting_kind::couple ? node.couple : node.force) += load.size_from;
    }
    template <class Stretch>
    void spread(const Stretch& load) {
        for (std::size_t i = part_at(load.from); i < parts_.size() && parts_[i].from() < load.to; ++i) {
            parts_[i].add(load);
        }
    }

    /// An equation divides deflections by the mean length of a part, moments by what turns it by one on the average.
    T moment_unit() const { return EI0_ / L0_; }
    T force_unit() const { return moment_unit() / L0_; }

    /// The unknowns of a part are scaled to its own length: so the coefficients of an equation are of one size, however
    /// short the part.
    line_state<T> start_by(const std::array<T, entries_of_state>& unknowns, std::size_t part) const {
        const T length = parts_[part].length();
        return {unknowns[0] * L0_, unknowns[1] * (L0_ / length), unknowns[2] * moment_unit(),
                unknowns[3] * (moment_unit() / length)};
    }
    line_state<T> start_by_one(std::size_t unknown, std::size_t part) const {
        std::array<T, entries_of_state> unknowns{T(0), T(0), T(0), T(0)};
        unknowns[unknown] = T(1);
        return start_by(unknowns, part);
    }

    template <class Unloaded>
    state_entries<T> entries(std::size_t part, const line_state<T>& loaded, const Unloaded& unloaded_by_one) const {
        state_entries<T> all{{part}, {part}, {part}, {part}};
        const auto fill = [&](const line_state<T>& state, auto&& place_of) {
            place_of(all.deflection) = state.deflection / L0_;
            place_of(all.turn) = state.turn;
            place_of(all.moment) = state.moment / moment_unit();
            place_of(all.shear) = state.shear / force_unit();
        };
        fill(loaded, [](state_entry<T>& e) -> T& { return e.constant; });
        for (std::size_t k = 0; k < entries_of_state; ++k) {
            fill(unloaded_by_one(k), [k](state_entry<T>& e) -> T& { return e.of[k]; });
        }
        return all;
    }
    state_entries<T> start_of(std::size_t part) const {
        return entries(part, {}, [&](std::size_t k) { return start_by_one(k, part); });
    }
    state_entries<T> end_of(std::size_t part) const {
        const auto& p = parts_[part];
        return entries(part, p.end_from({}, true),
                       [&](std::size_t k) { return p.end_from(start_by_one(k, part), false); });
    }

    void solve() {
        node_equations<T> equations(parts_.size());
        state_entries<T> before{}, after{};
        for (std::size_t i = 0; i < held_.size(); ++i) {
            const bool at_left_end = i == 0;
            const bool at_right_end = i == parts_.size();
            if (!at_left_end) before = end_of(i - 1);
            if (!at_right_end) after = start_of(i);
            hold(equations, held_[i], at_left_end ? nullptr : &before, at_right_end ? nullptr : &after);
            if (at_left_end) {
                clamp(equations, held_[i], after, T(1));
            } else if (at_right_end) {
                clamp(equations, held_[i], before, T(-1));
            } else {
                join(equations, held_[i], before, after);
            }
        }
        const auto unknowns = equations.solve();
        for (std::size_t i = 0; i < parts_.size(); ++i) parts_[i].place(start_by(unknowns[i], i));
    }

    /// The support, which makes the shear jump by its force.
    void hold(node_equations<T>& equations, const held_place& node, const state_entries<T>* before,
              const state_entries<T>* after) const {
        const auto spring = spring_law<T>::of(node.transverse, L0_ / force_unit());
        equations.add(spring.movement, (after ? after : before)->deflection);
        equations.add(-spring.movement * (node.settled / L0_));
        if (after) equations.add(-spring.force, after->shear);
        if (before) equations.add(spring.force, before->shear);
        equations.add(-spring.force * (node.force / force_unit()));
        equations.next();
    }
    /// What holds an end against turning: clockwise it makes the left end hog, the right end sag.
    void clamp(node_equations<T>& equations, const held_place& node, const state_entries<T>& inside,
               const T& hogs) const {
        const auto spring = spring_law<T>::of(node.turning, T(1) / moment_unit());
        equations.add(spring.movement, inside.turn);
        equations.add(-spring.movement * node.turned);
        equations.add(spring.force * hogs, inside.moment);
        equations.add(-spring.force * (node.couple / moment_unit()));
        equations.next();
    }
    /// What passes from part to part. In a hinge a couple turns the part right of it.
    void join(node_equations<T>& equations, const held_place& node, const state_entries<T>& before,
              const state_entries<T>& after) const {
        equations.add(T(1), before.deflection).add(T(-1), after.deflection).next();
        if (node.is_hinge) {
            equations.add(T(1), before.moment).add(-node.passed / moment_unit()).next();
            equations.add(-node.passed / moment_unit());
        } else {
            equations.add(T(1), before.turn).add(T(-1), after.turn).next();
            equations.add(T(-1), before.moment);
        }
        equations.add(T(1), after.moment).add(-node.couple / moment_unit()).next();
    }

    std::vector<held_place> held_;
    std::vector<integrated_part<T>> parts_;
    T L0_{}, EI0_{};
};

}  // namespace sagitta::detail
