// The force method: its steps when compiling and at run time, against the closed forms of the same beams, and what it
// refuses. Published beams stand in tests/published/force_method.cpp.
#include <sagitta/force_method.hpp>

#include <support/doctest_quantities.hpp>
#include <support/refusal.hpp>
#include <support/relative.hpp>

#include <sagitta/continuous_beam.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/extremes.hpp>
#include <sagitta/shear_flexible.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <string>
#include <tuple>
#include <type_traits>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;
using release_types::kind;

namespace {

constexpr auto L = 9.0 * m;
constexpr auto EI = 17.5 * MN * m2;
constexpr auto loads = uniform_load(4.5 * kN / m) + point_load(22.0 * kN, at(3.5 * m)) +
                       applied_couple(8.0 * kN * m, at(6.5 * m)) +
                       temperature_gradient(12e-6 / K, 9.0 * K, warm_side::top, 0.3 * m);

/// Greatest difference of any response along two lines, of its greatest value.
template <class A, class B>
double gap(const A& a, const B& b) {
    double greatest = 0;
    const auto compare = [&](const auto& response) {
        double apart = 0;
        double size = 0;
        for (int i = 0; i <= 96; ++i) {
            const auto x = a.supported().span() * (i / 96.0);
            const double one = response(a, x);
            apart = std::max(apart, std::abs(one - response(b, x)));
            size = std::max(size, std::abs(one));
        }
        greatest = std::max(greatest, apart / size);
    };
    compare([](const auto& l, const auto& x) { return l.deflection(x).value(); });
    compare([](const auto& l, const auto& x) { return l.slope(x).value(); });
    compare([](const auto& l, const auto& x) { return l.moment(x).value(); });
    compare([](const auto& l, const auto& x) { return l.shear(x).value(); });
    return greatest;
}

continuous_beam<> on_supports(std::initializer_list<double> places) {
    continuous_beam b(L, EI);
    for (const double x : places) b.support_at(x * m);
    return b;
}

}  // namespace

TEST_CASE("all steps when compiling: a propped cantilever from a simple beam") {
    // Two redundants of unlike dimension. The formulas are those of the simple beam: a force at a deflects it by
    // a^2 b^2/3 EI L, a couple at its end turns it by L/3 EI (common practice, no source).
    constexpr auto method = force_method(simple_beam(L, EI), translation_at(3.0 * m), rotation_at(0.0 * m));
    constexpr auto solved = method.under(uniform_load(4.0 * kN / m));

    constexpr auto f_00 = solved.flexibility<0, 0>();
    constexpr auto f_01 = solved.flexibility<0, 1>();
    constexpr auto f_10 = solved.flexibility<1, 0>();
    constexpr auto f_11 = solved.flexibility<1, 1>();
    static_assert(std::is_same_v<decltype(f_00), const decltype(1.0 * mm / (1.0 * kN))>);
    static_assert(std::is_same_v<decltype(f_01), const decltype(1.0 / (1.0 * kN))>);
    static_assert(std::is_same_v<decltype(f_10), const decltype(1.0 * rad / (1.0 * kN))>);
    static_assert(std::is_same_v<decltype(f_11), const decltype(1.0 * rad / (1.0 * kN * m))>);
    CHECK(relative(f_00 / (m / N), 9.0 * 36 / (3 * 17.5e6 * 9)) < 1e-14);
    CHECK(relative(f_01 / (1.0 / N), 3.0 * 6 * 15 / (6 * 17.5e6 * 9)) < 1e-14);  // a b (L + b)/6 EI L
    CHECK(relative(f_11 / (rad / (N * m)), 9 / (3 * 17.5e6)) < 1e-14);
    static_assert(solved.reciprocity_residual() < 1e-15);

    static_assert(std::is_same_v<decltype(solved.displacement<0>()), quantity<dimension::length>>);
    static_assert(std::is_same_v<decltype(solved.displacement<1>()), quantity<dimension::plane_angle>>);
    static_assert(solved.required<0>() == -solved.displacement<0>());
    static_assert(solved.displacement<0>() == solved.released_line().deflection(3.0 * m));
    static_assert(solved.displacement<1>() == solved.released_line().slope(0.0 * m));

    static_assert(std::is_same_v<decltype(solved.redundant<0>()), quantity<dimension::force>>);
    static_assert(std::is_same_v<decltype(solved.redundant<1>()), quantity<dimension::moment>>);
    static_assert(solved.reaction<0>() == -solved.redundant<0>());
    // Each row closes with the units of its own.
    static_assert(abs(f_00 * solved.redundant<0>() + f_01 * solved.redundant<1>() - solved.required<0>()) < 1e-15 * m);
    static_assert(abs(f_10 * solved.redundant<0>() + f_11 * solved.redundant<1>() - solved.required<1>()) <
                  1e-15 * rad);

    // The line is that of the original beam, and any question takes it while compiling.
    constexpr auto line = solved.line();
    static_assert(abs(line.deflection(3.0 * m)) < 1e-14 * m);
    static_assert(abs(line.slope(0.0 * m)) < 1e-15 * rad);
    static_assert(abs(greatest_deflection(line).value) < L / 500);
    static_assert(abs(line.moment(0.0 * m) - solved.redundant<1>()) < 1e-9 * N * m);
    const auto nodes = on_supports({0, 3, 9}).clamp(end::left).under(uniform_load(4.0 * kN / m));
    CHECK(gap(nodes, line) < 1e-13);
    CHECK(relative(solved.reaction<0>() / N, nodes.reaction_at(3.0 * m) / N) < 1e-13);

    static_assert(method.unit_line<0>().deflection(3.0 * m).value() == f_00.value());
    static_assert(method.unit_line<1>().moment(0.0 * m) == 1.0 * N * m);
}

