// Beams: what they are made of, and what they are made from.
#include <support/doctest_quantities.hpp>

#include <sagitta/beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/load.hpp>

#include <doctest/doctest.h>

#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto L = 7.2 * m;
constexpr auto EI = 210.0 * GPa * (8356.0 * cm4);

template <class Beam, class Left, class Right>
inline constexpr bool is_held =
    std::is_same_v<typename Beam::left_type, Left>&& std::is_same_v<typename Beam::right_type, Right>;

}  // namespace

TEST_CASE("a beam knows its span, its stiffness and how it is held") {
    constexpr auto b = simple_beam(L, EI);
    static_assert(b.span() == L);
    static_assert(b.EI() == EI);
    static_assert(std::is_same_v<decltype(b)::number, double>);
    static_assert(is_held<decltype(simple_beam(L, EI)), held::pinned, held::pinned>);
    static_assert(is_held<decltype(cantilever(L, EI)), held::fixed, held::free>);
    static_assert(is_held<decltype(propped_cantilever(L, EI)), held::fixed, held::pinned>);
    static_assert(is_held<decltype(fixed_beam(L, EI)), held::fixed, held::fixed>);
    static_assert(is_held<decltype(beam_with_ends<held::pinned, held::fixed>(L, EI)), held::pinned, held::fixed>);
}

TEST_CASE("a mirrored beam has its ends exchanged and all else kept") {
    constexpr auto image = mirrored(propped_cantilever(L, EI));
    static_assert(is_held<decltype(mirrored(propped_cantilever(L, EI))), held::pinned, held::fixed>);
    static_assert(is_held<decltype(mirrored(cantilever(L, EI))), held::free, held::fixed>);
    static_assert(std::is_same_v<decltype(mirrored(image)), decltype(propped_cantilever(L, EI))>);
    static_assert(image.span() == L && image.EI() == EI);
}

TEST_CASE("the stiffness may be written as E times I in any order and unit") {
    static_assert(simple_beam(L, 8356.0 * cm4 * (210.0 * GPa)).EI() == EI);
    static_assert(simple_beam(L, 210.0 * GPa * 8356.0 * cm4).EI() == EI);
    static_assert(
        std::is_same_v<decltype(simple_beam(24.0 * ft, 29000.0 * ksi * (200.0 * in4))), decltype(simple_beam(L, EI))>);
    static_assert(simple_beam(7 * m, EI).span() == 7.0 * m);
}

TEST_CASE("the number type of a beam is the wider of its arguments'") {
    static_assert(std::is_same_v<decltype(simple_beam(1.0F * m, 1.0F * kN * m2))::number, float>);
    static_assert(std::is_same_v<decltype(simple_beam(1.0F * m, 1.0 * kN * m2))::number, double>);
    static_assert(std::is_same_v<decltype(simple_beam(1.0 * m, 1.0L * kN * m2))::number, long double>);
    static_assert(std::is_same_v<decltype(simple_beam(1 * m, 1.0F * kN * m2))::number, double>);
}

TEST_CASE("which pairs of ends carry load") {
    static_assert(detail::stable_ends<held::pinned, held::pinned>);
    static_assert(detail::stable_ends<held::fixed, held::free>);
    static_assert(detail::stable_ends<held::free, held::fixed>);
    static_assert(!detail::stable_ends<held::pinned, held::free>);
    static_assert(!detail::stable_ends<held::free, held::pinned>);
    static_assert(!detail::stable_ends<held::free, held::free>);
}

TEST_CASE("deflections scale with load and span, and against stiffness") {
    // v ~ w L^4/EI: all powers of two, so that nothing is rounded.
    constexpr auto one = simple_beam(2.0 * m, 64.0 * N * m2).under(uniform_load(8.0 * N / m)).deflection(1.0 * m);
    constexpr auto stiffer = simple_beam(2.0 * m, 128.0 * N * m2).under(uniform_load(8.0 * N / m)).deflection(1.0 * m);
    constexpr auto longer = simple_beam(4.0 * m, 64.0 * N * m2).under(uniform_load(8.0 * N / m)).deflection(2.0 * m);
    static_assert(2.0 * stiffer == one);
    static_assert(longer == 16.0 * one);
}
