// The load cases themselves: what acts, how much of it, and where. Made by the functions of load.hpp.
#pragma once

#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/units.hpp>

#include <tuple>
#include <type_traits>

namespace sagitta {
namespace detail {

template <class N>
constexpr void require_load_factor(const N& factor) {
    if (!is_finite(factor)) [[unlikely]]
        refuse("load factor", factor, "must be a finite number");
}

}  // namespace detail

namespace load_types {

using namespace dimension;

/// A place on the beam, measured from its left end.
template <class T>
struct position {
    quantity<length, T> x;
};

/// A stretch of the beam, measured from its left end.
template <class T>
struct stretch {
    quantity<length, T> from;
    quantity<length, T> to;
};

/// Stands for the stretch from end to end, whatever the span.
struct whole_beam {};

/// What acts at one place, and how an end is moved. (Short tags: they keep the compiler's messages short.)
enum class action { point_force, couple, kink, offset };
enum class motion { settlement, rotation };

/// What acts at one place: a force, a couple, or a lack of fit (kink, offset).
template <action Action, class T>
class concentrated {
public:
    using number = T;
    static constexpr bool is_couple = Action == action::couple;
    static constexpr bool is_kink = Action == action::kink;
    static constexpr bool is_offset = Action == action::offset;
    /// Whether it imposes a deformation instead of a force.
    static constexpr bool is_lack_of_fit = is_kink || is_offset;
    using unit =
        std::conditional_t<is_couple, moment,
                           std::conditional_t<is_kink, plane_angle, std::conditional_t<is_offset, length, force>>>;

    constexpr concentrated(const quantity<unit, T>& size, const position<T>& where) : size_(size), where_(where) {
        detail::require_finite(is_couple   ? "applied_couple: size"
                               : is_kink   ? "imposed_kink: size"
                               : is_offset ? "imposed_offset: size"
                                           : "point_load: size",
                               size);
    }

    /// Downward force, clockwise couple, kink that makes the beam sag, or offset of the right part downward.
    [[nodiscard]] constexpr const quantity<unit, T>& size() const { return size_; }
    [[nodiscard]] constexpr const quantity<length, T>& at() const { return where_.x; }
    [[nodiscard]] constexpr concentrated scaled(const T& factor) const { return {size_ * factor, where_}; }

private:
    quantity<unit, T> size_;
    position<T> where_;
};

/// A line load that varies linearly over a stretch (Where: stretch<T> or whole_beam).
template <class T, class Where>
class linear {
public:
    using number = T;
    using where_type = Where;
    static constexpr bool is_uniform = false;

    constexpr linear(const quantity<line_load, T>& from, const quantity<line_load, T>& to, const Where& where)
        : from_(from), to_(to), where_(where) {
        detail::require_finite("linear_load: size at the start", from);
        detail::require_finite("linear_load: size at the end", to);
    }

    /// Downward load per length at the start and at the end of the stretch.
    [[nodiscard]] constexpr const quantity<line_load, T>& size_from() const { return from_; }
    [[nodiscard]] constexpr const quantity<line_load, T>& size_to() const { return to_; }
    [[nodiscard]] constexpr const Where& where() const { return where_; }
    [[nodiscard]] constexpr auto over(const stretch<T>& stretch_of_it) const {
        return linear<T, stretch<T>>(from_, to_, stretch_of_it);
    }
    [[nodiscard]] constexpr linear scaled(const T& factor) const { return {from_ * factor, to_ * factor, where_}; }

private:
    quantity<line_load, T> from_;
    quantity<line_load, T> to_;
    Where where_;
};

/// A line load of the same size over a stretch (Where: stretch<T> or whole_beam).
template <class T, class Where>
class uniform {
public:
    using number = T;
    using where_type = Where;
    static constexpr bool is_uniform = true;

    constexpr uniform(const quantity<line_load, T>& size, const Where& where) : size_(size), where_(where) {
        detail::require_finite("uniform_load: size", size);
    }

    [[nodiscard]] constexpr const quantity<line_load, T>& size_from() const { return size_; }
    [[nodiscard]] constexpr const quantity<line_load, T>& size_to() const { return size_; }
    [[nodiscard]] constexpr const Where& where() const { return where_; }
    [[nodiscard]] constexpr auto over(const stretch<T>& stretch_of_it) const {
        return uniform<T, stretch<T>>(size_, stretch_of_it);
    }
    [[nodiscard]] constexpr uniform scaled(const T& factor) const { return {size_ * factor, where_}; }

private:
    quantity<line_load, T> size_;
    Where where_;
};

/// An imposed movement of an end: a settlement (a length, downward) or a rotation (a plane angle, clockwise).
template <class End, motion Motion, class T>
class movement {
public:
    using number = T;
    using end_type = End;
    static constexpr bool is_rotation = Motion == motion::rotation;
    using unit = std::conditional_t<is_rotation, plane_angle, length>;

