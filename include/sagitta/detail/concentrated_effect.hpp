// The effect of a point load or a couple.
#pragma once

#include <sagitta/detail/load_effect.hpp>

namespace sagitta::detail {

/// A point load or a couple. The couple is the derivative of the point load with respect to its place.
template <load_types::action Action, class N, class Left, class Right, class T>
class load_effect<load_types::concentrated<Action, N>, Left, Right, T> {
    using load = load_types::concentrated<Action, N>;

public:
    static constexpr bool is_imposed = false;

    [[gnu::always_inline]] constexpr load_effect(const load& acting, const unit_beam<T>& b)
        : at_(coherent<length, T>(acting.at())), size_(coherent<typename load::unit, T>(acting.size())) {
        const auto L = b.span();
        const auto rest = L - at_;
        if (!(rest.value() >= T(0))) [[unlikely]]
            refuse(load::is_couple ? "applied_couple: at" : "point_load: at", at_,
                   "must not lie beyond the span of the beam, ", L);
        const T near = ratio(at_, L);
        const T far = ratio(rest, L);
        if constexpr (load::is_couple) {
            const auto F = size_ / L;
            left_ = state<Left, Right, 1>(F, near, far, b);
            right_ = state<Right, Left, 1>(-F, far, near, b);
        } else {
            left_ = state<Left, Right, 0>(size_, near, far, b);
            right_ = state<Right, Left, 0>(size_, far, near, b);
        }
    }

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x, const unit_beam<T>& b,
                                                                side which) const {
        // Just at a couple at the left end, what does not jump is seen from that end: supports stay where they are.
        constexpr bool jumps = R == response::moment || R == response::shear;
        const bool at_left_end = load::is_couple && !jumps && !(x > quantity<length, T>{});
        const bool before = at_left_end || (which == side::just_left ? x <= at_ : x < at_);
        if (before) return left_.template at<R>(x, b.EI());
        return seen_from_right<R>(right_.template at<R>(b.span() - x, b.EI()));
    }

    constexpr quantity<moment, T> couple_up_to(const quantity<length, T>& x) const requires(load::is_couple) {
        return at_ <= x ? size_ : quantity<moment, T>{};
    }
    constexpr quantity<length, T> start(const unit_beam<T>&) const { return at_; }
    constexpr quantity<length, T> stop(const unit_beam<T>&) const { return at_; }

private:
    template <class Here, class There, int order>
    [[gnu::always_inline]] static constexpr end_state<Here, T> state(const quantity<force, T>& F, const T& near,
                                                                     const T& far, const unit_beam<T>& b) {
        using across = derivative_t<decltype(across_row<Here, There>()), order>;
        using turning = derivative_t<decltype(turning_row<Here, There>()), order>;
        return state_from<Here>(F, across::value(near, far), turning::value(near, far), b);
    }

    quantity<length, T> at_;
    quantity<typename load::unit, T> size_;
    end_state<Left, T> left_{};
    end_state<Right, T> right_{};
};

}  // namespace sagitta::detail
