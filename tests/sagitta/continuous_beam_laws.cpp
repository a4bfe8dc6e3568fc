// Laws that every beam obeys, whatever its supports: no reference is needed to see them broken. Seeds are printed.
#include <support/continuous_scene.hpp>

#include <sagitta/extremes.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <string>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;
using scene::kind;

namespace {

struct sizes {
    double v, slope, M, V;
    template <class Line>
    explicit sizes(const Line& line)
        : v(std::abs(greatest_deflection(line).value.value())),
          slope(std::abs(extremes_of_slope(line).governing().value.value())),
          M(std::abs(extremes_of_moment(line).governing().value.value())),
          V(std::abs(extremes_of_shear(line).governing().value.value())) {
        // What the ends pass on counts, also where nothing of it is left inside.
        M = std::max({M, std::abs(line.end_moment(end::left).value()), std::abs(line.end_moment(end::right).value())});
    }
};

/// Calls law(scene, random) for random beams that are no mechanisms.
template <class Law>
void for_random_beams(std::uint64_t seed, int count, const Law& law) {
    CAPTURE(seed);
    scene::chance random(seed);
    scene::continuous_kind how;
    how.spring_decades = 2;
    scene::random_continuous draw(random, how);
    for (int beams = 0; beams < count;) {
        const auto c = draw.draw();
        INFO(scene::text(c));
        try {
            (void)scene::beam_of(c).under(scene::list_of(c.loads));
        } catch (const invalid_input&) {
            continue;
        }
        law(c, random);
        ++beams;
    }
}

auto line_of(const scene::continuous& c) { return scene::beam_of(c).under(scene::list_of(c.loads)); }

/// Force, and its moment about the left end, of a load.
std::array<double, 2> resultant(const scene::load& l, double L) {
    const bool whole = l.what == kind::uniform || l.what == kind::linear_whole;
    const double a = whole ? 0 : l.from, b = whole ? L : l.to;
    switch (l.what) {
        case kind::point:
            return {l.size, l.size * l.from};
        case kind::couple:
            return {0, l.size};
        case kind::uniform:
        case kind::partial_uniform:
            return {l.size * (b - a), l.size * (b - a) * (a + b) / 2};
        case kind::linear:
        case kind::linear_whole: {
            const double F = (l.size + l.size_to) / 2 * (b - a);
            return {F, F * a + (b - a) * (b - a) * (l.size / 6 + l.size_to / 3)};
        }
        default:
            return {0, 0};
    }
}

scene::continuous mirrored_scene(const scene::continuous& c) {
    auto image = c;
    for (auto& s : image.supports) s.at = c.L - s.at;
    for (auto& at : image.hinges) at = c.L - at;
    std::swap(image.turning[0], image.turning[1]);
    // The stiffness right of a step is what lies left of its image.
    auto steps = c.steps;
    std::stable_sort(steps.begin(), steps.end(), [](const auto& a, const auto& b) { return a.from < b.from; });
    image.steps.clear();
    image.EI = steps.empty() ? c.EI : steps.back().EI;
    for (std::size_t i = steps.size(); i-- > 0;) {
        image.steps.push_back({c.L - steps[i].from, i == 0 ? c.EI : steps[i - 1].EI});
    }
    for (auto& l : image.loads) {
        const double from = c.L - l.to;
        switch (l.what) {
            case kind::couple:
            case kind::offset:
                l.size = -l.size;
                [[fallthrough]];
            case kind::point:
            case kind::kink:
                l.from = c.L - l.from;
                break;
            case kind::linear_whole:
            case kind::linear:
                std::swap(l.size, l.size_to);
                [[fallthrough]];
            case kind::partial_uniform:
            case kind::partial_curvature:
                l.to = c.L - l.from;
                l.from = from;
                break;
            case kind::settlement_left:
                l.what = kind::settlement_right;
                break;
            case kind::settlement_right:
                l.what = kind::settlement_left;
                break;
            case kind::rotation_left:
                l.what = kind::rotation_right;
                l.size = -l.size;
                break;
            case kind::rotation_right:
                l.what = kind::rotation_left;
                l.size = -l.size;
                break;
            default:
                break;
        }
    }
    return image;
}

}  // namespace

