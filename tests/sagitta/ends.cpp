// Ends, sides, and the facts of the ways to hold an end.
#include <sagitta/ends.hpp>

#include <doctest/doctest.h>

#include <type_traits>

using namespace sagitta;

TEST_CASE("the two ends are objects of two types") {
    static_assert(!std::is_same_v<decltype(end::left), decltype(end::right)>);
    static_assert(std::is_empty_v<end::left_end> && std::is_empty_v<end::right_end>);
    CHECK(just_left != just_right);
}

TEST_CASE("what each way to hold an end holds") {
    static_assert(held::fixed::against_deflection && held::fixed::against_rotation);
    static_assert(held::pinned::against_deflection && !held::pinned::against_rotation);
    static_assert(!held::free::against_deflection && !held::free::against_rotation);
}
