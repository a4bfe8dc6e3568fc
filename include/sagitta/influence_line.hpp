// Influence lines: what a unit load, wherever it stands, causes at one section.
//
//     const auto eta = influence_of_moment(bridge, 9.0*m);
//     eta.ordinate(4.0*m);          // moment at 9 m for a load of 1 at 4 m: a length
//
// Each is the elastic line of the same beam, unloaded, under a unit displacement of the action that it tells (Müller-
// Breslau): a kink for a moment, an offset for a shear, a settlement for a reaction; the deflection at a section is
// that under a unit load there (Maxwell). So it is an exact piecewise cubic, and nothing here knows a formula.
#pragma once

#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/detail/released_structure.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/piecewise.hpp>
#include <sagitta/units.hpp>

#include <type_traits>
#include <variant>

namespace sagitta {

/// An influence line. Action is the dimension of what it tells: a moment, a force, a length or a plane angle.
template <class Line, class Action>
class influence_line {
public:
    using number = typename Line::number;
    /// Ordinates are actions per force: lengths for a moment, plain numbers for a shear or a reaction.
    using ordinate_unit = typename boost::units::divide_typeof_helper<Action, dimension::force>::type;
    using action_unit = Action;

    /// deflected: the line of the beam under the unit displacement. A load that stands right at x where the ordinate
    /// jumps is taken to stand on the given side of it.
    constexpr influence_line(const Line& deflected, const quantity<dimension::length, number>& x, side of_load)
        : deflected_(deflected), section_(x), of_load_(of_load) {}

    /// The action caused by a unit load at x (downward): action per force. x is a length on the beam, else
    /// invalid_input.
    template <class X>
    [[nodiscard]] constexpr quantity<ordinate_unit, number> ordinate(const X& x) const {
        const auto place = detail::expect_length<number>(x);
        return ordinate(place, side_of_load(place));
    }
    template <class X>
    [[nodiscard]] constexpr quantity<ordinate_unit, number> ordinate(const X& x, side which) const {
        return quantity<ordinate_unit, number>::from_value(deflected_.deflection(x, which).value());
    }

    /// The action caused by loads: point loads, couples and line loads, a composition of them or a load_list.
    /// invalid_input for what is no force (movements, curvatures, lacks of fit) or does not lie on the beam.
    template <class Loads>
    [[nodiscard]] quantity<Action, number> effect_of(const Loads& loads) const {
        constexpr bool right = load_types::is_loads<Loads>;
        static_assert(right, "sagitta: a load is expected here, such as point_load(60.0*kN, at(3.0*m)) or a load_list");
        quantity<Action, number> sum{};
        if constexpr (right) {
            load_list<number> list;
            list += loads;
            for (const auto& any : list.cases()) {
                std::visit([&](const auto& single) { sum += effect_of_case(single); }, any);
            }
        }
        return sum;
    }

    /// The action per line load over a stretch (lengths on the beam): the area under the influence line there.
    template <class Stretch>
    [[nodiscard]] constexpr auto area(const Stretch& where) const {
        const auto stretch = detail::expect_stretch<number>(where);
        if (!(stretch.to <= span())) [[unlikely]]
            detail::refuse("between: to", stretch.to, "must not lie beyond the span of the beam, ", span());
        return integral(stretch.from, stretch.to, [](const auto&) { return number(1); });
    }

    [[nodiscard]] constexpr const quantity<dimension::length, number>& section() const { return section_; }

    /// The beam under the unit displacement: its deflections are the ordinates, in coherent SI. piecewise_form of it
    /// gives the cubics, extremes_of_deflection their greatest and least.
    [[nodiscard]] constexpr const Line& deflected() const { return deflected_; }

private:
    constexpr const auto& span() const { return deflected_.supported().span(); }

    constexpr side side_of_load(const quantity<dimension::length, number>& x) const {
        if (x == section_) return of_load_;
        return x < span() ? just_right : just_left;
    }

