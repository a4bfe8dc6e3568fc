// The effect of an imposed curvature (temperature, shrinkage).
#pragma once

#include <sagitta/detail/load_effect.hpp>

namespace sagitta::detail {

/// An imposed curvature over a stretch. A kink acts like the second derivative of a point load -EI (angle) with
/// respect to its place, and the mean of a second derivative of a cubic is its value in the middle.
template <class N, class Where, class Left, class Right, class T>
class load_effect<load_types::imposed_curvature<N, Where>, Left, Right, T>
    : public stretch_effect<Where, Left, Right, T> {
    using load = load_types::imposed_curvature<N, Where>;
    using base = stretch_effect<Where, Left, Right, T>;

public:
    static constexpr bool is_imposed = true;

    constexpr load_effect(const load& acting, const unit_beam<T>& b)
        : base(acting.where(), b), size_(coherent<curvature, T>(acting.size())) {
        const auto seen = this->seen(b);
        this->left_ = state<Left, Right>(seen, b);
        this->right_ = state<Right, Left>(seen.mirrored(), b);
    }

    template <response R>
    constexpr response_quantity<R, T> at(const quantity<length, T>& x, const unit_beam<T>& b, side) const {
        const auto bend = [&](const quantity<length, T>& s) -> response_quantity<R, T> {
            if constexpr (R == response::deflection) {
                return -(size_ * s * s / T(2));
            } else if constexpr (R == response::slope) {
                return as_angle(-(size_ * s));
            } else {
                return {};
            }
        };
        return this->template at_with<R>(x, b, bend, bend);
    }

    constexpr quantity<curvature, T> imposed(const quantity<length, T>& x, const unit_beam<T>&, side which) const {
        return this->covers(x, which) ? size_ : quantity<curvature, T>{};
    }

private:
    template <class Here, class There>
    constexpr end_state<Here, T> state(const fractions<T>& seen, const unit_beam<T>& b) const {
        using across = derivative_t<decltype(across_row<Here, There>()), 2>;
        using turning = derivative_t<decltype(turning_row<Here, There>()), 2>;
        const auto L = b.span();
        const auto F = -(b.EI() * size_ * (this->to_ - this->from_) / L / L);
        return state_from<Here>(F, across::value(seen.near, seen.far), turning::value(seen.near, seen.far), b);
    }

    quantity<curvature, T> size_;
};

}  // namespace sagitta::detail