TEST_CASE("equilibrium: reactions and end moments balance the loads") {
    double worst = 0;
    for_random_beams(7701, 1500, [&](const scene::continuous& c, scene::chance&) {
        const auto line = line_of(c);
        double up = 0, about_left = 0, size = 0;
        for (const auto& l : c.loads) {
            const auto [F, moment] = resultant(l, c.L);
            up -= F;
            about_left -= moment;
            size += std::abs(F) + std::abs(moment) / c.L;
        }
        for (const auto& s : c.supports) {
            const double R = line.reaction_at(s.at * m).value();
            up += R;
            about_left += R * s.at;
            size += std::abs(R);
        }
        // A sagging end moment turns the beam clockwise at its left end, the other way at its right end.
        const double left = line.end_moment(end::left).value(), right = line.end_moment(end::right).value();
        about_left -= left - right;
        size += (std::abs(left) + std::abs(right)) / c.L;
        if (size == 0) return;
        worst = std::max({worst, std::abs(up) / size, std::abs(about_left) / c.L / size});
    });
    MESSAGE("greatest imbalance, of all forces there: " << worst);
    CHECK(worst < 1e-12);
}

TEST_CASE("reciprocity: forces and couples at two places (Maxwell, Betti)") {
    double worst = 0;
    for_random_beams(7702, 700, [&](const scene::continuous& c, scene::chance& random) {
        auto free = c;
        for (auto& s : free.supports) s.settled = 0;
        const auto b = scene::beam_of(free);
        const double f = std::isinf(c.kGA) ? 0 : 1 / c.kGA;
        const auto x = random.in(0, c.L) * m, y = random.in(0, c.L) * m;
        const auto P = b.under(point_load(1.0 * N, at(x)));
        const auto Q = b.under(point_load(1.0 * N, at(y)));
        const auto C = b.under(applied_couple(1.0 * N * m, at(y)));
        const auto turn = [&](const auto& line, const auto& place) {
            return (line.slope(place).value() - line.shear(place).value() * f);
        };
        const auto compare = [&](double one, double other, double size) {
            worst = std::max(worst, std::abs(one - other) / size);
        };
        compare(P.deflection(y).value(), Q.deflection(x).value(), std::max(sizes(P).v, sizes(Q).v));
        compare(turn(P, y), C.deflection(x).value(), std::max(sizes(C).v, sizes(P).slope));
    });
    MESSAGE("greatest difference, of the greatest deflection: " << worst);
    CHECK(worst < 1e-12);
}

TEST_CASE("mirror symmetry: the mirrored beam under mirrored loads") {
    double worst = 0;
    for_random_beams(7703, 1000, [&](const scene::continuous& c, scene::chance& random) {
        const auto b = scene::beam_of(c);
        for (const auto& l : c.loads) {
            for (const auto& n : b.nodes()) {
                // Right at a node a couple or a misfit belongs to the part right of it, here as there.
                if (scene::is_concentrated(l.what) && n.at.value() == l.from) return;
            }
        }
        const auto line = line_of(c), image = line_of(mirrored_scene(c));
        const sizes size(line);
        for (int i = 0; i < 4; ++i) {
            const double x = random.in(0, c.L), y = c.L - x;
            if (size.v > 0) {
                worst = std::max(worst, std::abs((line.deflection(x * m) - image.deflection(y * m)).value()) / size.v);
            }
            if (size.M > 0) {
                worst = std::max(worst, std::abs((line.moment(x * m) - image.moment(y * m)).value()) / size.M);
            }
        }
    });
    MESSAGE("greatest difference, of the greatest value: " << worst);
    CHECK(worst < 1e-12);
}

TEST_CASE("linearity: the line of a sum of loads is the sum of their lines") {
    double worst = 0;
    for_random_beams(7704, 1000, [&](const scene::continuous& c, scene::chance& random) {
        auto at_rest = c;
        for (auto& s : at_rest.supports) s.settled = 0;
        const auto b = scene::beam_of(at_rest);
        const auto x = random.in(0, c.L) * m;
        const double factor = random.in(-3, 3);
        double v = 0, M = 0, size_v = 0, size_M = 0;
        for (const auto& l : c.loads) {
            const auto line = b.under(scene::list_of({l}) * factor);
            v += line.deflection(x).value();
            M += line.moment(x).value();
            size_v += sizes(line).v;
            size_M += sizes(line).M;
        }
        const auto whole = b.under(scene::list_of(c.loads) * factor);
        if (size_v > 0) worst = std::max(worst, std::abs(whole.deflection(x).value() - v) / size_v);
        if (size_M > 0) worst = std::max(worst, std::abs(whole.moment(x).value() - M) / size_M);
    });
    MESSAGE("greatest difference, of the sum of the greatest values: " << worst);
    CHECK(worst < 1e-12);
}

