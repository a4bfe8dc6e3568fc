// Releases: what they carry, what they refuse, and lists of them.
#include <sagitta/release.hpp>

#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>

#include <doctest/doctest.h>

#include <limits>
#include <string>
#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;
using release_types::kind;

namespace {

constexpr double infinite = std::numeric_limits<double>::infinity();
constexpr double no_number = std::numeric_limits<double>::quiet_NaN();

}  // namespace

TEST_CASE("a release carries its place, its prescribed movement and its spring") {
    constexpr auto plain = translation_at(6.0 * m);
    static_assert(plain.at() == 6.0 * m);
    static_assert(plain.movement() == 0.0 * m);
    static_assert(plain.spring_flexibility().value() == 0);

    // In either order, without losing what was said before.
    constexpr auto one = translation_at(6.0 * m).prescribed(5.0 * mm).on_spring(8.0 * kN / mm);
    constexpr auto other = translation_at(6.0 * m).on_spring(8.0 * kN / mm).prescribed(5.0 * mm);
    static_assert(one.movement() == 5.0 * mm && other.movement() == one.movement());
    static_assert(one.spring_flexibility() == 1.0 / (8.0 * kN / mm));
    static_assert(other.spring_flexibility() == one.spring_flexibility());

    constexpr auto turned = rotation_at(0.0 * m).prescribed(2.0 * mrad).on_spring(500.0 * kN * m / rad);
    static_assert(turned.movement() == 2.0 * mrad);
    static_assert(turned.spring_flexibility() == 1.0 / (500.0 * kN * m / rad));
    constexpr auto kinked = relative_rotation_at(4.0 * m).prescribed(1.0 * mrad);
    static_assert(kinked.movement() == 1.0 * mrad);
    static_assert(kinked.released == kind::relative_rotation);

    // A rigid spring is none.
    static_assert(translation_at(6.0 * m).on_spring(infinite * N / m).spring_flexibility().value() == 0);
    static_assert(
        translation_at(6.0 * m).on_spring(std::numeric_limits<double>::max() * N / m).spring_flexibility().value() > 0);
}

TEST_CASE("the dimensions of displacements, redundants and flexibilities") {
    using namespace dimension;
    constexpr auto v = kind::translation, turn = kind::rotation, kink = kind::relative_rotation;
    static_assert(std::is_same_v<release_types::displacement<v>, length>);
    static_assert(std::is_same_v<release_types::displacement<kink>, plane_angle>);
    static_assert(std::is_same_v<release_types::redundant<v>, force>);
    static_assert(std::is_same_v<release_types::redundant<turn>, moment>);
    static_assert(std::is_same_v<quantity<release_types::flexibility<v, v>>, decltype(1.0 * mm / (1.0 * kN))>);
    static_assert(std::is_same_v<quantity<release_types::flexibility<v, turn>>, decltype(1.0 / (1.0 * kN))>);
    static_assert(std::is_same_v<quantity<release_types::flexibility<kink, v>>, decltype(1.0 * rad / (1.0 * kN))>);
    static_assert(
        std::is_same_v<quantity<release_types::flexibility<turn, kink>>, decltype(1.0 * rad / (1.0 * kN * m))>);
}

TEST_CASE("the number type is the widest that was given") {
    static_assert(std::is_same_v<decltype(translation_at(2.0F * m))::number, float>);
    static_assert(std::is_same_v<decltype(translation_at(2.0F * m).prescribed(1.0F * mm))::number, float>);
    static_assert(std::is_same_v<decltype(translation_at(2.0F * m).prescribed(1.0 * mm))::number, double>);
    static_assert(std::is_same_v<decltype(rotation_at(2.0 * m).on_spring(1.0L * N * m / rad))::number, long double>);
}

TEST_CASE("what is wrong is refused by name") {
    CHECK(refusal([] { (void)translation_at(-1.0 * m); }) ==
          "translation_at: x = -1 m must be a distance from the left end, not less than 0 m");
    CHECK(refusal([] { (void)rotation_at(no_number * m); }) ==
          "rotation_at: x = nan m must be a distance from the left end, not less than 0 m");
    CHECK(refusal([] { (void)relative_rotation_at(-2.0 * m); }) ==
          "relative_rotation_at: x = -2 m must be a distance from the left end, not less than 0 m");
    CHECK(refusal([] { (void)translation_at(1.0 * m).prescribed(infinite * m); }) ==
          "prescribed: by = inf m must be a finite number");
    CHECK(refusal([] { (void)rotation_at(1.0 * m).prescribed(no_number * rad); }) ==
          "prescribed: by = nan rad must be a finite number");
    CHECK(refusal([] { (void)translation_at(1.0 * m).on_spring(0.0 * N / m); }) ==
          "on_spring: stiffness = 0 N/m must be greater than 0");
    CHECK(refusal([] { (void)rotation_at(1.0 * m).on_spring(-3.0 * N * m / rad); }) ==
          "on_spring: stiffness = -3 N*m/rad must be greater than 0");
    CHECK(refusal([] { (void)rotation_at(1.0 * m).on_spring(no_number * N * m / rad); }) ==
          "on_spring: stiffness = nan N*m/rad must be greater than 0");
}

TEST_CASE("a list knows each release by the index that it returned") {
    release_list list;
    CHECK(list.size() == 0);
    const auto pier = list.add(translation_at(6.0 * m).prescribed(5.0 * mm));
    const auto clamp = list.add(rotation_at(0.0 * m));
    static_assert(std::is_same_v<decltype(pier), const release_index<kind::translation>>);
    CHECK(list.size() == 2);
    CHECK(list.get(pier).movement() == 5.0 * mm);
    CHECK(list.get(clamp).at() == 0.0 * m);
    const auto refused = "release_index = 2 must come from this list of releases";
    CHECK(refusal([&] { (void)list.get(release_index<kind::translation>{2}); }) == refused);
    CHECK(refusal([&] { (void)list.get(release_index<kind::rotation>{pier.value}); }) ==
          "release_index = 0 must come from this list of releases");
    std::size_t sum = 0;
    list.for_each([&](std::size_t i, const auto& one) { sum += 10 * i + (one.at() == 6.0 * m ? 1 : 2); });
    CHECK(sum == 13);
}
