// The piecewise form: joined without gaps, equal to the closed forms, each coefficient with its own dimension.
#include <support/doctest_quantities.hpp>
#include <support/relative.hpp>
#include <support/scene.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/piecewise.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <tuple>
#include <type_traits>
#include <utility>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr auto EI = 1.0e4 * kN * m2;

/// The dimension of the i-th coefficient is that of the 0-th over length^i.
template <class Tuple, std::size_t i = 0>
constexpr bool falls_by_lengths() {
    if constexpr (i + 1 == std::tuple_size_v<Tuple>) {
        return true;
    } else {
        using here = std::tuple_element_t<i, Tuple>;
        using next = std::tuple_element_t<i + 1, Tuple>;
        using expected = decltype(std::declval<here>() / std::declval<quantity<dimension::length>>());
        return std::is_same_v<typename next::unit_type, typename expected::unit_type> &&
               falls_by_lengths<Tuple, i + 1>();
    }
}

/// Coefficients as plain numbers.
template <class... C>
std::vector<double> numbers(const std::tuple<C...>& c) {
    return std::apply([](const auto&... each) { return std::vector<double>{each.value()...}; }, c);
}

template <class Segments, class Line>
void check_joined(const Segments& segments, const Line& line) {
    REQUIRE(segments.size() > 0);
    CHECK(segments.front().from() == 0.0 * m);
    CHECK(segments.back().to() == line.supported().span());
    for (std::size_t i = 0; i < segments.size(); ++i) {
        CHECK(segments[i].from() < segments[i].to());
        if (i > 0) CHECK(segments[i].from() == segments[i - 1].to());
    }
}

/// Greatest differences between polynomials and line, of the greatest value of each response.
template <class Line>
std::array<double, 4> differences(const Line& line, scene::chance& random) {
    const auto segments = piecewise_form(line);
    check_joined(segments, line);
    std::array<double, 4> size{}, off{};
    const auto compare = [&](std::size_t q, double computed, double expected) {
        size[q] = std::max(size[q], std::abs(expected));
        off[q] = std::max(off[q], std::abs(computed - expected));
    };
    for (const auto& s : segments) {
        for (int k = 0; k < 6; ++k) {
            const auto x = k == 0 ? s.from() : k == 1 ? s.to() : s.from() + (s.to() - s.from()) * random.in(0, 1);
            const side inside = k == 1 ? just_left : just_right;
            compare(0, s.deflection(x).value(), line.deflection(x, inside).value());
            compare(1, s.slope(x).value(), line.slope(x, inside).value());
            compare(2, s.moment(x).value(), line.moment(x, inside).value());
            compare(3, s.shear(x).value(), line.shear(x, inside).value());
        }
    }
    for (std::size_t q = 0; q < 4; ++q) off[q] = off[q] == 0 ? 0 : off[q] / size[q];
    return off;
}

}  // namespace

TEST_CASE("coefficients carry their dimensions") {
    using segment = elastic_segment<double>;
    const segment s;
    using deflection = decltype(s.deflection_coefficients());
    using slope = decltype(s.slope_coefficients());
    using moments = decltype(s.moment_coefficients());
    using shear = decltype(s.shear_coefficients());
    using load = decltype(s.load_coefficients());
    static_assert(std::tuple_size_v<deflection> == 6);
    static_assert(std::tuple_size_v<slope> == 5);
    static_assert(std::tuple_size_v<moments> == 4);
    static_assert(std::tuple_size_v<shear> == 3);
    static_assert(std::tuple_size_v<load> == 2);
    static_assert(std::is_same_v<std::tuple_element_t<0, deflection>, quantity<dimension::length>>);
    static_assert(std::is_same_v<std::tuple_element_t<0, slope>, quantity<dimension::dimensionless>>);
    static_assert(std::is_same_v<std::tuple_element_t<0, moments>, quantity<dimension::moment>>);
    static_assert(std::is_same_v<std::tuple_element_t<0, shear>, quantity<dimension::force>>);
    static_assert(std::is_same_v<std::tuple_element_t<0, load>, quantity<dimension::line_load>>);
    static_assert(falls_by_lengths<deflection>());
    static_assert(falls_by_lengths<slope>());
    static_assert(falls_by_lengths<moments>());
    static_assert(falls_by_lengths<shear>());
    static_assert(falls_by_lengths<load>());
}

