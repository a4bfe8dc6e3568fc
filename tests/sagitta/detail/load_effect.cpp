// Every load case on beams with guided ends, and on one of each other sort, against the exact reference: few numbers
// of a size near 1, compared at joints and between. elastic_line_accuracy.cpp asks the same of extreme places and
// sizes.
#include <support/reference.hpp>
#include <support/scene.hpp>

#include <sagitta/elastic_line.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <vector>

using namespace sagitta;
using boost::multiprecision::cpp_rational;
using reference::hold;
using what = reference::quantity;
using scene::kind;

namespace {

// Binary fractions: exact as doubles and as rational numbers.
constexpr double L = 4;
constexpr double EI = 8;
constexpr double places[] = {0, 0.25, 0.5, 1, 1.75, 2, 2.5, 3, 3.5, 4};
constexpr double bound = 2e-14;

std::vector<scene::load> every_load() {
    std::vector<scene::load> all{{kind::uniform, 1.5},          {kind::linear_whole, 1.0, -0.5},
                                 {kind::settlement_left, 0.25}, {kind::settlement_right, -0.5},
                                 {kind::rotation_left, 0.125},  {kind::rotation_right, -0.25},
                                 {kind::curvature, 0.25}};
    for (const double a : {0.0, 0.5, 2.5, 4.0}) {
        all.push_back({kind::point, 3, 0, a});
        all.push_back({kind::couple, -2, 0, a});
        all.push_back({kind::kink, 0.5, 0, a});
        all.push_back({kind::offset, 0.25, 0, a});
    }
    for (const double from : {0.0, 0.5, 2.0}) {
        for (const double to : {2.5, 4.0}) {
            all.push_back({kind::partial_uniform, 2, 0, from, to});
            all.push_back({kind::linear, -1, 3, from, to});
            all.push_back({kind::partial_curvature, 0.5, 0, from, to});
        }
    }
    return all;
}

void compare(double computed, const cpp_rational& exact) {
    CHECK(std::abs(computed - static_cast<double>(exact)) <= bound);
}

template <class Left, class Right>
void compare_all(hold left, hold right) {
    const auto beam = beam_with_ends<Left, Right>(L * units::m, EI * units::N * units::m2);
    for (const auto& load : every_load()) {
        if (!scene::can_act(load, left, right)) continue;
        CAPTURE(scene::text(load));
        const auto line = beam.under(scene::list_of({load}));
        const auto exact = scene::reference_of<cpp_rational>(left, right, L, EI, {load});
        for (const double place : places) {
            CAPTURE(place);
            const cpp_rational at(place);
            const auto x = place * units::m;
            for (const bool is_left : {true, false}) {
                const auto which = is_left ? just_left : just_right;
                const auto from = is_left ? reference::from::left : reference::from::right;
                compare(line.deflection(x, which).value(), exact.value(what::deflection, at, from));
                compare(line.slope(x, which).value(), exact.value(what::slope, at, from));
                compare(line.moment(x, which).value(), exact.value(what::moment, at, from));
                compare(line.shear(x, which).value(), exact.value(what::shear, at, from));
            }
        }
        compare(line.reaction(end::left).value(), exact.reaction_left());
        compare(line.reaction(end::right).value(), exact.reaction_right());
        compare(line.end_moment(end::left).value(), exact.end_moment_left());
        compare(line.end_moment(end::right).value(), exact.end_moment_right());
    }
}

}  // namespace

TEST_CASE("each load on a beam guided and clamped") {
    compare_all<held::guided, held::fixed>(hold::guided, hold::fixed);
}
TEST_CASE("each load on a beam pinned and guided") {
    compare_all<held::pinned, held::guided>(hold::pinned, hold::guided);
}
TEST_CASE("each load on a beam clamped and pinned") {
    compare_all<held::fixed, held::pinned>(hold::fixed, hold::pinned);
}
TEST_CASE("each load on a beam free and clamped") { compare_all<held::free, held::fixed>(hold::free, hold::fixed); }
