// Units as text.
#include <sagitta/detail/unit_text.hpp>

#include <doctest/doctest.h>

#include <string>

using namespace sagitta;
using namespace sagitta::detail;

namespace {

template <class Dimension, scale Size>
bool means(std::string_view text, unit_constant<Dimension, Size>) {
    const auto unit = read_unit(text);
    return unit.known && unit.powers == powers_of<Dimension> && unit.size == Size;
}

}  // namespace

TEST_CASE("units read as the constants of the same name") {
    using namespace units;
    CHECK(means("m", m));
    CHECK(means("ft", ft));
    CHECK(means("kip", kip));
    CHECK(means("ksi", ksi));
    CHECK(means("mrad", mrad));
    CHECK(means("kN*m", kN * m));
    CHECK(means("m*kN", kN * m));
    CHECK(means("kN/m", kN / m));
    CHECK(means("kip/ft", kip / ft));
    CHECK(means("cm4", cm4));
    CHECK(means("cm^4", cm4));
    CHECK(means("cm2*cm2", cm4));
    CHECK(means("N/mm2", N / mm2));
    CHECK(means("N/mm^2", N / mm2));
    CHECK(means("N/mm/mm", N / mm2));
    CHECK(means("kN*m2", kN * m2));
    CHECK(means("kip*in2", kip * in2));
    CHECK(means("kN*m/rad", kN * m / rad));
    CHECK(means("kN/mm", kN / mm));
    CHECK(means("m/m*kN", kN));
    CHECK(means("mm1", mm));
    static_assert(read_unit("kN*m").known);
}

TEST_CASE("what is no unit is not known") {
    for (const char* text :
         {"",   " ",  "meter", "kn", "KN", "M", "mm m", "m**2", "m^",   "m^0",  "m0",  "m-1",   "m^-1", "*m",
          "/m", "m*", "m/",    "2",  "2m", "1", "1/",   "m.",   "kN m", "m^^2", "kN*", "kN//m", "m22"}) {
        CAPTURE(std::string(text));
        CHECK_FALSE(read_unit(text).known);
    }
}

TEST_CASE("the usual units of each dimension are units of that dimension") {
    const auto check = [](const dimension_powers& powers) {
        std::string list(usual_units(powers));
        CHECK_FALSE(list.empty());
        list += ' ';
        for (std::size_t at = 0; at < list.size();) {
            const auto stop = list.find(' ', at);
            const auto name = list.substr(at, stop - at);
            CAPTURE(name);
            const auto unit = read_unit(name);
            CHECK(unit.known);
            CHECK(unit.powers == powers);
            at = stop + 1;
        }
    };
    check(powers_of<dimension::length>);
    check(powers_of<dimension::area>);
    check(powers_of<dimension::second_moment_of_area>);
    check(powers_of<dimension::force>);
    check(powers_of<dimension::moment>);
    check(powers_of<dimension::line_load>);
    check(powers_of<dimension::stress>);
    check(powers_of<dimension::flexural_rigidity>);
    check(powers_of<dimension::plane_angle>);
    check(powers_of<dimension::spring_stiffness>);
    check(powers_of<dimension::rotational_stiffness>);
    check(powers_of<dimension::curvature>);
    // Section moduli, and what force, couple and line load make a beam do: powers of force, length, angle.
    for (const dimension_powers powers :
         {dimension_powers{0, 3, 0}, dimension_powers{-1, 1, 0}, dimension_powers{-1, 0, 0}, dimension_powers{-1, 0, 1},
          dimension_powers{-1, -1, 1}, dimension_powers{0, -1, 1}}) {
        check(powers);
    }
    CHECK(usual_units({3, 0, 0}).empty());
}

TEST_CASE("dimensions as powers of force, length and angle") {
    static_assert(powers_of<dimension::length> == dimension_powers{0, 1, 0});
    static_assert(powers_of<dimension::force> == dimension_powers{1, 0, 0});
    static_assert(powers_of<dimension::moment> == dimension_powers{1, 1, 0});
    static_assert(powers_of<dimension::line_load> == dimension_powers{1, -1, 0});
    static_assert(powers_of<dimension::stress> == dimension_powers{1, -2, 0});
    static_assert(powers_of<dimension::flexural_rigidity> == dimension_powers{1, 2, 0});
    static_assert(powers_of<dimension::plane_angle> == dimension_powers{0, 0, 1});
    static_assert(powers_of<dimension::rotational_stiffness> == dimension_powers{1, 1, -1});
    static_assert(powers_of<dimension::dimensionless> == dimension_powers{});
}
