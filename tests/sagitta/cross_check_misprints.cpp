// Every coefficient and every divisor of every influence function is misprinted in turn, and cross_check must
// notice: the ends that are clamped, here; the others in cross_check_misprints_unclamped.cpp.
#include <support/misprints.hpp>

#include <sagitta/cross_check.hpp>

#include <doctest/doctest.h>

using namespace misprints;
using held::fixed;
using held::pinned;

TEST_CASE("the rows as printed pass") {
    CHECK(discrepancy<pinned, pinned>(weight + trapezium) < rounding);
    CHECK(discrepancy<pinned, fixed>(weight + trapezium) < rounding);
    CHECK(discrepancy<fixed, pinned>(weight + trapezium) < rounding);
    CHECK(discrepancy<fixed, fixed>(weight + trapezium) < rounding);
    CHECK(discrepancy<fixed, held::free>(weight + trapezium) < rounding);
    CHECK(discrepancy<held::free, fixed>(weight + trapezium) < rounding);
}

TEST_CASE("every misprinted coefficient is noticed: clamped end, pinned far end") {
    misprint_all_rows<fixed, pinned>();
}
TEST_CASE("every misprinted coefficient is noticed: clamped end, clamped far end") {
    misprint_all_rows<fixed, fixed>();
}
TEST_CASE("every misprinted coefficient is noticed: clamped end, free far end") {
    misprint_all_rows<fixed, held::free>();
}
