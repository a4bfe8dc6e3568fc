// The elastic line of a beam under loads: superposed closed forms for deflection, slope, moment and shear.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/detail/concentrated_effect.hpp>
#include <sagitta/detail/curvature_effect.hpp>
#include <sagitta/detail/line_load_effect.hpp>
#include <sagitta/detail/movement_effect.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>

#include <algorithm>
#include <array>
#include <cstddef>
#include <tuple>
#include <type_traits>
#include <variant>
#include <vector>

namespace sagitta {
namespace detail {

/// What none of the loads adds to a sum.
struct nothing {
    template <class Q>
    friend constexpr Q operator+(nothing, const Q& q) {
        return q;
    }
    template <class Q>
    requires(!std::is_same_v<Q, nothing>) friend constexpr Q operator+(const Q& q, nothing) { return q; }
};

/// A sum of effects, those of forces and those of imposed movements and curvatures apart: on a unit beam.
template <class Forced, class Imposed>
struct effect_sums {
    Forced forced;
    Imposed imposed;
};

/// The effects of loads known when compiling: a tuple, no allocation.
template <class Beam, class Loads>
class superposition;

template <class Left, class Right, class N, load_types::load_expression Loads>
class superposition<prismatic_beam<Left, Right, N>, Loads> {
public:
    using number = std::common_type_t<N, typename Loads::number>;
    using seen_beam = unit_beam<number>;

    // Written without std::apply and kept inline: then the compiler sees through the tuple, leaves out what an
    // answer does not need (half of every effect), and composing costs what the formulas cost.
    [[gnu::always_inline]] constexpr superposition(const seen_beam& b, const Loads& loads)
        : superposition(b, load_types::cases_of(loads), all{}) {}

    template <class Sum, class Response>
    [[gnu::always_inline]] constexpr Sum sum(const Response& response_of) const {
        return sum_over<Sum>(response_of, all{});
    }

    template <class Sum, class Response>
    [[gnu::always_inline]] constexpr auto sums(const Response& response_of) const {
        return sums_over<Sum>(response_of, all{});
    }

    /// The places where the elastic line changes its polynomial, both ends included, ascending.
    constexpr auto joints(const seen_beam& b) const {
        return std::apply(
            [&](const auto&... single) {
                std::array<quantity<dimension::length, number>, 2 * sizeof...(single) + 2> places{
                    quantity<dimension::length, number>{}, b.span(), single.start(b)..., single.stop(b)...};
                std::sort(places.begin(), places.end());
                return places;
            },
            effects_);
    }

private:
    template <class L>
    using effect_of = load_effect<L, Left, Right, number>;
    template <class... L>
    static std::tuple<effect_of<L>...> effects_of(const std::tuple<L...>&);
    using effects = decltype(effects_of(load_types::cases_of(std::declval<const Loads&>())));
    using all = std::make_index_sequence<std::tuple_size_v<effects>>;

    template <class Cases, std::size_t... i>
    [[gnu::always_inline]] constexpr superposition(const seen_beam& b, const Cases& cases, std::index_sequence<i...>)
        : effects_(effect(std::get<i>(cases), b)...) {}

    template <class Sum, class Response, std::size_t... i>
    [[gnu::always_inline]] constexpr Sum sum_over(const Response& response_of, std::index_sequence<i...>) const {
        return (response_of(std::get<i>(effects_)) + ...);
    }
    template <class Sum, class Response, std::size_t... i>
    [[gnu::always_inline]] constexpr auto sums_over(const Response& response_of, std::index_sequence<i...>) const {
        const auto forced = (nothing{} + ... + part<false, i>(response_of));
        const auto imposed = (nothing{} + ... + part<true, i>(response_of));
        return effect_sums<std::remove_const_t<decltype(forced)>, std::remove_const_t<decltype(imposed)>>{forced,
                                                                                                          imposed};
    }
    template <bool imposed, std::size_t i, class Response>
    [[gnu::always_inline]] constexpr auto part([[maybe_unused]] const Response& response_of) const {
        if constexpr (std::tuple_element_t<i, effects>::is_imposed == imposed) {
            return response_of(std::get<i>(effects_));
        } else {
            return nothing{};
        }
    }

    template <class L>
    [[gnu::always_inline]] static constexpr effect_of<L> effect(const L& single, const seen_beam& b) {
        if constexpr (requires { requires L::is_rotation; }) {
            static_assert(can_act_on<L, Left, Right>,
                          "sagitta: a support rotation needs a clamped end; this end turns freely");
        } else {
            static_assert(can_act_on<L, Left, Right>,
                          "sagitta: a settlement needs an end that is held against deflection; this end is free");
        }
        return effect_of<L>(single, b);
    }

