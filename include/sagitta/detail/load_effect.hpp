// What the effects of all load cases share: one load case on one beam is scale times shape, made ready for
// evaluation anywhere along the beam.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/detail/end_state.hpp>
#include <sagitta/detail/load_case.hpp>

#include <type_traits>

namespace sagitta::detail {

template <class T>
constexpr T ratio(const quantity<length, T>& part, const quantity<length, T>& whole) {
    return (part / whole).value();
}

/// A beam as the effects of loads see it: its rigidity is 1. The elastic line divides by the rigidity once, after it
/// has summed: then an uncertain rigidity (an interval) enters an answer once and widens it no more than it must.
template <class T>
struct unit_beam {
    quantity<length, T> L;

    constexpr const quantity<length, T>& span() const { return L; }
    static constexpr quantity<flexural_rigidity, T> EI() { return quantity<flexural_rigidity, T>::from_value(T(1)); }
};

/// A response as seen from the right end has x running the other way: slope and shear change their sign.
template <response R, class Q>
constexpr Q seen_from_right(const Q& q) {
    if constexpr (R == response::slope || R == response::shear) {
        return -q;
    } else {
        return q;
    }
}

/// The end state that a resultant force F makes at the end Here, given the pure numbers of its two rows.
template <class Here, class T>
constexpr end_state<Here, T> state_from(const quantity<force, T>& F, const T& across, const T& turning,
                                        const unit_beam<T>& b) {
    using state = end_state<Here, T>;
    return {scale_of_force<state::across_kind>(F, b.span(), b.EI()) * across,
            scale_of_force<state::turning_kind>(F, b.span(), b.EI()) * turning};
}

/// The effect of one load case on one beam. Every specialization answers
///   at<R>(x, beam, side)     the response R at x,
///   start(beam), stop(beam)  where its polynomial begins and ends,
///   is_imposed               whether it sets a deflection instead of a force, so that rigidity multiplies
///                            its moment and shear instead of dividing its slope and deflection,
/// and, where it has one, intensity(x, beam, side) or imposed(x, beam, side).
template <class Load, class Left, class Right, class T>
class load_effect;

/// A stretch of one beam, and the end states of whatever acts along it.
template <class Where, class Left, class Right, class T>
class stretch_effect {
public:
    static constexpr bool is_whole = std::is_same_v<Where, load_types::whole_beam>;

    [[gnu::always_inline]] constexpr stretch_effect([[maybe_unused]] const Where& where, const unit_beam<T>& b) {
        if constexpr (is_whole) {
            to_ = b.span();
        } else {
            from_ = coherent<length, T>(where.from);
            to_ = coherent<length, T>(where.to);
            if (!(to_ <= b.span())) [[unlikely]]
                refuse("between: to", to_, "must not lie beyond the span of the beam, ", b.span());
        }
    }

    constexpr quantity<length, T> start(const unit_beam<T>&) const { return from_; }
    constexpr quantity<length, T> stop(const unit_beam<T>&) const { return to_; }

protected:
    [[gnu::always_inline]] constexpr fractions<T> seen(const unit_beam<T>& b) const {
        if constexpr (is_whole) {
            return {T(1) / T(2), T(1) / T(2), T(1)};
        } else {
            const auto L = b.span();
            const auto twice = L * T(2);
            return {ratio(from_ + to_, twice), ratio((L - from_) + (L - to_), twice), ratio(to_ - from_, L)};
        }
    }

    constexpr bool covers(const quantity<length, T>& x, side which) const {
        return which == side::just_left ? x > from_ && x <= to_ : x >= from_ && x < to_;
    }

    /// The response at x; inside the stretch with what acts there, from the nearer end, so that nothing is left
    /// over at the supports. part_left(s) is measured from the start of the stretch, part_right(s) from its stop.
    template <response R, class PartLeft, class PartRight>
    [[gnu::always_inline]] constexpr response_quantity<R, T> at_with(const quantity<length, T>& x,
                                                                     const unit_beam<T>& b, const PartLeft& part_left,
                                                                     const PartRight& part_right) const {
        const auto back = b.span() - x;
        if constexpr (!is_whole) {
            if (x <= from_) return left_.template at<R>(x, b.EI());
            if (x >= to_) return seen_from_right<R>(right_.template at<R>(back, b.EI()));
        }
        if (x <= back) return left_.template at<R>(x, b.EI()) + part_left(x - from_);
        return seen_from_right<R>(right_.template at<R>(back, b.EI()) + part_right(to_ - x));
    }

    quantity<length, T> from_{};
    quantity<length, T> to_{};
    end_state<Left, T> left_{};
    end_state<Right, T> right_{};
};

}  // namespace sagitta::detail
