// Text to quantities, and there and back again.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/format.hpp>
#include <sagitta/parse.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

/// Why a text cannot be read; an empty failure where it can.
template <class Dimension>
parse_failure failure_of(std::string_view text) {
    parse_failure failure;
    if (try_parse<Dimension>(text, failure)) return {};
    CHECK_THROWS_AS((void)parse<Dimension>(text), invalid_input);
    CHECK_FALSE(failure.found.empty());
    CHECK_FALSE(failure.expected.empty());
    CHECK(failure.offset <= text.size());
    return failure;
}

}  // namespace

TEST_CASE("each dimension") {
    CHECK(parse<dimension::length>("7.2 m") == 7.2 * m);
    CHECK(parse<dimension::length>("250 mm") == 250 * mm);
    CHECK(parse<dimension::length>("24 ft") == 24 * ft);
    CHECK(parse<dimension::length>("6 in") == 6 * in);
    CHECK(parse<dimension::force>("22 kN") == 22 * kN);
    CHECK(parse<dimension::force>("5 kip") == 5 * kip);
    CHECK(parse<dimension::moment>("8 kN*m") == 8 * kN * m);
    CHECK(relative(parse<dimension::moment>("8 kip*ft").value(), 8 * 4448.2216152605 * 0.3048) < 1e-15);
    CHECK(parse<dimension::line_load>("4.5 kN/m") == 4.5 * kN / m);
    CHECK(relative(parse<dimension::line_load>("1.5 kip/ft").value(), 1.5 * 4448.2216152605 / 0.3048) < 1e-15);
    CHECK(parse<dimension::stress>("210 GPa") == 210 * GPa);
    CHECK(relative(parse<dimension::stress>("29000 ksi").value(), 29e6 * 4.4482216152605 / (0.0254 * 0.0254)) < 1e-15);
    CHECK(relative(parse<dimension::stress>("235 N/mm2").value(), 235e6) < 1e-15);
    CHECK(parse<dimension::second_moment_of_area>("8356 cm4") == 8356 * cm4);
    CHECK(relative(parse<dimension::second_moment_of_area>("100 in^4").value(), 100 * std::pow(0.0254, 4)) < 1e-14);
    CHECK(relative(parse<dimension::second_moment_of_area>("1e6 mm4").value(), 1e-6) < 1e-15);
    CHECK(relative(parse<dimension::area>("10 cm2").value(), 1e-3) < 1e-15);
    CHECK(parse<dimension::plane_angle>("0.5 mrad") == 0.5 * mrad);
    CHECK(parse<dimension::plane_angle>("90 deg") == 90 * deg);
    CHECK(parse<dimension::flexural_rigidity>("17548 kN*m2") == 17548 * kN * m2);
    CHECK(parse<dimension::spring_stiffness>("8 kN/mm") == 8 * kN / mm);
    CHECK(parse<dimension::rotational_stiffness>("500 kN*m/rad") == 500 * kN * m / rad);
    CHECK(relative(parse<dimension::rotational_stiffness>("2 kip*ft/deg").value(),
                   2 * 4448.2216152605 * 0.3048 * 180 / std::acos(-1.0)) < 1e-15);
}

TEST_CASE("numbers as people write them") {
    CHECK(parse<dimension::length>("7.2m") == 7.2 * m);
    CHECK(parse<dimension::length>("  7.2   m  ") == 7.2 * m);
    CHECK(parse<dimension::length>("\t7.2\tm\t") == 7.2 * m);
    CHECK(parse<dimension::length>("+7.2 m") == 7.2 * m);
    CHECK(parse<dimension::length>("-7.2 m") == -7.2 * m);
    CHECK(parse<dimension::length>(".5 m") == 0.5 * m);
    CHECK(parse<dimension::length>("5. m") == 5.0 * m);
    CHECK(parse<dimension::force>("1.5e3 N") == 1.5 * kN);
    CHECK(parse<dimension::force>("1.5E+3 N") == 1.5 * kN);
    CHECK(parse<dimension::force>("15e2N") == 1.5 * kN);
}

TEST_CASE("feet and inches") {
    CHECK(parse<dimension::length>("12 ft 6 in") == 12.5 * ft);
    CHECK(parse<dimension::length>("12ft 6in") == 12.5 * ft);
    CHECK(parse<dimension::length>("0 ft 3 in") == 3 * in);
    CHECK(parse<dimension::length>("12 ft 0 in") == 12 * ft);
    CHECK(relative(parse<dimension::length>("5 ft 11.5 in").value(), 71.5 * 0.0254) < 1e-15);
    // A sign counts for both.
    CHECK(parse<dimension::length>("-12 ft 6 in") == -12.5 * ft);
    CHECK(parse<dimension::length>("-0 ft 6 in") == -6 * in);
    CHECK(parse<dimension::length>("+12 ft 6 in") == 12.5 * ft);
    for (const char* wrong :
         {"12 ft 12 in", "12 ft -6 in", "12 ft 6", "12 ft 6 mm", "12 ft 6 ft", "12 m 6 in", "12 ft 6 in 3 in",
          "12 ft nan in", "12 ft, 6 in", "12 ft in", "6 in 12 ft", "12 ft 6 kN"}) {
        CAPTURE(std::string(wrong));
        CHECK_FALSE(failure_of<dimension::length>(wrong).found.empty());
    }
    CHECK_FALSE(failure_of<dimension::force>("12 kip 6 in").found.empty());
}

