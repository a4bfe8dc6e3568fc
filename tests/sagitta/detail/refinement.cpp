// Panels for a tolerance, on a rule coarse enough for its errors to be worked out by hand: the midpoint rule on x^2.
// Its area over [a, a + h] is h (a + h/2)^2, taken to stand in the middle.
#include <sagitta/detail/refinement.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <vector>

using namespace sagitta::detail;

namespace {

using fields = std::array<panel_moments<double>, 1>;

fields midpoint(double from, double to) {
    const double h = to - from, middle = (from + to) / 2;
    const double area = h * middle * middle;
    return {panel_moments<double>{area, area * h / 2, area * h / 2}};
}

// The gap between a panel and its halves, area and lever over width, by hand: 5/32 on [0, 1], 7/4 on [1, 3], 9/32 on
// [1, 2] and 13/32 on [2, 3]. It is relative to the areas of the given panels, 1/4 and 8.
constexpr double size = 0.25 + 8;

}  // namespace

TEST_CASE("panels that are good enough stay, and their errors add up") {
    const auto one = refine_panels<double, 1>({0, 1}, midpoint, 8.0);
    CHECK(one.bounds == std::vector<double>{0, 1});
    CHECK(one.error_estimate == doctest::Approx(5.0 / 32 / 0.25).epsilon(1e-15));

    const auto two = refine_panels<double, 1>({0, 1, 3}, midpoint, 8.0);
    CHECK(two.bounds == std::vector<double>{0, 1, 3});
    CHECK(two.error_estimate == doctest::Approx((5.0 / 32 + 7.0 / 4) / size).epsilon(1e-15));
}

TEST_CASE("a panel whose gap is more than an eighth of the tolerance is halved") {
    const auto found = refine_panels<double, 1>({0, 1, 3}, midpoint, 0.5);
    CHECK(found.bounds == std::vector<double>{0, 1, 2, 3});
    CHECK(found.error_estimate == doctest::Approx((5.0 + 9 + 13) / 32 / size).epsilon(1e-15));
    // 7/4 over size is 0.2121: just enough, and just not.
    CHECK(refine_panels<double, 1>({0, 1, 3}, midpoint, 8 * 0.2122).bounds.size() == 3);
    CHECK(refine_panels<double, 1>({0, 1, 3}, midpoint, 8 * 0.2121).bounds.size() == 4);
}

TEST_CASE("what is asked lies between the first bound and the last") {
    double least = 0, greatest = 3;
    const auto watched = [&](double from, double to) {
        least = std::min(least, from);
        greatest = std::max(greatest, to);
        CHECK(from < to);
        return midpoint(from, to);
    };
    (void)refine_panels<double, 1>({0, 1, 3}, watched, 0.5);
    CHECK(least == 0);
    CHECK(greatest == 3);
}

TEST_CASE("errors that are rounding count as none, and fields that vanish are no measure") {
    const auto constant = [](double from, double to) {
        const double h = to - from;
        return std::array{panel_moments<double>{h, h * h / 2, h * h / 2}, panel_moments<double>{}};
    };
    const auto found = refine_panels<double, 2>({0, 0.1, 0.7}, constant, 0.0);
    CHECK(found.error_estimate == 0);
    CHECK(found.bounds == std::vector<double>{0, 0.1, 0.7});
}

TEST_CASE("the worst field decides, whatever its sign") {
    const auto both = [](double from, double to) {
        const auto [good] = midpoint(from, to);
        const double h = to - from;
        const panel_moments<double> constant{-h, -h * h / 2, -h * h / 2};
        return std::array{constant, panel_moments<double>{-good.area, -good.about_from, -good.about_to}};
    };
    const auto found = refine_panels<double, 2>({0, 1}, both, 8.0);
    CHECK(found.error_estimate == doctest::Approx(5.0 / 8).epsilon(1e-15));
}

TEST_CASE("a tolerance that is not reached is refused, with what is reached") {
    // The rule gains two digits by ten times the panels: their gaps, each an eighth of the tolerance, add up to more.
    CHECK_THROWS_WITH_AS((void)(refine_panels<double, 1>({0, 1, 3}, midpoint, 1e-3)),
                         doctest::Contains("asked for a relative error of 0.001, reached 0.0033"),
                         sagitta::tolerance_not_reached);
}

TEST_CASE("a jump is closed in on until it is rounding") {
    const auto jump = [](double from, double to) {
        const double h = to - from, middle = (from + to) / 2;
        const double area = middle < 1.0 / 3 ? 0 : h;
        return fields{panel_moments<double>{area, area * h / 2, area * h / 2}};
    };
    const auto found = refine_panels<double, 1>({0, 1}, jump, 1e-6);
    CHECK(std::is_sorted(found.bounds.begin(), found.bounds.end()));
    CHECK(found.bounds.size() > 20);
    CHECK(found.error_estimate <= 1e-6);
}
