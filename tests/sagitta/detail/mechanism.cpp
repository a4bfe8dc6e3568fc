// Which beams are mechanisms: against direct stiffness in rational numbers, where no pivot is near zero without being
// it.
#include <support/refusal.hpp>
#include <support/scene.hpp>
#include <support/stiffness_reference.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/detail/mechanism.hpp>

#include <boost/multiprecision/cpp_int.hpp>

#include <doctest/doctest.h>

#include <limits>
#include <string>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;
using boost::multiprecision::cpp_rational;
using node = detail::node<double>;

namespace {

constexpr double rigid = std::numeric_limits<double>::infinity();

bool can_move(const std::vector<node>& nodes) {
    const double L = nodes.back().at.value();
    reference::continuous<cpp_rational> exact(L, 1);
    for (const auto& each : nodes) {
        const double x = each.at.value();
        exact.add_spring(x, each.transverse);
        if (each.is_hinge) exact.add_hinge(x);
    }
    exact.hold_turning(true, nodes.front().turning);
    exact.hold_turning(false, nodes.back().turning);
    return !exact.solve();
}

}  // namespace

TEST_CASE("random beams are mechanisms for the sweep if they are for direct stiffness in rational numbers") {
    constexpr std::uint64_t seed = 20261201;
    CAPTURE(seed);
    scene::chance random(seed);
    int mechanisms = 0;
    constexpr int count = 4000;
    for (int i = 0; i < count; ++i) {
        CAPTURE(i);
        std::vector<node> nodes;
        std::string text;
        const int last = random.whole(1, 8);
        for (int x = 0; x <= last; ++x) {
            node here{static_cast<double>(x) * m};
            if (random.in(0, 1) < 0.5) here.transverse = random.toss() ? rigid : 0.5;
            const bool at_end = x == 0 || x == last;
            if (at_end && random.in(0, 1) < 0.3) here.turning = random.toss() ? rigid : 0.25;
            if (!at_end && random.in(0, 1) < 0.4) here.is_hinge = true;
            text += std::to_string(x) + (here.transverse > 0 ? " held" : "") + (here.turning > 0 ? " turning" : "") +
                    (here.is_hinge ? " hinge; " : "; ");
            nodes.push_back(here);
        }
        CAPTURE(text);
        const bool moves = can_move(nodes);
        CHECK((detail::loose_node(nodes) != nullptr) == moves);
        mechanisms += moves ? 1 : 0;
    }
    CHECK(mechanisms > count / 5);
    CHECK(mechanisms < count * 4 / 5);
}

TEST_CASE("the place that is named can move") {
    const auto named = [](std::vector<node> nodes) {
        const auto* const found = detail::loose_node(nodes);
        return found == nullptr ? -1.0 : found->at.value();
    };
    const auto held = [](double x) { return node{x * m, rigid}; };
    const auto bare = [](double x) { return node{x * m}; };
    const auto hinge = [](double x) {
        node made{x * m};
        made.is_hinge = true;
        return made;
    };
    CHECK(named({held(0), bare(5), held(6)}) == -1);
    CHECK(named({bare(0), held(3), bare(6)}) == 6);                      // turns about 3
    CHECK(named({bare(0), held(6)}) == 0);                               // turns about 6
    CHECK(named({held(0), hinge(3), held(6)}) == 3);                     // folds
    CHECK(named({held(0), hinge(3), bare(6)}) == 3);                     // hangs down
    CHECK(named({held(0), hinge(2), hinge(3), held(4), held(6)}) == 2);  // turns about 3, which rests
    CHECK(named({held(0), held(2), hinge(3), held(4), bare(6)}) == -1);  // an arm on a strut
    CHECK(named({held(0), held(2), hinge(3), hinge(4), held(6)}) == 4);
}

TEST_CASE("mechanisms whose pivots were rounding are refused") {
    // Found among 2,000,000 random beams: the hinges leave three bars that two springs hold, and no pivot was small.
    auto b = continuous_beam(0.541258 * m, 1341.718898 * N * m2);
    b.support_at(0.0 * m).support_at(0.046709 * m).support_at(0.149854 * m);
    b.spring_at(0.45537 * m, 23397.494479 * N / m).spring_at(0.541258 * m, 4670089.209753 * N / m);
    b.hinge_at(0.231135 * m).hinge_at(0.287982 * m).hinge_at(0.457182 * m);
    const auto said = refusal([&] { (void)b.under(point_load(1.0 * kN, at(0.3 * m))); });
    CAPTURE(said);
    CHECK(said.find("continuous_beam: the place = 0.457182 m can move freely: the beam is a mechanism") == 0);
}
