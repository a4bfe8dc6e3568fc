// One load case on one beam: scale times shape, made ready for evaluation anywhere along the beam.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/detail/end_state.hpp>
#include <sagitta/load.hpp>

#include <type_traits>

namespace sagitta::detail {

template <class T>
constexpr T ratio(const quantity<length, T>& part, const quantity<length, T>& whole) {
    return (part / whole).value();
}

/// A response as seen from the right end has x running the other way: slope and shear change their sign.
template <response R, class Q>
constexpr Q seen_from_right(const Q& q) {
    if constexpr (R == response::slope || R == response::shear) {
        return -q;
    } else {
        return q;
    }
}

/// Intensity of a line load measured from one of its ends: w there, growing by gradient along the way.
template <class T, bool is_uniform>
struct intensity_profile {
    using gradient_unit = typename boost::units::divide_typeof_helper<line_load, length>::type;
    quantity<line_load, T> w;
    quantity<gradient_unit, T> gradient;

    /// w/a + gradient s/b, with no work done for the gradient of a uniform load.
    constexpr quantity<line_load, T> over(const quantity<length, T>& s, int a, int b) const {
        if constexpr (is_uniform) {
            return w / T(a);
        } else {
            return w / T(a) + gradient * s / T(b);
        }
    }
};

/// What a line load adds at the distance s behind the end from which its profile is measured.
template <response R, class T, bool is_uniform>
constexpr response_quantity<R, T> line_load_part(const quantity<length, T>& s,
                                                 const intensity_profile<T, is_uniform>& load,
                                                 const quantity<flexural_rigidity, T>& EI) {
    if constexpr (R == response::deflection) {
        return (s * s) * (s * s) * load.over(s, 24, 120) / EI;
    } else if constexpr (R == response::slope) {
        return as_angle(s * s * s * load.over(s, 6, 24) / EI);
    } else if constexpr (R == response::moment) {
        return -(s * s * load.over(s, 2, 6));
    } else {
        return -(s * load.over(s, 1, 2));
    }
}

/// The end state that a resultant force F makes at the end Here, given the pure numbers of its two rows.
template <class Here, class Left, class Right, class T>
constexpr end_state<Here, T> state_from(const quantity<force, T>& F, const T& across, const T& turning,
                                        const beam<Left, Right, T>& b) {
    using state = end_state<Here, T>;
    return {scale_of_force<state::across_kind>(F, b.span(), b.EI()) * across,
            scale_of_force<state::turning_kind>(F, b.span(), b.EI()) * turning};
}

template <class Load, class Left, class Right, class T>
class load_effect;

/// A point load or a couple. The couple is the derivative of the point load with respect to its place.
template <loads::action Action, class N, class Left, class Right, class T>
class load_effect<loads::concentrated<Action, N>, Left, Right, T> {
    using load = loads::concentrated<Action, N>;

public:
    [[gnu::always_inline]] constexpr load_effect(const load& acting, const beam<Left, Right, T>& b)
        : at_(coherent<length, T>(acting.at())) {
        const auto L = b.span();
        const auto rest = L - at_;
        if (!(rest.value() >= T(0))) [[unlikely]]
            refuse(load::is_couple ? "applied_couple: at" : "point_load: at", at_,
                   "must not lie beyond the span of the beam, ", L);
        const T near = ratio(at_, L);
        const T far = ratio(rest, L);
        const auto size = coherent<typename load::unit, T>(acting.size());
        if constexpr (load::is_couple) {
            const auto F = size / L;
            left_ = state<Left, Right, 1>(F, near, far, b);
            right_ = state<Right, Left, 1>(-F, far, near, b);
        } else {
            left_ = state<Left, Right, 0>(size, near, far, b);
            right_ = state<Right, Left, 0>(size, far, near, b);
        }
    }

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x,
                                                                const beam<Left, Right, T>& b, side which) const {
        const bool before = which == side::just_left ? x <= at_ : x < at_;
        if (before) return left_.template at<R>(x, b.EI());
        return seen_from_right<R>(right_.template at<R>(b.span() - x, b.EI()));
    }

