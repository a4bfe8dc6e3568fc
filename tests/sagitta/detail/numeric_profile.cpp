// Extremes and zeros where the stiffness varies: against dense sampling of the same line, and, for a constant stiffness
// that is given as a function, against the closed forms.
#include <support/scene.hpp>

#include <sagitta/extremes.hpp>
#include <sagitta/moment_area.hpp>
#include <sagitta/zeros.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr double L = 6;
constexpr double EI = 2e6;
constexpr int samples = 3000;

auto rigidity(double value) { return quantity<dimension::flexural_rigidity>::from_value(value); }

/// Loads that bend a beam to both sides, with and without an imposed curvature.
std::vector<load_list<>> several_loads() {
    std::vector<load_list<>> all(5);
    all[0] += point_load(20.0 * kN, at(2.0 * m)) - partial_uniform_load(9.0 * kN / m, between(3.0 * m, 6.0 * m));
    all[1] += applied_couple(30.0 * kN * m, at(4.0 * m)) + linear_load(0.0 * kN / m, 5.0 * kN / m);
    all[2] += partial_uniform_load(12.0 * kN / m, between(0.5 * m, 2.5 * m)) +
              imposed_curvature(-0.004 / m, between(1.0 * m, 5.0 * m));
    all[3] += imposed_curvature(0.003 / m) - point_load(15.0 * kN, at(3.5 * m)) +
              imposed_curvature(-0.005 / m, between(2.0 * m, 4.0 * m));
    // The slope of a simple beam is greatest where the curvature vanishes, a little before the couple turns it back.
    all[4] += imposed_curvature(-0.001 / m) - applied_couple(20.0 * kN * m, at(5.4 * m));
    return all;
}

template <class F>
void with_tapered_lines(const F& f) {
    const auto taper = [](const quantity<dimension::length>& x) {
        const double depth = 1 + 0.8 * x.value() / L;
        return rigidity(EI * depth * depth * depth);
    };
    scene::with_each_beam(L, EI, [&](const std::string& name, const auto& b, auto, auto) {
        int number = 0;
        for (const auto& loads : several_loads()) {
            CAPTURE(name);
            CAPTURE(number++);
            f(integrate_moment_area(b, loads, taper));
        }
    });
}

double place(int i) { return L * i / samples; }

}  // namespace

TEST_CASE("no sample beats an extreme of a tapered beam, and an extreme is what the line says there") {
    with_tapered_lines([](const auto& line) {
        const auto check = [&](const auto& found, const auto& response) {
            double greatest = response(0.0 * m).value(), least = greatest;
            for (int i = 0; i <= samples; ++i) {
                const double value = response(place(i) * m).value();
                greatest = std::max(greatest, value);
                least = std::min(least, value);
            }
            const double rounding = 1e-12 * std::max(greatest, -least);
            CHECK(found.greatest.value.value() >= greatest - rounding);
            CHECK(found.least.value.value() <= least + rounding);
            // Between two samples it is more by the square of their distance at most.
            CHECK(found.greatest.value.value() <= greatest + 1e-4 * (greatest - least) + rounding);
            CHECK(found.least.value.value() >= least - 1e-4 * (greatest - least) - rounding);
            CHECK(std::abs((response(found.greatest.at) - found.greatest.value).value()) <= rounding);
            CHECK(std::abs((response(found.least.at) - found.least.value).value()) <= rounding);
        };
        check(extremes_of_deflection(line), [&](const auto& x) { return line.deflection(x); });
        check(extremes_of_slope(line), [&](const auto& x) { return line.slope(x); });
        const auto both = extremes_of_deflection(line);
        CHECK(greatest_deflection(line).value == both.governing().value);
    });
}

TEST_CASE("zeros of a tapered beam: each change of sign that is sampled is found once, at a place where it vanishes") {
    with_tapered_lines([](const auto& line) {
        const auto check = [&](const auto& zeros, const auto& response) {
            std::vector<double> values;
            for (int i = 0; i <= samples; ++i) values.push_back(response(place(i) * m).value());
            double size = 0;
            for (const double value : values) size = std::max(size, std::abs(value));
            // About a support nothing but rounding may be left: no sign.
            std::vector<double> changes;
            double before = 0;
            for (int i = 0; i <= samples; ++i) {
                const double value = values[static_cast<std::size_t>(i)];
                if (std::abs(value) <= 1e-12 * size) continue;
                if (value * before < 0) changes.push_back(place(i));
                before = value;
            }
            std::vector<double> found;
            for (const auto& zero : zeros) {
                CHECK(std::abs(response(zero.from).value()) <= 1e-11 * size);
                CHECK(std::abs(response(zero.to).value()) <= 1e-11 * size);
                if (zero.changes_sign) found.push_back(zero.from.value());
            }
            std::string both;
            for (const double x : found) both += std::to_string(x) + " ";
            both += "found; sampled ";
            for (const double x : changes) both += std::to_string(x) + " ";
            CAPTURE(both);
            REQUIRE(found.size() == changes.size());
            for (std::size_t i = 0; i < found.size(); ++i) {
                CHECK(found[i] <= changes[i] + 1e-9);
                CHECK(found[i] >= changes[i] - 1.001 * L / samples);
            }
        };
        check(zeros_of_deflection(line), [&](const auto& x) { return line.deflection(x); });
        check(stationary_points(line), [&](const auto& x) { return line.slope(x); });
    });
}

TEST_CASE("a constant stiffness, given as a function, has the extremes and zeros of the closed forms") {
    scene::with_each_beam(L, EI, [&](const std::string& name, const auto& b, auto, auto) {
        int number = 0;
        auto all = several_loads();
        all.push_back(point_load(20.0 * kN, at(2.0 * m)) + imposed_kink(-6.0 * mrad, at(2.5 * m)) +
                      imposed_offset(4.0 * mm, at(4.5 * m)) + imposed_kink(3.0 * mrad, at(4.5 * m)));
        for (const auto& loads : all) {
            CAPTURE(name);
            CAPTURE(number++);
            const auto exact = b.under(loads);
            const auto line = integrate_moment_area(b, loads, [](const auto&) { return rigidity(EI); });
            const auto same = [](const auto& a, const auto& e) {
                const double size = std::abs(e.greatest.value.value()) + std::abs(e.least.value.value());
                CHECK(std::abs((a.greatest.value - e.greatest.value).value()) <= 1e-12 * size);
                CHECK(std::abs((a.least.value - e.least.value).value()) <= 1e-12 * size);
            };
            same(extremes_of_deflection(line), extremes_of_deflection(exact));
            same(extremes_of_slope(line), extremes_of_slope(exact));
            const auto a = stationary_points(line);
            const auto e = stationary_points(exact);
            REQUIRE(a.size() == e.size());
            for (std::size_t i = 0; i < a.size(); ++i) {
                CHECK(std::abs((a[i].from - e[i].from).value()) <= 1e-9 * L);
                CHECK(std::abs((a[i].to - e[i].to).value()) <= 1e-9 * L);
                CHECK(a[i].changes_sign == e[i].changes_sign);
            }
        }
    });
}
