// A list that grows at run time is the same as a composition that is known when compiling.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/core.hpp>

#include <doctest/doctest.h>

#include <limits>
#include <string>
#include <variant>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto joist = fixed_beam(7.2 * m, 210.0 * GPa * 8356.0 * cm4);
constexpr auto force_there = point_load(22.0 * kN, at(3.0 * m));
constexpr auto couple_there = applied_couple(8.0 * kN * m, at(4.1 * m));
constexpr auto all = force_there + couple_there + uniform_load(3.0 * kN / m) +
                     partial_uniform_load(9.0 * kN / m, between(1.2 * m, 4.8 * m)) +
                     linear_load(0.0 * kN / m, 6.0 * kN / m, between(1.2 * m, 4.8 * m)) +
                     linear_load(2.0 * kN / m, 1.0 * kN / m) + settlement(end::left, 5.0 * mm) +
                     settlement(end::right, 3.0 * mm) + support_rotation(end::left, -0.2 * mrad) +
                     support_rotation(end::right, 0.5 * mrad);

template <class Line, class Other>
void check_equal(const Line& line, const Other& other) {
    for (const double place : {0.0, 1.2, 3.0, 3.6, 4.1, 4.8, 6.0, 7.2}) {
        CAPTURE(place);
        const auto x = place * m;
        CHECK(line.deflection(x) == other.deflection(x));
        CHECK(line.slope(x) == other.slope(x));
        for (const auto which : {just_left, just_right}) {
            CHECK(line.moment(x, which) == other.moment(x, which));
            CHECK(line.shear(x, which) == other.shear(x, which));
            CHECK(line.load(x, which) == other.load(x, which));
        }
    }
    CHECK(line.reaction(end::left) == other.reaction(end::left));
    CHECK(line.reaction(end::right) == other.reaction(end::right));
    CHECK(line.end_moment(end::left) == other.end_moment(end::left));
    CHECK(line.end_moment(end::right) == other.end_moment(end::right));
}

template <class Load>
void check_alone(const Load& load) {
    load_list list;
    list += load;
    check_equal(joist.under(list), joist.under(load));
}

}  // namespace

TEST_CASE("each load case alone has the same effect in a list, bit for bit") {
    std::apply([](const auto&... single) { (check_alone(single), ...); }, all.cases());
}

TEST_CASE("a composition has the same effect in a list, up to the order of summation") {
    load_list list;
    list += all;
    CHECK(list.cases().size() == 10);
    const auto line = joist.under(list);
    const auto other = joist.under(all);
    for (const double place : {0.0, 1.2, 3.0, 3.6, 4.1, 4.8, 6.0, 7.2}) {
        CAPTURE(place);
        // Sizes of the parts: 1e-2 m, 1e-2 rad, 1e5 N*m, 1e5 N.
        CHECK(abs(line.deflection(place * m) - other.deflection(place * m)) <= 1e-17 * m);
        CHECK(abs(line.slope(place * m) - other.slope(place * m)) <= 1e-17 * rad);
        CHECK(abs(line.moment(place * m) - other.moment(place * m)) <= 1e-10 * N * m);
        CHECK(abs(line.shear(place * m) - other.shear(place * m)) <= 1e-10 * N);
    }
}

TEST_CASE("two loads have the same effect in a list, bit for bit") {
    load_list pair;
    pair += force_there;
    pair += couple_there;
    check_equal(joist.under(pair), joist.under(force_there + couple_there));
}

TEST_CASE("a list answers the questions of a composition") {
    load_list list;
    list += all;
    const auto of_list = greatest_deflection(joist.under(list));
    const auto of_composition = greatest_deflection(joist.under(all));
    CHECK(abs(of_list.value - of_composition.value) <= 1e-15 * abs(of_composition.value));
    CHECK(abs(of_list.at - of_composition.at) <= 1e-14 * m);
    const auto joints = joist.under(list).joints();
    const auto expected = joist.under(all).joints();
    CHECK(joints.front() == 0.0 * m);
    CHECK(joints.back() == 7.2 * m);
    REQUIRE(joints.size() == expected.size());
    for (std::size_t i = 0; i < joints.size(); ++i) CHECK(joints[i] == expected[i]);
}

