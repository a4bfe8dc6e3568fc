// A beam on any supports: spans, overhangs, steps of stiffness, springs, hinges, guided ends, shear deformation.
//
//     continuous_beam(14.0*m, EI).support_at(0.0*m).support_at(6.0*m).spring_at(12.0*m, 8.0*kN/mm)
//         .rigidity_from(6.0*m, 2.0*EI)
//
// The parts between its nodes are simple beams of the library; moments and movements at the nodes are found by
// compatibility of rotations and equilibrium (force method with the node moments as redundants, Clapeyron).
#pragma once

#include <sagitta/detail/continuous_line.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <iterator>
#include <limits>
#include <type_traits>
#include <utility>
#include <vector>

namespace sagitta {

/// The description of a beam. Every function adds to it and returns it; places are lengths on the beam from its
/// left end, otherwise invalid_input.
template <class T = double>
class continuous_beam {
public:
    using number = typename detail::in_order<T>::number;

    /// A beam of a length L (a length) with flexural rigidity EI, held nowhere yet.
    template <class L, class K>
    continuous_beam(const L& span, const K& rigidity) : L_(detail::expect_length<T>(span)) {
        if (!detail::is_positive(L_.value())) [[unlikely]]
            detail::refuse("span", L_, "must be greater than 0 m and finite");
        steps_.push_back({quantity<dimension::length, T>{}, positive_rigidity(rigidity)});
        nodes_.push_back({});
        nodes_.push_back({L_});
    }

    /// Supports it rigidly at x.
    template <class X>
    continuous_beam& support_at(const X& x) {
        return hold(on_beam(x), rigid());
    }
    /// Supports it at x by a spring of a stiffness (force per length; 0 to infinite).
    template <class X, class S>
    continuous_beam& spring_at(const X& x, const S& stiffness) {
        const T k = not_negative("spring_at: stiffness", detail::expect_spring_stiffness<T>(stiffness));
        return hold(on_beam(x), k);
    }
    /// Lets the support at x settle by a length (downward positive).
    template <class X, class S>
    continuous_beam& settle_at(const X& x, const S& by) {
        const auto place = on_beam(x);
        const auto settled = detail::expect_length<T>(by);
        detail::require_finite("settle_at: by", settled);
        node_type& support = node_at(place);
        if (!support.is_support) [[unlikely]]
            detail::refuse("settle_at: x", place, "must be a place where the beam is supported");
        support.settled = settled.value();
        return *this;
    }
    /// Clamps an end: it neither deflects nor rotates.
    template <class End>
    continuous_beam& clamp(End which) {
        node_type& clamped = end_node(which);
        clamped.turning = rigid();
        return hold(clamped.at, rigid());
    }
    /// Guides an end: free to move, not to rotate.
    template <class End>
    continuous_beam& guide(End which) {
        end_node(which).turning = rigid();
        return *this;
    }
    /// Holds an end against rotation by a spring of a stiffness (moment per angle; 0 to infinite).
    template <class End, class S>
    continuous_beam& turning_spring(End which, const S& stiffness) {
        end_node(which).turning =
            not_negative("turning_spring: stiffness", detail::expect_rotational_stiffness<T>(stiffness));
        return *this;
    }
    /// Makes a hinge at x: no moment is passed on there.
    template <class X>
    continuous_beam& hinge_at(const X& x) {
        return hinge_at(x, quantity<dimension::moment, T>{});
    }
    /// Makes a hinge at x that passes on a given bending moment (force times length, sagging positive): a pair of
    /// couples that acts on the parts left and right of it.
    template <class X, class C>
    continuous_beam& hinge_at(const X& x, const C& passing) {
        const auto place = on_beam(x);
        const auto passed = detail::expect_moment<T>(passing);
        if (!(place > quantity<dimension::length, T>{} && place < L_)) [[unlikely]]
            detail::refuse("hinge_at: x", place, "must lie between the ends of the beam, 0 m and ", L_);
        detail::require_finite("hinge_at: passing", passed);
        node_type& hinge = node_at(place);
        hinge.is_hinge = true;
        hinge.passed = passed.value();
        return *this;
    }
    /// From x on to the right, up to the next step, the flexural rigidity is this one.
    template <class X, class K>
    continuous_beam& rigidity_from(const X& x, const K& rigidity) {
        const step added{on_beam(x), positive_rigidity(rigidity)};
        node_at(added.from);
        const auto after = step_behind(added.from);
        if (std::prev(after)->from == added.from) {
            *std::prev(after) = added;
        } else {
            steps_.insert(after, added);
        }
        return *this;
    }
    /// Makes it deform in shear with a shear rigidity kGA (a force greater than 0; infinite: it does not).
    template <class S>
    continuous_beam& shear_rigidity(const S& kGA) {
        const auto rigidity = detail::expect_force<T>(kGA);
        if (!(rigidity.value() > T(0))) [[unlikely]]
            detail::refuse("shear_rigidity: kGA", rigidity, "must be greater than 0 N");
        shear_flexibility_ = T(1) / rigidity;
        return *this;
    }

