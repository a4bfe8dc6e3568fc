// Shapes are polynomials in two distances; here against the same polynomials written out, in rational numbers.
#include <sagitta/detail/shape.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <type_traits>

using sagitta::detail::derivative_t;
using sagitta::detail::shape;
using number = boost::multiprecision::cpp_rational;

namespace {

template <class Shape>
number at(const number& n) {
    const number f = 1 - n;
    return Shape::value(n, f);
}

/// The derivative by a five-point difference, which is exact for polynomials up to the fourth degree.
template <class Shape>
number difference(const number& n) {
    const number h(1, 16);
    const auto value = [&](int k) { return at<Shape>(n + k * h); };
    return (value(-2) - 8 * value(-1) + 8 * value(1) - value(2)) / (12 * h);
}

template <class Shape>
void check_derivatives() {
    for (const number& n : {number(1, 3), number(2, 7), number(9, 10)}) {
        CHECK(at<derivative_t<Shape, 1>>(n) == difference<Shape>(n));
        CHECK(at<derivative_t<Shape, 2>>(n) == difference<derivative_t<Shape, 1>>(n));
        CHECK(at<derivative_t<Shape, 3>>(n) == difference<derivative_t<Shape, 2>>(n));
        CHECK(at<derivative_t<Shape, 4>>(n) == 0);
    }
}

}  // namespace

TEST_CASE("a shape is the sum of its terms over its divisor") {
    const number n(2, 7);
    const number f(5, 7);
    const number general = (2 * f * f * f - 3 * n * f * f + 5 * n * n * f + 7 * n * n * n) / 6;
    CHECK(shape<6, 2, -3, 5, 7>::value(n, f) == general);
    // Leading and trailing zeros are factors n and f.
    CHECK(shape<6, 0, 2, 1, 0>::value(n, f) == n * f * (2 * f + n) / 6);
    CHECK(shape<-2, 0, 0, 3, 0>::value(n, f) == -3 * n * n * f / 2);
    CHECK(shape<4, 0, 0, 0, 3>::value(n, f) == 3 * n * n * n / 4);
    CHECK(shape<5, 3, 0, 0, 2>::value(n, f) == (3 * f * f * f + 2 * n * n * n) / 5);
    CHECK(shape<1, 1, 1>::value(n, f) == 1);
    CHECK(shape<-3, 2>::value(n, f) == number(-2, 3));
    CHECK(shape<7, 0, 0, 0>::value(n, f) == 0);
    CHECK(shape<1, 0, 4, 0>::value(n, f) == 4 * n * f);
    CHECK(shape<6, 4, 2>::value(n, f) == (4 * f + 2 * n) / 6);
    static_assert(shape<7, 0, 0, 0>::is_zero && !shape<1, 1, 1>::is_zero && !shape<6, 0, 2, 0>::is_zero);
}

TEST_CASE("a stretch seen from the other end") {
    constexpr sagitta::detail::fractions<double> seen{0.25, 0.75, 0.125};
    constexpr auto other = seen.mirrored();
    static_assert(other.near == 0.75 && other.far == 0.25 && other.width == 0.125);
}

TEST_CASE("derivatives with respect to the nearer distance") {
    check_derivatives<shape<6, 2, -3, 5, 7>>();
    check_derivatives<shape<6, 0, 2, 1, 0>>();
    check_derivatives<shape<-1, 0, 1, 0, 0>>();
    check_derivatives<shape<2, 2, 6, 3, 0>>();
    check_derivatives<shape<-2, 1, 0, 0>>();
    check_derivatives<shape<1, 1, 0>>();
    check_derivatives<shape<3, 2>>();
    static_assert(std::is_same_v<derivative_t<shape<6, 1, 2>, 0>, shape<6, 1, 2>>);
}

TEST_CASE("shapes keep their digits beside both ends, and are constexpr in any number type") {
    using row = shape<4, 0, 1, 0, 0>;  // n f^2 / 4
    static_assert(row::value(0.0, 1.0) == 0.0);
    static_assert(row::value(1.0, 0.0) == 0.0);
    static_assert(row::value(0.5, 0.5) == 0.03125);
    static_assert(row::value(0.5F, 0.5F) == 0.03125F);
    static_assert(row::value(0.5L, 0.5L) == 0.03125L);
    constexpr double tiny = 0x1p-500;
    static_assert(row::value(1.0, tiny) == 0x1p-1000 / 4);
}