    constexpr explicit movement(const quantity<unit, T>& size) : size_(size) {
        detail::require_finite(is_rotation ? "support_rotation: size" : "settlement: size", size);
    }

    [[nodiscard]] constexpr const quantity<unit, T>& size() const { return size_; }
    [[nodiscard]] constexpr movement scaled(const T& factor) const { return movement(size_ * factor); }

private:
    quantity<unit, T> size_;
};

/// An imposed curvature over a stretch (Where: stretch<T> or whole_beam): what a temperature gradient or uneven
/// shrinkage would make of the beam if nothing held it.
template <class T, class Where>
class imposed_curvature {
public:
    using number = T;
    using where_type = Where;

    constexpr imposed_curvature(const quantity<curvature, T>& size, const Where& where) : size_(size), where_(where) {
        detail::require_finite("imposed_curvature: size", size);
    }

    /// Positive where it makes the beam sag.
    [[nodiscard]] constexpr const quantity<curvature, T>& size() const { return size_; }
    [[nodiscard]] constexpr const Where& where() const { return where_; }
    [[nodiscard]] constexpr auto over(const stretch<T>& stretch_of_it) const {
        return imposed_curvature<T, stretch<T>>(size_, stretch_of_it);
    }
    [[nodiscard]] constexpr imposed_curvature scaled(const T& factor) const { return {size_ * factor, where_}; }

private:
    quantity<curvature, T> size_;
    Where where_;
};

template <class L>
inline constexpr bool is_load_case = false;
template <action A, class T>
inline constexpr bool is_load_case<concentrated<A, T>> = true;
template <class T, class W>
inline constexpr bool is_load_case<uniform<T, W>> = true;
template <class T, class W>
inline constexpr bool is_load_case<linear<T, W>> = true;
template <class E, motion M, class T>
inline constexpr bool is_load_case<movement<E, M, T>> = true;
template <class T, class W>
inline constexpr bool is_load_case<imposed_curvature<T, W>> = true;

template <class L>
concept load_case = is_load_case<L>;

/// Load cases acting together, their number known when compiling.
template <load_case... L>
class load_sum {
public:
    using number = std::common_type_t<typename L::number...>;

    constexpr explicit load_sum(const std::tuple<L...>& cases) : cases_(cases) {}

    [[nodiscard]] constexpr const std::tuple<L...>& cases() const { return cases_; }

    [[nodiscard]] constexpr load_sum scaled(const number& factor) const {
        return std::apply(
            [&](const L&... c) {
                return load_sum(std::tuple<L...>(c.scaled(static_cast<typename L::number>(factor))...));
            },
            cases_);
    }

private:
    std::tuple<L...> cases_;
};

template <class L>
inline constexpr bool is_load_sum = false;
template <class... L>
inline constexpr bool is_load_sum<load_sum<L...>> = true;

/// One load case or several acting together.
template <class L>
concept load_expression = load_case<L> || is_load_sum<L>;

/// Whether L is anything that a beam can be under: a load expression or a load_list.
template <class L>
inline constexpr bool is_loads = load_expression<L>;

template <class X>
concept not_a_load = !is_loads<X>;
template <class X>
concept not_a_number = !detail::number_type<X> && !is_loads<X>;

// What else is added to loads, or multiplied with them, is answered by a sentence.

template <class X>
constexpr void expect_load_to_add() {
    constexpr bool right = is_loads<X>;
    static_assert(right, "sagitta: to a load only another load is added");
}
template <class X>
constexpr void expect_load_to_subtract() {
    constexpr bool right = is_loads<X>;
    static_assert(right, "sagitta: from a load only another load is subtracted");
}
template <class X>
constexpr void expect_factor() {
    constexpr bool right = detail::number_type<X>;
    static_assert(right, "sagitta: a load is multiplied by a plain number");
}
template <class X>
constexpr void expect_divisor() {
    constexpr bool right = detail::number_type<X>;
    static_assert(right, "sagitta: a load is divided by a plain number");
}

/// The cases of a load expression as a tuple.
template <load_case L>
constexpr std::tuple<L> cases_of(const L& single) {
    return std::tuple<L>(single);
}
template <load_case... L>
constexpr const std::tuple<L...>& cases_of(const load_sum<L...>& sum) {
    return sum.cases();
}

}  // namespace load_types

}  // namespace sagitta
