// Many places at once: the same answers as one by one, into memory of the caller's.
#include <support/doctest_quantities.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/series.hpp>

#include <doctest/doctest.h>

#include <array>
#include <span>
#include <string>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto EI = 1.0e4 * kN * m2;
constexpr auto acting =
    uniform_load(6.0 * kN / m) + point_load(3.0 * kN, at(2.0 * m)) + applied_couple(4.0 * kN * m, at(5.0 * m));

template <class Line>
void same_as_one_by_one(const Line& line) {
    // In any order, repeated, at joints and ends.
    const std::vector<quantity<dimension::length>> places{5.0 * m, 0.0 * m, 8.0 * m, 2.0 * m, 2.0 * m, 7.9 * m};
    std::vector<quantity<dimension::length>> v(places.size());
    std::vector<quantity<dimension::plane_angle>> r(places.size());
    std::vector<quantity<dimension::moment>> M(places.size());
    std::vector<quantity<dimension::force>> V(places.size());
    fill_deflections(line, places, v);
    fill_slopes(line, places, r);
    fill_moments(line, places, M);
    fill_shears(line, places, V);
    for (std::size_t i = 0; i < places.size(); ++i) {
        CHECK(v[i] == line.deflection(places[i]));
        CHECK(r[i] == line.slope(places[i]));
        CHECK(M[i] == line.moment(places[i]));
        CHECK(V[i] == line.shear(places[i]));
    }
}

}  // namespace

TEST_CASE("series on every kind of line") {
    constexpr auto b = propped_cantilever(8.0 * m, EI);
    same_as_one_by_one(b.under(acting));
    same_as_one_by_one(b.under(load_list(acting)));
    same_as_one_by_one(continuous_beam(8.0 * m, EI).clamp(end::left).support_at(3.0 * m).under(acting));
}

TEST_CASE("series when compiling") {
    constexpr auto deflected = [] {
        const auto line = simple_beam(8.0 * m, EI).under(acting);
        std::array<quantity<dimension::length>, 3> places{1.0 * m, 4.0 * m, 8.0 * m};
        std::array<quantity<dimension::length>, 3> results{};
        fill_deflections(line, places, results);
        return results;
    }();
    static_assert(deflected[1] == simple_beam(8.0 * m, EI).under(acting).deflection(4.0 * m));
    static_assert(deflected[2] == 0.0 * m);
}

TEST_CASE("no places, and other number types") {
    const auto line = simple_beam(8.0 * m, EI).under(acting);
    CHECK_NOTHROW(fill_deflections(line, std::span<const quantity<dimension::length>>{},
                                   std::span<quantity<dimension::length>>{}));
    const auto narrow = simple_beam(8.0F * m, 1.0e4F * kN * m2).under(uniform_load(6.0F * kN / m));
    const std::array<quantity<dimension::length, float>, 1> places{4.0F * m};
    std::array<quantity<dimension::moment, float>, 1> results{};
    fill_moments(narrow, places, results);
    CHECK(results[0] == narrow.moment(4.0F * m));
}

TEST_CASE("wrong lengths and places are refused") {
    const auto line = simple_beam(8.0 * m, EI).under(acting);
    const std::vector<quantity<dimension::length>> places{1.0 * m, 9.0 * m};
    std::vector<quantity<dimension::length>> two(2), three(3);
    std::string said;
    try {
        fill_deflections(line, places, three);
    } catch (const invalid_input& refused) {
        said = refused.what();
    }
    CHECK(said.find("number of results = 3") != std::string::npos);
    said.clear();
    try {
        fill_deflections(line, places, two);
    } catch (const invalid_input& refused) {
        said = refused.what();
    }
    CHECK(said.find("x = 9 m") != std::string::npos);
}
