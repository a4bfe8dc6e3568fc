// Releases: what the force method sets free in a structure, each a displacement and the redundant that belongs to it.
//
//     translation_at(6.0*m)   rotation_at(0.0*m)   relative_rotation_at(4.0*m)
//     translation_at(6.0*m).prescribed(5.0*mm)     translation_at(6.0*m).on_spring(8.0*kN/mm)
//
// A displacement is that just right of its place: a kink or an offset that stands right there is part of it, and is
// closed with it.
#pragma once

#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/units.hpp>

#include <array>
#include <cstddef>
#include <limits>
#include <tuple>
#include <type_traits>
#include <utility>
#include <variant>
#include <vector>

namespace sagitta {
namespace release_types {

using namespace dimension;

/// What is released: the deflection or the rotation of a section, or the rotation of one section against the other
/// in a hinge.
enum class kind { translation, rotation, relative_rotation };

/// The dimensions that belong together: displacement, redundant, and the displacement I for each unit of redundant J.
template <kind K>
using displacement = std::conditional_t<K == kind::translation, length, plane_angle>;
template <kind K>
using redundant = std::conditional_t<K == kind::translation, force, moment>;
template <kind I, kind J>
using flexibility = typename boost::units::divide_typeof_helper<displacement<I>, redundant<J>>::type;

template <kind K>
inline constexpr const char* name_of = "translation_at: x";
template <>
inline constexpr const char* name_of<kind::rotation> = "rotation_at: x";
template <>
inline constexpr const char* name_of<kind::relative_rotation> = "relative_rotation_at: x";

/// One release. The functions below make it.
template <kind K, class T>
class release {
public:
    using number = T;
    static constexpr kind released = K;

    constexpr release(const quantity<length, T>& at, const quantity<displacement<K>, T>& movement,
                      const quantity<flexibility<K, K>, T>& spring_flexibility)
        : at_(at), movement_(movement), spring_flexibility_(spring_flexibility) {}

    /// The movement that the release shall have in the end, instead of none: a settlement, a lack of fit, a gap that
    /// closes. A length (downward) for a translation, a plane angle for a rotation (clockwise; a relative rotation
    /// counts as its displacement does: the section right of the hinge more clockwise than the one left of it).
    template <class D>
    [[nodiscard]] constexpr auto prescribed(const D& by) const {
        using U = std::common_type_t<T, detail::common_number<D>>;
        if constexpr (K == kind::translation) {
            return moving(detail::expect_length<U>(by));
        } else {
            return moving(detail::expect_angle<U>(by));
        }
    }
    /// A redundant that a spring takes. Its stiffness is a force per length for a translation, a moment per angle for
    /// a rotation; greater than 0, infinite: rigid.
    template <class S>
    [[nodiscard]] constexpr auto on_spring(const S& stiffness) const {
        using U = std::common_type_t<T, detail::common_number<S>>;
        if constexpr (K == kind::translation) {
            return sprung(detail::expect_spring_stiffness<U>(stiffness));
        } else {
            return sprung(detail::expect_rotational_stiffness<U>(stiffness));
        }
    }

    [[nodiscard]] constexpr const quantity<length, T>& at() const { return at_; }
    [[nodiscard]] constexpr const quantity<displacement<K>, T>& movement() const { return movement_; }
    /// What the spring gives way for each unit of the redundant: 0 where there is none.
    [[nodiscard]] constexpr const quantity<flexibility<K, K>, T>& spring_flexibility() const {
        return spring_flexibility_;
    }

private:
    using spring = flexibility<K, K>;

    template <class U>
    constexpr release<K, U> moving(const quantity<displacement<K>, U>& by) const {
        detail::require_finite("prescribed: by", by);
        return {detail::coherent<length, U>(at_), by, detail::coherent<spring, U>(spring_flexibility_)};
    }
    template <class Unit, class U>
    constexpr release<K, U> sprung(const quantity<Unit, U>& k) const {
        if (!(k.value() > U(0))) [[unlikely]]
            detail::refuse("on_spring: stiffness", k, "must be greater than 0");
        // Nothing is computed with an infinite stiffness: inf would spoil what a number carries besides its value.
        const bool is_rigid = std::numeric_limits<U>::has_infinity && k.value() > std::numeric_limits<U>::max();
        return {detail::coherent<length, U>(at_), detail::coherent<displacement<K>, U>(movement_),
                quantity<spring, U>::from_value(is_rigid ? U(0) : U(1) / k.value())};
    }