TEST_CASE("the library's own closed forms from other released structures") {
    const auto tip = translation_at(L);
    const auto turned_left = rotation_at(0.0 * m);
    const auto turned_right = rotation_at(L);
    const auto simple = simple_beam(L, EI);
    const auto arm = cantilever(L, EI);
    const auto propped = propped_cantilever(L, EI);
    const auto fixed = fixed_beam(L, EI);
    const auto moved = loads + settlement(end::left, 4.0 * mm);
    CHECK(gap(propped.under(loads), force_method(arm, tip).under(loads).line()) < 1e-13);
    CHECK(gap(propped.under(moved), force_method(simple, turned_left).under(moved).line()) < 1e-13);
    CHECK(gap(fixed.under(loads), force_method(arm, tip, turned_right).under(loads).line()) < 1e-13);
    CHECK(gap(fixed.under(loads), force_method(simple, turned_left, turned_right).under(loads).line()) < 1e-13);
    CHECK(gap(fixed.under(moved), force_method(propped, turned_right).under(moved).line()) < 1e-13);
    CHECK(gap(fixed.under(loads),
              force_method(mirrored(arm), translation_at(0.0 * m), turned_left).under(loads).line()) < 1e-13);
    const auto guided = beam_with_ends<held::guided, held::pinned>(L, EI);
    const auto held = translation_at(0.0 * m);
    CHECK(gap(propped.under(loads), force_method(guided, held).under(loads).line()) < 1e-13);

    // Prescribed movements are settlements and support rotations.
    const auto sunk = settlement(end::right, 6.0 * mm) + support_rotation(end::right, 2.0 * mrad);
    const auto sunk_tip = force_method(arm, tip.prescribed(6.0 * mm), turned_right.prescribed(2.0 * mrad)).under(loads);
    CHECK(gap(fixed.under(loads + sunk), sunk_tip.line()) < 1e-13);
    CHECK(sunk_tip.required<0>() == 6.0 * mm - sunk_tip.displacement<0>());
}

TEST_CASE("beams that deform in shear: it is sections that are released and turned") {
    const auto kGA = 3.0 * MN;
    const auto stocky = [&](const auto& beam) { return beam.with_shear_rigidity(kGA); };
    const auto simple = stocky(simple_beam(L, EI));
    const auto arm = stocky(cantilever(L, EI));
    const auto fixed = stocky(fixed_beam(L, EI)).under(loads);
    const auto by_rotations = force_method(simple, rotation_at(0.0 * m), rotation_at(L)).under(loads);
    const auto by_tip = force_method(arm, translation_at(L), rotation_at(L)).under(loads);
    CHECK(gap(fixed, by_rotations.line()) < 1e-13);
    CHECK(gap(fixed, by_tip.line()) < 1e-13);
    CHECK(by_rotations.reciprocity_residual() < 1e-15);
    CHECK(by_tip.reciprocity_residual() < 1e-15);
    // Forces and couples anywhere: by slopes dv/dx this would not be reciprocal.
    const auto mixed = force_method(simple, translation_at(2.0 * m), rotation_at(5.0 * m), rotation_at(0.0 * m),
                                    translation_at(6.0 * m));
    CHECK(mixed.flexibility().reciprocity_residual() < 1e-14);
}