    /// The integral of the ordinates times a factor that is linear in x: the moments of a polynomial, exact.
    template <class Factor>
    constexpr auto integral(const quantity<dimension::length, number>& from,
                            const quantity<dimension::length, number>& to, const Factor& factor) const {
        using unit = typename boost::units::multiply_typeof_helper<ordinate_unit, dimension::length>::type;
        number sum(0);
        detail::for_each_stretch(deflected_, from, to, [&](const auto& start, const auto& stop) {
            const elastic_segment<number> segment(deflected_, start, stop);
            const auto part = detail::normalized<detail::response::deflection>(segment);
            // The moments of a polynomial in t over [0, 1]: its coefficients over k + 1 and k + 2.
            number level(0), tilt(0);
            for (std::size_t k = 0; k < part.c.size(); ++k) {
                level += part.c[k] / number(static_cast<int>(k) + 1);
                tilt += part.c[k] / number(static_cast<int>(k) + 2);
            }
            const number at_start = factor(start);
            const number growth = factor(stop) - at_start;
            sum += (level * at_start + tilt * growth) * (stop - start).value();
        });
        return quantity<unit, number>::from_value(sum);
    }

    template <load_types::action What, class N>
    quantity<Action, number> effect_of_case(const load_types::concentrated<What, N>& load) const {
        if constexpr (load_types::concentrated<What, N>::is_lack_of_fit) {
            refuse_movement(load.size());
        } else {
            const auto x = detail::coherent<dimension::length, number>(load.at());
            if (!(x <= span())) [[unlikely]]
                detail::refuse("at", x, "must not lie beyond the span of the beam, ", span());
            if constexpr (load_types::concentrated<What, N>::is_couple) {
                return quantity<Action, number>::from_value(turn(x) * load.size().value());
            } else {
                return ordinate(x) * load.size();
            }
        }
    }
    template <class Load>
    requires requires { Load::is_uniform; }
    quantity<Action, number> effect_of_case(const Load& load) const {
        if constexpr (requires { load.where().to; }) {
            const auto a = load.where().from;
            const auto b = load.where().to;
            if (!(b <= span())) [[unlikely]]
                detail::refuse("between: to", b, "must not lie beyond the span of the beam, ", span());
            const number w = load.size_from().value();
            const number growth = load.size_to().value() - w;
            const auto sum = integral(a, b, [&](const auto& x) { return w + growth * ((x - a) / (b - a)).value(); });
            return quantity<Action, number>::from_value(sum.value());
        } else {
            return effect_of_case(load.over(load_types::stretch<number>{{}, span()}));
        }
    }
    template <class Load>
    quantity<Action, number> effect_of_case(const Load& load) const {
        refuse_movement(load.size());
    }
    template <class Size>
    [[noreturn]] static void refuse_movement(const Size& size) {
        detail::refuse("influence line: load of size", size, "is no force: movements and curvatures have no ordinate");
    }

    /// How far a couple at x turns: with its section, which the sliding of shear deformation does not turn.
    number turn(const quantity<dimension::length, number>& x) const {
        const side which = side_of_load(x);
        number angle = deflected_.slope(x, which).value();
        if constexpr (requires { deflected_.shear_flexibility(); }) {
            angle -= (deflected_.shear(x, which) * deflected_.shear_flexibility()).value();
        }
        return angle;
    }

