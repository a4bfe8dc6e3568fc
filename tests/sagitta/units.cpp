// Unit constants against their defined values, and what kinds of quantities and numbers the library takes.
// Definitions: international yard and pound agreement of 1959 (inch = 25.4 mm, pound = 0.45359237 kg), standard
// gravity 9.80665 m/s2 (CGPM 1901), and the decimal prefixes of SI.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <boost/multiprecision/cpp_int.hpp>
#include <boost/units/base_units/us/foot.hpp>
#include <boost/units/make_scaled_unit.hpp>
#include <boost/units/systems/cgs/length.hpp>
#include <boost/units/systems/si.hpp>
#include <boost/units/systems/si/prefixes.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <cstdint>
#include <limits>
#include <numbers>
#include <random>
#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;
using boost::multiprecision::cpp_rational;
using precise = boost::multiprecision::cpp_bin_float_50;

namespace {

/// The double that is nearest to a fraction.
double nearest(const cpp_rational& exact) {
    return static_cast<double>(boost::multiprecision::cpp_bin_float_100(exact));
}

const cpp_rational inch(254, 10000);
const cpp_rational foot = 12 * inch;
const cpp_rational pound_force = cpp_rational(45359237, 100000000) * cpp_rational(980665, 100000);

const cpp_rational two_to_52(std::int64_t(1) << 52);

/// A unit constant is the double nearest to its definition.
template <class Unit>
void check(Unit unit, const cpp_rational& exact) {
    CHECK((1.0 * unit).value() == nearest(exact));
    // Other values are rounded two more times at most: as products, and as quotients.
    std::mt19937_64 random(5);
    for (int i = 0; i < 200; ++i) {
        const double number = std::ldexp(static_cast<double>(random() >> 11U), -50);
        const cpp_rational error = cpp_rational((number * unit).value()) - cpp_rational(number) * exact;
        const cpp_rational ulps = abs(error) / (cpp_rational(number) * exact) * two_to_52;
        CHECK(ulps < 1);
        // There and back again.
        CHECK(std::abs(number * unit / unit - number) <= 2 * std::numeric_limits<double>::epsilon() * number);
    }
}

}  // namespace

TEST_CASE("units of length") {
    check(m, 1);
    check(cm, cpp_rational(1, 100));
    check(mm, cpp_rational(1, 1000));
    check(km, 1000);
    check(in, inch);
    check(ft, foot);
    static_assert(1.0 * in == 25.4 * mm);
    static_assert(1.0 * ft == 12.0 * in);
    static_assert((1.0 * in).value() == 0.0254);
}

TEST_CASE("units of force") {
    check(N, 1);
    check(kN, 1000);
    check(MN, 1000000);
    check(lbf, pound_force);
    check(kip, 1000 * pound_force);
    static_assert((1.0 * lbf).value() == 4.4482216152605);
}

TEST_CASE("units of stress") {
    check(Pa, 1);
    check(kPa, 1000);
    check(MPa, 1000000);
    check(GPa, 1000000000);
    check(psi, pound_force / (inch * inch));
    check(ksi, 1000 * pound_force / (inch * inch));
    static_assert(std::is_same_v<decltype(1.0 * N / mm2), decltype(1.0 * MPa)>);
    CHECK(1.0 * N / mm2 == 1.0 * MPa);
}

TEST_CASE("a degree is right to the last bit") {
    const auto pi = boost::math::constants::pi<precise>();
    CHECK((1.0 * deg).value() == static_cast<double>(pi / 180));
    CHECK((180.0 * deg).value() == std::numbers::pi);
    CHECK((90.0 * deg).value() == std::numbers::pi / 2);
    CHECK((1.0L * deg).value() == static_cast<long double>(pi / 180));
    CHECK((180.0L * deg).value() == std::numbers::pi_v<long double>);
    CHECK((1.0F * deg).value() == static_cast<float>(pi / 180));
    const precise degree = (precise(1) * deg).value();
    CHECK(abs(degree - pi / 180) <= std::numeric_limits<precise>::epsilon() * degree);
    for (int i = 1; i <= 360; ++i) {
        const double exact = static_cast<double>(pi * i / 180);
        CHECK(std::abs((i * deg).value() - exact) <= std::numeric_limits<double>::epsilon() * exact);
    }
    check(rad, 1);
    check(mrad, cpp_rational(1, 1000));
}

TEST_CASE("units of areas and second moments") {
    check(m2, 1);
    check(cm2, cpp_rational(1, 10000));
    check(mm2, cpp_rational(1, 1000000));
    check(in2, inch * inch);
    check(m4, 1);
    static_assert(std::is_same_v<decltype(1.0 * m4)::unit_type, dimension::second_moment_of_area>);
    check(cm4, cpp_rational(1, 100000000));
    check(mm4, cpp_rational(1, 1000000) * cpp_rational(1, 1000000));
    check(in4, inch * inch * inch * inch);
}

