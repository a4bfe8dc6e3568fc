// The effect of a settlement or a rotation of an end.
#pragma once

#include <sagitta/detail/load_effect.hpp>

namespace sagitta::detail {

/// True where the end in question holds the beam against a movement, so that the movement can be imposed.
template <class Load, class Left, class Right>
inline constexpr bool can_act_on = true;
template <class End, load_types::motion Motion, class N, class Left, class Right>
inline constexpr bool can_act_on<load_types::movement<End, Motion, N>, Left, Right> = [] {
    using held = std::conditional_t<std::is_same_v<End, end::left_end>, Left, Right>;
    return Motion == load_types::motion::rotation ? held::against_rotation : held::against_deflection;
}();

/// An imposed movement of an end. Its deflected shape is an influence shape (reciprocal theorem).
template <class End, load_types::motion Motion, class N, class Left, class Right, class T>
class load_effect<load_types::movement<End, Motion, N>, Left, Right, T> {
    using load = load_types::movement<End, Motion, N>;
    static constexpr bool is_left = std::is_same_v<End, end::left_end>;
    using here = std::conditional_t<is_left, Left, Right>;
    using there = std::conditional_t<is_left, Right, Left>;

public:
    static constexpr bool is_imposed = true;

    constexpr load_effect(const load& imposed, const unit_beam<T>&)
        : size_(coherent<typename load::unit, T>(imposed.size())) {}

    template <response R>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at(const quantity<length, T>& x, const unit_beam<T>& b,
                                                                side) const {
        const auto L = b.span();
        if constexpr (!can_act_on<load, Left, Right>) {
            return {};
        } else if constexpr (is_left) {
            return along<R>(amplitude(L), ratio(x, L), ratio(L - x, L), b);
        } else {
            return seen_from_right<R>(along<R>(amplitude(L), ratio(L - x, L), ratio(x, L), b));
        }
    }

    constexpr quantity<length, T> start(const unit_beam<T>&) const { return {}; }
    constexpr quantity<length, T> stop(const unit_beam<T>& b) const { return b.span(); }

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
                                                   const unit_beam<T>& b) {
        using shape = derivative_t<decltype(shape_of_movement()), static_cast<int>(R)>;
        const T number = shape::value(near, far);
        const auto L = b.span();
        if constexpr (R == response::deflection) {
            return size * number;
        } else if constexpr (R == response::slope) {
            return as_angle(size * number / L);
        } else if constexpr (R == response::moment) {
            return -(b.EI() * size / L / L * number);
        } else {
            return -(b.EI() * size / L / L / L * number);
        }
    }

    quantity<typename load::unit, T> size_;
};

}  // namespace sagitta::detail
