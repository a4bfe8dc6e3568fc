// The elastic line of a continuous beam: its parts are simple beams, and the moments and movements at the nodes
// between them make it one.
#pragma once

#include <sagitta/detail/beam_part.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/node.hpp>
#include <sagitta/detail/place_parts.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <cstddef>
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
        M_ = detail::place_parts(nodes_, parts_);
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

    side inner_side(const quantity<dimension::length, T>& x) const { return x < beam_.span() ? just_right : just_left; }
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

    continuous_beam<T> beam_;
    load_list<T> loads_;
    std::vector<detail::node<T>> nodes_;
    std::vector<part> parts_;
    std::vector<quantity<dimension::moment, T>> M_;
};

}  // namespace sagitta