    effects effects_;
};

/// The effects of a load_list.
template <class Left, class Right, class N, class M>
class superposition<prismatic_beam<Left, Right, N>, load_list<M>> {
public:
    using number = std::common_type_t<N, M>;
    using seen_beam = unit_beam<number>;

    superposition(const seen_beam& b, const load_list<M>& list) {
        effects_.reserve(list.cases().size());
        for (const auto& any : list.cases()) {
            std::visit([&](const auto& single) { add(single, b); }, any);
        }
    }

    template <class Sum, class Response>
    Sum sum(const Response& response_of) const {
        Sum total{};
        for (const auto& any : effects_) {
            total += std::visit([&](const auto& single) { return response_of(single); }, any);
        }
        return total;
    }
    template <class Sum, class Response>
    effect_sums<Sum, Sum> sums(const Response& response_of) const {
        effect_sums<Sum, Sum> total{};
        for (const auto& any : effects_) {
            std::visit(
                [&](const auto& single) { (single.is_imposed ? total.imposed : total.forced) += response_of(single); },
                any);
        }
        return total;
    }

    std::vector<quantity<dimension::length, number>> joints(const seen_beam& b) const {
        std::vector<quantity<dimension::length, number>> places{quantity<dimension::length, number>{}, b.span()};
        for (const auto& any : effects_) {
            std::visit(
                [&](const auto& single) {
                    places.push_back(single.start(b));
                    places.push_back(single.stop(b));
                },
                any);
        }
        std::sort(places.begin(), places.end());
        return places;
    }

private:
    template <class L>
    void add(const L& single, const seen_beam& b) {
        if constexpr (can_act_on<L, Left, Right>) {
            effects_.emplace_back(load_effect<L, Left, Right, number>(single, b));
        } else {
            refuse(L::is_rotation ? "support_rotation" : "settlement", single.size(),
                   L::is_rotation ? "needs a clamped end; this end turns freely"
                                  : "needs an end that is held against deflection; this end is free");
        }
    }

    template <class... L>
    static std::variant<load_effect<L, Left, Right, number>...> any_effect_of(const std::variant<L...>&);
    using any_effect = decltype(any_effect_of(std::declval<const load_types::any_load<M>&>()));

    std::vector<any_effect> effects_;
};

}  // namespace detail

/// What beam.under(loads) returns. Every answer is a quantity in coherent SI.
///
/// Places x are lengths from the left end; invalid_input is thrown where x is not on the beam. Where a
/// concentrated load stands, shear (force) or moment (couple) have two values: side says which is meant. By
/// default it is the value just right of x, at the right end of the beam the one just left of it, so that both
/// ends answer for the beam itself. At an end, the other side of it answers for the support.
///
/// Accuracy in double: within 1e-13 of the greatest value of the same response in the same beam for each load
/// case; errors of superposed cases add.
template <class Left, class Right, class N, class Loads>
class elastic_line<prismatic_beam<Left, Right, N>, Loads> {
    using superposed = detail::superposition<prismatic_beam<Left, Right, N>, Loads>;
    using response = detail::response;

public:
    using number = typename superposed::number;
    using beam_type = prismatic_beam<Left, Right, number>;

    [[gnu::always_inline]] constexpr elastic_line(const prismatic_beam<Left, Right, N>& b, const Loads& loads)
        : beam_(detail::coherent<dimension::length, number>(b.span()),
                detail::coherent<dimension::flexural_rigidity, number>(b.EI())),
          loads_(loads),
          superposed_(seen(), loads) {}

    /// Deflection, downward positive (a length).
    template <class X>
    [[nodiscard, gnu::always_inline]] constexpr quantity<dimension::length, number> deflection(const X& x) const {
        return answer<response::deflection>(on_beam(x), just_right);
    }
    /// Slope dv/dx, clockwise positive (a plane angle).
    template <class X>
    [[nodiscard, gnu::always_inline]] constexpr quantity<dimension::plane_angle, number> slope(const X& x) const {
        return answer<response::slope>(on_beam(x), just_right);
    }
    /// Bending moment, sagging positive (force times length).
    template <class X>
    [[nodiscard, gnu::always_inline]] constexpr quantity<dimension::moment, number> moment(const X& x) const {
        const auto place = on_beam(x);
        return answer<response::moment>(place, inner_side(place));
    }
    template <class X>
    [[nodiscard, gnu::always_inline]] constexpr quantity<dimension::moment, number> moment(const X& x,
                                                                                           side which) const {
        return answer<response::moment>(on_beam(x), which);
    }
    /// Shear force V = dM/dx.
    template <class X>
    [[nodiscard, gnu::always_inline]] constexpr quantity<dimension::force, number> shear(const X& x) const {
        const auto place = on_beam(x);
        return answer<response::shear>(place, inner_side(place));
    }
    template <class X>
    [[nodiscard, gnu::always_inline]] constexpr quantity<dimension::force, number> shear(const X& x, side which) const {
        return answer<response::shear>(on_beam(x), which);
    }
    /// The line load at x, downward positive (force per length).
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::line_load, number> load(const X& x, side which = just_right) const {
        const auto place = on_beam(x);
        using result = quantity<dimension::line_load, number>;
        return superposed_.template sum<result>([&](const auto& effect) -> result {
            if constexpr (requires { effect.intensity(place, seen(), which); }) {
                return effect.intensity(place, seen(), which);
            } else {
                return {};
            }
        });
    }
    /// The imposed curvature at x, sagging positive (1 per length).
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::curvature, number> imposed_curvature(const X& x,
                                                                                     side which = just_right) const {
        const auto place = on_beam(x);
        using result = quantity<dimension::curvature, number>;
        return superposed_.template sum<result>([&](const auto& effect) -> result {
            if constexpr (requires { effect.imposed(place, seen(), which); }) {
                return effect.imposed(place, seen(), which);
            } else {
                return {};
            }
        });
    }

