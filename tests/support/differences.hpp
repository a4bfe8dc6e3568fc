// Derivatives by dual numbers against central differences in 50 digits: with a step of 1e-16 their own error is some
// 1e-32, so that every digit of the dual numbers is tested.
#pragma once

#include "../../examples/sensitivity/dual.hpp"

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

#include <array>
#include <cmath>
#include <cstddef>
#include <string>
#include <vector>

namespace differences {

using precise = boost::multiprecision::number<boost::multiprecision::cpp_bin_float<50>, boost::multiprecision::et_off>;

/// An answer by name.
template <class T>
struct answer {
    std::string name;
    T value;
};

/// answers_of(inputs) is a list of answers in any number type; every one is differentiated by every input.
template <std::size_t count, class Answers>
void compare(const std::array<const char*, count>& names, const std::array<double, count>& inputs,
             const Answers& answers_of) {
    int moving = 0;
    for (std::size_t i = 0; i < count; ++i) {
        std::array<dual<double>, count> with_dual{};
        std::array<precise, count> above{}, below{};
        const precise step = precise(inputs[i]) * precise(1e-16);
        for (std::size_t k = 0; k < count; ++k) {
            with_dual[k] = k == i ? varied(inputs[k]) : dual<double>(inputs[k]);
            above[k] = k == i ? precise(inputs[k]) + step : precise(inputs[k]);
            below[k] = k == i ? precise(inputs[k]) - step : precise(inputs[k]);
        }
        const auto duals = answers_of(with_dual);
        const auto highs = answers_of(above);
        const auto lows = answers_of(below);
        REQUIRE(duals.size() == highs.size());
        REQUIRE(duals.size() == lows.size());
        for (std::size_t k = 0; k < duals.size(); ++k) {
            CAPTURE(names[i]);
            CAPTURE(duals[k].name);
            const auto derivative = static_cast<double>((highs[k].value - lows[k].value) / (step + step));
            const auto value = static_cast<double>((highs[k].value + lows[k].value) / 2);
            // An answer that the input leaves alone is measured by what a full change of the input could make of it.
            const double size = std::abs(derivative) + std::abs(value / inputs[i]);
            CHECK(std::abs(duals[k].value.derivative - derivative) <= 1e-10 * size);
            CHECK(std::abs(duals[k].value.value - value) <= 1e-12 * std::abs(value));
            if (std::abs(derivative) > 1e-3 * size) ++moving;
        }
    }
    CHECK(moving > static_cast<int>(count));  // or nothing would have been tested
}

}  // namespace differences
