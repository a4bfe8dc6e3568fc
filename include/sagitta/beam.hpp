// Beams: a span, a constant flexural rigidity, and how each end is held.
#pragma once

#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/influence.hpp>
#include <sagitta/detail/load_case.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/units.hpp>

namespace sagitta {

template <class Beam, class Loads>
class elastic_line;
template <class Left, class Right, class T>
class shear_flexible_beam;

/// A prismatic beam of one span. Left and Right are ways to hold an end (held::fixed, held::pinned, held::free).
template <class Left, class Right, class T = double>
class prismatic_beam {
public:
    static_assert(detail::stable_ends<Left, Right>,
                  "sagitta: a beam held like this is a mechanism; it needs a clamped end or two supports");

    using number = T;
    using left_type = Left;
    using right_type = Right;

    /// Throws invalid_input unless the span and EI are greater than 0 and finite.
    constexpr prismatic_beam(const quantity<dimension::length, T>& span,
                             const quantity<dimension::flexural_rigidity, T>& EI)
        : span_(span), EI_(EI) {
        if (!detail::is_positive(span.value())) [[unlikely]]
            detail::refuse("span", span, "must be greater than 0 m and finite");
        if (!detail::is_positive(EI.value())) [[unlikely]]
            detail::refuse("EI", EI, "must be greater than 0 N*m^2 and finite");
    }

    [[nodiscard]] constexpr const quantity<dimension::length, T>& span() const { return span_; }
    [[nodiscard]] constexpr const quantity<dimension::flexural_rigidity, T>& EI() const { return EI_; }

    /// The elastic line under a load case, a composition of load cases or a load_list (elastic_line.hpp).
    template <class Loads>
    [[nodiscard, gnu::always_inline]] constexpr auto under(const Loads& loads) const {
        constexpr bool right = load_types::is_loads<Loads>;
        static_assert(right, "sagitta: a load is expected here, such as uniform_load(4.5*kN/m) or a load_list");
        if constexpr (right) return elastic_line<prismatic_beam, Loads>(*this, loads);
    }

    /// The beam that also deforms in shear, with the shear rigidity kGA (a force; shear_flexible.hpp).
    template <class S>
    [[nodiscard]] constexpr auto with_shear_rigidity(const S& kGA) const {
        return shear_flexible_beam<Left, Right, T>(*this, detail::expect_force<T>(kGA));
    }

private:
    quantity<dimension::length, T> span_;
    quantity<dimension::flexural_rigidity, T> EI_;
};

/// A beam from the ways its two ends are held, left then right: beam_with_ends<held::pinned, held::fixed>(L, EI).
/// L is a length, EI a flexural rigidity.
template <class Left, class Right, class L, class K>
[[nodiscard]] constexpr auto beam_with_ends(const L& span, const K& EI) {
    using T = detail::common_number<L, K>;
    using beam = prismatic_beam<Left, Right, T>;
    if constexpr (detail::has_dimension<L, dimension::length>) {
        return beam(detail::expect_length<T>(span), detail::expect_rigidity<T>(EI));
    } else {  // one sentence is enough
        return beam(detail::expect_length<T>(span), detail::coherent<dimension::flexural_rigidity, T>(EI));
    }
}

/// Supported at both ends, free to rotate there.
template <class L, class K>
[[nodiscard]] constexpr auto simple_beam(const L& span, const K& EI) {
    return beam_with_ends<held::pinned, held::pinned>(span, EI);
}

/// Clamped at the left end, free at the right.
template <class L, class K>
[[nodiscard]] constexpr auto cantilever(const L& span, const K& EI) {
    return beam_with_ends<held::fixed, held::free>(span, EI);
}

/// Clamped at the left end, supported at the right.
template <class L, class K>
[[nodiscard]] constexpr auto propped_cantilever(const L& span, const K& EI) {
    return beam_with_ends<held::fixed, held::pinned>(span, EI);
}

/// Clamped at both ends.
template <class L, class K>
[[nodiscard]] constexpr auto fixed_beam(const L& span, const K& EI) {
    return beam_with_ends<held::fixed, held::fixed>(span, EI);
}

/// The same beam with its ends exchanged.
template <class Left, class Right, class T>
[[nodiscard]] constexpr prismatic_beam<Right, Left, T> mirrored(const prismatic_beam<Left, Right, T>& b) {
    return {b.span(), b.EI()};
}

}  // namespace sagitta