    /// The sum of the couples applied from the left end up to and at x, clockwise positive (force times length).
    template <class X>
    [[nodiscard]] constexpr quantity<dimension::moment, number> couples_up_to(const X& x) const {
        const auto place = on_beam(x);
        using result = quantity<dimension::moment, number>;
        return superposed_.template sum<result>([&](const auto& effect) -> result {
            if constexpr (requires { effect.couple_up_to(place); }) {
                return effect.couple_up_to(place);
            } else {
                return {};
            }
        });
    }

    /// The force that the support at an end exerts on the beam, upward positive; 0 at a free end. Loads that
    /// stand right at the support are part of it.
    [[nodiscard]] constexpr quantity<dimension::force, number> reaction(end::left_end) const {
        return answer<response::shear>({}, just_left);
    }
    [[nodiscard]] constexpr quantity<dimension::force, number> reaction(end::right_end) const {
        return -answer<response::shear>(beam_.span(), just_right);
    }

    /// The bending moment at the support of an end, sagging positive; 0 unless the end is clamped. A couple
    /// that stands right at the support lies between this value and the beam's own.
    [[nodiscard]] constexpr quantity<dimension::moment, number> end_moment(end::left_end) const {
        return answer<response::moment>({}, just_left);
    }
    [[nodiscard]] constexpr quantity<dimension::moment, number> end_moment(end::right_end) const {
        return answer<response::moment>(beam_.span(), just_right);
    }

    /// Flexural rigidity, the same at every x.
    template <class X>
    [[nodiscard]] constexpr const quantity<dimension::flexural_rigidity, number>& rigidity(const X&) const {
        return beam_.EI();
    }

    [[nodiscard]] constexpr const beam_type& supported() const { return beam_; }
    [[nodiscard]] constexpr const Loads& loads() const { return loads_; }

    /// The places where the elastic line passes from one polynomial to the next, both ends included, ascending
    /// and possibly repeated (an array, or a vector where the loads are a load_list).
    [[nodiscard]] constexpr auto joints() const { return superposed_.joints(seen()); }

private:
    template <class X>
    [[gnu::always_inline]] constexpr quantity<dimension::length, number> on_beam(const X& x) const {
        const auto place = detail::expect_length<number>(x);
        if (!(place.value() >= number(0) && place <= beam_.span())) [[unlikely]]
            detail::refuse("x", place, "must lie on the beam, from 0 m to ", beam_.span());
        return place;
    }

    constexpr side inner_side(const quantity<dimension::length, number>& x) const {
        return x < beam_.span() ? just_right : just_left;
    }

    [[gnu::always_inline]] constexpr detail::unit_beam<number> seen() const { return {beam_.span()}; }

    template <response R>
    [[gnu::always_inline]] constexpr detail::response_quantity<R, number> answer(
        const quantity<dimension::length, number>& x, side which) const {
        constexpr bool is_deformation = R == response::deflection || R == response::slope;
        const auto b = seen();
        const auto sums = superposed_.template sums<detail::response_quantity<R, number>>([&](
            const auto& effect) __attribute__((always_inline)) { return effect.template at<R>(x, b, which); });
        const number& EI = beam_.EI().value();
        return with_rigidity<is_deformation>(sums.forced, [&](const auto& q) { return q / EI; }) +
               with_rigidity<!is_deformation>(sums.imposed, [&](const auto& q) { return q * EI; });
    }
    template <bool matters, class Sum, class Apply>
    [[gnu::always_inline]] static constexpr Sum with_rigidity(const Sum& sum, const Apply& apply) {
        if constexpr (matters && !std::is_same_v<Sum, detail::nothing>) {
            return apply(sum);
        } else {
            return sum;
        }
    }

    beam_type beam_;
    Loads loads_;
    superposed superposed_;
};

}  // namespace sagitta