TEST_CASE("continuous beams, from supports taken away, clamps loosened and hinges put in") {
    auto original =
        on_supports({0, 3.5, 6}).clamp(end::left).spring_at(9.0 * m, 2.0 * kN / mm).settle_at(3.5 * m, 4.0 * mm);
    original.rigidity_from(5.0 * m, 1.5 * EI);
    const auto expected = original.under(loads);

    auto hinged =
        on_supports({0, 3.5, 6}).hinge_at(3.5 * m).settle_at(3.5 * m, 4.0 * mm).spring_at(9.0 * m, 2.0 * kN / mm);
    hinged.rigidity_from(5.0 * m, 1.5 * EI);
    const auto moments = force_method(hinged, rotation_at(0.0 * m), relative_rotation_at(3.5 * m)).under(loads);
    CHECK(gap(expected, moments.line()) < 1e-13);
    CHECK(moments.reciprocity_residual() < 1e-15);
    CHECK(relative(moments.redundant<0>() / (N * m), expected.end_moment(end::left) / (N * m)) < 1e-12);
    CHECK(relative(moments.redundant<1>() / (N * m), expected.moment(3.5 * m) / (N * m)) < 1e-12);

    auto free = on_supports({0, 6}).clamp(end::left);
    free.rigidity_from(5.0 * m, 1.5 * EI);
    const auto forces =
        force_method(free, translation_at(3.5 * m).prescribed(4.0 * mm), translation_at(L).on_spring(2.0 * kN / mm))
            .under(loads);
    CHECK(gap(expected, forces.line()) < 1e-12);
    CHECK(relative(forces.reaction<0>() / N, expected.reaction_at(3.5 * m) / N) < 1e-12);
    CHECK(relative(forces.reaction<1>() / N, expected.reaction(end::right) / N) < 1e-12);
    // A spring gives way by what it carries.
    CHECK(relative(forces.line().deflection(L) / m, forces.reaction<1>() / (2.0 * kN / mm) / m) < 1e-12);
}

TEST_CASE("a clamp that gives, a hinge that resists and was built with a kink") {
    const auto k = 900.0 * kN * m / rad;
    const auto clamp = force_method(simple_beam(L, EI), rotation_at(0.0 * m).on_spring(k)).under(loads);
    const auto given = on_supports({0, 9}).turning_spring(end::left, k).under(loads);
    CHECK(gap(given, clamp.line()) < 1e-13);

    const auto spans = on_supports({0, 4, 9}).hinge_at(4.0 * m);
    const auto joint =
        force_method(spans, relative_rotation_at(4.0 * m).on_spring(k).prescribed(3.0 * mrad)).under(loads);
    const auto line = joint.line();
    const auto jump = line.slope(4.0 * m, just_right) - line.slope(4.0 * m, just_left);
    // M = -k (jump - kink): the moment is sagging where the hinge has opened less than it was built.
    CHECK(relative(joint.redundant<0>() / (N * m), k * (3.0 * mrad - jump) / (N * m)) < 1e-12);
    CHECK(relative(line.moment(4.0 * m) / (N * m), joint.redundant<0>() / (N * m)) < 1e-13);
}

TEST_CASE("settlements of the released structure move it, not its unit states") {
    const auto spans = [] { return on_supports({0, 4, 9}).hinge_at(4.0 * m); };
    const auto still = force_method(spans(), relative_rotation_at(4.0 * m));
    const auto sunk = force_method(spans().settle_at(4.0 * m, 9.0 * mm), relative_rotation_at(4.0 * m));
    CHECK(sunk.flexibility().coefficient<0, 0>() == still.flexibility().coefficient<0, 0>());
    CHECK(sunk.unit_line<0>().deflection(4.0 * m) == 0.0 * m);
    const auto line = sunk.under(loads).line();
    CHECK(gap(on_supports({0, 4, 9}).settle_at(4.0 * m, 9.0 * mm).under(loads), line) < 1e-12);

    // A hinge that passes a moment on already gets the redundant on top of it.
    const auto rusty =
        force_method(on_supports({0, 4, 9}).hinge_at(4.0 * m, 5.0 * kN * m), relative_rotation_at(4.0 * m));
    const auto closed = rusty.under(loads);
    CHECK(gap(on_supports({0, 4, 9}).under(loads), closed.line()) < 1e-12);
    CHECK(relative((closed.redundant<0>() + 5.0 * kN * m) / (N * m), still.under(loads).redundant<0>() / (N * m)) <
          1e-12);
}

