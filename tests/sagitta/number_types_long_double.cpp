// The whole library in long double.
#include <support/number_types.hpp>

TEST_CASE("long double: every answer within 32 units of last place of the greatest value") {
    constexpr double ulps = 32;
    // Where long double is double there is nothing to gain.
    if (std::numeric_limits<long double>::digits >= 64) {
        CHECK(ulps * static_cast<double>(std::numeric_limits<long double>::epsilon()) < 1e-17);
    }
    number_types::check<long double>(ulps);
}
