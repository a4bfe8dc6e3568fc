// Quantities as text.
#include <sagitta/format.hpp>

#include <doctest/doctest.h>

#include <fmt/format.h>

#include <cmath>
#include <limits>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

/// Formats with a format string that is known only at run time.
template <class Q>
std::string at_run_time(const std::string& format, const Q& q) {
    return fmt::format(fmt::runtime(format), q);
}

}  // namespace

TEST_CASE("each dimension in the units of the trade") {
    CHECK(fmt::format("{:.1f mm}", 12.34 * mm) == "12.3 mm");
    CHECK(fmt::format("{:.2f m}", 3600 * mm) == "3.60 m");
    CHECK(fmt::format("{:.3f in}", 25.4 * mm) == "1.000 in");
    CHECK(fmt::format("{:.2f ft}", 3.048 * m) == "10.00 ft");
    CHECK(fmt::format("{:.0f cm}", 3.6 * m) == "360 cm");
    CHECK(fmt::format("{:.3f km}", 3600 * m) == "3.600 km");
    CHECK(fmt::format("{:.1f kN}", 22e3 * N) == "22.0 kN");
    CHECK(fmt::format("{:.1f MN}", 22e6 * N) == "22.0 MN");
    CHECK(fmt::format("{:.3f kip}", 5000 * lbf) == "5.000 kip");
    CHECK(fmt::format("{:.2f kN*m}", 8000 * N * m) == "8.00 kN*m");
    CHECK(fmt::format("{:.2f kip*ft}", 12 * kip * in) == "1.00 kip*ft");
    CHECK(fmt::format("{:.2f kN/m}", 4.5 * N / mm) == "4.50 kN/m");
    CHECK(fmt::format("{:.2f kip/ft}", 1.5 * kip / ft) == "1.50 kip/ft");
    CHECK(fmt::format("{:.0f MPa}", 210.0 * GPa) == "210000 MPa");
    CHECK(fmt::format("{:.0f N/mm2}", 210.0 * GPa) == "210000 N/mm2");
    CHECK(fmt::format("{:.0f ksi}", 29000 * ksi) == "29000 ksi");
    CHECK(fmt::format("{:.0f psi}", 1 * ksi) == "1000 psi");
    CHECK(fmt::format("{:.0f cm4}", 8356 * cm4) == "8356 cm4");
    CHECK(fmt::format("{:.1f in4}", 200.5 * in4) == "200.5 in4");
    CHECK(fmt::format("{:.1f cm2}", 0.01 * m2) == "100.0 cm2");
    CHECK(fmt::format("{:.2f mrad}", 0.0005 * rad) == "0.50 mrad");
    CHECK(fmt::format("{:.1f deg}", 3.14159265358979 / 2 * rad) == "90.0 deg");
    CHECK(fmt::format("{:.0f kN*m2}", 210.0 * GPa * (8356.0 * cm4)) == "17548 kN*m2");
    CHECK(fmt::format("{:.3f mm/kN}", 1.0 * mm / (2.0 * kN)) == "0.500 mm/kN");
}

TEST_CASE("without a unit the usual one") {
    CHECK(fmt::format("{:.1f}", 12.3 * mm) == "12.3 mm");
    CHECK(fmt::format("{:.2f}", 3.6 * m) == "3.60 m");
    CHECK(fmt::format("{:.2f}", 1.0 * m) == "1.00 m");
    CHECK(fmt::format("{:.0f}", 999.0 * mm) == "999 mm");
    CHECK(fmt::format("{:.1f}", -12.3 * mm) == "-12.3 mm");
    CHECK(fmt::format("{:.1f}", -3.6 * m) == "-3.6 m");
    CHECK(fmt::format("{:.1f}", -1.5 * m) == "-1.5 m");
    CHECK(fmt::format("{:.1f}", -1.0 * m) == "-1.0 m");
    CHECK(fmt::format("{:.0f}", 0.0 * m) == "0 mm");
    CHECK(fmt::format("{:.1f}", 22e3 * N) == "22.0 kN");
    CHECK(fmt::format("{:.1f}", 8e3 * N * m) == "8.0 kN*m");
    CHECK(fmt::format("{:.1f}", 4.5e3 * N / m) == "4.5 kN/m");
    CHECK(fmt::format("{:.0f}", 2.1e11 * Pa) == "210000 MPa");
    CHECK(fmt::format("{:.0f}", 8356e-8 * m4) == "8356 cm4");
    CHECK(fmt::format("{:.2f}", 0.0005 * rad) == "0.50 mrad");
}

