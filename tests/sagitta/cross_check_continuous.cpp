// Continuous beams against the integrator that finds their redundants by itself: they agree on every kind of beam, and
// whatever is wrong in an answer, or in the beam that was solved, is noticed.
#include <support/continuous_scene.hpp>
#include <support/relative.hpp>

#include <sagitta/cross_check.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <functional>
#include <limits>
#include <string>
#include <utility>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

using line_type = continuous_line<double>;
using result = cross_check_result<double>;

std::string text(const result& r) {
    const auto number = [](double x) { return std::string(doctest::toString(x).c_str()); };
    return "deflection " + number(r.deflection) + ", slope " + number(r.slope) + ", moment " + number(r.moment) +
           ", shear " + number(r.shear);
}

/// The greatest discrepancies of so many random beams, none above its bound.
result random_beams(std::uint64_t seed, int count, const scene::continuous_kind& how, double bound,
                    double bound_of_shear, double bound_of_slope = 1e-10) {
    CAPTURE(seed);
    scene::chance random(seed);
    scene::random_continuous draw(random, how);
    result worst;
    int mechanisms = 0;
    for (int i = 0; i < count; ++i) {
        CAPTURE(i);
        const auto c = draw.draw();
        INFO(scene::text(c));
        try {
            const auto line = scene::beam_of(c).under(scene::list_of(c.loads));
            const auto one = cross_check(line);
            INFO(text(one));
            CHECK(std::max(one.deflection, one.moment) <= bound);
            CHECK(one.slope <= std::max(bound, bound_of_slope));
            CHECK(one.shear <= bound_of_shear);
            CHECK(one.greatest() <=
                  std::max({bound, bound_of_slope, bound_of_shear}));  // not-a-number would slip through a maximum
            worst = {std::max(worst.shear, one.shear), std::max(worst.moment, one.moment),
                     std::max(worst.slope, one.slope), std::max(worst.deflection, one.deflection)};
        } catch (const invalid_input&) {
            ++mechanisms;  // which continuous_beam_accuracy.cpp proves
        }
    }
    CHECK(mechanisms < count / 4);
    return worst;
}

/// Everything that a beam can have.
scene::continuous jetty() {
    scene::continuous c;
    c.L = 26;
    c.EI = 4e7;
    c.supports = {{0, 6e7, 0.004},    {5, scene::rigid, 0.006},   {11, 3e7},
                  {16, scene::rigid}, {21, scene::rigid, -0.003}, {26, 2e6}};
    c.turning = {9e6, scene::rigid};
    c.hinges = {8, 16};
    c.steps = {{6.5, 6e7}, {13, 2.5e7}};
    c.kGA = 5e7;
    using scene::kind;
    c.loads = {{kind::uniform, 4e3},
               {kind::linear, 2e3, 9e3, 3, 14.5},
               {kind::partial_uniform, 7e3, 0, 17, 19},
               {kind::linear_whole, 1e3, -2e3},
               {kind::point, 4e4, 0, 9.5},
               {kind::point, 2e4, 0, 16},
               {kind::couple, 3e4, 0, 2.5},
               {kind::couple, 2e4, 0, 8},
               {kind::couple, -3e4, 0, 0},
               {kind::point, 2e4, 0, 26},
               {kind::couple, 1e4, 0, 26},
               {kind::settlement_left, 0.002},
               {kind::rotation_left, 0.003},
               {kind::rotation_right, -0.002},
               {kind::curvature, 1e-4},
               {kind::partial_curvature, 4e-4, 0, 12, 15}};
    return c;
}

line_type solved(const scene::continuous& c) { return scene::beam_of(c).under(scene::list_of(c.loads)); }

enum class wrong { deflection, slope, moment, shear, reaction, end_moment };

/// A line one of whose answers is wrong by a factor on a stretch.
class misprinted_line : public line_type {
public:
    misprinted_line(const line_type& line, wrong what, double factor, double from = 0,
                    double to = std::numeric_limits<double>::infinity())
        : line_type(line), what_(what), factor_(factor), from_(from), to_(to) {}

