// Laws that hold for every elastic line, whatever the formulas: checked on random loads with fixed seeds.
#include <support/doctest_quantities.hpp>
#include <support/reference.hpp>
#include <support/scene.hpp>

#include <sagitta/elastic_line.hpp>

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;
using reference::hold;
using scene::kind;

namespace {

constexpr double L = 7.2;
constexpr double EI = 1.75e7;

/// Sizes of the responses along a beam, for bounds relative to them.
template <class Line>
struct sizes {
    double deflection = 0, slope = 0, moment = 0, shear = 0;
    explicit sizes(const Line& line) {
        for (int i = 0; i <= 60; ++i) {
            const auto x = L * i / 60 * m;
            deflection = std::max(deflection, std::abs(line.deflection(x).value()));
            slope = std::max(slope, std::abs(line.slope(x).value()));
            moment = std::max(moment, std::abs(line.moment(x).value()));
            shear = std::max(shear, std::abs(line.shear(x).value()));
        }
    }
};

/// Calls f(name, beam, loads, left, right) for several random superpositions on every beam.
template <class F>
void for_random_lines(std::uint64_t seed, int rounds, const F& f) {
    CAPTURE(seed);
    scene::chance random(seed);
    for (int i = 0; i < rounds; ++i) {
        scene::with_each_beam(L, EI, [&](const std::string& name, const auto& b, hold left, hold right) {
            CAPTURE(name);
            CAPTURE(i);
            f(b, scene::random_loads(random, random.whole(1, 5), L, EI, left, right), left, right, random);
        });
    }
}

scene::load mirrored_load(scene::load l) {
    switch (l.what) {
        case kind::couple:
            l.size = -l.size;
            l.from = L - l.from;
            break;
        case kind::offset:
            // Seen from the other side it is the other part that lies lower; raised by the offset it is the same.
            l.size = -l.size;
            l.from = L - l.from;
            break;
        case kind::kink:
        case kind::point:
            l.from = L - l.from;
            break;
        case kind::partial_curvature:
        case kind::partial_uniform: {
            const double start = L - l.to;
            l.to = L - l.from;
            l.from = start;
            break;
        }
        case kind::linear: {
            const double start = L - l.to;
            l.to = L - l.from;
            l.from = start;
            std::swap(l.size, l.size_to);
            break;
        }
        case kind::linear_whole:
            std::swap(l.size, l.size_to);
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
        case kind::uniform:
        case kind::curvature:
            break;
    }
    return l;
}

}  // namespace

TEST_CASE("mirrored loads on the mirrored beam give the mirrored line") {
    for_random_lines(11, 12, [](const auto& b, const auto& loads, hold, hold, scene::chance& random) {
        const auto line = b.under(scene::list_of(loads));
        std::vector<scene::load> other;
        for (const auto& l : loads) other.push_back(mirrored_load(l));
        const auto image = mirrored(b).under(scene::list_of(other));
        const sizes size(line);
        for (int k = 0; k < 8; ++k) {
            const double x = random.in(0, L);
            const double y = L - x;
            CHECK(std::abs((line.deflection(x * m) - image.deflection(y * m)).value()) <= 1e-13 * size.deflection);
            CHECK(std::abs((line.slope(x * m) + image.slope(y * m)).value()) <= 1e-13 * size.slope);
            CHECK(std::abs((line.moment(x * m) - image.moment(y * m)).value()) <= 1e-12 * size.moment);
            CHECK(std::abs((line.shear(x * m) + image.shear(y * m)).value()) <= 1e-12 * size.shear);
        }
        CHECK(std::abs((line.reaction(end::left) - image.reaction(end::right)).value()) <= 1e-12 * size.shear);
        CHECK(std::abs((line.end_moment(end::left) - image.end_moment(end::right)).value()) <= 1e-12 * size.moment);
    });
}