TEST_CASE("products and quotients of units") {
    check(kN / m, 1000);
    check(kip / ft, 1000 * pound_force / foot);
    check(lbf / ft, pound_force / foot);
    check(kN * m, 1000);
    check(kip * ft, 1000 * pound_force * foot);
    check(kip * in, 1000 * pound_force * inch);
    check(kip * in2, 1000 * pound_force * inch * inch);
    check(N / mm, 1000);
    static_assert(std::is_same_v<decltype(1.0 * kN / m)::unit_type, dimension::line_load>);
    static_assert(std::is_same_v<decltype(1.0 * kip / ft)::unit_type, dimension::line_load>);
    static_assert(std::is_same_v<decltype(1.0 * kN * m)::unit_type, dimension::moment>);
    static_assert(std::is_same_v<decltype(1.0 * kip * ft)::unit_type, dimension::moment>);
    static_assert(std::is_same_v<decltype(1.0 * GPa * cm4)::unit_type, dimension::flexural_rigidity>);
    static_assert(std::is_same_v<decltype(210.0 * GPa * (8356.0 * cm4))::unit_type, dimension::flexural_rigidity>);
    // Known value of E = 29000 ksi: 199.948 GPa (common practice).
    CHECK(relative(29000.0 * ksi / GPa, 199.948) < 1e-6);
}

TEST_CASE("a quantity over a unit of its dimension is a plain number") {
    static_assert(std::is_same_v<decltype(7.2 * m / mm), double>);
    static_assert(7.2 * m / mm == 7200.0);
    static_assert(3.0 * kN / N == 3000.0);
    static_assert(8.0 * ft / in == 96.0);
    static_assert(std::is_same_v<decltype(1.0F * m / mm), float>);
    static_assert(std::is_same_v<decltype(6.0 * kN / m)::unit_type, dimension::line_load>);
    static_assert(6.0 * kN / (2.0 * m) == 3.0 * kN / m);
}

TEST_CASE("a quantity knows its dimension, a plain number has none") {
    static_assert(detail::has_dimension<decltype(1.0 * m), dimension::length>);
    static_assert(detail::has_dimension<decltype(1.0F * ft), dimension::length>);
    static_assert(!detail::has_dimension<decltype(1.0 * m), dimension::force>);
    static_assert(!detail::has_dimension<double, dimension::length>);
}

TEST_CASE("integers become doubles, so that nothing is truncated") {
    static_assert(std::is_same_v<decltype(7 * m), quantity<dimension::length>>);
    static_assert(7 * m / 2 == 3.5 * m);
    static_assert(m.size == detail::scale{});
    static_assert(25 * mm == 2.5 * cm);
    static_assert(3 * (1 * m) == 3.0 * m);
    static_assert((1 * m) * 3 == 3.0 * m);
    static_assert(std::is_same_v<decltype(std::int8_t(1) * m), quantity<dimension::length>>);
    static_assert(std::is_same_v<decltype(1U * m), quantity<dimension::length>>);
    static_assert(7.2 * m / 250 == 28.8 * mm);
}

TEST_CASE("a number of another floating-point type takes the wider type") {
    static_assert(std::is_same_v<decltype(2.0F * (1.0 * m)), quantity<dimension::length, double>>);
    static_assert(std::is_same_v<decltype((1.0F * m) * 2.0), quantity<dimension::length, double>>);
    static_assert(std::is_same_v<decltype((1.0F * m) * 2), quantity<dimension::length, float>>);
    static_assert(std::is_same_v<decltype((1.0F * m) / 2), quantity<dimension::length, float>>);
    static_assert(std::is_same_v<decltype((1.0L * m) / 2.0), quantity<dimension::length, long double>>);
}

TEST_CASE("the magnitude of a quantity") {
    static_assert(abs(-3.0 * mm) == 3.0 * mm);
    static_assert(abs(3.0 * mm) == 3.0 * mm);
    static_assert(abs(-2.0F * kN) == 2.0F * kN);
}

TEST_CASE("a quantity is as small as its number") {
    static_assert(sizeof(quantity<dimension::length>) == sizeof(double));
    static_assert(sizeof(quantity<dimension::flexural_rigidity, float>) == sizeof(float));
    static_assert(sizeof(simple_beam(1.0 * m, 1.0 * kN * m2)) == 2 * sizeof(double));
    static_assert(sizeof(point_load(1.0 * kN, at(1.0 * m))) == 2 * sizeof(double));
    static_assert(sizeof(uniform_load(1.0 * kN / m)) <= 2 * sizeof(double));
}

