// The integrator of continuous beams against direct stiffness in exact arithmetic: no answer of the library takes part.
#include <support/continuous_scene.hpp>
#include <support/relative.hpp>

#include <sagitta/detail/continuous_integrator.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <cstddef>
#include <limits>
#include <string>

namespace {

namespace mp = boost::multiprecision;
using wide = mp::number<mp::cpp_bin_float<100>, mp::et_off>;
using answer = reference::quantity;
using reference::from;
using integrator = sagitta::detail::continuous_integrator<double>;

/// Greatest value and greatest error of a quantity along a beam.
struct error_of {
    double size = 0, error = 0;

    void compare(double computed, const wide& truth) {
        size = std::max(size, std::abs(static_cast<double>(truth)));
        const double e = std::abs(static_cast<double>(wide(wide(computed) - truth)));
        if (!(e <= error)) error = e;
    }
    /// What vanishes but for rounding is measured by what the others imply.
    [[nodiscard]] double relative(double implied) const {
        const double rounding = implied * (1e6 * std::numeric_limits<double>::epsilon());
        return error == 0 ? 0 : error / (size < rounding ? implied : size);
    }
};

struct found {
    std::array<double, 4> error{};  // deflection, slope, moment, shear
    double support = 0;
    int beams = 0;

    [[nodiscard]] double greatest() const {
        double most = support;
        for (const double e : error) {
            if (!(e <= most)) most = e;
        }
        return most;
    }
    void take(const found& one) {
        for (std::size_t q = 0; q < 4; ++q) error[q] = std::max(error[q], one.error[q]);
        support = std::max(support, one.support);
        ++beams;
    }
};

std::string report(const found& f) {
    const auto number = [](double x) { return std::string(doctest::toString(x).c_str()); };
    return "deflection " + number(f.error[0]) + ", slope " + number(f.error[1]) + ", moment " + number(f.error[2]) +
           ", shear " + number(f.error[3]) + ", at supports " + number(f.support) + " on " + std::to_string(f.beams) +
           " beams";
}

found compare(const scene::continuous& c, const reference::continuous<wide>& exact) {
    const integrator integrated(scene::beam_of(c), scene::list_of(c.loads));
    const double f = std::isinf(c.kGA) ? 0 : 1 / c.kGA;
    std::array<error_of, 4> along;
    const auto at = [&](double x, from which, const sagitta::detail::line_state<double>& s) {
        const std::array<double, 4> values{s.deflection, s.turn + s.shear * f, s.moment, s.shear};
        for (std::size_t q = 0; q < 4; ++q) {
            along[q].compare(values[q], exact.value(static_cast<answer>(q), wide(x), which));
        }
    };
    for (const auto& part : integrated.parts()) {
        for (const auto& p : part.panels()) {
            if (p.from == p.to) continue;  // a lack of fit: its neighbours have its two sides
            at(p.from, from::right, p.at_from);
            at(p.to, from::left, p.at_to);
        }
    }
    error_of force{along[3].size}, moment{along[2].size};
    const auto described = scene::beam_of(c);
    for (std::size_t i = 0; i < described.nodes().size(); ++i) {
        const auto& node = described.nodes()[i];
        force.compare(integrated.reaction(i), exact.reaction(node.at.value()));
    }
    moment.compare(integrated.left_end_moment(), exact.end_moment(true));
    moment.compare(integrated.right_end_moment(), exact.end_moment(false));

    const double span = c.mean_span;
    const double stiff = c.EI / span;
    force.size = std::max(force.size, along[3].size);
    moment.size = std::max(moment.size, along[2].size);
    const double implied =
        std::max({along[0].size / span * stiff, along[1].size * stiff, moment.size, force.size * span});
    return {{along[0].relative(implied / stiff * span), along[1].relative(implied / stiff), along[2].relative(implied),
             along[3].relative(implied / span)},
            std::max(force.relative(implied / span), moment.relative(implied))};
}

found random_beams(std::uint64_t seed, int count, const scene::continuous_kind& how, double bound) {
    CAPTURE(seed);
    scene::chance random(seed);
    scene::random_continuous draw(random, how);
    found worst;
    for (int i = 0; i < count; ++i) {
        CAPTURE(i);
        const auto c = draw.draw();
        INFO(scene::text(c));
        auto exact = scene::reference_of<wide>(c);
        if (!exact.solve()) continue;  // a mechanism
        REQUIRE(exact.misfit() < 1e-25);
        const auto one = compare(c, exact);
        INFO(report(one));
        CHECK(one.greatest() <= bound);
        worst.take(one);
    }
    CHECK(worst.beams > count * 3 / 4);
    return worst;
}

}  // namespace

TEST_CASE("random beams on rigid supports, integrated, within 1e-12 of the greatest value") {
    scene::continuous_kind how;
    how.rigid_share = 1;
    how.spans_most = 12;
    MESSAGE("greatest errors: " << report(random_beams(8101, 600, how, 1e-12)));
}

TEST_CASE("random beams on springs a hundred times softer to a hundred times stiffer, integrated, within 1e-12") {
    scene::continuous_kind how;
    how.spring_decades = 2;
    MESSAGE("greatest errors: " << report(random_beams(8102, 1200, how, 1e-12)));
}

TEST_CASE("random beams on the softest and stiffest springs, integrated, within 1e-12") {
    MESSAGE("greatest errors: " << report(random_beams(8103, 1200, {}, 1e-12)));
}

TEST_CASE("random beams with parts shorter than a fiftieth of the mean span, integrated, within 1e-12") {
    for (const double shortest : {1e-2, 1e-3, 1e-4, 1e-6}) {
        scene::continuous_kind how;
        how.rigid_share = 1;
        how.shortest_part = shortest;
        MESSAGE("shortest part " << shortest << ": " << report(random_beams(8104, 300, how, 1e-12)));
    }
}

TEST_CASE("a hinge that passes on the moment of Clapeyron's equation changes nothing") {
    using namespace sagitta::units;
    const double EI = 5e6, w = 2e3, left = 4, right = 6;
    // The support moment of two spans under a uniform load (Clapeyron's equation of three moments).
    const double M = -w * (left * left * left + right * right * right) / (8 * (left + right));
    auto beam = sagitta::continuous_beam((left + right) * m, EI * N * m2)
                    .support_at(0.0 * m)
                    .support_at(left * m)
                    .support_at((left + right) * m);
    beam.hinge_at(left * m, M * N * m);
    const integrator integrated(beam, sagitta::load_list(sagitta::uniform_load(w * N / m)));
    const auto& before = integrated.parts().front().end();
    const auto& after = integrated.parts().back().start();
    CHECK(relative(before.moment, M) < 1e-13);
    CHECK(relative(after.moment, M) < 1e-13);
    CHECK(relative(after.turn, before.turn) < 1e-13);
    CHECK(relative(integrated.reaction(0), w * left / 2 + M / left) < 1e-13);
    CHECK(relative(integrated.reaction(2), w * right / 2 + M / right) < 1e-13);
}

TEST_CASE("the mean length of parts, and what they turn by under a unit moment") {
    using namespace sagitta::units;
    auto beam = sagitta::continuous_beam(10.0 * m, 5.0 * MN * m2).support_at(0.0 * m).support_at(10.0 * m);
    beam.rigidity_from(4.0 * m, 10.0 * MN * m2);
    const integrator integrated(beam, sagitta::load_list(sagitta::uniform_load(1.0 * N / m)));
    CHECK(integrated.mean_span() == 5);
    CHECK(relative(integrated.mean_flexibility(), (4 / 5e6 + 6 / 10e6) / 2) < 1e-15);
}
