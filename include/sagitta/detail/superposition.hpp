// The effects of all loads on one beam, added up: of loads known when compiling, or of a load_list.
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
#include <utility>
#include <variant>
#include <vector>

namespace sagitta::detail {

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

template <class Effect>
inline constexpr bool is_lack_of_fit = requires {
    requires Effect::is_lack_of_fit;
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

    /// Whether deflection or slope may jump anywhere.
    static constexpr bool may_jump() { return has_lack_of_fit(std::type_identity<effects>{}); }

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
    template <class... E>
    static constexpr bool has_lack_of_fit(std::type_identity<std::tuple<E...>>) {
        return (... || is_lack_of_fit<E>);
    }
    using all = std::make_index_sequence<std::tuple_size_v<effects>>;

    template <class Cases, std::size_t... i>
    [[gnu::always_inline]] constexpr superposition(const seen_beam& b, const Cases& cases, std::index_sequence<i...>)
        : effects_(effect(std::get<i>(cases), b)...) {}

    template <class Sum, class Response, std::size_t... i>
    [[gnu::always_inline]] constexpr Sum sum_over(const Response& response_of, std::index_sequence<i...>) const {
        return (... + response_of(std::get<i>(effects_)));
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
    static constexpr bool may_jump() { return true; }

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

}  // namespace sagitta::detail