    auto deflection(const quantity<dimension::length>& x, side which) const {
        return line_type::deflection(x, which) * printed(wrong::deflection, x);
    }
    auto slope(const quantity<dimension::length>& x, side which) const {
        return line_type::slope(x, which) * printed(wrong::slope, x);
    }
    auto moment(const quantity<dimension::length>& x, side which) const {
        return line_type::moment(x, which) * printed(wrong::moment, x);
    }
    auto shear(const quantity<dimension::length>& x, side which) const {
        return line_type::shear(x, which) * printed(wrong::shear, x);
    }
    auto reaction_at(const quantity<dimension::length>& x) const {
        return line_type::reaction_at(x) * printed(wrong::reaction, x);
    }
    auto end_moment(end::left_end) const {
        return line_type::end_moment(end::left) * printed(wrong::end_moment, 0.0 * m);
    }
    auto end_moment(end::right_end) const {
        return line_type::end_moment(end::right) * printed(wrong::end_moment, supported().span());
    }

private:
    double printed(wrong what, const quantity<dimension::length>& x) const {
        return what == what_ && x.value() >= from_ && x.value() <= to_ ? factor_ : 1;
    }
    wrong what_;
    double factor_, from_, to_;
};

/// A line that was solved for another beam, or under other loads, than it says.
class mistaken_line : public line_type {
public:
    mistaken_line(const line_type& line, const scene::continuous& told)
        : line_type(line), beam_(scene::beam_of(told)), loads_(scene::list_of(told.loads)) {}

    [[nodiscard]] const continuous_beam<>& supported() const { return beam_; }
    [[nodiscard]] const load_list<>& loads() const { return loads_; }

private:
    continuous_beam<> beam_;
    load_list<> loads_;
};

}  // namespace

// The integrator itself holds 1e-12 on all of these beams (detail/continuous_integrator.cpp), so that what differs is
// the rounding of the answers. Slopes keep a budget of their own: where a beam moves by much more than it bends, they
// are what is left of tilts that nearly cancel; shears one on very soft springs, where under couples they are what is
// left of forces that nearly cancel. Both are measured against themselves.
TEST_CASE("random continuous beams on rigid supports are confirmed to 1e-11, slopes to 1e-10") {
    scene::continuous_kind how;
    how.rigid_share = 1;
    how.spans_most = 12;
    MESSAGE("greatest discrepancies: " << text(random_beams(7301, 3000, how, 1e-11, 1e-11)));
}

TEST_CASE("random continuous beams on springs a hundred times softer to stiffer, to 1e-11, slopes to 1e-10") {
    scene::continuous_kind how;
    how.spring_decades = 2;
    MESSAGE("greatest discrepancies: " << text(random_beams(7302, 3000, how, 1e-11, 1e-11)));
}

TEST_CASE(
    "random continuous beams on springs a million times softer to stiffer, to 1e-11, slopes to 1e-10, shears to 1e-9") {
    MESSAGE("greatest discrepancies: " << text(random_beams(7303, 3000, {}, 1e-11, 1e-9)));
}

TEST_CASE("random continuous beams with short parts, to the square of their shortness") {
    for (const double shortest : {1e-2, 1e-3, 1e-4}) {
        scene::continuous_kind how;
        how.rigid_share = 1;
        how.shortest_part = shortest;
        const double bound = 1e-14 / shortest / shortest;
        const auto worst = random_beams(7304, 1000, how, bound, bound);
        MESSAGE("shortest part " << shortest << " of the mean span, greatest discrepancies: " << text(worst));
    }
}

TEST_CASE("two spans and two thousand are confirmed to 1e-13") {
    scene::chance random(7305);
    for (const int spans : {1, 2, 2000}) {
        CAPTURE(spans);
        std::vector<double> places{0};
        for (int i = 0; i < spans; ++i) places.push_back(places.back() + random.in(4, 9));
        continuous_beam<> b(places.back() * m, 2e7 * N * m2);
        load_list<> loads = uniform_load(4.5 * kN / m);
        for (const double x : places) b.support_at(x * m);
        for (int i = 0; i < spans; ++i)
            loads += point_load(random.in(-9, 30) * kN, at(random.in(0, places.back()) * m));
        b.hinge_at(random.in(0.1, 0.9) * places[1] * m)
            .rigidity_from(random.in(0.1, 0.9) * places[1] * m, 3e7 * N * m2);
        if (spans > 1) b.clamp(end::right);
        if (spans == 1) b.clamp(end::left);
        const auto one = cross_check(b.under(loads));
        CHECK(one.greatest() <= 1e-13);
        MESSAGE(spans << " spans: " << text(one));
    }
}