    quantity<length, T> at_;
    quantity<displacement<K>, T> movement_;
    quantity<flexibility<K, K>, T> spring_flexibility_;
};

template <class R>
inline constexpr bool is_release = false;
template <kind K, class T>
inline constexpr bool is_release<release<K, T>> = true;

template <kind K, class X>
constexpr auto release_at(const X& x) {
    using T = detail::common_number<X>;
    const auto place = detail::expect_length<T>(x);
    if (!(place.value() >= T(0))) [[unlikely]]
        detail::refuse(name_of<K>, place, "must be a distance from the left end, not less than 0 m");
    return release<K, T>(place, {}, {});
}

/// Releases whose number is known when compiling, in the order in which they were named.
template <class... R>
class release_pack {
public:
    using number = std::common_type_t<typename R::number...>;
    static constexpr bool is_fixed = true;
    static constexpr std::array kinds{R::released...};
    template <std::size_t i>
    static constexpr kind kind_of = kinds[i < kinds.size() ? i : 0];

    constexpr explicit release_pack(const R&... each) : each_(each...) {}

    [[nodiscard]] static constexpr std::size_t size() { return sizeof...(R); }
    template <std::size_t i>
    [[nodiscard]] constexpr const auto& get() const {
        return std::get<i>(each_);
    }
    /// Calls a function with the index and the release, for each.
    template <class Function>
    constexpr void for_each(const Function& f) const {
        [&]<std::size_t... i>(std::index_sequence<i...>) { (f(i, std::get<i>(each_)), ...); }
        (std::index_sequence_for<R...>{});
    }
    /// A value for each release, and for each pair of them.
    template <class Value>
    [[nodiscard]] static constexpr auto values() {
        return std::array<Value, size()>{};
    }
    template <class Value>
    [[nodiscard]] static constexpr auto table() {
        return std::array<Value, size() * size()>{};
    }

private:
    std::tuple<R...> each_;
};

}  // namespace release_types

/// The deflection at x, downward positive (x: a length, its distance from the left end). The redundant is a force,
/// downward positive as the displacement; the support that was taken away exerts it, so that its reaction is upward
/// and of opposite sign. Throws invalid_input where x is less than 0.
template <class X>
[[nodiscard]] constexpr auto translation_at(const X& x) {
    return release_types::release_at<release_types::kind::translation>(x);
}

/// The rotation of the section at x, clockwise positive; at a hinge that of the section right of it. The redundant is
/// a couple, clockwise positive: at the left end of a beam it is the bending moment there, at the right end minus it.
template <class X>
[[nodiscard]] constexpr auto rotation_at(const X& x) {
    return release_types::release_at<release_types::kind::rotation>(x);
}

/// The rotation of the section right of a hinge at x less that of the section left of it: positive where the line has a
/// peak, negative where it sags (imposed_kink counts the other way). The redundant is the pair of couples that closes
/// it: the bending moment in the hinge, sagging positive.
template <class X>
[[nodiscard]] constexpr auto relative_rotation_at(const X& x) {
    return release_types::release_at<release_types::kind::relative_rotation>(x);
}

/// Which release of a release_list. Its type remembers the kind and so the dimensions.
template <release_types::kind K>
struct release_index {
    std::size_t value;
};

/// Releases whose number is known only at run time. Adding one returns the index by which answers are asked for.
template <class T = double>
class release_list {
public:
    using number = T;
    static constexpr bool is_fixed = false;

    template <release_types::kind K>
    release_index<K> add(const release_types::release<K, T>& one) {
        each_.emplace_back(one);
        return {each_.size() - 1};
    }
    void reserve(std::size_t count) { each_.reserve(count); }

    [[nodiscard]] std::size_t size() const { return each_.size(); }
    /// Throws invalid_input where the index is none of this list.
    template <release_types::kind K>
    [[nodiscard]] const release_types::release<K, T>& get(const release_index<K>& which) const {
        if (which.value < each_.size()) {
            if (const auto* one = std::get_if<release_types::release<K, T>>(&each_[which.value])) return *one;
        }
        detail::refuse("release_index", static_cast<double>(which.value), "must come from this list of releases");
    }
    template <class Function>
    void for_each(const Function& f) const {
        for (std::size_t i = 0; i < each_.size(); ++i) {
            std::visit([&](const auto& one) { f(i, one); }, each_[i]);
        }
    }
    template <class Value>
    [[nodiscard]] auto values() const {
        return std::vector<Value>(size());
    }
    template <class Value>
    [[nodiscard]] auto table() const {
        return std::vector<Value>(size() * size());
    }

private:
    using kind = release_types::kind;
    std::vector<std::variant<release_types::release<kind::translation, T>, release_types::release<kind::rotation, T>,
                             release_types::release<kind::relative_rotation, T>>>
        each_;
};

}  // namespace sagitta
