// Not-a-numbers, infinities, zeros of either sign, subnormal, huge and tiny numbers through every public function: an
// answer, or a refusal that is an invalid_input; never a not-a-number, never another exception, never a hang.
#include <sagitta/sagitta.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <functional>
#include <limits>
#include <string>
#include <utility>
#include <vector>

using namespace sagitta;
using namespace sagitta::units;

namespace {

using limits = std::numeric_limits<double>;
const std::vector<double> hostile{limits::quiet_NaN(),
                                  -limits::quiet_NaN(),
                                  limits::infinity(),
                                  -limits::infinity(),
                                  0.0,
                                  -0.0,
                                  limits::denorm_min(),
                                  -limits::denorm_min(),
                                  limits::min(),
                                  -limits::min(),
                                  limits::epsilon(),
                                  1e-200,
                                  1e-30,
                                  1e30,
                                  1e200,
                                  -1e200,
                                  limits::max(),
                                  -limits::max(),
                                  limits::lowest()};

using answers = std::vector<double>;

/// Every answer of a line that has a name, at both ends and in the middle of its span.
template <class Line>
answers all_of(const Line& line) {
    answers all;
    const auto L = line.supported().span();
    for (const auto& x : {0.0 * L, L / 2.0, L}) {
        for (const side which : {just_left, just_right}) {
            all.insert(all.end(), {line.deflection(x, which).value(), line.slope(x, which).value(),
                                   line.moment(x, which).value(), line.shear(x, which).value()});
        }
        all.push_back(line.load(x).value());
        all.push_back(line.imposed_curvature(x).value());
    }
    const auto add = [&](const auto& extremes) {
        all.insert(all.end(), {extremes.greatest.at.value(), extremes.greatest.value.value(), extremes.least.at.value(),
                               extremes.least.value.value()});
    };
    add(extremes_of_deflection(line));
    add(extremes_of_slope(line));
    add(extremes_of_moment(line));
    add(extremes_of_shear(line));
    all.push_back(greatest_deflection(line).value.value());
    for (const auto& zero : zeros_of_deflection(line)) all.push_back(zero.from.value());
    for (const auto& zero : stationary_points(line)) all.push_back(zero.from.value());
    for (const auto& zero : points_of_contraflexure(line)) all.push_back(zero.from.value());
    all.push_back(line.reaction(end::left).value());
    all.push_back(line.reaction(end::right).value());
    all.push_back(line.end_moment(end::left).value());
    all.push_back(line.end_moment(end::right).value());
    return all;
}

constexpr auto L = 7.2 * m;
constexpr auto EI = 1.75e7 * N * m2;

continuous_beam<> girder() {
    continuous_beam<> b(14.0 * m, EI);
    b.support_at(0.0 * m).support_at(6.0 * m).support_at(12.0 * m);
    return b;
}

struct entrance {
    std::string name;
    std::function<answers(double)> call;
};

const std::vector<entrance> entrances{
    {"span of a simple beam",
     [](double v) { return all_of(simple_beam(v * m, EI).under(uniform_load(1.0 * kN / m))); }},
    {"span of a fixed beam",
     [](double v) { return all_of(fixed_beam(v * m, EI).under(load_list<>(uniform_load(1.0 * kN / m)))); }},
    {"EI", [](double v) { return all_of(propped_cantilever(L, v * N * m2).under(uniform_load(1.0 * kN / m))); }},
    {"kGA",
     [](double v) { return all_of(fixed_beam(L, EI).with_shear_rigidity(v * N).under(uniform_load(1.0 * kN / m))); }},
    {"point load", [](double v) { return all_of(simple_beam(L, EI).under(point_load(v * N, at(3.0 * m)))); }},
    {"place of a point load", [](double v) { return all_of(fixed_beam(L, EI).under(point_load(1.0 * N, at(v * m)))); }},
    {"couple", [](double v) { return all_of(simple_beam(L, EI).under(applied_couple(v * N * m, at(3.0 * m)))); }},
    {"place of a couple",
     [](double v) { return all_of(fixed_beam(L, EI).under(applied_couple(1.0 * N * m, at(v * m)))); }},
    {"uniform load", [](double v) { return all_of(cantilever(L, EI).under(uniform_load(v * N / m))); }},
    {"start of a stretch",
     [](double v) {
         return all_of(fixed_beam(L, EI).under(partial_uniform_load(1.0 * N / m, between(v * m, 5.0 * m))));
     }},
    {"stop of a stretch",
     [](double v) {
         return all_of(fixed_beam(L, EI).under(partial_uniform_load(1.0 * N / m, between(0.0 * m, v * m))));
     }},
    {"first size of a linear load",
     [](double v) { return all_of(simple_beam(L, EI).under(linear_load(v * N / m, 1.0 * N / m))); }},
    {"last size of a linear load",
     [](double v) { return all_of(simple_beam(L, EI).under(linear_load(1.0 * N / m, v * N / m))); }},
    {"settlement", [](double v) { return all_of(fixed_beam(L, EI).under(settlement(end::left, v * m))); }},
    {"rotation", [](double v) { return all_of(fixed_beam(L, EI).under(support_rotation(end::right, v * rad))); }},
    {"kink", [](double v) { return all_of(fixed_beam(L, EI).under(imposed_kink(v * rad, at(3.0 * m)))); }},
    {"offset", [](double v) { return all_of(fixed_beam(L, EI).under(imposed_offset(v * m, at(3.0 * m)))); }},
    {"place of a kink", [](double v) { return all_of(fixed_beam(L, EI).under(imposed_kink(1.0 * rad, at(v * m)))); }},
    {"curvature", [](double v) { return all_of(propped_cantilever(L, EI).under(imposed_curvature(v / m))); }},
    {"temperature",
     [](double v) {
         return all_of(fixed_beam(L, EI).under(temperature_gradient(12e-6 / K, v * K, warm_side::top, 0.3 * m)));
     }},
    {"depth",
     [](double v) {
         return all_of(fixed_beam(L, EI).under(temperature_gradient(12e-6 / K, 20.0 * K, warm_side::top, v * m)));
     }},
    {"load factor", [](double v) { return all_of(simple_beam(L, EI).under(v * uniform_load(1.0 * N / m))); }},
    {"divisor of a load", [](double v) { return all_of(simple_beam(L, EI).under(uniform_load(1.0 * N / m) / v)); }},
    {"factor of a list",
     [](double v) { return all_of(simple_beam(L, EI).under(load_list<>(uniform_load(1.0 * N / m)) * v)); }},
    {"section",
     [](double v) {
         const auto line = simple_beam(L, EI).under(uniform_load(1.0 * N / m));
         return answers{line.deflection(v * m).value(), line.moment(v * m).value(),
                        tangent_at(line, v * m).slope().value()};
     }},
    {"stretch of a question",
     [](double v) {
         const auto line = simple_beam(L, EI).under(uniform_load(1.0 * N / m));
         return answers{extremes_of_moment(line, between(1.0 * m, v * m)).greatest.value.value()};
     }},
    {"second point of a chord",
     [](double v) {
         const auto line = simple_beam(L, EI).under(uniform_load(1.0 * N / m));
         return answers{chord_between(line, 1.0 * m, v * m).slope().value()};
     }},
    {"point of moment area",
     [](double v) {
         const auto line = fixed_beam(L, EI).under(uniform_load(1.0 * N / m));
         return answers{moment_area(line, 1.0 * m, v * m).deviation.value()};
     }},
    {"cross-check",
     [](double v) {
         // A check that cannot be made is not passed: it answers not-a-number, as documented.
         const double found = cross_check(fixed_beam(L, EI).under(uniform_load(v * N / m))).greatest();
         return answers{found <= 1e-12 ? 0.0 : 1.0};
     }},
    {"stiffness that varies",
     [](double v) {
         const auto line = integrate_moment_area(simple_beam(L, EI), uniform_load(1.0 * N / m),
                                                 [v](const auto& x) { return EI * (1.0 + v * (x / L).value()); });
         return answers{line.deflection(3.0 * m).value(), greatest_deflection(line).value.value()};
     }},
    {"step of stiffness",
     [](double v) {
         const auto line = integrate_moment_area(simple_beam(L, EI), uniform_load(1.0 * N / m),
                                                 [](const auto&) { return EI; }, {v * m});
         return answers{line.deflection(3.0 * m).value()};
     }},
    {"tolerance",
     [](double v) {
         const auto line = integrate_moment_area(
             simple_beam(L, EI), uniform_load(1.0 * N / m), [](const auto& x) { return EI * (1.0 + (x / L).value()); },
             {}, v);
         return answers{line.deflection(3.0 * m).value()};
     }},
    {"length of a continuous beam",
     [](double v) {
         continuous_beam<> b(v * m, EI);
         b.support_at(0.0 * m).support_at(v * m);
         return all_of(b.under(uniform_load(1.0 * N / m)));
     }},
    {"EI of a continuous beam",
     [](double v) { return all_of(girder().rigidity_from(6.0 * m, v * N * m2).under(uniform_load(1.0 * N / m))); }},
    {"place of a support",
     [](double v) { return all_of(girder().support_at(v * m).under(uniform_load(1.0 * N / m))); }},
    {"spring",
     [](double v) { return all_of(girder().spring_at(14.0 * m, v * N / m).under(uniform_load(1.0 * N / m))); }},
    {"turning spring",
     [](double v) {
         return all_of(girder().turning_spring(end::left, v * N * m / rad).under(uniform_load(1.0 * N / m)));
     }},
    {"settlement of a support",
     [](double v) { return all_of(girder().settle_at(6.0 * m, v * m).under(uniform_load(1.0 * N / m))); }},
    {"hinge", [](double v) { return all_of(girder().hinge_at(v * m).under(uniform_load(1.0 * N / m))); }},
    {"moment of a hinge",
     [](double v) { return all_of(girder().hinge_at(3.0 * m, v * N * m).under(uniform_load(1.0 * N / m))); }},
    {"shear rigidity",
     [](double v) { return all_of(girder().shear_rigidity(v * N).under(uniform_load(1.0 * N / m))); }},
    {"load on a continuous beam", [](double v) { return all_of(girder().under(point_load(v * N, at(7.0 * m)))); }},
    {"place of a load on a continuous beam",
     [](double v) { return all_of(girder().under(applied_couple(1.0 * N * m, at(v * m)))); }},
    {"cross-check of a continuous beam",
     [](double v) { return answers{cross_check(girder().under(point_load(v * N, at(7.0 * m)))).greatest()}; }},
    {"section of an influence line",
     [](double v) { return answers{influence_of_moment(girder(), v * m).ordinate(7.0 * m).value()}; }},
    {"ordinate", [](double v) { return answers{influence_of_moment(girder(), 7.0 * m).ordinate(v * m).value()}; }},
    {"axle",
     [](double v) {
         const load_train<> train{{v * N, 0.0 * m}, {1.0 * N, 2.0 * m}};
         const auto worst = extremes_of_train(influence_of_moment(girder(), 7.0 * m), train);
         return answers{worst.greatest.value.value(), worst.greatest.at.value(), worst.least.value.value()};
     }},
    {"place of an axle",
     [](double v) {
         const load_train<> train{{1.0 * N, 0.0 * m}, {1.0 * N, v * m}};
         const auto worst = extremes_of_train(influence_of_moment(girder(), 7.0 * m), train);
         return answers{worst.greatest.value.value(), worst.greatest.at.value(), worst.least.value.value()};
     }},
    {"position of a train",
     [](double v) {
         return answers{
             effect_of_train(influence_of_moment(girder(), 7.0 * m), load_train<>{{1.0 * N, 0.0 * m}}, v * m).value()};
     }},
    {"pattern",
     [](double v) {
         return answers{governing_patterns(influence_of_moment(girder(), 7.0 * m), v * N / m).greatest.value.value()};
     }},
    {"place of a release",
     [](double v) {
         return answers{force_method(simple_beam(L, EI), translation_at(v * m))
                            .under(uniform_load(1.0 * N / m))
                            .redundant<0>()
                            .value()};
     }},
    {"movement of a release",
     [](double v) {
         return answers{force_method(simple_beam(L, EI), translation_at(3.0 * m).prescribed(v * m))
                            .under(uniform_load(1.0 * N / m))
                            .redundant<0>()
                            .value()};
     }},
    {"spring of a release",
     [](double v) {
         return answers{force_method(simple_beam(L, EI), translation_at(3.0 * m).on_spring(v * N / m))
                            .under(uniform_load(1.0 * N / m))
                            .redundant<0>()
                            .value()};
     }},
};

std::string what_is_said(const entrance& at, double v, answers& given) {
    try {
        given = at.call(v);
    } catch (const invalid_input& refused) {
        return refused.what();
    } catch (const tolerance_not_reached& missed) {
        return missed.what();
    }
    return "";
}

}  // namespace

TEST_CASE("hostile values: an answer that is a number, or a refusal that names an argument") {
    int answered = 0, refused = 0, overflowed = 0;
    for (const auto& at : entrances) {
        CAPTURE(at.name);
        for (const double v : hostile) {
            CAPTURE(v);
            answers given;
            const std::string said = what_is_said(at, v, given);
            if (!said.empty()) {
                ++refused;
                CHECK(said.find(" = ") != std::string::npos);
                continue;
            }
            ++answered;
            bool is_a_number = !given.empty(), is_finite = true;
            for (const double each : given) {
                is_a_number = is_a_number && !std::isnan(each);
                is_finite = is_finite && std::isfinite(each);
            }
            CHECK(is_a_number);
            if (!is_finite) ++overflowed;
        }
    }
    MESSAGE(entrances.size() << " entrances: " << answered << " answers, " << overflowed
                             << " of them with an infinity (overflow), " << refused << " refusals");
}