TEST_CASE("each response is the derivative of the one before") {
    const auto line = propped_cantilever(7.0 * m, EI)
                          .under(linear_load(1.0 * kN / m, 4.0 * kN / m, between(1.0 * m, 5.0 * m)) +
                                 point_load(3.0 * kN, at(2.0 * m)) + applied_couple(5.0 * kN * m, at(6.0 * m)));
    const double rigidity = 1e7;
    for (const auto& s : piecewise_form(line)) {
        const auto v = numbers(s.deflection_coefficients());
        const auto r = numbers(s.slope_coefficients());
        const auto M = numbers(s.moment_coefficients());
        const auto V = numbers(s.shear_coefficients());
        const auto w = numbers(s.load_coefficients());
        for (std::size_t i = 0; i < r.size(); ++i) {
            CHECK(r[i] == doctest::Approx(static_cast<double>(i + 1) * v[i + 1]).epsilon(1e-14));
        }
        for (std::size_t i = 0; i < M.size(); ++i) {
            CHECK(-M[i] / rigidity == doctest::Approx(static_cast<double>(i + 1) * r[i + 1]).epsilon(1e-14));
        }
        for (std::size_t i = 0; i < V.size(); ++i) {
            CHECK(V[i] == doctest::Approx(static_cast<double>(i + 1) * M[i + 1]).epsilon(1e-14));
        }
        for (std::size_t i = 0; i < w.size(); ++i) {
            CHECK(-w[i] == doctest::Approx(static_cast<double>(i + 1) * V[i + 1]).epsilon(1e-14));
        }
    }
}

TEST_CASE("a polynomial known by heart, when compiling") {
    // Simple beam under w: v = w (L^3 x - 2 L x^3 + x^4)/(24 EI). AISC Steel Construction Manual table 3-23
    // diagram 1, from memory. Numbers that make the coefficients whole: w = 24 kN/m, L = 2 m, EI = 1 kN m2.
    constexpr auto line = simple_beam(2.0 * m, 1.0 * kN * m2).under(uniform_load(24.0 * kN / m));
    constexpr auto segments = piecewise_form(line);
    static_assert(segments.size() == 1);
    constexpr auto v = segments[0].deflection_coefficients();
    constexpr auto near = [](double computed, double whole) {
        return computed - whole < 1e-14 && whole - computed < 1e-14;
    };
    static_assert(std::get<0>(v) == 0.0 * m);
    static_assert(near(std::get<1>(v).value(), 8));
    static_assert(near(std::get<2>(v).value(), 0));
    static_assert(near(std::get<3>(v).value(), -4));
    static_assert(near(std::get<4>(v).value(), 1));
    static_assert(std::get<5>(v).value() == 0);
    static_assert(near(segments[0].deflection(1.0 * m) / m, 5));
    static_assert(segments[0].load(0.3 * m) == 24.0 * kN / m);
}

TEST_CASE("segments on all beams under all loads are the closed forms") {
    constexpr std::uint64_t seed = 51;
    CAPTURE(seed);
    scene::chance random(seed);
    std::array<double, 4> worst{};
    for (int i = 0; i < 200; ++i) {
        const double L = i % 2 == 0 ? 7.2 : random.in(0.01, 1000);
        scene::with_each_beam(L, 1.75e7, [&](const std::string& name, const auto& b, auto left, auto right) {
            CAPTURE(name);
            CAPTURE(i);
            const auto line =
                b.under(scene::list_of(scene::random_loads(random, random.whole(1, 6), L, 1.75e7, left, right)));
            const auto off = differences(line, random);
            for (std::size_t q = 0; q < 4; ++q) {
                CAPTURE(q);
                CHECK(off[q] <= 1e-13);
                worst[q] = std::max(worst[q], off[q]);
            }
        });
    }
    MESSAGE("greatest differences: deflection " << worst[0] << ", slope " << worst[1] << ", moment " << worst[2]
                                                << ", shear " << worst[3]);
}

