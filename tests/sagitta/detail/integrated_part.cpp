// One part of a continuous beam by quadrature: against the field of an unloaded part and of its loads, integrated by
// hand (v' = turn + V/kGA, turn' = -M/EI - k, M' = V, V' = -w; common practice, derived here).
#include <sagitta/detail/integrated_part.hpp>

#include <support/relative.hpp>

#include <doctest/doctest.h>

#include <cmath>

using namespace sagitta::detail;

namespace {

constexpr double from = 12.5, l = 3.25, EI = 7e4, kGA = 9e3;
constexpr double bound = 1e-14;

integrated_part<double> unloaded(double shear_flexibility) { return {from, from + l, EI, shear_flexibility}; }

void check(const line_state<double>& found, const line_state<double>& wanted) {
    CHECK(relative(found.deflection, wanted.deflection) < bound);
    CHECK(relative(found.turn, wanted.turn) < bound);
    CHECK(relative(found.moment, wanted.moment) < bound);
    CHECK(relative(found.shear, wanted.shear) < bound);
}

}  // namespace

TEST_CASE("what each entry of the state at the start makes of the end") {
    for (const double f : {0.0, 1 / kGA}) {
        CAPTURE(f);
        auto part = unloaded(f);
        part.divide_into_panels();
        check(part.end_from({1, 0, 0, 0}, false), {1, 0, 0, 0});
        check(part.end_from({0, 1, 0, 0}, false), {l, 1, 0, 0});
        check(part.end_from({0, 0, 1, 0}, false), {-l * l / 2 / EI, -l / EI, 1, 0});
        check(part.end_from({0, 0, 0, 1}, false), {-l * l * l / 6 / EI + l * f, -l * l / 2 / EI, l, 1});
    }
}

TEST_CASE("what each load makes of the end where the start is at rest") {
    const double f = 1 / kGA;
    const auto end_under = [&](const auto& load) {
        auto part = unloaded(f);
        part.add(load);
        part.divide_into_panels();
        CHECK(part.end_from({}, false).deflection == 0);
        return part.end_from({}, true);
    };
    const double P = 500, C = -320, w = 70, g = 40, k = 0.003;
    const double a = 0.75, b = l - a;  // the load stands at a, the end is b behind it
    check(end_under(acting_load<double>{acting_kind::point_force, from + a, from + a, P, P}),
          {P * b * b * b / 6 / EI - P * b * f, P * b * b / 2 / EI, -P * b, -P});
    check(end_under(acting_load<double>{acting_kind::couple, from + a, from + a, C, C}),
          {-C * b * b / 2 / EI, -C * b / EI, C, 0});
    // A line load that grows by g a metre; it begins at a and is cut where the part ends, which it does not outlive.
    check(end_under(acting_load<double>{acting_kind::line, from + a, from + l + 1, w, w + g * (b + 1)}),
          {std::pow(b, 4) / EI * (w / 24 + g * b / 120) - b * b * (w / 2 + g * b / 6) * f,
           b * b * b / EI * (w / 6 + g * b / 24), -b * b * (w / 2 + g * b / 6), -b * (w + g * b / 2)});
    // And one that has begun before the part.
    check(end_under(acting_load<double>{acting_kind::line, from - 2, from + l, w - 2 * g, w + g * l}),
          {std::pow(l, 4) / EI * (w / 24 + g * l / 120) - l * l * (w / 2 + g * l / 6) * f,
           l * l * l / EI * (w / 6 + g * l / 24), -l * l * (w / 2 + g * l / 6), -l * (w + g * l / 2)});
    check(end_under(acting_curvature<double>{from + a, from + l + 5, k}), {-k * b * b / 2, -k * b, 0, 0});
    check(end_under(acting_curvature<double>{from - 7, from + a, k}), {-k * a * (b + a / 2), -k * a, 0, 0});
}

TEST_CASE("loads that end where the part begins, or begin where it ends, leave it alone") {
    auto part = unloaded(0);
    part.add(acting_load<double>{acting_kind::line, from - 2, from, 5, 5});
    part.add(acting_load<double>{acting_kind::line, from + l, from + l + 3, 5, 5});
    part.add(acting_curvature<double>{from - 2, from, 5});
    part.add(acting_curvature<double>{from + l, from + l + 3, 5});
    part.divide_into_panels();
    CHECK(part.panels().size() == 3);
    check(part.end_from({1, 2, 3, 4}, true), part.end_from({1, 2, 3, 4}, false));
}

TEST_CASE("a placed part has its states on both sides of a load that makes them jump") {
    auto part = unloaded(0);
    part.add(acting_load<double>{acting_kind::point_force, from + 1, from + 1, 100, 100});
    part.add(acting_load<double>{acting_kind::couple, from + 1, from + 1, 30, 30});
    part.divide_into_panels();
    part.place({0.5, 0.25, 20, 10});
    REQUIRE(part.panels().size() == 6);
    CHECK(part.panels()[2].to == from + 1);
    check(part.panels()[2].at_to, {0.5 + 0.25 - (20.0 / 2 + 10.0 / 6) / EI, 0.25 - (20.0 + 10.0 / 2) / EI, 30, 10});
    check(part.panels()[3].at_from, {0.5 + 0.25 - (20.0 / 2 + 10.0 / 6) / EI, 0.25 - (20.0 + 10.0 / 2) / EI, 60, -90});
    check(part.end(), part.end_from({0.5, 0.25, 20, 10}, true));
    panel_moments<double> all;
    part.add_curvature_within(all, from, from + 1);
    CHECK(relative(all.area, 25 / EI) < bound);
    CHECK(relative(all.about_to, (10 + 10.0 / 6) / EI) < bound);
    CHECK(relative(all.about_from, (10 + 10.0 / 3) / EI) < bound);
}