    constexpr quantity<line_load, T> intensity(const quantity<length, T>&, const beam<Left, Right, T>&, side) const {
        return {};
    }
    constexpr quantity<length, T> start(const beam<Left, Right, T>&) const { return at_; }
    constexpr quantity<length, T> stop(const beam<Left, Right, T>&) const { return at_; }

private:
    template <class Here, class There, int order>
    [[gnu::always_inline]] static constexpr end_state<Here, T> state(const quantity<force, T>& F, const T& near,
                                                                     const T& far, const beam<Left, Right, T>& b) {
        using across = derivative_t<decltype(across_row<Here, There>()), order>;
        using turning = derivative_t<decltype(turning_row<Here, There>()), order>;
        return state_from<Here>(F, across::value(near, far), turning::value(near, far), b);
    }

    quantity<length, T> at_;
    end_state<Left, T> left_{};
    end_state<Right, T> right_{};
};

/// Line loads are integrals of the point load over its place: their resultant times the mean of the shapes
/// over the stretch.
template <class Load, class Left, class Right, class T>
requires requires { typename Load::where_type; }
class load_effect<Load, Left, Right, T> {
    static constexpr bool is_uniform = Load::is_uniform;
    static constexpr bool is_whole = std::is_same_v<typename Load::where_type, loads::whole_beam>;
    using profile = intensity_profile<T, is_uniform>;

public:
    [[gnu::always_inline]] constexpr load_effect(const Load& acting, const beam<Left, Right, T>& b)
        : w_from_(coherent<line_load, T>(acting.size_from())), w_to_(coherent<line_load, T>(acting.size_to())) {
        const auto L = b.span();
        if constexpr (is_whole) {
            to_ = L;
            left_ = state<Left, Right>({T(1) / T(2), T(1) / T(2), T(1)}, w_from_, w_to_, b);
            right_ = state<Right, Left>({T(1) / T(2), T(1) / T(2), T(1)}, w_to_, w_from_, b);
        } else {
            from_ = coherent<length, T>(acting.where().from);
            to_ = coherent<length, T>(acting.where().to);
            if (!(to_ <= L)) [[unlikely]]
                refuse("between: to", to_, "must not lie beyond the span of the beam, ", L);
            const auto twice = L * T(2);
            const fractions<T> seen{ratio(from_ + to_, twice), ratio((L - from_) + (L - to_), twice),
                                    ratio(to_ - from_, L)};
            left_ = state<Left, Right>(seen, w_from_, w_to_, b);
            right_ = state<Right, Left>(seen.mirrored(), w_to_, w_from_, b);
        }
    }

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x,
                                                                const beam<Left, Right, T>& b, side) const {
        const auto back = b.span() - x;
        if constexpr (!is_whole) {
            if (x <= from_) return left_.template at<R>(x, b.EI());
            if (x >= to_) return seen_from_right<R>(right_.template at<R>(back, b.EI()));
        }
        // Under the load: from the nearer end, so that nothing is left over at the supports.
        if (x <= back) {
            return left_.template at<R>(x, b.EI()) + line_load_part<R>(x - from_, profile{w_from_, gradient()}, b.EI());
        }
        return seen_from_right<R>(right_.template at<R>(back, b.EI()) +
                                  line_load_part<R>(to_ - x, profile{w_to_, -gradient()}, b.EI()));
    }

    constexpr quantity<line_load, T> intensity(const quantity<length, T>& x, const beam<Left, Right, T>&,
                                               side which) const {
        const bool covered = which == side::just_left ? x > from_ && x <= to_ : x >= from_ && x < to_;
        return covered ? profile{w_from_, gradient()}.over(x - from_, 1, 1) : quantity<line_load, T>{};
    }
    constexpr quantity<length, T> start(const beam<Left, Right, T>&) const { return from_; }
    constexpr quantity<length, T> stop(const beam<Left, Right, T>&) const { return to_; }