TEST_CASE("units: the same beam in feet and kip and in metres and newtons") {
    // What differs is the rounding of the conversion of every input.
    const auto metric = [](double ft_number) { return ft_number * 0.3048; };
    constexpr double kip_in_N = 4448.2216152605;
    double worst = 0;
    scene::chance random(7705);
    for (int i = 0; i < 200; ++i) {
        const double l1 = random.in(10, 30), l2 = random.in(10, 30), w = random.in(0.5, 4), P = random.in(1, 40);
        const double a = random.in(1, 9), k = random.in(10, 500), E = random.in(1000, 30000), I = random.in(100, 5000);
        continuous_beam us((l1 + l2) * ft, E * ksi * (I * in4));
        us.clamp(end::left).support_at(l1 * ft).spring_at((l1 + l2) * ft, k * kip / ft);
        const double ksi_in_Pa = kip_in_N / 0.0254 / 0.0254, inch4 = 0.0254 * 0.0254 * 0.0254 * 0.0254;
        continuous_beam si(metric(l1 + l2) * m, E * ksi_in_Pa * I * inch4 * N * m2);
        si.clamp(end::left).support_at(metric(l1) * m).spring_at(metric(l1 + l2) * m, k * kip_in_N / 0.3048 * N / m);
        const auto in_us = us.under(uniform_load(w * kip / ft) + point_load(P * kip, at(a * ft)));
        const auto in_si =
            si.under(uniform_load(w * kip_in_N / 0.3048 * N / m) + point_load(P * kip_in_N * N, at(metric(a) * m)));
        const double x = random.in(0, l1);
        worst = std::max(
            {worst, std::abs((in_us.deflection(x * ft) - in_si.deflection(metric(x) * m)).value()) / sizes(in_si).v,
             std::abs((in_us.moment(x * ft) - in_si.moment(metric(x) * m)).value()) / sizes(in_si).M});
    }
    MESSAGE("greatest difference, of the greatest value: " << worst);
    CHECK(worst < 1e-14);
}

TEST_CASE("continuity over supports, and the chain of derivatives between") {
    double worst_jump = 0, worst_chain = 0;
    for_random_beams(7706, 1000, [&](const scene::continuous& c, scene::chance& random) {
        const auto line = line_of(c);
        const auto b = scene::beam_of(c);
        const sizes size(line);
        for (const auto& s : c.supports) {
            if (s.at == 0 || s.at == c.L || size.v == 0) continue;
            bool hinged = false;
            for (const double h : c.hinges) hinged = hinged || h == s.at;
            double kink = 0, offset = 0;
            for (const auto& l : c.loads) {
                if (l.from == s.at && l.what == kind::kink) kink += l.size;
                if (l.from == s.at && l.what == kind::offset) offset += l.size;
            }
            const auto x = s.at * m;
            const auto jump = [&](const auto& before, const auto& after) { return (after - before).value(); };
            worst_jump = std::max(
                worst_jump,
                std::abs(jump(line.deflection(x, just_left), line.deflection(x, just_right)) - offset) / size.v);
            if (!hinged && std::isinf(c.kGA)) {
                worst_jump =
                    std::max(worst_jump, std::abs(jump(line.slope(x, just_left), line.slope(x, just_right)) + kink) /
                                             std::max(size.slope, size.v / c.L));
            }
        }
        // V is the derivative of M: over a stretch without joints the secant of a cubic is Simpson's mean of the slope.
        for (const auto& piece : piecewise_form(line)) {
            const double from = piece.from().value(), to = piece.to().value();
            if (to - from < 1e-3 * c.mean_span || size.M == 0) continue;
            const double h = to - from, t = random.in(0.2, 0.8);
            const auto M = [&](double x) { return piece.moment(x * m).value(); };
            const auto V = [&](double x) { return line.shear(x * m).value(); };
            const double a = from + 0.1 * h, z = from + (0.1 + t) * h;
            const double mean = (V(a) + 4 * V((a + z) / 2) + V(z)) / 6;
            worst_chain = std::max(worst_chain, std::abs(M(z) - M(a) - mean * (z - a)) / (size.M + size.V * h));
        }
    });
    MESSAGE("greatest jump " << worst_jump << ", greatest break of the chain " << worst_chain);
    CHECK(worst_jump < 1e-12);
    CHECK(worst_chain < 1e-12);
}
