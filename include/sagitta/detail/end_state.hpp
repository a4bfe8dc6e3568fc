// The elastic line of an unloaded stretch, developed from an end of the beam: the two values that the way of
// holding the end leaves open decide all of it.
#pragma once

#include <sagitta/detail/influence.hpp>
#include <sagitta/units.hpp>

#include <type_traits>

namespace sagitta::detail {

/// The four responses, in the order in which each is the derivative of the one before (up to sign and EI).
enum class response : int { deflection = 0, slope = 1, moment = 2, shear = 3 };

template <response R>
using unit_of_response = std::conditional_t<
    R == response::deflection, length,
    std::conditional_t<R == response::slope, plane_angle, std::conditional_t<R == response::moment, moment, force>>>;

template <response R, class T>
using response_quantity = quantity<unit_of_response<R>, T>;

/// A pure number as an angle, and an angle as the pure number that small rotations are.
template <class Q>
constexpr auto as_angle(const Q& ratio) {
    using T = typename Q::value_type;
    return quantity<plane_angle, T>::from_value(ratio.value());
}
template <class T>
constexpr auto as_ratio(const quantity<plane_angle, T>& angle) {
    return quantity<dimensionless, T>::from_value(angle.value());
}

/// The scale of each response to a force F on a beam of span L: F L^3/EI, F L^2/EI, F L, F. Grouped so that
/// several loads on one beam share what does not depend on them.
template <response R, class T>
constexpr response_quantity<R, T> scale_of_force(const quantity<force, T>& F, const quantity<length, T>& L,
                                                 const quantity<flexural_rigidity, T>& EI) {
    if constexpr (R == response::deflection) {
        return F * (L * L * L / EI);
    } else if constexpr (R == response::slope) {
        return as_angle(F * (L * L / EI));
    } else if constexpr (R == response::moment) {
        return F * L;
    } else {
        return F;
    }
}

template <class T>
constexpr T half() {
    return T(1) / T(2);
}
template <class T>
constexpr T sixth() {
    return T(1) / T(6);
}

/// What stands at an end held like End, seen with x running away from it. Values that the end does not allow
/// are zero and not stored: a pinned end has a slope and a shear, a clamped one a moment and a shear, a free
/// one a deflection and a slope.
template <class End, class T>
struct end_state {
    static constexpr response across_kind = End::against_deflection ? response::shear : response::deflection;
    static constexpr response turning_kind = End::against_rotation ? response::moment : response::slope;

    response_quantity<across_kind, T> across;
    response_quantity<turning_kind, T> turning;

    constexpr end_state& operator+=(const end_state& other) {
        across += other.across;
        turning += other.turning;
        return *this;
    }

    /// The response at the distance s from the end, nothing acting in between.
    template <response R>
    constexpr response_quantity<R, T> at(const quantity<length, T>& s, const quantity<flexural_rigidity, T>& EI) const {
        if constexpr (R == response::deflection) {
            return deflection(s, EI);
        } else if constexpr (R == response::slope) {
            return slope(s, EI);
        } else if constexpr (R == response::moment) {
            return moment_at(s);
        } else {
            return shear();
        }
    }

private:
    static constexpr bool has_shear = End::against_deflection;
    static constexpr bool has_moment = End::against_rotation;

    constexpr quantity<length, T> deflection(const quantity<length, T>& s,
                                             const quantity<flexural_rigidity, T>& EI) const {
        if constexpr (has_shear && has_moment) {
            return -(s * s) * (turning * half<T>() + across * s * sixth<T>()) / EI;
        } else if constexpr (has_shear) {
            return s * (as_ratio(turning) - across * (s * s * sixth<T>() / EI));
        } else if constexpr (has_moment) {
            return across - turning * (s * s * half<T>() / EI);
        } else {
            return across + as_ratio(turning) * s;
        }
    }

    constexpr quantity<plane_angle, T> slope(const quantity<length, T>& s,
                                             const quantity<flexural_rigidity, T>& EI) const {
        if constexpr (has_shear && has_moment) {
            return as_angle(-s * (turning + across * s / T(2)) / EI);
        } else if constexpr (has_shear) {
            return turning - as_angle(across * (s * s * half<T>() / EI));
        } else if constexpr (has_moment) {
            return as_angle(-turning * s / EI);
        } else {
            return turning;
        }
    }

    constexpr quantity<moment, T> moment_at(const quantity<length, T>& s) const {
        if constexpr (has_shear && has_moment) {
            return turning + across * s;
        } else if constexpr (has_shear) {
            return across * s;
        } else if constexpr (has_moment) {
            return turning;
        } else {
            return {};
        }
    }

    constexpr quantity<force, T> shear() const {
        if constexpr (has_shear) {
            return across;
        } else {
            return {};
        }
    }
};

}  // namespace sagitta::detail