TEST_CASE("lists are a vector space") {
    load_list a;
    a += force_there;
    load_list b;
    b += couple_there + uniform_load(3.0 * kN / m);
    const auto effect = [](const load_list<>& list) { return joist.under(list).deflection(2.9 * m).value(); };
    const double rounding = 1e-15 * (std::abs(effect(a)) + std::abs(effect(b)));
    CHECK(relative(effect(a + b), effect(a) + effect(b)) < 1e-15);
    CHECK(std::abs(effect(a + b - b) - effect(a)) <= rounding);
    CHECK(std::abs(effect(a - a)) <= rounding);
    CHECK(effect(2.0 * a) == 2 * effect(a));
    CHECK(effect(a * 2.0) == 2 * effect(a));
    CHECK(effect(a / 2.0) == effect(a) / 2);
    CHECK(effect(-a) == -effect(a));
    CHECK(effect(2 * a) == 2 * effect(a));
    CHECK(relative(effect(a + couple_there), effect(a) + joist.under(couple_there).deflection(2.9 * m).value()) <
          1e-14);
    CHECK(relative(effect(a - couple_there), effect(a) - joist.under(couple_there).deflection(2.9 * m).value()) <
          1e-14);
    CHECK((a + b).cases().size() == 3);
    // A load case may stand in front.
    CHECK(relative(effect(force_there + b), effect(a) + effect(b)) < 1e-15);
    CHECK(relative(effect(force_there - b), effect(a) - effect(b)) < 1e-14);

    auto changed = a;
    changed *= 3.0;
    CHECK(relative(effect(changed), 3 * effect(a)) < 1e-15);
    changed /= 3.0;
    CHECK(relative(effect(changed), effect(a)) < 1e-15);
    changed -= force_there;
    CHECK(std::abs(effect(changed)) <= rounding);
    changed.clear();
    CHECK(changed.cases().empty());
    CHECK(effect(changed) == 0);
}

TEST_CASE("a list may be added to itself") {
    load_list list;
    list += force_there + couple_there;
    const auto once = joist.under(list).deflection(2.0 * m).value();
    list += list;
    CHECK(joist.under(list).deflection(2.0 * m).value() == 2 * once);
    const auto& itself = list;
    list -= itself;
    CHECK(std::abs(joist.under(list).deflection(2.0 * m).value()) <= 1e-15 * std::abs(once));
}

TEST_CASE("a movement that the beam cannot take is refused when the list meets the beam") {
    const auto EI = 1.0e4 * kN * m2;
    load_list turned;
    turned += support_rotation(end::left, 0.5 * mrad);
    CHECK_NOTHROW((void)cantilever(3.0 * m, EI).under(turned));
    CHECK_THROWS_WITH_AS((void)simple_beam(3.0 * m, EI).under(turned),
                         "support_rotation = 0.0005 rad needs a clamped end; this end turns freely", invalid_input);
    CHECK_THROWS_AS((void)mirrored(propped_cantilever(3.0 * m, EI)).under(turned), invalid_input);
    load_list sunk;
    sunk += settlement(end::right, 5.0 * mm);
    CHECK_NOTHROW((void)simple_beam(3.0 * m, EI).under(sunk));
    CHECK_THROWS_WITH_AS((void)cantilever(3.0 * m, EI).under(sunk),
                         "settlement = 0.005 m needs an end that is held against deflection; this end is free",
                         invalid_input);
}

TEST_CASE("factors of a list are checked") {
    load_list list;
    list += force_there;
    const double nan = std::numeric_limits<double>::quiet_NaN();
    CHECK_THROWS_WITH_AS(list *= nan, "load factor = nan must be a finite number", invalid_input);
    CHECK_THROWS_AS(list /= 0.0, invalid_input);
    // The list is as it was.
    CHECK(std::get<0>(list.cases().front()).size() == 22.0 * kN);
}

TEST_CASE("lists of other number types") {
    load_list<float> list;
    list += point_load(1.0F * kN, at(2.0F * m));
    const auto line = simple_beam(4.0F * m, 1000.0F * kN * m2).under(list);
    static_assert(std::is_same_v<decltype(line.moment(2.0F * m)), quantity<dimension::moment, float>>);
    CHECK(line.moment(2.0F * m).value() == 1000.0F);
    CHECK(simple_beam(4.0 * m, 1000.0 * kN * m2).under(list).moment(2.0 * m) == 1.0 * kN * m);
}
