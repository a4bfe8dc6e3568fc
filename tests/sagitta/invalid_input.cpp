// Values that are wrong at run time: each is refused by a sentence that names the argument, its value with unit,
// and the bound. Nothing is clamped.
#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>

#include <sagitta/core.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <limits>
#include <stdexcept>
#include <string>
#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr double not_a_number = std::numeric_limits<double>::quiet_NaN();
constexpr double infinity = std::numeric_limits<double>::infinity();

/// True where a text holds all parts, in this order.
bool holds(const std::string& text, std::initializer_list<const char*> parts) {
    std::size_t at = 0;
    for (const char* part : parts) {
        at = text.find(part, at);
        if (at == std::string::npos) return false;
    }
    return true;
}

#define CHECK_REFUSED(expression, ...)                                 \
    do {                                                               \
        const std::string said = refusal([&] { (void)(expression); }); \
        CAPTURE(said);                                                 \
        CHECK(holds(said, {__VA_ARGS__}));                             \
    } while (false)

constexpr auto EI = 1.0e4 * kN * m2;
constexpr auto joist = simple_beam(6.0 * m, EI);

}  // namespace

TEST_CASE("an invalid_input is a std::invalid_argument") {
    static_assert(std::is_base_of_v<std::invalid_argument, invalid_input>);
    CHECK_THROWS_AS((void)simple_beam(0.0 * m, EI), std::invalid_argument);
}

TEST_CASE("the span of a beam") {
    CHECK_REFUSED(simple_beam(0.0 * m, EI), "span = 0 m", "greater than 0 m");
    CHECK_REFUSED(cantilever(-1.5 * m, EI), "span = -1.5 m", "greater than 0 m");
    CHECK_REFUSED(fixed_beam(not_a_number * m, EI), "span = nan m", "greater than 0 m");
    CHECK_REFUSED(propped_cantilever(infinity * m, EI), "span = inf m", "finite");
    CHECK_REFUSED(simple_beam(-300.0 * mm, EI), "span = -0.3 m");
}

TEST_CASE("the flexural rigidity of a beam") {
    CHECK_REFUSED(simple_beam(1.0 * m, 0.0 * EI), "EI = 0 N*m^2", "greater than 0 N*m^2");
    CHECK_REFUSED(cantilever(1.0 * m, -EI), "EI = -10000000 N*m^2", "greater than 0 N*m^2");
    CHECK_REFUSED(fixed_beam(1.0 * m, not_a_number * EI), "EI = nan N*m^2", "greater than 0 N*m^2");
    CHECK_REFUSED(propped_cantilever(1.0 * m, infinity * EI), "EI = inf N*m^2", "finite");
}

TEST_CASE("the place of a concentrated load") {
    CHECK_REFUSED(at(-0.1 * m), "at = -0.1 m", "not less than 0 m");
    CHECK_REFUSED(at(not_a_number * m), "at = nan m", "not less than 0 m");
    CHECK_REFUSED(at(-infinity * m), "at = -inf m", "not less than 0 m");
    CHECK_REFUSED(joist.under(point_load(1.0 * kN, at(6.5 * m))), "point_load: at = 6.5 m", "beyond the span", "6 m");
    CHECK_REFUSED(joist.under(applied_couple(1.0 * kN * m, at(7.0 * m))), "applied_couple: at = 7 m", "beyond the span",
                  "6 m");
    CHECK_REFUSED(joist.under(point_load(1.0 * kN, at(infinity * m))), "at = inf m");
    CHECK_REFUSED(joist.under(point_load(1.0 * kN, at(std::nextafter(6.0, 7.0) * m))), "point_load: at");
    CHECK_NOTHROW((void)joist.under(point_load(1.0 * kN, at(6.0 * m))));
    CHECK_NOTHROW((void)joist.under(point_load(1.0 * kN, at(0.0 * m))));
    CHECK_NOTHROW((void)joist.under(point_load(1.0 * kN, at(-0.0 * m))));
}

TEST_CASE("the stretch of a line load") {
    CHECK_REFUSED(between(-0.1 * m, 1.0 * m), "between: from = -0.1 m", "not less than 0 m");
    CHECK_REFUSED(between(not_a_number * m, 1.0 * m), "between: from = nan m");
    CHECK_REFUSED(between(2.0 * m, 2.0 * m), "between: to = 2 m", "greater than", "2 m");
    CHECK_REFUSED(between(2.0 * m, 1.0 * m), "between: to = 1 m", "greater than", "2 m");
    CHECK_REFUSED(between(2.0 * m, not_a_number * m), "between: to = nan m", "greater than", "2 m");
    CHECK_REFUSED(joist.under(partial_uniform_load(1.0 * kN / m, between(1.0 * m, 6.5 * m))), "between: to = 6.5 m",
                  "beyond the span", "6 m");
    CHECK_REFUSED(joist.under(linear_load(1.0 * kN / m, 2.0 * kN / m, between(7.0 * m, 8.0 * m))), "between: to = 8 m",
                  "beyond the span", "6 m");
    CHECK_REFUSED(joist.under(partial_uniform_load(1.0 * kN / m, between(1.0 * m, infinity * m))),
                  "between: to = inf m");
    CHECK_NOTHROW((void)joist.under(partial_uniform_load(1.0 * kN / m, between(0.0 * m, 6.0 * m))));
}

