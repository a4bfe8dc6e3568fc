// The elastic line of a continuous beam: its parts are simple beams, and the moments and movements at the nodes
// between them make it one.
#pragma once

#include <sagitta/detail/banded_system.hpp>
#include <sagitta/detail/beam_part.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/node.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <cstddef>
#include <iterator>
#include <limits>
#include <type_traits>
#include <utility>
#include <variant>
#include <vector>

namespace sagitta {

template <class T>
class continuous_beam;

/// The elastic line of a continuous beam. Answers as elastic_line does; every question of floor 3 takes it.
template <class T>
class continuous_line {
    using part = detail::beam_part<T>;
    using response = detail::response;

public:
    using number = T;

    continuous_line(const continuous_beam<T>& described, load_list<T> loads)
        : beam_(described), loads_(std::move(loads)) {
        make_parts();
        distribute(loads_);
        solve();
    }

    template <class X>
    [[nodiscard]] quantity<dimension::length, T> deflection(const X& x) const {
        const auto place = on_beam(x);
        return answer<response::deflection>(place, inner_side(place));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::length, T> deflection(const X& x, side which) const {
        return answer<response::deflection>(x, which);
    }
    /// Slope. Inside the beam side matters at hinges and kinks, and at point loads where the beam deforms in shear.
    template <class X>
    [[nodiscard]] quantity<dimension::plane_angle, T> slope(const X& x) const {
        const auto place = on_beam(x);
        return answer<response::slope>(place, inner_side(place));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::plane_angle, T> slope(const X& x, side which) const {
        return answer<response::slope>(x, which);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::moment, T> moment(const X& x) const {
        return answer<response::moment>(x, just_right);
    }
    /// At an end of the beam the side beyond it answers for the support.
    template <class X>
    [[nodiscard]] quantity<dimension::moment, T> moment(const X& x, side which) const {
        const auto place = on_beam(x);
        if (is_left_end(place, which)) return end_moment(end::left);
        if (is_right_end(place, which)) return end_moment(end::right);
        return answer<response::moment>(place, which);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::force, T> shear(const X& x) const {
        return answer<response::shear>(x, just_right);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::force, T> shear(const X& x, side which) const {
        const auto place = on_beam(x);
        if (is_left_end(place, which)) return reaction(end::left);
        if (is_right_end(place, which)) return -reaction(end::right);
        return answer<response::shear>(place, which);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::line_load, T> load(const X& x) const {
        const auto place = on_beam(x);
        return load(place, inner_side(place));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::curvature, T> imposed_curvature(const X& x) const {
        const auto place = on_beam(x);
        return imposed_curvature(place, inner_side(place));
    }
    template <class X>
    [[nodiscard]] quantity<dimension::line_load, T> load(const X& x, side which) const {
        const auto place = on_beam(x);
        return part_at(place, which).load(place, which);
    }
    template <class X>
    [[nodiscard]] quantity<dimension::curvature, T> imposed_curvature(const X& x, side which) const {
        const auto place = on_beam(x);
        return part_at(place, which).imposed_curvature(place, which);
    }
    /// Flexural rigidity at x.
    template <class X>
    [[nodiscard]] quantity<dimension::flexural_rigidity, T> rigidity(const X& x, side which = just_right) const {
        return part_at(on_beam(x), which).EI();
    }

    /// The force of the support at x, upward positive; invalid_input where there is none.
    template <class X>
    [[nodiscard]] quantity<dimension::force, T> reaction_at(const X& x) const {
        const auto place = on_beam(x);
        const auto here = std::lower_bound(nodes_.begin(), nodes_.end(), place,
                                           [](const detail::node<T>& n, const auto& p) { return n.at < p; });
        if (here->at != place || !here->is_support) [[unlikely]]
            detail::refuse("reaction_at: x", place, "must be a place where the beam is supported");
        return reaction_of(static_cast<std::size_t>(here - nodes_.begin()));
    }
    [[nodiscard]] quantity<dimension::force, T> reaction(end::left_end) const { return reaction_of(0); }
    [[nodiscard]] quantity<dimension::force, T> reaction(end::right_end) const {
        return reaction_of(nodes_.size() - 1);
    }
    /// The bending moment that an end's support passes on, sagging positive.
    [[nodiscard]] quantity<dimension::moment, T> end_moment(end::left_end) const { return M_.front(); }
    [[nodiscard]] quantity<dimension::moment, T> end_moment(end::right_end) const { return M_.back(); }

    [[nodiscard]] const auto& shear_flexibility() const { return beam_.shear_flexibility(); }

    [[nodiscard]] const continuous_beam<T>& supported() const { return beam_; }
    [[nodiscard]] const load_list<T>& loads() const { return loads_; }

    [[nodiscard]] std::vector<quantity<dimension::length, T>> joints() const {
        std::vector<quantity<dimension::length, T>> places;
        for (const auto& p : parts_) {
            for (const auto& s : p.joints()) places.push_back(std::min(p.from() + s, p.to()));
        }
        return places;
    }

private:
    template <class X>
    quantity<dimension::length, T> on_beam(const X& x) const {
        const auto place = detail::expect_length<T>(x);
        if (!(place.value() >= T(0) && place <= beam_.span())) [[unlikely]]
            detail::refuse("x", place, "must lie on the beam, from 0 m to ", beam_.span());
        return place;
    }

    side inner_side(const quantity<dimension::length, T>& x) const {
        return x < beam_.span() ? just_right : just_left;
    }
    bool is_left_end(const quantity<dimension::length, T>& x, side which) const {
        return which == side::just_left && !(x > quantity<dimension::length, T>{});
    }
    bool is_right_end(const quantity<dimension::length, T>& x, side which) const {
        return which == side::just_right && !(x < beam_.span());
    }

    /// The part at x, at a node the one right of it.
    std::size_t index_of(const quantity<dimension::length, T>& x) const {
        const auto after = std::upper_bound(parts_.begin(), parts_.end(), x,
                                            [](const auto& place, const part& p) { return place < p.from(); });
        return static_cast<std::size_t>(after - parts_.begin()) - 1;
    }
    const part& part_at(const quantity<dimension::length, T>& x, side which) const {
        const std::size_t i = index_of(x);
        return which == side::just_left && i > 0 && parts_[i].from() == x ? parts_[i - 1] : parts_[i];
    }

    template <response R, class X>
    detail::response_quantity<R, T> answer(const X& x, side which) const {
        const auto place = on_beam(x);
        return part_at(place, which).template at<R>(place, which);
    }

    quantity<dimension::force, T> reaction_of(std::size_t i) const {
        quantity<dimension::force, T> up{};
        if (i < parts_.size()) up += parts_[i].outer_shear_left();
        if (i > 0) up -= parts_[i - 1].outer_shear_right();
        return up;
    }

    void make_parts() {
        nodes_ = beam_.nodes();
        for (std::size_t i = 1; i < nodes_.size(); ++i) {
            parts_.emplace_back(nodes_[i - 1].at, nodes_[i].at, beam_.rigidity_after(nodes_[i - 1].at),
                                beam_.shear_flexibility());
        }
    }

    void distribute(const load_list<T>& loads) {
        for (const auto& any : loads.cases()) std::visit([&](const auto& single) { put(single); }, any);
    }
    template <load_types::action Action, class N>
    void put(const load_types::concentrated<Action, N>& load) {
        if (!(load.at() <= beam_.span())) [[unlikely]]
            detail::refuse("at", load.at(), "must not lie beyond the span of the beam, ", beam_.span());
        parts_[index_of(detail::coherent<dimension::length, T>(load.at()))].add(load);
    }
    template <class Load>
    requires requires { typename Load::where_type; }
    void put(const Load& load) {
        if constexpr (requires { load.where().to; }) {
            if (!(load.where().to <= beam_.span())) [[unlikely]]
                detail::refuse("between: to", load.where().to, "must not lie beyond the span of the beam, ",
                               beam_.span());
            const auto stop = detail::coherent<dimension::length, T>(load.where().to);
            for (std::size_t i = index_of(detail::coherent<dimension::length, T>(load.where().from));
                 i < parts_.size() && parts_[i].from() < stop; ++i) {
                parts_[i].add(load);
            }
        } else {
            put(load.over(load_types::stretch<T>{quantity<dimension::length, T>{}, beam_.span()}));
        }
    }
    template <class End, load_types::motion Motion, class N>
    void put(const load_types::movement<End, Motion, N>& movement) {
        auto& held = std::is_same_v<End, end::left_end> ? nodes_.front() : nodes_.back();
        if constexpr (Motion == load_types::motion::rotation) {
            if (held.turning == T(0)) [[unlikely]]
                detail::refuse("support_rotation", movement.size(), "needs a clamped end; this end turns freely");
            held.turned += movement.size().value();
        } else {
            if (held.transverse == T(0)) [[unlikely]]
                detail::refuse("settlement", movement.size(),
                               "needs an end that is held against deflection; this end is free");
            held.settled += movement.size().value();
        }
    }

    void solve();

    continuous_beam<T> beam_;
    load_list<T> loads_;
    std::vector<detail::node<T>> nodes_;
    std::vector<part> parts_;
    std::vector<quantity<dimension::moment, T>> M_;
};

/// Two unknowns a node, its moment and its deflection, and two equations: the sections left and right of it turn
/// alike, and forces balance. Two more a part, the tilt of its chord and the shear that its end moments make: written out
/// as equations of their own, so that differences of deflections and of moments keep coefficients that are exact (a beam
/// on soft springs moves far more than it bends). Scaled to a mean span and the first EI, so that every coefficient is near
/// 1 and any stiffness k from 0 to infinite enters as k/(1 + k) and 1/(1 + k).
template <class T>
void continuous_line<T>::solve() {
    const std::size_t count = nodes_.size();
    const T L0 = beam_.span().value() / T(static_cast<double>(parts_.size()));
    const T EI0 = parts_.front().EI().value();
    // Nothing is computed with an infinite stiffness: inf * 0 would spoil what a number carries besides its value.
    const auto is_rigid = [](const T& k) { return k > std::numeric_limits<T>::max(); };
    const auto stiff = [&](const T& k) {
        if (is_rigid(k)) return T(1);
        return k > T(1) ? T(1) / (T(1) + T(1) / k) : k / (T(1) + k);
    };
    const auto soft = [&](const T& k) { return is_rigid(k) ? T(0) : T(1) / (T(1) + k); };
    const auto scaled = [&](const T& k, const T& unit) { return is_rigid(k) ? k : k * unit; };
    const auto M = [](std::size_t i) { return 4 * i; };
    const auto v = [](std::size_t i) { return 4 * i + 1; };
    const auto tilt = [](std::size_t part_number) { return 4 * part_number + 2; };
    const auto V = [](std::size_t part_number) { return 4 * part_number + 3; };
    detail::banded_system<T, 4> equations(4 * count - 2);

    std::vector<T> turning_weight(count, T(1)), balance_weight(count, T(1));
    for (std::size_t i = 0; i < count; ++i) {
        const detail::node<T>& here = nodes_[i];
        const bool at_end = i == 0 || i + 1 == count;
        const T k_turning = scaled(here.turning, L0 / EI0);
        const T k_transverse = scaled(here.transverse, L0 * L0 * L0 / EI0);
        balance_weight[i] = soft(k_transverse);
        equations(v(i), v(i)) = -stiff(k_transverse);
        equations.right_hand_side(v(i)) = -stiff(k_transverse) * here.settled / L0;
        if (here.is_hinge || (at_end && here.turning == T(0))) {
            turning_weight[i] = T(0);
            equations(M(i), M(i)) = T(1);
            equations.right_hand_side(M(i)) = here.passed * L0 / EI0;
        } else if (at_end) {
            // A spring resists with the moment -k (turn - imposed) at the left end, with +k at the right one.
            turning_weight[i] = stiff(k_turning);
            equations(M(i), M(i)) = -soft(k_turning);
            equations.right_hand_side(M(i)) = (i == 0 ? -turning_weight[i] : turning_weight[i]) * here.turned;
        }
    }
    std::vector<T> powers;
    powers.reserve(parts_.size());
    for (std::size_t i = 0; i < parts_.size(); ++i) {
        const part& p = parts_[i];
        const auto loaded = p.simply_supported();
        const T L = p.span().value() / L0;
        const T bend = EI0 / p.EI().value() * L;
        const T slide = p.shear_flexibility().value() * EI0 / (L0 * L0);
        const T load_turn = p.shear_turn().value();
        // Tilt and shear are counted in units of 1/power, so that a short part has coefficients near 1 as well.
        const T power = detail::power_of_two_below(L);
        equations(tilt(i), v(i + 1)) = T(1);
        equations(tilt(i), v(i)) = T(-1);
        equations(tilt(i), tilt(i)) = -L / power;
        equations(V(i), M(i + 1)) = T(1);
        equations(V(i), M(i)) = T(-1);
        equations(V(i), V(i)) = -L / power;
        powers.push_back(power);
        // One end of the part at a time: sign is 1 for its left end, -1 for its right end.
        const auto join = [&](std::size_t near, std::size_t far, int sign, const T& slope, const T& reaction) {
            // The turn of the section, equal on both sides of the node.
            const T w = T(-sign) * turning_weight[near];
            equations(M(near), M(near)) += w * T(sign) * bend / T(3);
            equations(M(near), M(far)) += w * T(sign) * bend / T(6);
            equations(M(near), V(i)) -= w * slide / power;
            equations(M(near), tilt(i)) += w / power;
            equations.right_hand_side(M(near)) -= w * (slope + load_turn);
            // What the part rests on the node with.
            const T b = balance_weight[near];
            equations(v(near), V(i)) += T(sign) * b / power;
            equations.right_hand_side(v(near)) -= b * reaction * L0 * L0 / EI0;
        };
        // A kink that stands right at a node lies between the slope of the node and that of the part.
        const quantity<dimension::length, T> start{};
        join(i, i + 1, 1, loaded.slope(start, just_left).value(), loaded.reaction(end::left).value());
        join(i + 1, i, -1, loaded.slope(p.span(), just_right).value(), loaded.reaction(end::right).value());
    }

    std::vector<T> unknowns;
    const std::size_t free_unknown = equations.solve(unknowns);
    if (free_unknown < 4 * count - 2) [[unlikely]]
        detail::refuse("continuous_beam: the place", nodes_[free_unknown / 4].at,
                       free_unknown % 4 == 0 ? "can turn freely: the beam is a mechanism"
                                             : "can move freely: the beam is a mechanism");
    // What is known beforehand is exact: the moment in a hinge, the movement of a rigid support.
    std::vector<quantity<dimension::length, T>> moved;
    for (std::size_t i = 0; i < count; ++i) {
        const T& weight = turning_weight[i];
        const T known = nodes_[i].passed;
        M_.push_back(quantity<dimension::moment, T>::from_value(weight == T(0) ? known : unknowns[M(i)] * EI0 / L0));
        const T settled = nodes_[i].settled;
        moved.push_back(
            quantity<dimension::length, T>::from_value(balance_weight[i] == T(0) ? settled : unknowns[v(i)] * L0));
    }
    for (std::size_t i = 0; i < parts_.size(); ++i) {
        const T tilted = unknowns[tilt(i)] / powers[i];
        const T shear = unknowns[V(i)] / powers[i] * EI0 / (L0 * L0);
        parts_[i].place(M_[i], M_[i + 1], moved[i], moved[i + 1],
                        quantity<dimension::plane_angle, T>::from_value(tilted),
                        quantity<dimension::force, T>::from_value(shear));
    }
}

}  // namespace sagitta
