// Continuous beams of the library against the stiffness reference: errors by quantity, relative to its greatest value.
#pragma once

#include "continuous_scene.hpp"

#include <doctest/doctest.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <string>
#include <vector>

namespace scene {

/// Greatest errors, relative to the greatest value of the quantity along the same beam.
struct found {
    std::array<double, 4> error{};  // deflection, slope, moment, shear
    double reaction = 0, end_moment = 0;
    int beams = 0, mechanisms = 0;

    [[nodiscard]] double greatest() const {
        return std::max({error[0], error[1], error[2], error[3], reaction, end_moment});
    }
    void take(const found& one) {
        for (std::size_t q = 0; q < 4; ++q) error[q] = std::max(error[q], one.error[q]);
        reaction = std::max(reaction, one.reaction);
        end_moment = std::max(end_moment, one.end_moment);
        ++beams;
    }
};

inline std::string report(const found& worst) {
    const auto number = [](double x) { return std::string(doctest::toString(x).c_str()); };
    return "deflection " + number(worst.error[0]) + ", slope " + number(worst.error[1]) + ", moment " +
           number(worst.error[2]) + ", shear " + number(worst.error[3]) + ", reactions " + number(worst.reaction) +
           ", end moments " + number(worst.end_moment) + " on " + std::to_string(worst.beams) + " beams; " +
           std::to_string(worst.mechanisms) + " mechanisms refused";
}

template <class T>
T value_of(const sagitta::continuous_line<T>& line, reference::quantity what, T x, sagitta::side which) {
    using namespace sagitta::units;
    using answer = reference::quantity;
    switch (what) {
        case answer::deflection:
            return line.deflection(x * m, which).value();
        case answer::slope:
            return line.slope(x * m, which).value();
        case answer::moment:
            return line.moment(x * m, which).value();
        case answer::shear:
            return line.shear(x * m, which).value();
    }
    return T(0);
}

/// A beam of the library in the number type N against the reference in T. False where the beam is a mechanism, which
/// both sides must say.
template <class N, class T>
bool compare(const continuous& c, chance& random, found& one) {
    using namespace sagitta;
    using namespace sagitta::units;
    using reference::from;
    using answer = reference::quantity;
    const auto described = beam_of<N>(c);
    const auto loads = list_of<N>(c.loads);
    auto reference = reference_of<T>(c);
    if (!reference.solve()) {
        CHECK_THROWS_AS((void)described.under(loads), invalid_input);
        return false;
    }
    // A tenth of a unit of last place is nothing beside the budgets.
    REQUIRE(reference.misfit() < 0.1 * static_cast<double>(std::numeric_limits<N>::epsilon()));
    const auto line = described.under(loads);
    std::vector<double> places = reference.places();
    for (std::size_t i = 1; i < reference.places().size(); ++i) {
        const double low = places[i - 1];
        places.push_back(low + (places[i] - low) * random.in(0, 1));
        places.push_back((low + places[i]) / 2);
    }
    std::array<double, 4> greatest{}, error{};
    for (const double place : places) {
        const N x = static_cast<N>(place);
        for (const bool is_left : {true, false}) {
            // Beyond an end the line answers for the support, which reactions and end moments below are about.
            if ((is_left && place == 0) || (!is_left && place == c.L)) continue;
            const auto which = is_left ? just_left : just_right;
            for (std::size_t q = 0; q < 4; ++q) {
                const auto what = static_cast<answer>(q);
                const T truth = reference.value(what, T(x), is_left ? from::left : from::right);
                const N computed = value_of(line, what, x, which);
                greatest[q] = std::max(greatest[q], std::abs(static_cast<double>(truth)));
                error[q] = std::max(error[q], std::abs(static_cast<double>(T(T(computed) - truth))));
            }
        }
    }
    // At the supports: their forces are jumps of the shear, and may carry a point load besides.
    double force = greatest[3], force_error = 0;
    for (const auto& s : c.supports) {
        const T truth = reference.reaction(s.at);
        force = std::max(force, std::abs(static_cast<double>(truth)));
        force_error =
            std::max(force_error,
                     std::abs(static_cast<double>(T(T(line.reaction_at(static_cast<N>(s.at) * m).value()) - truth))));
    }
    double moment = greatest[2], moment_error = 0;
    for (const bool at_left : {true, false}) {
        const T truth = reference.end_moment(at_left);
        const N computed = (at_left ? line.end_moment(end::left) : line.end_moment(end::right)).value();
        moment = std::max(moment, std::abs(static_cast<double>(truth)));
        moment_error = std::max(moment_error, std::abs(static_cast<double>(T(T(computed) - truth))));
    }
    // A slope is a difference of deflections and turns, a shear one of moments: where it is less than a thousandth
    // of them it cannot be better than their rounding. A quantity that vanishes but for rounding is measured by
    // what the others imply.
    const double span = c.mean_span;
    const double stiff = c.EI / span;
    const double implied = std::max({greatest[0] / span * stiff, greatest[1] * stiff, moment, force * span});
    const auto relative = [](double e, double size, double implied_size) {
        const double rounding = implied_size * (1e6 * static_cast<double>(std::numeric_limits<N>::epsilon()));
        return e == 0 ? 0 : e / (size < rounding ? implied_size : size);
    };
    const double slope = std::max(greatest[1], 1e-3 * std::max(greatest[0] / span, moment / stiff));
    const double shear = std::max(greatest[3], 1e-3 * moment / span);
    one.error = {relative(error[0], greatest[0], implied * span / stiff), relative(error[1], slope, implied / stiff),
                 relative(error[2], moment, implied), relative(error[3], shear, implied / span)};
    one.reaction = relative(force_error, std::max(force, shear), implied / span);
    one.end_moment = relative(moment_error, moment, implied);
    return true;
}

}  // namespace scene