    Line deflected_;
    quantity<dimension::length, number> section_;
    side of_load_;
};

namespace detail {

template <class Beam, class X>
constexpr auto section_on(const Beam& b, const X& x) {
    using T = typename Beam::number;
    const auto place = expect_length<T>(x);
    if (!(place.value() >= T(0) && place <= b.span())) [[unlikely]]
        refuse("influence line: section x", place, "must lie on the beam, from 0 m to ", b.span());
    return place;
}

template <class Action, class Line, class Place>
constexpr auto influence_line_of(const Line& deflected, const Place& x, side of_load) {
    return influence_line<Line, Action>(deflected, x, of_load);
}

template <class T, class D>
constexpr quantity<D, T> unit_of() {
    return quantity<D, T>::from_value(T(1));
}

}  // namespace detail

// Each takes a beam (single span with or without shear deformation, or a continuous_beam) and a section x, a length on
// the beam (else invalid_input). Accuracy: that of the deflections of the beam.

/// Influence line of the bending moment at x; at a support that of the support moment.
template <class Beam, class X>
[[nodiscard]] constexpr auto influence_of_moment(const Beam& b, const X& x) {
    using T = typename Beam::number;
    const auto place = detail::section_on(b, x);
    return detail::influence_line_of<dimension::moment>(
        detail::unmoved(b).under(imposed_kink(detail::unit_of<T, dimension::plane_angle>(), sagitta::at(place))), place,
        just_right);
}

/// Influence line of the shear force just left or just right of x.
template <class Beam, class X>
[[nodiscard]] constexpr auto influence_of_shear(const Beam& b, const X& x, side which) {
    using T = typename Beam::number;
    const auto place = detail::section_on(b, x);
    const auto offset = imposed_offset(detail::unit_of<T, dimension::length>(), sagitta::at(place));
    // A load right at the section stands on the other side of it.
    const side of_load = which == side::just_right ? just_left : just_right;
    if constexpr (requires { b.unmoved(); }) {
        auto moved = b.unmoved();
        // An offset right at an inner support moves the part right of it. Moved the other way, the support leaves only
        // the part left of it displaced.
        if (which == side::just_left && place < b.span() && b.is_supported_at(place)) {
            moved.settle_at(place, -detail::unit_of<T, dimension::length>());
        }
        return detail::influence_line_of<dimension::force>(moved.under(offset), place, of_load);
    } else {
        return detail::influence_line_of<dimension::force>(b.under(offset), place, of_load);
    }
}
template <class Beam, class X>
[[nodiscard]] constexpr auto influence_of_shear(const Beam& b, const X& x) {
    const auto place = detail::section_on(b, x);
    return influence_of_shear(b, place, place < b.span() ? just_right : just_left);
}

/// Influence line of the deflection at x (length per force).
template <class Beam, class X>
[[nodiscard]] constexpr auto influence_of_deflection(const Beam& b, const X& x) {
    using T = typename Beam::number;
    const auto place = detail::section_on(b, x);
    return detail::influence_line_of<dimension::length>(
        detail::unmoved(b).under(point_load(detail::unit_of<T, dimension::force>(), sagitta::at(place))), place,
        just_right);
}

/// Influence line of a reaction, upward positive: of an end (end::left, end::right), or of the support at a place of a
/// continuous_beam (a length). What is not supported there is refused: it has no reaction.
template <class Beam, class Where>
[[nodiscard]] constexpr auto influence_of_reaction(const Beam& b, const Where& where) {
    using T = typename Beam::number;
    constexpr bool is_left = std::is_same_v<Where, end::left_end>;
    const auto of = [&](const auto& line, const quantity<dimension::length, T>& x) {
        return detail::influence_line_of<dimension::force>(line, x, x < b.span() ? just_right : just_left);
    };
    if constexpr (is_left || std::is_same_v<Where, end::right_end>) {
        const auto sunk = settlement(where, detail::unit_of<T, dimension::length>());
        return of(detail::unmoved(b).under(sunk), is_left ? quantity<dimension::length, T>{} : b.span());
    } else {
        constexpr bool has_places = requires { b.unmoved(); };
        static_assert(has_places, "sagitta: a single span is supported at its ends: write end::left or end::right");
        const auto x = detail::section_on(b, where);
        auto moved = detail::unmoved(b);
        if constexpr (has_places) {
            if (!b.is_supported_at(x)) [[unlikely]]
                detail::refuse("influence_of_reaction: x", x, "must be a place where the beam is supported");
        }
        if constexpr (has_places) moved.settle_at(x, detail::unit_of<T, dimension::length>());
        return of(moved.under(load_list<T>{}), x);
    }
}

}  // namespace sagitta