TEST_CASE("reciprocity: a unit force at a deflects b as one at b deflects a (Maxwell, Betti)") {
    constexpr std::uint64_t seed = 12;
    CAPTURE(seed);
    scene::chance random(seed);
    for (int i = 0; i < 20; ++i) {
        scene::with_each_beam(L, EI, [&](const std::string& name, const auto& b, hold left, hold right) {
            CAPTURE(name);
            const double a = random.in(0, L);
            const double c = random.in(0, L);
            const auto force_at = [&](double x) { return b.under(point_load(1.0 * N, at(x * m))); };
            const auto couple_at = [&](double x) { return b.under(applied_couple(1.0 * N * m, at(x * m))); };
            const auto close = [](double p, double q) { return std::abs(p - q) <= 1e-12 * (std::abs(p) + 1e-8); };
            CHECK(close(force_at(a).deflection(c * m).value(), force_at(c).deflection(a * m).value()));
            CHECK(close(couple_at(a).slope(c * m).value(), couple_at(c).slope(a * m).value()));
            // A couple is conjugate to the slope: the signs are the same, both clockwise.
            CHECK(close(couple_at(a).deflection(c * m).value(), force_at(c).slope(a * m).value()));
            // A settlement of 1 is conjugate to the reaction (which is upward): v(a) = R, by Betti.
            if (left != hold::free) {
                load_list sunk;
                sunk += settlement(end::left, 1.0 * m);
                CHECK(close(b.under(sunk).deflection(a * m).value(), force_at(a).reaction(end::left).value()));
            }
            if (right == hold::fixed) {
                load_list turned;
                turned += support_rotation(end::right, 1.0 * rad);
                // The end moment that sags is counter-clockwise on the beam's right end, the rotation clockwise.
                CHECK(close(b.under(turned).deflection(a * m).value(), force_at(a).end_moment(end::right).value()));
            }
        });
    }
}

TEST_CASE("reactions and end moments balance the loads") {
    for_random_lines(13, 30, [](const auto& b, const auto& loads, hold left, hold right, scene::chance&) {
        const auto line = b.under(scene::list_of(loads));
        double down = 0;
        double about_left = 0;  // clockwise
        double size = 0;
        for (const auto& l : loads) {
            double force_sum = 0;
            double moment_sum = 0;
            switch (l.what) {
                case kind::point:
                    force_sum = l.size;
                    moment_sum = l.size * l.from;
                    break;
                case kind::couple:
                    moment_sum = l.size;
                    break;
                case kind::uniform:
                case kind::partial_uniform: {
                    const double from = l.what == kind::uniform ? 0 : l.from;
                    const double to = l.what == kind::uniform ? L : l.to;
                    force_sum = l.size * (to - from);
                    moment_sum = force_sum * (from + to) / 2;
                    break;
                }
                case kind::linear_whole:
                case kind::linear: {
                    const double from = l.what == kind::linear_whole ? 0 : l.from;
                    const double to = l.what == kind::linear_whole ? L : l.to;
                    const double width = to - from;
                    force_sum = (l.size + l.size_to) / 2 * width;
                    moment_sum = force_sum * from + width * width * (l.size + 2 * l.size_to) / 6;
                    break;
                }
                default:
                    break;
            }
            down += force_sum;
            about_left += moment_sum;
            size += std::abs(force_sum) + std::abs(moment_sum) / L;
        }
        const double up_left = line.reaction(end::left).value();
        const double up_right = line.reaction(end::right).value();
        const double end_left = line.end_moment(end::left).value();
        const double end_right = line.end_moment(end::right).value();
        size += std::abs(up_left) + std::abs(up_right) + (std::abs(end_left) + std::abs(end_right)) / L;
        CHECK(std::abs(up_left + up_right - down) <= 1e-14 * size);
        CHECK(std::abs(about_left - up_right * L + end_left - end_right) <= 1e-14 * size * L);
        // What an end does not hold is exactly zero.
        if (left == hold::free) CHECK(up_left == 0);
        if (right == hold::free) CHECK(up_right == 0);
        if (left != hold::fixed) CHECK(end_left == 0);
        if (right != hold::fixed) CHECK(end_right == 0);
    });
}

TEST_CASE("ends that are held stay where they are put, exactly") {
    for_random_lines(14, 20, [](const auto& b, const auto& loads, hold left, hold right, scene::chance&) {
        const auto line = b.under(scene::list_of(loads));
        double sunk_left = 0, sunk_right = 0, turned_left = 0, turned_right = 0;
        double size_of_sums = 0;
        for (const auto& l : loads) {
            if (l.what == kind::settlement_left) sunk_left += l.size;
            if (l.what == kind::settlement_right) sunk_right += l.size;
            if (l.what == kind::rotation_left) turned_left += l.size;
            if (l.what == kind::rotation_right) turned_right += l.size;
            if (l.what >= kind::settlement_left && l.what <= kind::rotation_right) size_of_sums += std::abs(l.size);
        }
        // Without imposed movements the bound is zero.
        const double bound = 1e-15 * size_of_sums;
        if (left != hold::free) CHECK(std::abs(line.deflection(0.0 * m).value() - sunk_left) <= bound);
        if (right != hold::free) CHECK(std::abs(line.deflection(L * m).value() - sunk_right) <= bound);
        if (left == hold::fixed) CHECK(std::abs(line.slope(0.0 * m).value() - turned_left) <= bound);
        if (right == hold::fixed) CHECK(std::abs(line.slope(L * m).value() - turned_right) <= bound);
    });
}

