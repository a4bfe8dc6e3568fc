// Every row of the table of influence functions, and every shape derived from one, is exactly what the reference
// solution finds: compared in rational numbers, without any tolerance.
#include <support/reference.hpp>

#include <sagitta/detail/influence.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <utility>

using namespace sagitta;
using boost::multiprecision::cpp_rational;
using reference::hold;
using reference::quantity;

namespace {

template <class End>
constexpr hold hold_of() {
    if constexpr (End::against_deflection) return End::against_rotation ? hold::fixed : hold::pinned;
    return End::against_rotation ? hold::guided : hold::free;
}

/// A beam of span 1 and stiffness 1 under what act adds to it.
template <class Here, class There, class Act>
reference::beam<cpp_rational> solved(const Act& act) {
    reference::beam<cpp_rational> b(hold_of<Here>(), hold_of<There>(), 1, 1);
    act(b);
    b.solve();
    return b;
}

// Binary fractions: exact as doubles.
constexpr double places[] = {0, 0.0625, 0.25, 0.375, 0.5, 0.71875, 0.9375, 1};
constexpr std::pair<double, double> stretches[] = {{0, 1}, {0, 0.25}, {0.375, 0.71875}, {0.9375, 1}};

/// The two values that the end Here leaves open, by the shapes and by the reference.
template <class Here, class There, class OfShape>
void compare(const reference::beam<cpp_rational>& exact, const OfShape& of_shape) {
    const cpp_rational zero(0);
    const auto across = Here::against_deflection ? quantity::shear : quantity::deflection;
    const auto turning = Here::against_rotation ? quantity::moment : quantity::slope;
    CHECK(of_shape(detail::across_row<Here, There>()) == exact.value(across, zero, reference::from::left));
    CHECK(of_shape(detail::turning_row<Here, There>()) == exact.value(turning, zero, reference::from::left));
}

template <class Here, class There>
void compare_all() {
    for (const double a : places) {
        CAPTURE(a);
        const cpp_rational near(a);
        const cpp_rational far(1 - a);
        compare<Here, There>(solved<Here, There>([&](auto& b) { b.add_force(1, a); }),
                             [&](auto row) { return decltype(row)::value(near, far); });
        // A clockwise couple is a force at a + d/2 and an opposite one at a - d/2: the derivative.
        compare<Here, There>(solved<Here, There>([&](auto& b) { b.add_couple(1, a); }),
                             [&](auto row) { return detail::derivative_t<decltype(row), 1>::value(near, far); });
    }
    for (const auto& stretch : stretches) {
        const double from = stretch.first;
        const double to = stretch.second;
        CAPTURE(from);
        CAPTURE(to);
        const cpp_rational width(to - from);
        const cpp_rational middle((from + to) / 2);
        const detail::fractions<cpp_rational> seen{middle, 1 - middle, width};
        compare<Here, There>(solved<Here, There>([&](auto& b) { b.add_line(1, 1, from, to); }),
                             [&](auto row) { return cpp_rational(width * detail::mean_over<decltype(row)>(seen)); });
        compare<Here, There>(solved<Here, There>([&](auto& b) { b.add_line(-1, 1, from, to); }), [&](auto row) {
            return cpp_rational(width * detail::tilted_mean_over<decltype(row)>(seen));
        });
    }
    // By the reciprocal theorem the rows of a held end are also its movements as deflected shapes.
    for (const double x : places) {
        CAPTURE(x);
        const cpp_rational near(x);
        const cpp_rational far(1 - x);
        if constexpr (Here::against_deflection) {
            const auto sunk = solved<Here, There>([](auto& b) { b.add_settlement(true, 1); });
            CHECK(detail::influence<Here, There>::shear::value(near, far) == sunk.value(quantity::deflection, near));
        }
        if constexpr (Here::against_rotation) {
            const auto turned = solved<Here, There>([](auto& b) { b.add_rotation(true, 1); });
            const cpp_rational shape = detail::influence<Here, There>::moment::value(near, far);
            CHECK(-shape == turned.value(quantity::deflection, near));
        }
    }
}

}  // namespace

TEST_CASE("influence functions: pinned, the far end pinned") { compare_all<held::pinned, held::pinned>(); }
TEST_CASE("influence functions: pinned, the far end clamped") { compare_all<held::pinned, held::fixed>(); }
TEST_CASE("influence functions: clamped, the far end pinned") { compare_all<held::fixed, held::pinned>(); }
TEST_CASE("influence functions: clamped, the far end clamped") { compare_all<held::fixed, held::fixed>(); }
TEST_CASE("influence functions: clamped, the far end free") { compare_all<held::fixed, held::free>(); }
TEST_CASE("influence functions: free, the far end clamped") { compare_all<held::free, held::fixed>(); }
TEST_CASE("influence functions: guided, the far end clamped") { compare_all<held::guided, held::fixed>(); }
TEST_CASE("influence functions: clamped, the far end guided") { compare_all<held::fixed, held::guided>(); }
TEST_CASE("influence functions: guided, the far end pinned") { compare_all<held::guided, held::pinned>(); }
TEST_CASE("influence functions: pinned, the far end guided") { compare_all<held::pinned, held::guided>(); }
