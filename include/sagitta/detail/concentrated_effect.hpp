// The effect of what acts at one place: a point load, a couple, a kink, an offset.
#pragma once

#include <sagitta/detail/load_effect.hpp>

namespace sagitta::detail {

/// A point load and its derivatives with respect to its place: the first is that of a couple, the second that of a
/// kink, the third that of an offset (a jump of slope or deflection acts like a load -EI times its size).
template <load_types::action Action, class N, class Left, class Right, class T>
class load_effect<load_types::concentrated<Action, N>, Left, Right, T> {
    using load = load_types::concentrated<Action, N>;

public:
    static constexpr bool is_lack_of_fit = load::is_lack_of_fit;
    static constexpr bool is_imposed = is_lack_of_fit;

    [[gnu::always_inline]] constexpr load_effect(const load& acting, const unit_beam<T>& b)
        : at_(coherent<length, T>(acting.at())), size_(coherent<typename load::unit, T>(acting.size())) {
        const auto L = b.span();
        const auto rest = L - at_;
        if (!(rest.value() >= T(0))) [[unlikely]]
            refuse(load::is_couple   ? "applied_couple: at"
                   : load::is_kink   ? "imposed_kink: at"
                   : load::is_offset ? "imposed_offset: at"
                                     : "point_load: at",
                   at_, "must not lie beyond the span of the beam, ", L);
        const T near = ratio(at_, L);
        const T far = ratio(rest, L);
        const auto F = resultant(b);
        left_ = state<Left, Right>(F, near, far, b);
        // Seen from the right end the place runs the other way.
        right_ = state<Right, Left>(order % 2 == 0 ? F : -F, far, near, b);
    }

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x, const unit_beam<T>& b,
                                                                side which) const {
        // Just at the left end, what does not jump is seen from that end: supports stay where they are.
        constexpr bool jumps = load::is_kink     ? R == response::slope
                               : load::is_offset ? R == response::deflection
                                                 : R == response::moment || R == response::shear;
        const bool at_left_end = order > 0 && !jumps && !(x > quantity<length, T>{});
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
    static constexpr int order = load::is_couple ? 1 : load::is_kink ? 2 : load::is_offset ? 3 : 0;

    /// The force that, differentiated so many times, is this load.
    [[gnu::always_inline]] constexpr quantity<force, T> resultant(const unit_beam<T>& b) const {
        const auto L = b.span();
        if constexpr (load::is_couple) {
            return size_ / L;
        } else if constexpr (load::is_kink) {
            return -(as_ratio(size_) * (b.EI() / L / L));
        } else if constexpr (load::is_offset) {
            return -(size_ * (b.EI() / L / L / L));
        } else {
            return size_;
        }
    }

    template <class Here, class There>
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