TEST_CASE("at run time the numbers are the same, and the indices know their dimensions") {
    const auto simple = simple_beam(L, EI);
    const auto pier = translation_at(3.0 * m).prescribed(2.0 * mm);
    const auto spring = translation_at(6.0 * m).on_spring(5.0 * kN / mm);
    const auto clamp = rotation_at(0.0 * m);
    const auto fixed_size = force_method(simple, pier, clamp, spring).under(loads);

    release_list list;
    const auto at_pier = list.add(pier);
    const auto at_clamp = list.add(clamp);
    const auto at_spring = list.add(spring);
    const auto method = force_method(simple, list);
    const auto solved = method.under(load_list<>(loads));
    const auto same = method.under(loads);

    static_assert(std::is_same_v<decltype(solved.displacement(at_pier)), quantity<dimension::length>>);
    static_assert(std::is_same_v<decltype(solved.redundant(at_clamp)), quantity<dimension::moment>>);
    static_assert(std::is_same_v<decltype(solved.flexibility(at_clamp, at_spring)), decltype(1.0 * rad / (1.0 * N))>);
    CHECK(solved.displacement(at_pier) == fixed_size.displacement<0>());
    CHECK(solved.displacement(at_clamp) == fixed_size.displacement<1>());
    CHECK(solved.required(at_pier) == fixed_size.required<0>());
    CHECK(solved.flexibility(at_pier, at_clamp) == fixed_size.flexibility<0, 1>());
    CHECK(solved.flexibility(at_clamp, at_spring) == fixed_size.flexibility<1, 2>());
    CHECK(solved.reciprocity_residual() == fixed_size.reciprocity_residual());
    CHECK(solved.redundant(at_clamp) == fixed_size.redundant<1>());
    CHECK(solved.reaction(at_spring) == fixed_size.reaction<2>());
    CHECK(same.reaction(at_spring) == fixed_size.reaction<2>());
    CHECK(method.unit_line(at_clamp).slope(0.0 * m).value() == solved.flexibility(at_clamp, at_clamp).value());
    CHECK(gap(fixed_size.line(), solved.line()) < 1e-14);
    CHECK(gap(fixed_size.line(), same.line()) < 1e-14);
    CHECK(gap(fixed_size.line(), force_method(simple, pier, clamp, spring).under(load_list<>(loads)).line()) < 1e-14);
    const auto wrong = solved.flexibility().with(at_pier, at_clamp, 1.01 * solved.flexibility(at_pier, at_clamp));
    CHECK(wrong.reciprocity_residual() > 1e-3);
}

TEST_CASE("no release at all leaves the released structure") {
    const auto solved = force_method(simple_beam(L, EI), release_list<>()).under(loads);
    CHECK(gap(simple_beam(L, EI).under(loads), solved.line()) == 0);
    CHECK(solved.reciprocity_residual() == 0);
}

TEST_CASE("many spans, as a beam without supports and as hinged spans") {
    // The moments over the supports of a long row under one load fade by sqrt 3 - 2 from support to support (three
    // moments, Clapeyron; common practice, no source).
    constexpr int spans = 40;
    continuous_beam hinged(spans * 1.0 * m, EI);
    auto original = hinged;
    release_list hinges;
    std::vector<release_index<kind::relative_rotation>> over;
    for (int i = 0; i <= spans; ++i) {
        hinged.support_at(i * 1.0 * m);
        original.support_at(i * 1.0 * m);
    }
    for (int i = 1; i < spans; ++i) {
        hinged.hinge_at(i * 1.0 * m);
        over.push_back(hinges.add(relative_rotation_at(i * 1.0 * m)));
    }
    const auto load = point_load(10.0 * kN, at(0.5 * m));
    const auto solved = force_method(hinged, hinges).under(load);
    CHECK(gap(original.under(load), solved.line()) < 1e-13);
    CHECK(solved.reciprocity_residual() < 1e-15);
    for (std::size_t i = 1; i < 20; ++i) {
        const double ratio = (solved.redundant(over[i]) / solved.redundant(over[i - 1])).value();
        CHECK(ratio == doctest::Approx(std::sqrt(3.0) - 2).epsilon(1e-12));
    }
    // Only neighbours have a flexibility in common.
    CHECK(std::abs(solved.flexibility(over[3], over[5]).value()) < 1e-22);
    CHECK(relative(solved.flexibility(over[3], over[4]) / (rad / (N * m)), 1 / (6 * 17.5e6)) < 1e-13);
}