TEST_CASE("a composition and a load_list have the same segments") {
    constexpr auto b = fixed_beam(6.0 * m, EI);
    constexpr auto loads = uniform_load(2.0 * kN / m) + point_load(3.0 * kN, at(2.0 * m)) +
                           linear_load(1.0 * kN / m, 4.0 * kN / m, between(2.0 * m, 5.0 * m)) +
                           imposed_curvature(0.001 / m, between(1.0 * m, 4.0 * m));
    constexpr auto fixed_size = piecewise_form(b.under(loads));
    static_assert(fixed_size.size() == 5);
    const auto listed = piecewise_form(b.under(load_list(loads)));
    REQUIRE(listed.size() == fixed_size.size());
    for (std::size_t i = 0; i < listed.size(); ++i) {
        CHECK(listed[i].from() == fixed_size[i].from());
        CHECK(listed[i].to() == fixed_size[i].to());
        const auto a = numbers(fixed_size[i].deflection_coefficients());
        const auto c = numbers(listed[i].deflection_coefficients());
        for (std::size_t k = 0; k < a.size(); ++k) {
            CHECK(std::abs(a[k] - c[k]) <= 1e-15 * std::max(1e-3, std::abs(a[k])));
        }
    }
}

TEST_CASE("segments of a beam that deforms in shear, is stepped and hinged") {
    scene::chance random(52);
    const auto line = continuous_beam(14.0 * m, EI)
                          .clamp(end::left)
                          .support_at(6.0 * m)
                          .spring_at(13.0 * m, 4.0 * kN / mm)
                          .rigidity_from(3.0 * m, 2.5 * EI)
                          .hinge_at(8.0 * m)
                          .shear_rigidity(3.0 * MN)
                          .under(linear_load(1.0 * kN / m, 6.0 * kN / m, between(1.0 * m, 9.0 * m)) +
                                 point_load(4.0 * kN, at(12.0 * m)) + imposed_curvature(0.001 / m) +
                                 applied_couple(3.0 * kN * m, at(11.0 * m)));
    const auto segments = piecewise_form(line);
    check_joined(segments, line);
    CHECK(segments.size() == 9);
    double worst = 0;
    for (const auto& s : segments) {
        for (int k = 0; k < 20; ++k) {
            const auto x = s.from() + (s.to() - s.from()) * random.in(0, 1);
            worst = std::max({worst, std::abs((s.deflection(x) - line.deflection(x)) / mm) / 10,
                              std::abs((s.slope(x) - line.slope(x)) / mrad) / 10,
                              std::abs((s.moment(x) - line.moment(x)) / (kN * m)) / 10,
                              std::abs((s.shear(x) - line.shear(x)) / kN) / 10});
        }
    }
    CHECK(worst < 1e-12);
}

TEST_CASE("joints at one place make no empty segment") {
    const auto line =
        simple_beam(6.0 * m, EI)
            .under(point_load(1.0 * kN, at(0.0 * m)) + point_load(1.0 * kN, at(2.0 * m)) +
                   applied_couple(1.0 * kN * m, at(2.0 * m)) +
                   partial_uniform_load(1.0 * kN / m, between(2.0 * m, 6.0 * m)) + point_load(1.0 * kN, at(6.0 * m)));
    const auto segments = piecewise_form(line);
    REQUIRE(segments.size() == 2);
    check_joined(segments, line);
}