TEST_CASE("the size of a load") {
    for (const double wrong : {not_a_number, infinity, -infinity}) {
        CAPTURE(wrong);
        const std::string value = std::isnan(wrong) ? "nan" : wrong > 0 ? "inf" : "-inf";
        CHECK_REFUSED(point_load(wrong * kN, at(1.0 * m)), "point_load", (value + " N").c_str(), "finite");
        CHECK_REFUSED(applied_couple(wrong * kN * m, at(1.0 * m)), "applied_couple", (value + " N*m").c_str(),
                      "finite");
        CHECK_REFUSED(uniform_load(wrong * kN / m), "uniform_load", (value + " N/m").c_str(), "finite");
        CHECK_REFUSED(partial_uniform_load(wrong * kN / m, between(1.0 * m, 2.0 * m)), "uniform_load",
                      (value + " N/m").c_str(), "finite");
        CHECK_REFUSED(linear_load(wrong * kN / m, 1.0 * kN / m), "linear_load", "start", (value + " N/m").c_str());
        CHECK_REFUSED(linear_load(1.0 * kN / m, wrong * kN / m), "linear_load", "end", (value + " N/m").c_str());
        CHECK_REFUSED(linear_load(1.0 * kN / m, wrong * kN / m, between(1.0 * m, 2.0 * m)), "linear_load", "end",
                      (value + " N/m").c_str());
        CHECK_REFUSED(settlement(end::left, wrong * mm), "settlement", (value + " m").c_str(), "finite");
        CHECK_REFUSED(support_rotation(end::right, wrong * rad), "support_rotation", (value + " rad").c_str(),
                      "finite");
    }
    // Any sign, and zero, is a load.
    CHECK_NOTHROW((void)point_load(-1.0 * kN, at(1.0 * m)));
    CHECK_NOTHROW((void)uniform_load(0.0 * kN / m));
}

TEST_CASE("the factor of a load") {
    const auto load = point_load(1.0 * kN, at(1.0 * m));
    const auto loads = load + uniform_load(1.0 * kN / m);
    CHECK_REFUSED(not_a_number * load, "load factor = nan", "finite");
    CHECK_REFUSED(load * infinity, "load factor = inf", "finite");
    CHECK_REFUSED(loads * not_a_number, "load factor = nan", "finite");
    CHECK_REFUSED(load / not_a_number, "load factor = nan", "finite");
    CHECK_REFUSED(load / 0.0, "load factor = inf", "finite");
    CHECK_REFUSED(load / 0, "load factor = inf", "finite");
    // Finite in parts, but not as a product.
    CHECK_REFUSED(1e308 * (10.0 * load), "point_load", "inf N", "finite");
}

TEST_CASE("a place on the elastic line") {
    const auto line = joist.under(uniform_load(1.0 * kN / m));
    CHECK_REFUSED(line.deflection(6.5 * m), "x = 6.5 m", "on the beam", "0 m", "6 m");
    CHECK_REFUSED(line.slope(-0.5 * m), "x = -0.5 m", "on the beam", "6 m");
    CHECK_REFUSED(line.moment(not_a_number * m), "x = nan m", "on the beam", "6 m");
    CHECK_REFUSED(line.shear(infinity * m), "x = inf m", "on the beam", "6 m");
    CHECK_REFUSED(line.moment(7.0 * m, just_left), "x = 7 m");
    CHECK_REFUSED(line.shear(7.0 * m, just_right), "x = 7 m");
    CHECK_REFUSED(line.load(-1.0 * m), "x = -1 m");
    CHECK_THROWS_AS((void)line.deflection(std::nextafter(6.0, 7.0) * m), invalid_input);
    CHECK_THROWS_AS((void)line.deflection(-std::numeric_limits<double>::denorm_min() * m), invalid_input);
    CHECK_NOTHROW((void)line.deflection(6.0 * m));
    CHECK_NOTHROW((void)line.deflection(-0.0 * m));
    CHECK_REFUSED(moment_area(line, 0.0 * m, 6.5 * m), "x = 6.5 m", "on the beam", "6 m");
}

TEST_CASE("values are printed so that they can be told from the bound") {
    const auto line = joist.under(uniform_load(1.0 * kN / m));
    // Seventeen digits tell any two doubles apart; more would say nothing.
    CHECK_REFUSED(line.deflection(std::nextafter(6.0, 7.0) * m), "x = 6.0000000000000009 m must");
    // One part in 10^12 beyond: with nine digits the sentence would contradict itself.
    const auto said = refusal([&] { (void)line.deflection(6.000000000006 * m); });
    CAPTURE(said);
    CHECK(holds(said, {"x = 6.0000000000", " m must", "6 m"}));
}

TEST_CASE("other number types are refused in the same words") {
    CHECK_REFUSED(simple_beam(-2.0F * m, 1.0F * kN * m2), "span = -2 m");
    CHECK_REFUSED(simple_beam(-2.0L * m, 1.0L * kN * m2), "span = -2 m");
    using precise = boost::multiprecision::cpp_bin_float_50;
    CHECK_REFUSED(simple_beam(precise(-2) * m, precise(1) * kN * m2), "span = -2 m");
    CHECK_REFUSED(simple_beam(precise(0) * m, precise(1) * kN * m2), "span = 0 m");
    CHECK_NOTHROW((void)simple_beam(precise(1) / 1000 * m, precise(1) / 1000 * kN * m2));
    CHECK_REFUSED(simple_beam(precise(2) * m, std::numeric_limits<precise>::infinity() * kN * m2), "EI = inf N*m^2");
}