TEST_CASE("a beam with everything on it is confirmed, whatever answer is wrong is noticed as its own size") {
    const auto line = solved(jetty());
    const auto right = cross_check(line);
    MESSAGE("as it is: " << text(right));
    REQUIRE(right.greatest() <= 1e-13);

    constexpr double by = 1e-6;
    const auto noticed = [&](wrong what) { return cross_check(misprinted_line(line, what, 1 + by)); };
    const auto only = [&](const result& r, double result::*which) {
        INFO(text(r));
        CHECK(relative(r.*which, by) < 1e-3);
        for (double result::*each : {&result::shear, &result::moment, &result::slope, &result::deflection}) {
            if (each != which) CHECK(r.*each <= 1e-13);
        }
    };
    only(noticed(wrong::deflection), &result::deflection);
    only(noticed(wrong::slope), &result::slope);
    only(noticed(wrong::moment), &result::moment);
    only(noticed(wrong::shear), &result::shear);
    const auto supports = noticed(wrong::reaction);
    CHECK(supports.shear > by / 3);
    CHECK(supports.shear <= by * 1.001);
    CHECK(supports.moment <= 1e-13);
    const auto ends = noticed(wrong::end_moment);
    CHECK(ends.moment > by / 100);
    CHECK(ends.moment <= by * 1.001);
    CHECK(ends.shear <= 1e-13);
}

TEST_CASE("an answer that is wrong in one span only is noticed, one that is not a number too") {
    const auto line = solved(jetty());
    const auto nodes = line.supported().nodes();
    for (std::size_t i = 1; i < nodes.size(); ++i) {
        const double from = nodes[i - 1].at.value();
        const double to = nodes[i].at.value();
        CAPTURE(from);
        for (const wrong what : {wrong::deflection, wrong::slope, wrong::moment, wrong::shear}) {
            CAPTURE(static_cast<int>(what));
            CHECK(cross_check(misprinted_line(line, what, 1.001, from, to)).greatest() > 1e-6);
            const double nan = std::numeric_limits<double>::quiet_NaN();
            CHECK_FALSE(cross_check(misprinted_line(line, what, nan, from, to)).greatest() <= 1);
        }
    }
    // Of every support and every end.
    const double nan = std::numeric_limits<double>::quiet_NaN();
    const auto three =
        continuous_beam(10.0 * m, 1.0 * MN * m2).support_at(0.0 * m).support_at(4.0 * m).clamp(end::right);
    const auto of_three = three.under(uniform_load(2.0 * kN / m));
    for (const double x : {0.0, 4.0, 10.0}) {
        CAPTURE(x);
        CHECK_FALSE(cross_check(misprinted_line(of_three, wrong::reaction, nan, x, x)).greatest() <= 1);
    }
    for (const double x : {0.0, 10.0}) {
        CHECK_FALSE(cross_check(misprinted_line(of_three, wrong::end_moment, nan, x, x)).greatest() <= 1);
    }
}

TEST_CASE("a beam solved with any one figure wrong by a millionth is noticed") {
    const auto told = jetty();
    REQUIRE(cross_check(mistaken_line(solved(told), told)).greatest() <= 1e-13);
    int figures = 0;
    double least = 1;
    const auto mistake = [&](const std::string& figure, const std::function<double&(scene::continuous&)>& stands) {
        CAPTURE(figure);
        auto misread = told;
        double& value = stands(misread);
        if (value == 0 || std::isinf(value)) return;
        value *= 1 + 1e-6;
        const double greatest = cross_check(mistaken_line(solved(misread), told)).greatest();
        CHECK(greatest > 1e-10);
        least = std::min(least, greatest);
        ++figures;
    };
    mistake("EI", [](auto& c) -> double& { return c.EI; });
    mistake("kGA", [](auto& c) -> double& { return c.kGA; });
    for (std::size_t i = 0; i < told.supports.size(); ++i) {
        mistake("stiffness " + std::to_string(i), [i](auto& c) -> double& { return c.supports[i].stiffness; });
        mistake("settled " + std::to_string(i), [i](auto& c) -> double& { return c.supports[i].settled; });
    }
    for (std::size_t i = 0; i < 2; ++i) {
        mistake("turning " + std::to_string(i), [i](auto& c) -> double& { return c.turning[i]; });
        mistake("place of step " + std::to_string(i), [i](auto& c) -> double& { return c.steps[i].from; });
        mistake("EI of step " + std::to_string(i), [i](auto& c) -> double& { return c.steps[i].EI; });
    }
    mistake("place of hinge", [](auto& c) -> double& { return c.hinges[0]; });
    for (std::size_t i = 0; i < told.loads.size(); ++i) {
        const auto name = scene::text(told.loads[i]) + ": ";
        mistake(name + "size", [i](auto& c) -> double& { return c.loads[i].size; });
        mistake(name + "size to", [i](auto& c) -> double& { return c.loads[i].size_to; });
        // What goes straight into a support, or turns it there, would stand elsewhere.
        if (told.loads[i].from < 26) mistake(name + "from", [i](auto& c) -> double& { return c.loads[i].from; });
        mistake(name + "to", [i](auto& c) -> double& { return c.loads[i].to; });
    }
    MESSAGE(figures << " figures; the least that was noticed: " << least);
    CHECK(figures > 40);
}

