// The whole library in float.
#include <support/number_types.hpp>

TEST_CASE("float: every answer within 32 units of last place (4e-6) of the greatest value") {
    constexpr double ulps = 32;
    static_assert(ulps * std::numeric_limits<float>::epsilon() < 4e-6);
    number_types::check<float>(ulps);
}

TEST_CASE("a float stays a float") {
    using namespace sagitta;
    using namespace sagitta::units;
    constexpr auto line = fixed_beam(7.25F * m, 8.0F * GPa * (2.0F * cm4)).under(uniform_load(2.0F * kN / m));
    static_assert(std::is_same_v<decltype(line.deflection(1.0F * m))::value_type, float>);
    static_assert(greatest_deflection(line).value > 0.0F * m);
    static_assert(std::is_same_v<decltype(line)::number, float>);
}