TEST_CASE("each response is the derivative of the one before: EI (v'' + imposed) = -M, V = dM/dx, w = -dV/dx") {
    for_random_lines(15, 12, [](const auto& b, const auto& loads, hold, hold, scene::chance&) {
        const auto line = b.under(scene::list_of(loads));
        const sizes size(line);
        const auto joints = scene::joints_of(L, loads);
        for (std::size_t i = 1; i < joints.size(); ++i) {
            const double width = joints[i] - joints[i - 1];
            if (width < 1e-3 * L) continue;
            const double x = joints[i - 1] + 0.4 * width;
            const double h = 0.1 * width;
            // Five-point differences are exact on quartics, and all but the slope and deflection under a linear
            // load are such: the deflection is a quintic, whose fifth derivative leaves h^4 w'/(30 EI).
            const auto derivative = [&](auto response) {
                const auto f = [&](int k) { return response((x + k * h) * m).value(); };
                return (f(-2) - 8 * f(-1) + 8 * f(1) - f(2)) / (12 * h);
            };
            const double growth = std::abs((line.load((x + h) * m) - line.load(x * m)).value()) / h;
            CAPTURE(x);
            const double noise = 1e-14 * L / h;
            CHECK(std::abs(derivative([&](auto s) { return line.deflection(s); }) - line.slope(x * m).value()) <=
                  noise * (size.slope + size.deflection / L) + 1.01 * h * h * h * h * growth / (30 * EI));
            CHECK(std::abs(derivative([&](auto s) { return line.slope(s); }) + line.moment(x * m).value() / EI +
                           line.imposed_curvature(x * m).value()) <= 10 * noise * (size.moment / EI + size.slope / L));
            CHECK(std::abs(derivative([&](auto s) { return line.moment(s); }) - line.shear(x * m).value()) <=
                  noise * (size.shear + size.moment / L));
            CHECK(std::abs(derivative([&](auto s) { return line.shear(s); }) + line.load(x * m).value()) <=
                  10 * noise * size.shear / L + 1e-13 * std::abs(line.load(x * m).value()));
        }
    });
}

TEST_CASE("the line is continuous at joints but for what stands there: a load, a kink, an offset") {
    for_random_lines(16, 20, [](const auto& b, const auto& loads, hold, hold, scene::chance&) {
        const auto line = b.under(scene::list_of(loads));
        const sizes size(line);
        for (const double x : scene::joints_of(L, loads)) {
            if (x == 0 || x == L) continue;
            CAPTURE(x);
            const double before = std::nextafter(x, 0.0);
            double force_there = 0;
            double couple_there = 0;
            double kink_there = 0;
            double offset_there = 0;
            for (const auto& l : loads) {
                if (l.from != x) continue;
                if (l.what == kind::point) force_there += l.size;
                if (l.what == kind::couple) couple_there += l.size;
                if (l.what == kind::kink) kink_there += l.size;
                if (l.what == kind::offset) offset_there += l.size;
            }
            const double rise = (line.deflection(x * m) - line.deflection(before * m)).value();
            CHECK(std::abs(rise - offset_there) <= 1e-13 * size.deflection);
            const double turn = (line.slope(x * m) - line.slope(before * m)).value();
            CHECK(std::abs(turn + kink_there) <= 1e-13 * size.slope);
            CHECK(line.deflection(x * m) == line.deflection(x * m, just_right));
            CHECK(line.slope(x * m) == line.slope(x * m, just_right));
            CHECK(std::abs((line.deflection(before * m) - line.deflection(x * m, just_left)).value()) <=
                  1e-13 * size.deflection);
            CHECK(std::abs((line.slope(before * m) - line.slope(x * m, just_left)).value()) <= 1e-13 * size.slope);
            const auto jump_of_shear = line.shear(x * m, just_right) - line.shear(x * m, just_left);
            const auto jump_of_moment = line.moment(x * m, just_right) - line.moment(x * m, just_left);
            CHECK(std::abs(jump_of_shear.value() + force_there) <= 1e-12 * size.shear);
            CHECK(std::abs(jump_of_moment.value() - couple_there) <= 1e-12 * size.moment);
            // By default the value just right of the place; just left of it the function itself has come there.
            CHECK(line.shear(x * m) == line.shear(x * m, just_right));
            CHECK(line.moment(x * m) == line.moment(x * m, just_right));
            CHECK(std::abs((line.shear(before * m) - line.shear(x * m, just_left)).value()) <= 1e-12 * size.shear);
        }
    });
}

