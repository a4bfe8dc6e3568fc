// Shear deformation as an option of a beam: joist.with_shear_rigidity(kGA).under(loads).
//
// Sections turn as bending makes them, and the line slides by V/kGA on top (Timoshenko; kGA is the shear modulus
// times the shear area). With kGA infinite every number is the one without shear deformation, to the bit.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/load.hpp>
#include <sagitta/units.hpp>

namespace sagitta {

template <class Beam, class Loads>
class shear_flexible_line;

/// A beam that also deforms in shear (beam.with_shear_rigidity makes one).
template <class Left, class Right, class T>
class shear_flexible_beam {
public:
    using number = T;

    /// Throws invalid_input unless kGA is greater than 0.
    constexpr shear_flexible_beam(const prismatic_beam<Left, Right, T>& bending,
                                  const quantity<dimension::force, T>& kGA)
        : bending_(bending), kGA_(kGA) {
        if (!(kGA.value() > T(0))) [[unlikely]]
            detail::refuse("shear rigidity kGA", kGA, "must be greater than 0 N");
    }

    [[nodiscard]] constexpr const prismatic_beam<Left, Right, T>& bending() const { return bending_; }
    [[nodiscard]] constexpr const quantity<dimension::length, T>& span() const { return bending_.span(); }
    [[nodiscard]] constexpr const quantity<dimension::flexural_rigidity, T>& EI() const { return bending_.EI(); }
    [[nodiscard]] constexpr const quantity<dimension::force, T>& kGA() const { return kGA_; }

    template <class Loads>
    [[nodiscard]] constexpr auto under(const Loads& loads) const {
        return shear_flexible_line<shear_flexible_beam, Loads>(*this, loads);
    }

private:
    prismatic_beam<Left, Right, T> bending_;
    quantity<dimension::force, T> kGA_;
};

/// Its elastic line: the line of the beam in bending, what the sliding adds, and, where clamped ends would be turned
/// by it, the end moments that turn them back. Answers as elastic_line does; slope is dv/dx, sliding included.
template <class Left, class Right, class N, class Loads>
class shear_flexible_line<shear_flexible_beam<Left, Right, N>, Loads> {
    using bending_line = elastic_line<prismatic_beam<Left, Right, N>, Loads>;

public:
    using number = typename bending_line::number;
    using beam_type = shear_flexible_beam<Left, Right, number>;

    constexpr shear_flexible_line(const shear_flexible_beam<Left, Right, N>& b, const Loads& loads)
        : bent_(b.bending(), loads),
          beam_(bent_.supported(), detail::coherent<dimension::force, number>(b.kGA())),
          flexibility_(number(1) / beam_.kGA()),
          mean_shear_(slid(b.span()) / beam_.span()),
          corrected_(end_moments()) {}