TEST_CASE("a relative rotation counts as right less left: the other way than a kink, which sags") {
    // Two spans of 8 m with a hinge in the first; hinge and lack of fit by both ways of saying it.
    continuous_beam released(16.0 * m, 2.0e7 * N * m2);
    released.support_at(0.0 * m).support_at(8.0 * m).support_at(16.0 * m).hinge_at(3.0 * m);
    continuous_beam whole(16.0 * m, 2.0e7 * N * m2);
    whole.support_at(0.0 * m).support_at(8.0 * m).support_at(16.0 * m);
    const auto solved =
        force_method(released, relative_rotation_at(3.0 * m).prescribed(1.0 * mrad)).under(load_list<>{});
    const auto kinked = whole.under(imposed_kink(-1.0 * mrad, at(3.0 * m)));
    for (const double x : {1.0, 3.0, 6.0, 8.0, 12.0}) {
        CHECK(std::abs((solved.line().deflection(x * m) - kinked.deflection(x * m)) / m) < 1e-15);
    }
    CHECK(std::abs((solved.redundant<0>() - kinked.moment(3.0 * m)) / (N * m)) < 1e-9);
    // Under a load the hinge sags and the released rotation is negative; the redundant then is a sagging moment.
    const auto loaded =
        force_method(released, relative_rotation_at(3.0 * m)).under(load_list<>(uniform_load(5.0 * kN / m)));
    CHECK(loaded.displacement<0>() < 0.0 * rad);
    CHECK(loaded.redundant<0>() > 0.0 * N * m);
}

TEST_CASE("what cannot be released is refused by name") {
    const auto simple = simple_beam(L, EI);
    const auto arm = cantilever(L, EI);
    const auto method = [](const auto&... given) { return refusal([&] { (void)force_method(given...); }); };
    CHECK(method(simple, translation_at(3.0 * m), translation_at(L)) ==
          "translation_at: x = 9 m cannot be released: the released structure holds it");
    CHECK(method(simple, translation_at(0.0 * m)) ==
          "translation_at: x = 0 m cannot be released: the released structure holds it");
    CHECK(method(arm, rotation_at(0.0 * m)) ==
          "rotation_at: x = 0 m cannot be released: the released structure holds it");
    CHECK(method(simple, translation_at(9.5 * m)) == "translation_at: x = 9.5 m must lie on the beam, from 0 m to 9 m");
    const auto dependent = "translation_at: x = 4 m is not independent: the other releases, if held, hold it as well";
    CHECK(method(simple, translation_at(4.0 * m), translation_at(4.0 * m)) == dependent);
    CHECK(method(simple, translation_at(4.0 * m), rotation_at(0.0 * m), translation_at(4.0 * m)) == dependent);
    CHECK(method(simple, rotation_at(2.0 * m), rotation_at(2.0 * m)) ==
          "rotation_at: x = 2 m is not independent: the other releases, if held, hold it as well");
    // Two springs at one place share what they carry.
    const auto pair = force_method(simple, translation_at(4.0 * m).on_spring(1.0 * kN / mm),
                                   translation_at(4.0 * m).on_spring(3.0 * kN / mm))
                          .under(loads);
    const auto one = force_method(simple, translation_at(4.0 * m).on_spring(4.0 * kN / mm)).under(loads);
    CHECK(relative(pair.reaction<1>() / N, 0.75 * one.reaction<0>() / N) < 1e-12);

    const auto hinged = on_supports({0, 4, 9}).hinge_at(4.0 * m);
    CHECK(method(hinged, relative_rotation_at(3.0 * m)) ==
          "relative_rotation_at: x = 3 m must be a place where the released structure has a hinge");
    release_list list;
    list.add(relative_rotation_at(3.0 * m));
    CHECK(method(simple, list) ==
          "relative_rotation_at: x = 3 m must be a hinge, which of the released structures only a continuous_beam has");
    release_list other;
    const auto pier = other.add(translation_at(3.0 * m));
    const auto solved = force_method(simple, other).under(loads);
    CHECK(refusal([&] { (void)solved.redundant(release_index<kind::rotation>{pier.value}); }) ==
          "release_index = 0 must come from this list of releases");
    CHECK(refusal([&] { (void)solved.flexibility(pier, release_index<kind::translation>{3}); }) ==
          "release_index = 3 must come from this list of releases");

    // A mechanism is refused by the beam itself, and so is a load that does not lie on it.
    CHECK(refusal([] { (void)force_method(on_supports({0}), translation_at(4.0 * m)); }).find("mechanism") !=
          std::string::npos);
    const auto beyond = point_load(1.0 * kN, at(9.5 * m));
    CHECK(refusal([&] { (void)force_method(simple, other).under(beyond); }).find("at = 9.5 m must not lie beyond") !=
          std::string::npos);
}