private:
    constexpr auto gradient() const {
        if constexpr (is_uniform) {
            return decltype(profile::gradient){};
        } else {
            return (w_to_ - w_from_) / (to_ - from_);
        }
    }

    template <class Here, class There>
    [[gnu::always_inline]] constexpr end_state<Here, T> state(const fractions<T>& seen,
                                                              const quantity<line_load, T>& w_from,
                                                              const quantity<line_load, T>& w_to,
                                                              const beam<Left, Right, T>& b) const {
        using across = decltype(across_row<Here, There>());
        using turning = decltype(turning_row<Here, There>());
        const auto width = to_ - from_;
        if constexpr (is_uniform) {
            return state_from<Here>(w_from * width, mean_over<across>(seen), mean_over<turning>(seen), b);
        } else {
            const auto even = (w_from + w_to) / T(2) * width;
            const auto tilt = (w_to - w_from) / T(2) * width;
            auto sum = state_from<Here>(even, mean_over<across>(seen), mean_over<turning>(seen), b);
            sum += state_from<Here>(tilt, tilted_mean_over<across>(seen), tilted_mean_over<turning>(seen), b);
            return sum;
        }
    }

    quantity<length, T> from_{};
    quantity<length, T> to_{};
    quantity<line_load, T> w_from_;
    quantity<line_load, T> w_to_;
    end_state<Left, T> left_{};
    end_state<Right, T> right_{};
};

/// True where the end in question holds the beam against a movement, so that the movement can be imposed.
template <class Load, class Left, class Right>
inline constexpr bool can_act_on = true;
template <class End, loads::motion Motion, class N, class Left, class Right>
inline constexpr bool can_act_on<loads::movement<End, Motion, N>, Left, Right> = [] {
    using held = std::conditional_t<std::is_same_v<End, end::left_end>, Left, Right>;
    return Motion == loads::motion::rotation ? held::against_rotation : held::against_deflection;
}();

/// An imposed movement of an end. Its deflected shape is an influence shape (reciprocal theorem).
template <class End, loads::motion Motion, class N, class Left, class Right, class T>
class load_effect<loads::movement<End, Motion, N>, Left, Right, T> {
    using load = loads::movement<End, Motion, N>;
    static constexpr bool is_left = std::is_same_v<End, end::left_end>;
    using here = std::conditional_t<is_left, Left, Right>;
    using there = std::conditional_t<is_left, Right, Left>;

public:
    constexpr load_effect(const load& imposed, const beam<Left, Right, T>&)
        : size_(coherent<typename load::unit, T>(imposed.size())) {}

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x,
                                                                const beam<Left, Right, T>& b, side) const {
        const auto L = b.span();
        if constexpr (!can_act_on<load, Left, Right>) {
            return {};
        } else if constexpr (is_left) {
            return along<R>(amplitude(L), ratio(x, L), ratio(L - x, L), b);
        } else {
            return seen_from_right<R>(along<R>(amplitude(L), ratio(L - x, L), ratio(x, L), b));
        }
    }

    constexpr quantity<line_load, T> intensity(const quantity<length, T>&, const beam<Left, Right, T>&, side) const {
        return {};
    }
    constexpr quantity<length, T> start(const beam<Left, Right, T>&) const { return {}; }
    constexpr quantity<length, T> stop(const beam<Left, Right, T>& b) const { return b.span(); }

private:
    static constexpr auto shape_of_movement() {
        if constexpr (load::is_rotation) {
            return typename influence<here, there>::moment{};
        } else {
            return typename influence<here, there>::shear{};
        }
    }

    /// The size of the shape as a length. A rotation that is clockwise is so from the left end; the moment row
    /// is the shape of a turn in the other sense.
    constexpr quantity<length, T> amplitude([[maybe_unused]] const quantity<length, T>& L) const {
        if constexpr (!load::is_rotation) {
            return size_;
        } else if constexpr (is_left) {
            return -as_ratio(size_) * L;
        } else {
            return as_ratio(size_) * L;
        }
    }

    template <response R>
    static constexpr response_quantity<R, T> along(const quantity<length, T>& size, const T& near, const T& far,
                                                   const beam<Left, Right, T>& b) {
        using shape = derivative_t<decltype(shape_of_movement()), static_cast<int>(R)>;
        const T number = shape::value(near, far);
        const auto L = b.span();
        if constexpr (R == response::deflection) {
            return size * number;
        } else if constexpr (R == response::slope) {
            return as_angle(size / L * number);
        } else if constexpr (R == response::moment) {
            return -(b.EI() * size / L / L * number);
        } else {
            return -(b.EI() * size / L / L / L * number);
        }
    }

    quantity<typename load::unit, T> size_;
};

}  // namespace sagitta::detail
