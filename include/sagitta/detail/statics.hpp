// Shear and moment of a beam by equilibrium alone: for each load a field that balances it and satisfies the
// ends, found by numerical integration of the load. Where the beam is indeterminate any such field serves, and
// compatibility does the rest (moment_area.hpp).
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/gauss_rule.hpp>
#include <sagitta/ends.hpp>

#include <algorithm>

namespace sagitta::detail {

/// The released structure that carries a load. The nearer clamped end is taken where there is one: then the
/// far part of the beam stays unstressed, and no digits are lost to a field that redundants must undo.
enum class carried { from_left, from_right, by_both };

template <class Left, class Right, class T>
carried carrier_of(const acting_load<T>& load, const T& L) {
    constexpr bool left_clamped = Left::against_rotation;
    constexpr bool right_clamped = Right::against_rotation;
    const bool nearer_left = load.centre() <= L / T(2);
    // A guided end takes moments, no forces.
    constexpr bool guided =
        (left_clamped && !Left::against_deflection) || (right_clamped && !Right::against_deflection);
    if (guided && load.kind == acting_kind::couple) {
        return nearer_left ? carried::from_left : carried::from_right;
    }
    if constexpr (!Right::against_deflection) {
        return carried::from_left;
    } else if constexpr (!Left::against_deflection) {
        return carried::from_right;
    } else {
        if (nearer_left && left_clamped) return carried::from_left;
        if (!nearer_left && right_clamped) return carried::from_right;
        return carried::by_both;
    }
}

template <class T>
struct shear_and_moment {
    T shear{};
    T moment{};
};

/// A section at base + offset. Distances are formed from the base first, so that sections of a narrow panel
/// far from the origin keep their digits.
template <class T>
struct section {
    T base{};
    T offset{};

    T x() const { return base + offset; }
    T behind(const T& a) const { return (base - a) + offset; }
    T ahead_of(const T& b) const { return (b - base) - offset; }
};

/// One load with its released structure.
template <class T>
class balanced_load {
public:
    balanced_load(const acting_load<T>& load, carried how, const T& L) : load_(load), how_(how), L_(L) {
        if (load.kind == acting_kind::line) gradient_ = (load.size_to - load.size_from) / (load.to - load.from);
        if (how == carried::by_both) {
            switch (load.kind) {
                case acting_kind::point_force:
                    left_ = load.size_from * (L - load.from) / L;
                    right_ = load.size_from * load.from / L;
                    break;
                case acting_kind::couple:
                    left_ = -load.size_from / L;
                    right_ = load.size_from / L;
                    break;
                case acting_kind::line:
                    left_ = integral(T(0), width(), L - load.from, T(-1)).moment / L;
                    right_ = integral(T(0), width(), load.from, T(1)).moment / L;
                    break;
            }
        }
    }

    /// Shear and moment at x; just left or just right of it where the load makes them jump.
    shear_and_moment<T> at(const section<T>& x, side which) const {
        const T past_start = x.behind(load_.from);
        const T past_stop = x.behind(load_.to);
        const bool before = which == side::just_left ? past_start <= T(0) : past_start < T(0);
        const bool beyond = which == side::just_left ? past_stop > T(0) : past_stop >= T(0);
        switch (how_) {
            case carried::from_left:
                return beyond ? shear_and_moment<T>{} : held_on_the_left(past_start, before);
            case carried::from_right:
                return before ? shear_and_moment<T>{} : held_on_the_right(past_start, beyond);
            case carried::by_both:
                break;
        }
        if (before) return {left_, left_ * x.x()};
        if (beyond) return {-right_, right_ * x.ahead_of(L_)};
        const auto passed = integral(T(0), past_start, past_start, T(-1));
        return {left_ - passed.shear, left_ * x.x() - passed.moment};
    }

    T intensity(const T& x, side which) const {
        if (load_.kind != acting_kind::line) return T(0);
        const bool covered =
            which == side::just_left ? x > load_.from && x <= load_.to : x >= load_.from && x < load_.to;
        return covered ? load_.intensity(x - load_.from) : T(0);
    }

private:
    /// What lies right of the section hangs on the part left of it.
    shear_and_moment<T> held_on_the_left(const T& past_start, bool before) const {
        if (load_.kind == acting_kind::point_force) return {load_.size_from, load_.size_from * past_start};
        if (load_.kind == acting_kind::couple) return {T(0), -load_.size_from};
        const T start = before ? T(0) : past_start;
        return integral(start, width(), past_start, T(-1));
    }

    /// What lies left of the section hangs on the part right of it.
    shear_and_moment<T> held_on_the_right(const T& past_start, bool beyond) const {
        if (load_.kind == acting_kind::point_force) return {-load_.size_from, -load_.size_from * past_start};
        if (load_.kind == acting_kind::couple) return {T(0), load_.size_from};
        const T stop = beyond ? width() : past_start;
        const auto sum = integral(T(0), stop, past_start, T(-1));
        return {-sum.shear, -sum.moment};
    }

    T width() const { return load_.to - load_.from; }

    /// The integral of the line load times the lever arm c + d u, where u runs from the start of the load: a
    /// narrow load keeps its digits wherever it stands. Two Gauss points are exact up to cubic integrands.
    shear_and_moment<T> integral(const T& from, const T& to, const T& c, const T& d) const {
        if (!(from < to)) return {};
        const T half = (to - from) / T(2);
        const T offset = half * gauss_rule<T, 2>::abscissa()[0];
        const T u1 = (from + half) - offset;
        const T u2 = (from + half) + offset;
        const T w1 = load_.size_from + gradient_ * u1;
        const T w2 = load_.size_from + gradient_ * u2;
        return {(w1 + w2) * half, (w1 * (c + d * u1) + w2 * (c + d * u2)) * half};
    }

    acting_load<T> load_;
    carried how_;
    T L_;
    T left_{}, right_{};
    T gradient_{};
};

}  // namespace sagitta::detail