    /// The same beam before anything has moved it: no support has settled, no hinge passes a moment on.
    [[nodiscard]] continuous_beam unmoved() const {
        continuous_beam same = *this;
        for (node_type& each : same.nodes_) each.settled = each.passed = T(0);
        return same;
    }
    template <class X>
    [[nodiscard]] bool is_supported_at(const X& x) const {
        const auto place = on_beam(x);
        const auto here = node_behind(place);
        return here->at == place && here->is_support;
    }
    /// The stretches between neighbouring supports and, where the ends are not supported, the overhangs.
    [[nodiscard]] std::vector<load_types::stretch<T>> spans() const {
        std::vector<load_types::stretch<T>> all;
        auto from = nodes_.front().at;
        for (const auto& n : nodes_) {
            if (!(from < n.at) || !(n.is_support || n.at == L_)) continue;
            all.push_back({from, n.at});
            from = n.at;
        }
        return all;
    }

    [[nodiscard]] const quantity<dimension::length, T>& span() const { return L_; }
    [[nodiscard]] const std::vector<detail::node<T>>& nodes() const { return nodes_; }
    [[nodiscard]] const auto& shear_flexibility() const { return shear_flexibility_; }

    /// The flexural rigidity just right of x.
    [[nodiscard]] const quantity<dimension::flexural_rigidity, T>& rigidity_after(
        const quantity<dimension::length, T>& x) const {
        return std::prev(step_behind(x))->EI;
    }

    /// The elastic line under a load case, a composition or a load_list. Throws invalid_input if the beam can move
    /// freely, or where a load does not lie on it. A settlement or rotation of an end acts where the end is held.
    template <class Loads>
    [[nodiscard]] continuous_line<T> under(const Loads& loads) const {
        constexpr bool right = load_types::is_loads<Loads>;
        static_assert(right, "sagitta: a load is expected here, such as uniform_load(4.5*kN/m) or a load_list");
        load_list<T> list;
        if constexpr (right) list += loads;
        return continuous_line<T>(*this, std::move(list));
    }

private:
    using node_type = detail::node<T>;
    struct step {
        quantity<dimension::length, T> from;
        quantity<dimension::flexural_rigidity, T> EI;
    };
    static T rigid() { return std::numeric_limits<T>::infinity(); }

    template <class K>
    static quantity<dimension::flexural_rigidity, T> positive_rigidity(const K& rigidity) {
        const auto EI = detail::expect_rigidity<T>(rigidity);
        if (!detail::is_positive(EI.value())) [[unlikely]]
            detail::refuse("EI", EI, "must be greater than 0 N*m^2 and finite");
        return EI;
    }
    template <class Q>
    static T not_negative(const char* argument, const Q& k) {
        if (!(k.value() >= T(0))) [[unlikely]]
            detail::refuse(argument, k, "must not be less than 0");
        return k.value();
    }

    template <class X>
    quantity<dimension::length, T> on_beam(const X& x) const {
        const auto place = detail::expect_length<T>(x);
        if (!(place.value() >= T(0) && place <= L_)) [[unlikely]]
            detail::refuse("x", place, "must lie on the beam, from 0 m to ", L_);
        return place;
    }
    auto step_behind(const quantity<dimension::length, T>& x) const {
        return std::upper_bound(steps_.begin(), steps_.end(), x,
                                [](const auto& place, const step& s) { return place < s.from; });
    }
    auto step_behind(const quantity<dimension::length, T>& x) {
        return steps_.begin() + (std::as_const(*this).step_behind(x) - steps_.cbegin());
    }

    continuous_beam& hold(const quantity<dimension::length, T>& place, const T& stiffness) {
        node_type& support = node_at(place);
        support.transverse = stiffness;
        support.is_support = true;
        return *this;
    }
    template <class End>
    node_type& end_node(End) {
        detail::expect_end<End>();
        return std::is_same_v<End, end::left_end> ? nodes_.front() : nodes_.back();
    }

    /// The node at a place, or the next one behind it.
    auto node_behind(const quantity<dimension::length, T>& place) const {
        return std::lower_bound(nodes_.cbegin(), nodes_.cend(), place,
                                [](const node_type& n, const auto& x) { return n.at < x; });
    }

    /// The node at a place, made if there is none.
    node_type& node_at(const quantity<dimension::length, T>& place) {
        const auto here = nodes_.begin() + (node_behind(place) - nodes_.cbegin());
        return here->at == place ? *here : *nodes_.insert(here, node_type{place});
    }

    quantity<dimension::length, T> L_;
    std::vector<node_type> nodes_;
    std::vector<step> steps_;
    quantity<typename detail::beam_part<T>::inverse_force, T> shear_flexibility_{};
};

template <class L, class K>
continuous_beam(const L&, const K&) -> continuous_beam<detail::common_number<L, K>>;

}  // namespace sagitta