TEST_CASE("quantities of Boost.Units are accepted in any unit of the right dimension") {
    namespace bu = boost::units;
    constexpr auto EI = 1.0e4 * kN * m2;
    constexpr auto expected = simple_beam(7.2 * m, EI).under(point_load(22.0 * kN, at(3.0 * m))).deflection(3.6 * m);

    const auto span = 7.2 * bu::si::meters;
    const auto load = 22000.0 * bu::si::newtons;
    const auto rigidity = 1.0e7 * bu::si::newtons * bu::si::square_meters;
    const auto plain = simple_beam(span, rigidity).under(point_load(load, at(3.0 * bu::si::meters)));
    CHECK(plain.deflection(3.6 * bu::si::meters) == expected);

    using centimetre = bu::make_scaled_unit<bu::si::length, bu::scale<10, bu::static_rational<-2>>>::type;
    const bu::quantity<centimetre> scaled = 720.0 * centimetre();
    CHECK(relative(simple_beam(scaled, EI).span().value(), 7.2) < 1e-15);
    const bu::quantity<bu::cgs::length> cgs = 720.0 * bu::cgs::centimeters;
    CHECK(relative(simple_beam(cgs, EI).span().value(), 7.2) < 1e-15);
    using us_foot = bu::us::foot_base_unit::unit_type;
    const bu::quantity<us_foot> feet = 10.0 * us_foot();
    CHECK(relative(simple_beam(feet, EI).span().value(), 3.048) < 1e-15);
    using kilonewton = bu::make_scaled_unit<bu::si::force, bu::scale<10, bu::static_rational<3>>>::type;
    const auto foreign = simple_beam(scaled, EI).under(point_load(22.0 * kilonewton(), at(300.0 * centimetre())));
    CHECK(relative(foreign.deflection(360.0 * centimetre()).value(), expected.value()) < 1e-14);
    // Numbers that are integers do not truncate on the way.
    const bu::quantity<centimetre, int> whole = 725 * centimetre();
    CHECK(relative(simple_beam(whole, EI).span().value(), 7.25) < 1e-15);
    // The system of units is the library's own (short names in messages); Boost's converts to it and back by itself.
    const quantity<dimension::length> ours = span;
    const bu::quantity<bu::si::length> theirs = expected;
    const bu::quantity<bu::si::energy> moment = plain.moment(3.0 * m);
    CHECK(ours == 7.2 * m);
    CHECK(theirs.value() == expected.value());
    CHECK(moment.value() == plain.moment(3.0 * m).value());
    static_assert(std::is_same_v<bu::get_dimension<dimension::flexural_rigidity>::type,
                                 bu::get_dimension<decltype(rigidity)::unit_type>::type>);
    // Results convert to any unit.
    CHECK(relative(bu::quantity<centimetre>(expected).value(), 100 * expected.value()) < 1e-14);
}

TEST_CASE("other number types go through the library") {
    // P a^2 b^2/(3 EI L) under the load, AISC Steel Construction Manual table 3-23 case 8, from memory.
    const auto under_load = [](auto one) {
        using T = decltype(one);
        const T L = 8;
        const T a = 3;
        const auto b = simple_beam(L * m, T(1000) * kN * m2);
        const auto line = b.under(point_load(T(6) * kN, at(a * m)));
        static_assert(std::is_same_v<decltype(line.deflection(a * m)), quantity<dimension::length, T>>);
        static_assert(std::is_same_v<typename decltype(b)::number, T>);
        const T exact = T(6) * 9 * 25 / (T(3) * 1000 * 8);
        const T error = line.deflection(a * m).value() / exact - 1;
        return error < 0 ? T(-error) : error;
    };
    CHECK(under_load(1.0F) < 4 * std::numeric_limits<float>::epsilon());
    CHECK(under_load(1.0) < 4 * std::numeric_limits<double>::epsilon());
    CHECK(under_load(1.0L) < 4 * std::numeric_limits<long double>::epsilon());
    CHECK(under_load(precise(1)) < 4 * std::numeric_limits<precise>::epsilon());

    static_assert(std::is_same_v<decltype(simple_beam(1.0F * m, 1.0 * kN * m2))::number, double>);
    static_assert(std::is_same_v<
                  decltype(simple_beam(1.0F * m, 1.0F * kN * m2).under(uniform_load(1.0F * kN / m)).moment(0.5F * m)),
                  quantity<dimension::moment, float>>);
    constexpr float in_float =
        simple_beam(8.0F * m, 1000.0F * kN * m2).under(uniform_load(1.0F * kN / m)).moment(4.0F * m).value();
    static_assert(in_float == 8000.0F);
}
