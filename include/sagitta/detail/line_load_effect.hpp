// The effect of a uniform or linear load.
#pragma once

#include <sagitta/detail/load_effect.hpp>

namespace sagitta::detail {

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

/// Line loads are integrals of the point load over its place: their resultant times the mean of the shapes
/// over the stretch.
template <class Load, class Left, class Right, class T>
requires requires { Load::is_uniform; }
class load_effect<Load, Left, Right, T> : public stretch_effect<typename Load::where_type, Left, Right, T> {
    static constexpr bool is_uniform = Load::is_uniform;
    using base = stretch_effect<typename Load::where_type, Left, Right, T>;
    using profile = intensity_profile<T, is_uniform>;

public:
    static constexpr bool is_imposed = false;

    [[gnu::always_inline]] constexpr load_effect(const Load& acting, const unit_beam<T>& b)
        : base(acting.where(), b),
          w_from_(coherent<line_load, T>(acting.size_from())),
          w_to_(coherent<line_load, T>(acting.size_to())) {
        const auto seen = this->seen(b);
        this->left_ = state<Left, Right>(seen, w_from_, w_to_, b);
        this->right_ = state<Right, Left>(seen.mirrored(), w_to_, w_from_, b);
    }

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x, const unit_beam<T>& b,
                                                                side) const {
        return this->template at_with<R>(
            x, b,
            [&](const quantity<length, T>& s) __attribute__((always_inline)) {
                return line_load_part<R>(s, profile{w_from_, gradient()}, b.EI());
            },
            [&](const quantity<length, T>& s) __attribute__((always_inline)) {
                return line_load_part<R>(s, profile{w_to_, -gradient()}, b.EI());
            });
    }

    constexpr quantity<line_load, T> intensity(const quantity<length, T>& x, const unit_beam<T>&, side which) const {
        if (!this->covers(x, which)) return {};
        return profile{w_from_, gradient()}.over(x - this->from_, 1, 1);
    }

private:
    constexpr auto gradient() const {
        if constexpr (is_uniform) {
            return decltype(profile::gradient){};
        } else {
            return (w_to_ - w_from_) / (this->to_ - this->from_);
        }
    }

    template <class Here, class There>
    [[gnu::always_inline]] constexpr end_state<Here, T> state(const fractions<T>& seen,
                                                              const quantity<line_load, T>& w_from,
                                                              const quantity<line_load, T>& w_to,
                                                              const unit_beam<T>& b) const {
        using across = decltype(across_row<Here, There>());
        using turning = decltype(turning_row<Here, There>());
        const auto width = this->to_ - this->from_;
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

    quantity<line_load, T> w_from_;
    quantity<line_load, T> w_to_;
};

}  // namespace sagitta::detail