TEST_CASE("a beam solved without one of its parts, or loads, is noticed") {
    const auto told = jetty();
    const auto notices = [&](const scene::continuous& solved_for) {
        return cross_check(mistaken_line(solved(solved_for), told)).greatest() > 1e-4;
    };
    for (std::size_t i = 0; i < told.loads.size(); ++i) {
        auto c = told;
        c.loads.erase(c.loads.begin() + static_cast<std::ptrdiff_t>(i));
        CAPTURE(scene::text(told.loads[i]));
        CHECK(notices(c));
    }
    for (std::size_t i = 0; i < told.hinges.size(); ++i) {
        auto c = told;
        c.hinges.erase(c.hinges.begin() + static_cast<std::ptrdiff_t>(i));
        CHECK(notices(c));
    }
    for (const std::size_t i : {0u, 1u}) {
        auto c = told;
        c.turning[i] = c.turning[i] == 9e6 ? scene::rigid : 1e7;
        CHECK(notices(c));
    }
    for (std::size_t i = 0; i < told.supports.size(); ++i) {
        auto c = told;
        c.supports[i].stiffness = std::isinf(c.supports[i].stiffness) ? 1e8 : scene::rigid;
        CHECK(notices(c));
    }
}

TEST_CASE("forces that vanish but for rounding are measured by the moments, on a beam of any size") {
    for (const double L : {1e-3, 0.3, 700.0}) {
        CAPTURE(L);
        // Bent by couples at its ends alone, the same at both.
        const auto beam = continuous_beam(L * m, 1.0 * MN * m2).support_at(0.0 * m).support_at(L * m);
        const auto line =
            beam.under(applied_couple(0.7 * kN * m, at(0.0 * m)) - applied_couple(0.7 * kN * m, at(L * m)) +
                       applied_couple(0.3 * kN * m, at(L / 3 * m)) - applied_couple(0.3 * kN * m, at(L / 7 * m)));
        CHECK(cross_check(line).greatest() <= 1e-13);
    }
}

TEST_CASE("what bends nothing has no discrepancy") {
    const auto beam = continuous_beam(9.0 * m, 2e7 * N * m2).clamp(end::left).support_at(4.0 * m).support_at(9.0 * m);
    CHECK(cross_check(beam.under(load_list<>{})).greatest() == 0);
    // Loads that go straight into supports: what rounding leaves of them is measured by them.
    CHECK(cross_check(beam.under(point_load(7.0 * kN, at(4.0 * m)))).greatest() <= 1e-13);
    CHECK(cross_check(beam.under(point_load(7.0 * kN, at(0.0 * m)) + point_load(3.0 * kN, at(9.0 * m)))).greatest() <=
          1e-13);
    CHECK(cross_check(beam.under(applied_couple(7.0 * kN * m, at(0.0 * m)))).greatest() <= 1e-13);
    // All supports settle alike, or along a line.
    auto moved = continuous_beam(9.0 * m, 2e7 * N * m2).support_at(0.0 * m).support_at(4.0 * m).support_at(9.0 * m);
    moved.settle_at(0.0 * m, 3.0 * mm).settle_at(4.0 * m, 3.0 * mm).settle_at(9.0 * m, 3.0 * mm);
    CHECK(cross_check(moved.under(load_list<>{})).greatest() <= 1e-13);
    moved.settle_at(0.0 * m, 0.0 * mm).settle_at(4.0 * m, 4.0 * mm).settle_at(9.0 * m, 9.0 * mm);
    CHECK(cross_check(moved.under(load_list<>{})).greatest() <= 1e-13);
}

TEST_CASE_TEMPLATE("in any number type", T, float, long double, boost::multiprecision::cpp_bin_float_50) {
    const auto line = continuous_beam<T>(T(14) * m, T(2e7) * N * m2)
                          .clamp(end::left)
                          .support_at(T(6) * m)
                          .spring_at(T(12) * m, T(8e6) * N / m)
                          .settle_at(T(6) * m, T(0.004) * m)
                          .rigidity_from(T(6) * m, T(4e7) * N * m2)
                          .hinge_at(T(8) * m)
                          .shear_rigidity(T(1e8) * N)
                          .under(uniform_load(T(1e4) * N / m) + point_load(T(1e4) * N, at(T(7) * m)) +
                                 applied_couple(T(1e4) * N * m, at(T(3) * m)));
    CHECK(cross_check(line).greatest() <= T(20) * std::numeric_limits<T>::epsilon());
}
