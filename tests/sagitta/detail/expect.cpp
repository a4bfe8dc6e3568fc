// Arguments of any unit of the right dimension become coherent quantities of one number type.
#include <sagitta/detail/expect.hpp>

#include <boost/units/make_scaled_unit.hpp>

#include <doctest/doctest.h>

#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;
using namespace sagitta::detail;

TEST_CASE("quantities pass, in the number type that is asked for") {
    static_assert(std::is_same_v<decltype(expect_length<float>(1.0 * m)), quantity<dimension::length, float>>);
    static_assert(expect_length<double>(3.0F * m) == 3.0 * m);
    static_assert(expect_force<double>(1.0 * kip) == 1.0 * kip);
    static_assert(expect_moment<double>(1.0 * kN * m) == 1.0 * kN * m);
    static_assert(expect_line_load<double>(1.0 * kN / m) == 1.0 * kN / m);
    static_assert(expect_angle<double>(1.0 * deg) == 1.0 * deg);
    static_assert(expect_rigidity<double>(1.0 * GPa * cm4) == 1.0 * GPa * cm4);
    static_assert(expect_spring_stiffness<double>(1.0 * kN / mm) == 1.0 * kN / mm);
    static_assert(expect_rotational_stiffness<double>(1.0 * kN * m / rad) == 1.0 * kN * m / rad);
}

TEST_CASE("another unit of the dimension is converted, integers without loss") {
    using millimetre =
        boost::units::make_scaled_unit<length, boost::units::scale<10, boost::units::static_rational<-3>>>::type;
    const boost::units::quantity<millimetre, int> whole = 1500 * millimetre();
    CHECK(expect_length<double>(whole) == 1.5 * m);
}

TEST_CASE("dimensions are told apart, units of one dimension are not") {
    static_assert(has_dimension<quantity<dimension::length>, dimension::length>);
    static_assert(has_dimension<quantity<dimension::length, int>, dimension::length>);
    static_assert(!has_dimension<quantity<dimension::force>, dimension::length>);
    static_assert(!has_dimension<double, dimension::length>);
    static_assert(!has_dimension<quantity<dimension::moment>, dimension::force>);
    static_assert(
        std::is_same_v<common_number<quantity<dimension::length, float>, quantity<dimension::force, int>>, double>);
    static_assert(
        std::is_same_v<common_number<quantity<dimension::length, float>, quantity<dimension::force, float>>, float>);
}