    /// Deflection, downward positive; x is a length on the beam.
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::length, number> deflection(const X& x) const {
        return deflection(x, inner_side(x));
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::length, number> deflection(const X& x, side which) const {
        const auto s = detail::expect_length<number>(x);
        return bent_.deflection(s, which) + (slid(s) - unslid(s)) * flexibility_ + corrected_.deflection(s);
    }
    /// Slope dv/dx, clockwise positive.
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::plane_angle, number> slope(const X& x) const {
        return slope(x, inner_side(x));
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::plane_angle, number> slope(const X& x, side which) const {
        auto V = bent_.shear(x, which);
        if constexpr (on_two_supports) V -= mean_shear_;
        return bent_.slope(x, which) + detail::as_angle(V * flexibility_) + corrected_.slope(x);
    }
    /// Bending moment, sagging positive.
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::moment, number> moment(const X& x, side which) const {
        // Inside the beam, also at its ends: the correcting couples stand right there.
        return bent_.moment(x, which) + corrected_.moment(x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::moment, number> moment(const X& x) const {
        return moment(x, inner_side(x));
    }
    /// Shear force V = dM/dx.
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::force, number> shear(const X& x, side which) const {
        return bent_.shear(x, which) + corrected_.shear(x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::force, number> shear(const X& x) const {
        return shear(x, inner_side(x));
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::line_load, number> load(const X& x) const {
        return bent_.load(x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::curvature, number> imposed_curvature(const X& x) const {
        return bent_.imposed_curvature(x);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::line_load, number> load(const X& x, side which) const {
        return bent_.load(x, which);
    }
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::curvature, number> imposed_curvature(const X& x, side which) const {
        return bent_.imposed_curvature(x, which);
    }

    /// The force that the support at an end exerts on the beam, upward positive.
    [[nodiscard]] constexpr quantity<dimension::force, number> reaction(end::left_end) const {
        return bent_.reaction(end::left) + corrected_.reaction(end::left);
    }
    [[nodiscard]] constexpr quantity<dimension::force, number> reaction(end::right_end) const {
        return bent_.reaction(end::right) + corrected_.reaction(end::right);
    }
    /// The bending moment at the support of an end, sagging positive.
    [[nodiscard]] constexpr quantity<dimension::moment, number> end_moment(end::left_end) const {
        return bent_.end_moment(end::left) + corrected_.moment(quantity<dimension::length, number>{});
    }
    [[nodiscard]] constexpr quantity<dimension::moment, number> end_moment(end::right_end) const {
        return bent_.end_moment(end::right) + corrected_.moment(beam_.span());
    }

    template <class X>
    [[nodiscard]] constexpr const quantity<dimension::flexural_rigidity, number>& rigidity(const X&) const {
        return beam_.EI();
    }
    [[nodiscard]] constexpr const auto& shear_flexibility() const { return flexibility_; }
    [[nodiscard]] constexpr const beam_type& supported() const { return beam_; }
    [[nodiscard]] constexpr const Loads& loads() const { return bent_.loads(); }
    [[nodiscard]] constexpr auto joints() const { return bent_.joints(); }

private:
    static constexpr bool on_two_supports = Left::against_deflection && Right::against_deflection;
    using per_force = typename boost::units::divide_typeof_helper<dimension::dimensionless, dimension::force>::type;

    template <class X>
    constexpr side inner_side(const X& x) const {
        return detail::expect_length<number>(x) < beam_.span() ? just_right : just_left;
    }

    /// The integral of the shear of the loads up to x: the rise of the moment, less the couples passed.
    constexpr quantity<dimension::moment, number> slid(const quantity<dimension::length, number>& x) const {
        return bent_.moment(x, just_right) - bent_.end_moment(end::left) - bent_.couples_up_to(x);
    }
    /// What holds against the sliding: the support or supports that stay where they are.
    constexpr quantity<dimension::moment, number> unslid(const quantity<dimension::length, number>& x) const {
        if constexpr (on_two_supports) {
            return mean_shear_ * x;
        } else if constexpr (Left::against_deflection) {
            return {};
        } else {
            return mean_shear_ * beam_.span();
        }
    }

    /// Between two supports the chord of the sliding turns all sections by minus the mean of V/kGA. Clamped ends
    /// turn back: end moments X on a simple beam that itself deforms in shear.
    constexpr auto end_moments() const {
        using couple = load_types::concentrated<load_types::action::couple, number>;
        quantity<dimension::moment, number> left{}, right{};
        if constexpr (on_two_supports && (Left::against_rotation || Right::against_rotation)) {
            const auto turned = mean_shear_ * flexibility_;
            const auto bend = beam_.span() / (number(6) * beam_.EI());
            const auto slide = flexibility_ / beam_.span();
            if constexpr (Left::against_rotation && Right::against_rotation) {
                left = turned / (bend + number(2) * slide);
                right = -left;
            } else if constexpr (Left::against_rotation) {
                left = turned / (number(2) * bend + slide);
            } else {
                right = -(turned / (number(2) * bend + slide));
            }
        }
        const prismatic_beam<held::pinned, held::pinned, number> simple(beam_.span(), beam_.EI());
        return simple.under(couple(left, {quantity<dimension::length, number>{}}) + couple(-right, {beam_.span()}));
    }

    bending_line bent_;
    beam_type beam_;
    quantity<per_force, number> flexibility_;
    quantity<dimension::force, number> mean_shear_;
    using couples = load_types::load_sum<load_types::concentrated<load_types::action::couple, number>,
                                         load_types::concentrated<load_types::action::couple, number>>;
    elastic_line<prismatic_beam<held::pinned, held::pinned, number>, couples> corrected_;
};

}  // namespace sagitta