TEST_CASE("without a number part six significant digits") {
    CHECK(fmt::format("{}", 22.0 * kN) == "22 kN");
    CHECK(fmt::format("{}", 1.0 / 3.0 * kN) == "0.333333 kN");
    CHECK(fmt::format("{: kN}", 22.0 * kN) == "22 kN");
    CHECK(fmt::format("{: N}", 123456.7 * N) == "123457 N");
}

TEST_CASE("the number part is that of any number in fmt") {
    CHECK(fmt::format("{:+.1f mm}", 12.3 * mm) == "+12.3 mm");
    CHECK(fmt::format("{:8.1f mm}|", 12.3 * mm) == "    12.3 mm|");
    CHECK(fmt::format("{:<8.1f mm}|", 12.3 * mm) == "12.3     mm|");
    CHECK(fmt::format("{:>8.1f mm}|", 12.3 * mm) == "    12.3 mm|");
    CHECK(fmt::format("{:^8.1f mm}|", 12.3 * mm) == "  12.3   mm|");
    CHECK(fmt::format("{:*>8.1f mm}", 12.3 * mm) == "****12.3 mm");
    CHECK(fmt::format("{:08.1f mm}", -12.3 * mm) == "-00012.3 mm");
    CHECK(fmt::format("{:.2e N}", 123456.0 * N) == "1.23e+05 N");
    CHECK(fmt::format("{:.3g kN*m}", 8.1234 * kN * m) == "8.12 kN*m");
    CHECK(fmt::format("{:.1f mm} at {:.2f m}\n", 12.34 * mm, 3.6 * m) == "12.3 mm at 3.60 m\n");
    CHECK(fmt::format("{1:.1f m} {0:.1f kN}", 1.0 * kN, 2.0 * m) == "2.0 m 1.0 kN");
}

TEST_CASE("values that are no ordinary number") {
    CHECK(fmt::format("{:.1f kN}", std::numeric_limits<double>::infinity() * kN) == "inf kN");
    CHECK(fmt::format("{:.1f kN}", std::nan("") * kN) == "nan kN");
    CHECK(fmt::format("{:.1f mm}", -0.0 * m) == "0.0 mm");  // a zero has no sign on paper
}

TEST_CASE("other number types") {
    CHECK(fmt::format("{:.1f mm}", 12.25F * mm) == "12.2 mm");
    CHECK(fmt::format("{:.2f kN}", 12.25L * kN) == "12.25 kN");
    CHECK(fmt::format("{:.2f}", 0.5F * m) == "500.00 mm");
}

TEST_CASE("a dimension that the trade has no unit for is written in coherent units") {
    CHECK(fmt::format("{:.1f}", 2.0 * m * m * m * m * m) == "2.0 m^5");
    CHECK(fmt::format("{:.1f}", 2.0 * kN * kN) == "2000000.0 N^2");
    CHECK(fmt::format("{:.1f}", 2.0 * N / (1.0 * rad)) == "2.0 N rad^-1");
}

TEST_CASE("format strings that arrive at run time are checked when they are used") {
    CHECK(at_run_time("{:.1f mm}", 12.3 * mm) == "12.3 mm");
    for (const char* wrong :
         {"{:.1f kN}",  "{:.1f furlong}", "{:.1f mm2}", "{:.1f MM}",   "{:.1f }",     "{:.1f mm/}", "{:.1f mm*}",
          "{:.1f mm0}", "{:.1f mm^}",     "{:.1f /mm}", "{:.1f 1/mm}", "{:.1f mm-1}", "{:{}f mm}",  "{:.{}f mm}",
          "{:d mm}",    "{:x mm}",        "{:s mm}",    "{:.1f3 mm}",  "{:.1ff mm}",  "{:.1fmm}",   "{:mm}"}) {
        CAPTURE(std::string(wrong));
        CHECK_THROWS_AS(at_run_time(wrong, 12.3 * mm), fmt::format_error);
    }
    CHECK_THROWS_WITH_AS(at_run_time("{:.1f kN}", 12.3 * mm),
                         "the unit in a format string has another dimension than the quantity", fmt::format_error);
    CHECK_THROWS_AS(at_run_time("{:.1f m}", 12.3 * kN), fmt::format_error);
    CHECK_THROWS_AS(at_run_time("{:.1f kN}", 12.3 * kN * m), fmt::format_error);
    CHECK_THROWS_AS(at_run_time("{:.1f kN*m}", 12.3 * kN / m), fmt::format_error);
    CHECK_THROWS_AS(at_run_time("{:.1f rad}", 12.3 * kN), fmt::format_error);
}
