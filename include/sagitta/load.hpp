// Load cases and their vector space.
//
// point_load, applied_couple, uniform_load, partial_uniform_load, linear_load, settlement, support_rotation,
// imposed_kink, imposed_offset, imposed_curvature and temperature_gradient make load cases; + - * / compose them. A
// composition whose length is known when compiling allocates nothing and is constexpr; load_list (load_list.hpp) grows
// at run time.
#pragma once

#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/load_case.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/units.hpp>

#include <tuple>
#include <type_traits>

namespace sagitta {
namespace load_types {

template <load_expression A, load_expression B>
[[nodiscard, gnu::always_inline]] constexpr auto operator+(const A& a, const B& b) {
    return load_sum(std::tuple_cat(cases_of(a), cases_of(b)));
}

template <load_expression L, detail::number_type N>
[[nodiscard]] constexpr L operator*(const L& load, const N& factor) {
    detail::require_load_factor(factor);
    return load.scaled(static_cast<typename L::number>(factor));
}
template <load_expression L, detail::number_type N>
[[nodiscard]] constexpr L operator*(const N& factor, const L& load) {
    return load * factor;
}
template <load_expression L, detail::number_type N>
[[nodiscard]] constexpr L operator/(const L& load, const N& divisor) {
    return load * (typename L::number(1) / static_cast<typename L::number>(divisor));
}
template <load_expression L>
[[nodiscard]] constexpr L operator-(const L& load) {
    return load.scaled(typename L::number(-1));
}
template <load_expression A, load_expression B>
[[nodiscard]] constexpr auto operator-(const A& a, const B& b) {
    return a + (-b);
}

// Whatever else is added to a load, or multiplied with it, is answered by a sentence.

template <load_expression L, not_a_load X>
constexpr L operator+(const L& load, const X&) {
    expect_load_to_add<X>();
    return load;
}
template <not_a_load X, load_expression L>
constexpr L operator+(const X&, const L& load) {
    expect_load_to_add<X>();
    return load;
}
template <load_expression L, not_a_load X>
constexpr L operator-(const L& load, const X&) {
    expect_load_to_subtract<X>();
    return load;
}
template <not_a_load X, load_expression L>
constexpr L operator-(const X&, const L& load) {
    expect_load_to_subtract<X>();
    return load;
}
template <load_expression L, not_a_number X>
constexpr L operator*(const L& load, const X&) {
    expect_factor<X>();
    return load;
}
template <not_a_number X, load_expression L>
constexpr L operator*(const X&, const L& load) {
    expect_factor<X>();
    return load;
}
template <load_expression L, load_expression X>
constexpr L operator*(const L& load, const X&) {
    expect_factor<X>();
    return load;
}
template <load_expression L, not_a_number X>
constexpr L operator/(const L& load, const X&) {
    expect_divisor<X>();
    return load;
}

}  // namespace load_types

// Places are bounded by the beam as well, but only beam.under(...) knows its span and refuses what lies beyond.

/// A place for a concentrated load: its distance from the left end (a length, not negative).
template <class X>
[[nodiscard]] constexpr auto at(const X& x) {
    using T = detail::common_number<X>;
    const auto place = detail::expect_length<T>(x);
    if (!(place.value() >= T(0))) [[unlikely]]
        detail::refuse("at", place, "must be a distance from the left end, not less than 0 m");
    return load_types::position<T>{place};
}

/// A stretch for a line load: two distances from the left end (lengths, not negative, from < to).
template <class From, class To>
[[nodiscard]] constexpr auto between(const From& from, const To& to) {
    using T = detail::common_number<From, To>;
    const auto start = detail::expect_length<T>(from);
    const auto stop = detail::expect_length<T>(to);
    if constexpr (detail::has_dimension<From, dimension::length> && detail::has_dimension<To, dimension::length>) {
        if (!(start.value() >= T(0))) [[unlikely]]
            detail::refuse("between: from", start, "must be a distance from the left end, not less than 0 m");
        if (!(start.value() < stop.value())) [[unlikely]]
            detail::refuse("between: to", stop, "must be a distance from the left end, greater than from = ", start);
    }
    return load_types::stretch<T>{start, stop};
}

namespace detail {

template <class P>
struct number_of_place {
    using type = double;
};
template <class T>
struct number_of_place<load_types::position<T>> {
    using type = T;
};
template <class T>
struct number_of_place<load_types::stretch<T>> {
    using type = T;
};

template <class T, class P>
constexpr load_types::position<T> expect_position([[maybe_unused]] const P& place) {
    constexpr bool right = requires { place.x; };
    static_assert(right, "sagitta: a place on the beam is expected here: write at(3.0*m)");
    if constexpr (right) {
        return {coherent<dimension::length, T>(place.x)};
    } else {
        return {};
    }
}

template <class T, class P>
constexpr auto expect_stretch(const P& place) {
    constexpr bool right = requires { place.from, place.to; };
    static_assert(right, "sagitta: a stretch of the beam is expected here: write between(1.2*m, 4.8*m)");
    if constexpr (right) {
        return load_types::stretch<T>{coherent<dimension::length, T>(place.from),
                                      coherent<dimension::length, T>(place.to)};
    } else {
        return load_types::stretch<T>{};
    }
}

}  // namespace detail

/// A concentrated force P (a force, downward positive) at a place: point_load(22.0*kN, at(3.0*m)).
template <class F, class P>
[[nodiscard]] constexpr auto point_load(const F& size, const P& place) {
    using T = std::common_type_t<detail::common_number<F>, typename detail::number_of_place<P>::type>;
    return load_types::concentrated<load_types::action::point_force, T>(detail::expect_force<T>(size),
                                                                        detail::expect_position<T>(place));
}

/// A concentrated couple (force times length, clockwise positive) at a place: applied_couple(8.0*kN*m, at(7.2*m)).
template <class C, class P>
[[nodiscard]] constexpr auto applied_couple(const C& size, const P& place) {
    using T = std::common_type_t<detail::common_number<C>, typename detail::number_of_place<P>::type>;
    return load_types::concentrated<load_types::action::couple, T>(detail::expect_moment<T>(size),
                                                                   detail::expect_position<T>(place));
}

/// A line load w (force per length, downward positive) over the whole beam.
template <class W>
[[nodiscard]] constexpr auto uniform_load(const W& size) {
    using T = detail::common_number<W>;
    return load_types::uniform<T, load_types::whole_beam>(detail::expect_line_load<T>(size), {});
}

/// A line load w over a stretch: partial_uniform_load(9.0*kN/m, between(1.2*m, 4.8*m)).
template <class W, class S>
[[nodiscard]] constexpr auto partial_uniform_load(const W& size, const S& where) {
    using T = std::common_type_t<detail::common_number<W>, typename detail::number_of_place<S>::type>;
    return load_types::uniform<T, load_types::stretch<T>>(detail::expect_line_load<T>(size),
                                                          detail::expect_stretch<T>(where));
}

/// A line load that varies linearly from its first size to its second over a stretch (trapezoidal, triangular).
template <class W1, class W2, class S>
[[nodiscard]] constexpr auto linear_load(const W1& size_from, const W2& size_to, const S& where) {
    using T = std::common_type_t<detail::common_number<W1, W2>, typename detail::number_of_place<S>::type>;
    return load_types::linear<T, load_types::stretch<T>>(
        detail::expect_line_load<T>(size_from), detail::expect_line_load<T>(size_to), detail::expect_stretch<T>(where));
}

/// The same over the whole beam.
template <class W1, class W2>
[[nodiscard]] constexpr auto linear_load(const W1& size_from, const W2& size_to) {
    using T = detail::common_number<W1, W2>;
    return load_types::linear<T, load_types::whole_beam>(detail::expect_line_load<T>(size_from),
                                                         detail::expect_line_load<T>(size_to), {});
}

/// An end that moves down by a given length (downward positive): settlement(end::right, 5.0*mm).
template <class End, class D>
[[nodiscard]] constexpr auto settlement(End, const D& size) {
    detail::expect_end<End>();
    using T = detail::common_number<D>;
    return load_types::movement<End, load_types::motion::settlement, T>(detail::expect_length<T>(size));
}

/// A clamped end that is turned by a given angle (clockwise positive): support_rotation(end::left, 0.5*mrad).
template <class End, class R>
[[nodiscard]] constexpr auto support_rotation(End, const R& size) {
    detail::expect_end<End>();
    using T = detail::common_number<R>;
    return load_types::movement<End, load_types::motion::rotation, T>(detail::expect_angle<T>(size));
}

/// A kink (a plane angle, positive where it makes the beam sag) that a cause other than load puts into the beam at a
/// place: two parts joined at an angle. imposed_kink(2.0*mrad, at(3.0*m)).
template <class A, class P>
[[nodiscard]] constexpr auto imposed_kink(const A& size, const P& place) {
    using T = std::common_type_t<detail::common_number<A>, typename detail::number_of_place<P>::type>;
    return load_types::concentrated<load_types::action::kink, T>(detail::expect_angle<T>(size),
                                                                 detail::expect_position<T>(place));
}

/// An offset (a length): at a place the part right of it is joined lower by so much than the part left of it.
/// imposed_offset(3.0*mm, at(3.0*m)).
template <class D, class P>
[[nodiscard]] constexpr auto imposed_offset(const D& size, const P& place) {
    using T = std::common_type_t<detail::common_number<D>, typename detail::number_of_place<P>::type>;
    return load_types::concentrated<load_types::action::offset, T>(detail::expect_length<T>(size),
                                                                   detail::expect_position<T>(place));
}

/// A curvature (1 per length, sagging positive) that a cause other than load imposes over a stretch, such as
/// shrinkage: imposed_curvature(0.0002/m, between(0.0*m, 3.0*m)).
template <class C, class S>
[[nodiscard]] constexpr auto imposed_curvature(const C& size, const S& where) {
    using T = std::common_type_t<detail::common_number<C>, typename detail::number_of_place<S>::type>;
    return load_types::imposed_curvature<T, load_types::stretch<T>>(detail::expect_curvature<T>(size),
                                                                    detail::expect_stretch<T>(where));
}

/// The same over the whole beam.
template <class C>
[[nodiscard]] constexpr auto imposed_curvature(const C& size) {
    using T = detail::common_number<C>;
    return load_types::imposed_curvature<T, load_types::whole_beam>(detail::expect_curvature<T>(size), {});
}

/// The side of a section that is the warmer one.
enum class warm_side { top, bottom };

/// A temperature that varies linearly through the depth: the curvature alpha (difference) / depth, sagging where
/// the bottom is the warmer side. expansion: coefficient alpha (1 per temperature); difference: between top and
/// bottom (a temperature); depth of the section (a length greater than 0); then optionally a stretch.
template <class A, class D, class H, class... Stretch>
[[nodiscard]] constexpr auto temperature_gradient(const A& expansion, const D& difference, warm_side warm,
                                                  const H& depth, const Stretch&... where) {
    using T = detail::common_number<A, D, H>;
    const auto h = detail::expect_length<T>(depth);
    if (!detail::is_positive(h.value())) [[unlikely]]
        detail::refuse("temperature_gradient: depth", h, "must be greater than 0 m and finite");
    const T strain = detail::expect_expansion<T>(expansion).value() * detail::expect_temperature<T>(difference).value();
    const auto size = quantity<dimension::curvature, T>::from_value(strain / h.value());
    return sagitta::imposed_curvature(warm == warm_side::bottom ? size : -size, where...);
}

}  // namespace sagitta