TEST_CASE("what cannot be read is refused, saying what was found and what would do") {
    for (const char* wrong :
         {"",        " ",      "m",      "7.2",     "seven m",    "7,2 m",   "7.2 kN", "7.2 m2", "7.2 furlong",
          "7.2 M",   "nan m",  "inf m",  "-inf m",  "infinity m", "1e400 m", "0x10 m", "--1 m",  "+-1 m",
          "-+1 m",   "++1 m",  "+ 1 m",  "7.2 m m", "7.2 m 3",    "7.2 m,",  "7.2 m/", "7.2 m*", "7.2 /m",
          "7.2 1/m", "7.2 m0", "7.2 m^", "7.2e m",  "7.2 7.2 m",  "1 2 m",   "7.2 m\n"}) {
        CAPTURE(std::string(wrong));
        CHECK_FALSE(failure_of<dimension::length>(wrong).found.empty());
    }
    const auto other_dimension = failure_of<dimension::length>("7.2 kN");
    CHECK(other_dimension.found == "the unit 'kN'");
    CHECK(other_dimension.expected == "one of the units m, mm, cm, ft, in");
    CHECK(other_dimension.offset == 4);
    CHECK(failure_of<dimension::length>("7.2").found == "no unit");
    CHECK(failure_of<dimension::length>("+7").found == "no unit");
    CHECK(failure_of<dimension::force>("1e308 kN").expected == "a number within the range of double");
    CHECK(failure_of<dimension::length>("").found == "nothing");
    CHECK(failure_of<dimension::length>("seven m").found == "'seven m'");
    CHECK(failure_of<dimension::length>("seven m").offset == 0);
    CHECK(failure_of<dimension::length>("7.2 m extra").found == "'extra'");
    CHECK(failure_of<dimension::length>("7.2 m extra").offset == 6);
    CHECK(failure_of<dimension::force>("5 m").expected == "one of the units kN, N, MN, lbf, kip");
    CHECK_THROWS_WITH_AS((void)parse<dimension::force>("5 m"),
                         "'5 m': found the unit 'm', expected one of the units kN, N, MN, lbf, kip", invalid_input);
}

TEST_CASE("where nothing is written, a value that someone might have written is shown") {
    const auto shown = [](const parse_failure& failure, const std::string& example) {
        return failure.expected == "a number with a unit, such as '" + example + "'";
    };
    CHECK(shown(failure_of<dimension::length>(""), "7.2 m"));
    CHECK(shown(failure_of<dimension::second_moment_of_area>(""), "8356 cm4"));
    CHECK(shown(failure_of<dimension::force>(""), "22 kN"));
    CHECK(shown(failure_of<dimension::moment>(""), "8 kN*m"));
    CHECK(shown(failure_of<dimension::line_load>(""), "4.5 kN/m"));
    CHECK(shown(failure_of<dimension::stress>(""), "210 GPa"));
    CHECK(shown(failure_of<dimension::plane_angle>(""), "0.5 mrad"));
    CHECK(shown(failure_of<dimension::flexural_rigidity>(""), "1 kN*m2"));
}

TEST_CASE("a value survives writing and reading") {
    constexpr std::uint64_t seed = 81;
    CAPTURE(seed);
    scene::chance random(seed);
    for (int i = 0; i < 2000; ++i) {
        const double number = (random.toss() ? 1 : -1) * std::pow(10.0, random.in(-12, 12));
        CAPTURE(number);
        const auto same = [](const auto& back, const auto& q) { return relative(back.value(), q.value()) < 1e-15; };
        const auto a = number * m;
        CHECK(parse<dimension::length>(fmt::format("{:.17g m}", a)) == a);
        CHECK(same(parse<dimension::length>(fmt::format("{:.17g in}", a)), a));
        CHECK(same(parse<dimension::length>(fmt::format("{:.17g}", a)), a));
        const auto P = number * N;
        CHECK(parse<dimension::force>(fmt::format("{:.17g N}", P)) == P);
        CHECK(same(parse<dimension::force>(fmt::format("{:.17g kip}", P)), P));
        CHECK(same(parse<dimension::force>(fmt::format("{:.17g}", P)), P));
        const auto C = number * N * m;
        CHECK(same(parse<dimension::moment>(fmt::format("{:.17g kip*ft}", C)), C));
        const auto w = number * N / m;
        CHECK(same(parse<dimension::line_load>(fmt::format("{:.17g kip/ft}", w)), w));
        const auto E = number * Pa;
        CHECK(same(parse<dimension::stress>(fmt::format("{:.17g ksi}", E)), E));
        const auto I = number * m4;
        CHECK(same(parse<dimension::second_moment_of_area>(fmt::format("{:.17g in4}", I)), I));
        const auto r = number * rad;
        CHECK(same(parse<dimension::plane_angle>(fmt::format("{:.17g deg}", r)), r));
        const auto rigidity = quantity<dimension::flexural_rigidity>::from_value(number);
        CHECK(same(parse<dimension::flexural_rigidity>(fmt::format("{:.17g kip*in2}", rigidity)), rigidity));
    }
}
