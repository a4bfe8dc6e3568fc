// The whole library in 50 decimal digits, without expression templates.
#include <support/number_types.hpp>

TEST_CASE("50 digits: every answer within 32 units of last place of the greatest value") {
    using precise =
        boost::multiprecision::number<boost::multiprecision::cpp_bin_float<50>, boost::multiprecision::et_off>;
    constexpr double ulps = 32;
    CHECK(ulps * static_cast<double>(std::numeric_limits<precise>::epsilon()) < 1e-48);
    number_types::check<precise>(ulps);
}
