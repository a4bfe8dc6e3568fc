// A released structure as the force method asks it: its line under a unit redundant, how a release moves along a
// line, and the structure with the redundants on it.
#pragma once

#include <sagitta/detail/compatibility_equations.hpp>
#include <sagitta/detail/end_state.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/release.hpp>
#include <sagitta/units.hpp>

#include <cstddef>
#include <type_traits>

namespace sagitta::detail {

template <class Structure>
concept has_hinges = requires(Structure s) {
    s.hinge_at(s.span(), quantity<moment, typename Structure::number>{});
};

/// Whether a structure can be released like this.
template <class Structure, class R>
inline constexpr bool takes_release = true;
template <class Structure, class T>
inline constexpr bool takes_release<Structure, release_types::release<release_types::kind::relative_rotation, T>> =
    has_hinges<Structure>;

/// Calls a function with the index and the release, for each that the structure takes.
template <class Structure, class Releases, class Function>
constexpr void for_each_release(const Releases& releases, const Function& f) {
    releases.for_each([&](std::size_t i, const auto& r) {
        if constexpr (takes_release<Structure, std::decay_t<decltype(r)>>) f(i, r);
    });
}

/// Unit redundants act on a structure that nothing else moves.
template <class Structure>
constexpr Structure unmoved(const Structure& released) {
    if constexpr (requires { released.unmoved(); }) {
        return released.unmoved();
    } else {
        return released;
    }
}

/// A redundant of a size as a load. That of a hinge is none: it is a pair of couples, which the hinge passes on.
template <class T, release_types::kind K, class N>
constexpr auto redundant_load(const release_types::release<K, N>& r, const T& size) {
    using namespace load_types;
    static_assert(K != release_types::kind::relative_rotation);
    constexpr auto what = K == release_types::kind::translation ? action::point_force : action::couple;
    return concentrated<what, T>(quantity<release_types::redundant<K>, T>::from_value(size),
                                 position<T>{coherent<length, T>(r.at())});
}

/// Adds a moment to what a hinge passes on already.
template <class Structure, class T>
void pass_on(Structure& s, const quantity<length, T>& x, const T& size) {
    for (const auto& node : s.nodes()) {
        if (!node.is_hinge || node.at != x) continue;
        s.hinge_at(x, quantity<moment, T>::from_value(node.passed + size));
        return;
    }
    refuse("relative_rotation_at: x", x, "must be a place where the released structure has a hinge");
}

/// T: the number type of the unit.
template <class T, class Structure, release_types::kind K, class N>
constexpr auto line_under_unit(const Structure& resting, const release_types::release<K, N>& r) {
    if constexpr (K != release_types::kind::relative_rotation) {
        return resting.under(redundant_load(r, T(1)));
    } else {
        Structure kinked = resting;
        pass_on(kinked, coherent<length, T>(r.at()), T(1));
        return kinked.under(load_list<T>{});
    }
}

/// The turn of a section. A beam that deforms in shear slides on top of it: couples do no work on that part of dv/dx.
template <class Line, class X>
constexpr auto turn_of_section(const Line& line, const X& x, side which) {
    if constexpr (requires { line.shear_flexibility(); }) {
        return line.slope(x, which) - as_angle(line.shear(x, which) * line.shear_flexibility());
    } else {
        return line.slope(x);
    }
}
template <class Line, class X>
constexpr auto turn_of_section(const Line& line, const X& x) {
    return turn_of_section(line, x, x < line.supported().span() ? just_right : just_left);
}

/// How a release moves in an elastic line.
template <class Line, release_types::kind K, class N>
constexpr auto displacement_in(const Line& line, const release_types::release<K, N>& r) {
    const auto x = coherent<length, typename Line::number>(r.at());
    if constexpr (K == release_types::kind::translation) {
        return line.deflection(x);
    } else if constexpr (K == release_types::kind::rotation) {
        return turn_of_section(line, x);
    } else {
        return line.slope(x, just_right) - line.slope(x, just_left) -
               as_angle((line.shear(x, just_right) - line.shear(x, just_left)) * line.shear_flexibility());
    }
}

/// Whether a release moves under its own unit redundant, by more than what is rounding: next to a support that holds
/// it the displacement is far below what the turn of the section would make of it along the span.
template <class Line, release_types::kind K, class N>
constexpr bool moves(const Line& line, const release_types::release<K, N>& r) {
    using T = typename Line::number;
    const auto x = coherent<length, T>(r.at());
    const auto L = line.supported().span();
    T possible;
    if constexpr (K == release_types::kind::translation) {
        possible = abs(turn_of_section(line, x)).value() * L.value();
    } else {
        possible = L.value() / line.rigidity(x).value();
    }
    return displacement_in(line, r).value() > rounding_share<T>() * possible;
}

template <class Structure, release_types::kind K, class N>
constexpr void require_place(const Structure& released, const release_types::release<K, N>& r) {
    if constexpr (!takes_release<Structure, release_types::release<K, N>>)
        refuse(release_types::name_of<K>, r.at(),
               "must be a hinge, which of the released structures only a continuous_beam has");
    if (!(r.at() <= released.span())) [[unlikely]]
        refuse(release_types::name_of<K>, r.at(), "must lie on the beam, from 0 m to ", released.span());
}

}  // namespace sagitta::detail
