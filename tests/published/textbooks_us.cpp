// Worked examples of textbooks in feet, inches and pounds, read as recomputed in public companions to the books.
// A result "EI x deflection" is the deflection of a beam of EI = 1 lbf ft^2 (or kip ft^2).
#include "support/published.hpp"

#include <sagitta/core.hpp>

using namespace sagitta;
using namespace sagitta::units;
using published::printed;
using published::row;
using published::source;

namespace {

const source pytel{"Pytel and Kiusalaas, Mechanics of Materials (2nd ed.), Ch. 6 and 7"};
const source hibbeler{"R. C. Hibbeler, Mechanics of Materials, Ch. 12"};
const source levinson{"I. J. Levinson, Statics and Strength of Materials, Ch. 13"};
const source junnarkar{"S. B. Junnarkar, Mechanics of Structures, Ch. 6"};

constexpr auto lbf_ft2 = 1.0 * lbf * ft * ft;
constexpr auto kip_ft2 = 1.0 * kip * ft * ft;

}  // namespace

TEST_CASE("Pytel and Kiusalaas, in US units") {
    const auto line_1 = cantilever(8.0 * ft, 29e6 * psi * 285.0 * in4).under(uniform_load(400.0 * lbf / ft));
    row(pytel, "example 6.1: max deflection, in").meets("0.0428", greatest_deflection(line_1).value / in);

    // Example 6.10: the overhang of 4 ft turns with its support, where it holds the span of 10 ft with 120 lbf ft
    // hogging, and bends as a cantilever. (The companion prints the unit as lb ft^2.)
    const auto overhang = cantilever(4.0 * ft, lbf_ft2).under(point_load(30.0 * lbf, at(4.0 * ft)));
    const auto span = simple_beam(10.0 * ft, lbf_ft2)
                          .under(point_load(150.0 * lbf, at(4.0 * ft)) +
                                 applied_couple(-overhang.end_moment(end::left), at(10.0 * ft)));
    const double upward = -(span.slope(10.0 * ft) / rad * 4.0 + overhang.deflection(4.0 * ft) / ft);
    row(pytel, "example 6.10: EI x upward deflection at D, lbf ft^3").meets("1120", upward);
}

TEST_CASE("Hibbeler, in US units") {
    // Example 12.12: an overhang of 12 ft with 5 kip at its end, on a span of 12 ft.
    constexpr auto EI = 29e3 * ksi * 125.0 * in4;
    const auto overhang = cantilever(12.0 * ft, EI).under(point_load(5.0 * kip, at(12.0 * ft)));
    const auto span = simple_beam(12.0 * ft, EI).under(applied_couple(-overhang.end_moment(end::left), at(12.0 * ft)));
    const double deflection = span.slope(12.0 * ft) / rad * 144.0 + overhang.deflection(12.0 * ft) / in;
    row(hibbeler, "example 12.12: deflection at C, in").meets("2.75", deflection);
}

TEST_CASE("Levinson") {
    const auto line_2 = cantilever(8.0 * ft, 1.5e6 * psi * 50.0 * in4).under(uniform_load(84.8 * lbf / ft));
    row(levinson, "example 13.2: deflection of the free end, in").meets("1.00", line_2.deflection(8.0 * ft) / in);

    const auto line_3 =
        cantilever(7.0 * ft, lbf_ft2).under(partial_uniform_load(50.0 * lbf / ft, between(2.0 * ft, 7.0 * ft)));
    row(levinson, "example 13.3: EI x deflection of the free end, lbf ft^3")
        .meets({"14600", 3}, line_3.deflection(7.0 * ft) / ft);

    const auto line_5 =
        cantilever(8.0 * ft, lbf_ft2).under(uniform_load(180.0 * lbf / ft) + point_load(1200.0 * lbf, at(6.0 * ft)));
    row(levinson, "example 13.5: EI x deflection of the free end, lbf ft^3")
        .meets({"222000", 3}, line_5.deflection(8.0 * ft) / ft);

    const auto line_6 = fixed_beam(16.0 * ft, kip_ft2)
                            .under(partial_uniform_load(3.0 * kip / ft, between(0.0 * ft, 8.0 * ft)) +
                                   point_load(6.0 * kip, at(8.0 * ft)));
    row(levinson, "example 13.6: EI x midspan deflection, kip ft^3").meets("384", line_6.deflection(8.0 * ft) / ft);
}

TEST_CASE("Junnarkar") {
    const auto line_1 = cantilever(5.0 * ft, 1.5e6 * psi * (3.0 * 6.0 * 6.0 * 6.0 / 12.0) * in4)
                            .under(partial_uniform_load(120.0 * lbf / ft, between(0.0 * ft, 3.0 * ft)) +
                                   point_load(150.0 * lbf, at(5.0 * ft)));
    row(junnarkar, "example 1: deflection of the free end, in").meets("0.1823", line_1.deflection(5.0 * ft) / in);

    constexpr auto ton = 2240.0 * lbf;  // the long ton
    const auto line_7 =
        simple_beam(20.0 * ft, 13000.0 * ton / in2 * 220.0 * in4).under(point_load(5.0 * ton, at(16.0 * ft)));
    const auto lowest = greatest_deflection(line_7);
    row(junnarkar, "example 7: location of max deflection, ft").meets("11.31", lowest.at / ft);
    row(junnarkar, "example 7: max deflection, in").meets("0.2917", lowest.value / in);
    // The printed midspan deflection is greater than the greatest. By hand: P b (3 L^2 - 4 b^2)/48 EI, b = 4 ft.
    const double by_hand = 5.0 * 48 * (3.0 * 240 * 240 - 4.0 * 48 * 48) / (48.0 * 13000 * 220);
    row(junnarkar, "example 7: midspan deflection, in").is_misprint("0.624", line_7.deflection(10.0 * ft) / in);
    CHECK(line_7.deflection(10.0 * ft) / in == doctest::Approx(by_hand).epsilon(1e-12));
    CHECK(line_7.deflection(10.0 * ft) < lowest.value);
}
