// The loads of a beam as plain numbers in coherent SI, for the integrator: what acts where, and how the ends
// are moved. No shape is known here.
#pragma once

#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>

#include <algorithm>
#include <cstddef>
#include <type_traits>
#include <variant>
#include <vector>

namespace sagitta::detail {

enum class acting_kind { point_force, couple, line };

/// A curvature imposed between two places.
template <class T>
struct acting_curvature {
    T from, to;
    T size;
};

/// A lack of fit at one place: by how much the slope falls and the deflection grows there.
template <class T>
struct acting_misfit {
    T at;
    T kink;
    T offset;
};

/// A force or couple at from = to, or a line load from size_from to size_to.
template <class T>
struct acting_load {
    acting_kind kind;
    T from, to;
    T size_from, size_to;

    /// The line load at the distance u behind its start.
    constexpr T intensity(const T& u) const { return size_from + (size_to - size_from) * (u / (to - from)); }
    constexpr T centre() const { return (from + to) / T(2); }
};

/// Everything that acts on a beam of span L.
template <class T>
struct acting_loads {
    std::vector<acting_load<T>> loads;
    std::vector<acting_curvature<T>> curvatures;
    std::vector<acting_misfit<T>> misfits;
    T settlement_left{}, settlement_right{};
    T rotation_left{}, rotation_right{};

    template <class Loads>
    acting_loads(const Loads& acting, const T& beam_span) {
        if constexpr (load_types::load_expression<Loads>) {
            std::apply([&](const auto&... single) { (add(single, beam_span), ...); }, load_types::cases_of(acting));
        } else {
            loads.reserve(acting.cases().size());
            for (const auto& any : acting.cases()) std::visit([&](const auto& single) { add(single, beam_span); }, any);
        }
    }

    /// Where loads, curvatures, lacks of fit and the given steps of stiffness begin and end, and the ends of the beam,
    /// ascending.
    [[nodiscard]] std::vector<T> joints(const T& beam_span, const std::vector<T>& steps) const {
        std::vector<T> places{T(0), beam_span};
        places.reserve(2 + 2 * (loads.size() + curvatures.size()) + steps.size());
        for (const auto& load : loads) places.insert(places.end(), {load.from, load.to});
        for (const auto& imposed : curvatures) places.insert(places.end(), {imposed.from, imposed.to});
        for (const auto& misfit : misfits) places.push_back(misfit.at);
        places.insert(places.end(), steps.begin(), steps.end());
        std::sort(places.begin(), places.end());
        places.erase(std::unique(places.begin(), places.end()), places.end());
        return places;
    }

private:
    template <load_types::action Action, class N>
    void add(const load_types::concentrated<Action, N>& load, const T&) {
        const T a = static_cast<T>(load.at().value());
        const T size = static_cast<T>(load.size().value());
        if constexpr (load_types::concentrated<Action, N>::is_lack_of_fit) {
            misfits.push_back({a, load.is_kink ? size : T(0), load.is_kink ? T(0) : size});
        } else {
            loads.push_back({load.is_couple ? acting_kind::couple : acting_kind::point_force, a, a, size, size});
        }
    }

    template <class Load>
    requires requires { Load::is_uniform; }
    void add(const Load& load, const T& beam_span) {
        loads.push_back({acting_kind::line, start(load, T(0)), stop(load, beam_span),
                         static_cast<T>(load.size_from().value()), static_cast<T>(load.size_to().value())});
    }

    template <class N, class Where>
    void add(const load_types::imposed_curvature<N, Where>& load, const T& beam_span) {
        curvatures.push_back({start(load, T(0)), stop(load, beam_span), static_cast<T>(load.size().value())});
    }

    template <class Load>
    static T start(const Load& load, const T& left_end) {
        if constexpr (requires { load.where().from; }) {
            return static_cast<T>(load.where().from.value());
        } else {
            return left_end;
        }
    }
    template <class Load>
    static T stop(const Load& load, const T& right_end) {
        if constexpr (requires { load.where().to; }) {
            return static_cast<T>(load.where().to.value());
        } else {
            return right_end;
        }
    }

    template <class End, load_types::motion Motion, class N>
    void add(const load_types::movement<End, Motion, N>& movement, const T&) {
        constexpr bool is_left = std::is_same_v<End, end::left_end>;
        T& total = movement.is_rotation ? (is_left ? rotation_left : rotation_right)
                                        : (is_left ? settlement_left : settlement_right);
        total += static_cast<T>(movement.size().value());
    }
};

}  // namespace sagitta::detail