TEST_CASE("at an end the inner side answers for the beam, the outer side for the support") {
    for_random_lines(17, 20, [](const auto& b, const auto& loads, hold, hold, scene::chance&) {
        auto all = loads;
        // Right at the ends too.
        all.push_back({kind::point, 3e4, 0, 0, 0});
        all.push_back({kind::point, -2e4, 0, L, 0});
        all.push_back({kind::couple, 5e4, 0, 0, 0});
        all.push_back({kind::couple, 4e4, 0, L, 0});
        const auto line = b.under(scene::list_of(all));
        const auto left = 0.0 * m;
        const auto right = L * m;
        CHECK(line.reaction(end::left) == line.shear(left, just_left));
        CHECK(line.reaction(end::right) == -line.shear(right, just_right));
        CHECK(line.end_moment(end::left) == line.moment(left, just_left));
        CHECK(line.end_moment(end::right) == line.moment(right, just_right));
        CHECK(line.shear(left) == line.shear(left, just_right));
        CHECK(line.moment(left) == line.moment(left, just_right));
        CHECK(line.shear(right) == line.shear(right, just_left));
        CHECK(line.moment(right) == line.moment(right, just_left));
        const sizes size(line);
        const double bound = 1e-12;
        CHECK(std::abs((line.shear(left) - line.reaction(end::left)).value() + 3e4) <= bound * (size.shear + 3e4));
        CHECK(std::abs((-line.reaction(end::right) - line.shear(right)).value() - 2e4) <= bound * (size.shear + 3e4));
        CHECK(std::abs((line.moment(left) - line.end_moment(end::left)).value() - 5e4) <= bound * (size.moment + 5e4));
        CHECK(std::abs((line.end_moment(end::right) - line.moment(right)).value() - 4e4) <=
              bound * (size.moment + 5e4));
    });
}

TEST_CASE("the line load on both sides of a place") {
    constexpr auto line = simple_beam(6.0 * m, 1.0e4 * kN * m2)
                              .under(partial_uniform_load(9.0 * kN / m, between(1.0 * m, 4.0 * m)) +
                                     linear_load(2.0 * kN / m, 6.0 * kN / m, between(4.0 * m, 6.0 * m)) +
                                     point_load(7.0 * kN, at(2.0 * m)));
    static_assert(line.load(0.5 * m) == 0.0 * kN / m);
    static_assert(line.load(1.0 * m) == 9.0 * kN / m);
    static_assert(line.load(1.0 * m, just_left) == 0.0 * kN / m);
    static_assert(line.load(2.0 * m) == 9.0 * kN / m);
    static_assert(line.load(4.0 * m, just_left) == 9.0 * kN / m);
    static_assert(line.load(4.0 * m, just_right) == 2.0 * kN / m);
    static_assert(line.load(5.0 * m) == 4.0 * kN / m);
    static_assert(line.load(6.0 * m, just_left) == 6.0 * kN / m);
}

TEST_CASE("joints are where loads begin, stand and end, ascending") {
    constexpr auto line =
        simple_beam(6.0 * m, 1.0e4 * kN * m2)
            .under(point_load(7.0 * kN, at(2.0 * m)) + partial_uniform_load(9.0 * kN / m, between(1.0 * m, 4.0 * m)));
    constexpr auto joints = line.joints();
    static_assert(std::is_sorted(joints.begin(), joints.end()));
    for (const double place : {0.0, 1.0, 2.0, 4.0, 6.0}) {
        CHECK(std::find(joints.begin(), joints.end(), place * m) != joints.end());
    }
}

TEST_CASE("a line knows its beam and its loads") {
    constexpr auto load = point_load(7.0 * kN, at(2.0 * m));
    constexpr auto line = simple_beam(6.0 * m, 1.0e4 * kN * m2).under(load);
    static_assert(line.supported().span() == 6.0 * m);
    static_assert(line.supported().EI() == 1.0e4 * kN * m2);
    static_assert(line.loads().size() == 7.0 * kN);
}

TEST_CASE("supports stay where they are, to the bit, whatever stands right at them") {
    for (int i = 1; i <= 40; ++i) {
        const double span = 0.37 * i;
        CAPTURE(span);
        const auto simple = simple_beam(span * m, 1.0 * MN * m2);
        const auto fixed = fixed_beam(span * m, 1.0 * MN * m2);
        for (const double a : {0.0, span / 3, span}) {
            CAPTURE(a);
            const auto couple = applied_couple(7.0 * kN * m, at(a * m));
            const auto kink = imposed_kink(3.0 * mrad, at(a * m));
            for (const double x : {0.0, span}) {
                CHECK(simple.under(couple).deflection(x * m) == 0.0 * m);
                CHECK(simple.under(kink).deflection(x * m) == 0.0 * m);
                CHECK(fixed.under(couple).deflection(x * m) == 0.0 * m);
                CHECK(fixed.under(couple).slope(x * m) == 0.0 * rad);
            }
        }
    }
}
