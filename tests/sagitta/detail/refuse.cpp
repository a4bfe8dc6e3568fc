// Sentences of refusal, and what counts as finite.
#include <sagitta/detail/refuse.hpp>

#include <boost/numeric/interval.hpp>

#include <doctest/doctest.h>

#include <limits>

using namespace sagitta;
using namespace sagitta::units;

TEST_CASE("a refusal names argument, value with unit, bound and limit") {
    CHECK_THROWS_WITH_AS(detail::refuse("span", -1.5 * m, "must be greater than 0 m"),
                         "span = -1.5 m must be greater than 0 m", invalid_input);
    CHECK_THROWS_WITH_AS(detail::refuse("x", 3.0 * ft, "must lie on the beam, up to ", 0.5 * m),
                         "x = 0.9144 m must lie on the beam, up to 0.5 m", invalid_input);
    CHECK_THROWS_WITH_AS(detail::refuse("size", 2.0 * kN, "is wrong"), "size = 2000 N is wrong", invalid_input);
    CHECK_THROWS_WITH_AS(detail::refuse("size", 2.0 * kN * m, "is wrong"), "size = 2000 N*m is wrong", invalid_input);
    CHECK_THROWS_WITH_AS(detail::refuse("size", 2.0 * kN / m, "is wrong"), "size = 2000 N/m is wrong", invalid_input);
    CHECK_THROWS_WITH_AS(detail::refuse("size", 2.0 * mrad, "is wrong"), "size = 0.002 rad is wrong", invalid_input);
    CHECK_THROWS_WITH_AS(detail::refuse("factor", 2.5, "is wrong"), "factor = 2.5 is wrong", invalid_input);
}

TEST_CASE("an interval is shown by its middle") {
    const boost::numeric::interval<double> between(1.0, 4.0);
    CHECK(detail::as_double(between) == 2.5);
}

TEST_CASE("finite numbers") {
    static_assert(detail::is_finite(0.0));
    static_assert(detail::is_finite(-1e308));
    static_assert(detail::is_finite(7));
    CHECK_FALSE(detail::is_finite(std::numeric_limits<double>::infinity()));
    CHECK_FALSE(detail::is_finite(-std::numeric_limits<double>::infinity()));
    CHECK_FALSE(detail::is_finite(std::numeric_limits<double>::quiet_NaN()));
    CHECK_FALSE(detail::is_finite(std::numeric_limits<float>::infinity()));
}
