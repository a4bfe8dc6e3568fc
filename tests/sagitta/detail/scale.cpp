// Scales of units: exact powers, rounded only when a value is converted.
#include <sagitta/detail/scale.hpp>

#include <boost/math/constants/constants.hpp>
#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

using namespace sagitta::detail;
using precise = boost::multiprecision::cpp_bin_float_50;

TEST_CASE("scales multiply, divide and invert by their powers") {
    constexpr scale foot{.twelves = 1, .inches = 1};
    constexpr scale kip{.tens = 3, .pounds = 1};
    static_assert(foot * foot.inverse() == scale{});
    static_assert(kip / kip == scale{});
    static_assert(kip / foot * foot == kip);
    static_assert((kip * foot).inverse().inverse() == kip * foot);
    static_assert(!(kip == foot));
    constexpr scale degree{.degrees = 1};
    static_assert(kip * foot / degree == scale{.tens = 3, .twelves = 1, .inches = 1, .pounds = 1, .degrees = -1});
    static_assert(degree * degree == scale{.degrees = 2});
}

TEST_CASE("conversion known when compiling and at run time are the same") {
    constexpr scale kip_per_foot = scale{.tens = 3, .pounds = 1} / scale{.twelves = 1, .inches = 1};
    for (const double value : {1.0, 1.5, -7.3, 1e-9, 123456.789}) {
        CHECK(to_coherent<kip_per_foot>(value) == to_coherent(value, kip_per_foot));
    }
    static_assert(to_coherent<scale{}>(1.1) == 1.1);
    static_assert(to_coherent<scale{.tens = -3}>(1.0) == 0.001);
    static_assert(to_coherent<scale{.inches = 1}>(1.0) == 0.0254);
}

TEST_CASE("pi has the digits of its number type") {
    const auto digits = boost::math::constants::pi<precise>();
    CHECK(pi<float>() == static_cast<float>(digits));
    CHECK(pi<double>() == static_cast<double>(digits));
    CHECK(pi<long double>() == static_cast<long double>(digits));
    CHECK(abs(pi<precise>() - digits) <= std::numeric_limits<precise>::epsilon() * 4);
    // The sum of its parts is pi to half a unit in the last place of the last of them.
    using wider = boost::multiprecision::cpp_bin_float_100;
    CHECK(abs(pi<wider>() - boost::math::constants::pi<wider>()) <= ldexp(wider(1), -216));
}

TEST_CASE("integers promote, everything else stays") {
    static_assert(std::is_same_v<real_number<int>, double>);
    static_assert(std::is_same_v<real_number<unsigned char>, double>);
    static_assert(std::is_same_v<real_number<float>, float>);
    static_assert(std::is_same_v<common_real<float, int>, float>);
    static_assert(std::is_same_v<common_real<int, int>, double>);
    static_assert(std::is_same_v<common_real<float, double>, double>);
    static_assert(number_type<int> && number_type<long double> && number_type<precise>);
    static_assert(!number_type<const char*> && !number_type<scale>);
}
