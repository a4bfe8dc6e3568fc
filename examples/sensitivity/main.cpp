// Which input does the deflection hang on most?
//
// A floor beam of an invented office building, clamped in a wall at its left end and resting on a column at the right.
// Each input is varied in turn by giving it the derivative 1; the answer then carries its derivative with it. Shown is
// by how many percent the greatest deflection changes when the input changes by one percent.
#include "dual.hpp"

#include <sagitta/sagitta.hpp>

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <cstddef>

namespace {

using namespace sagitta;
using namespace sagitta::units;

enum input : std::size_t { span, rigidity, dead, partition_load, partition_place, settled, count };

struct named_input {
    const char* name;
    const char* unit;
    double value;  // in the unit
};

constexpr std::array<named_input, count> inputs{{
    {"span L", "m", 7.2},
    {"rigidity EI", "kN*m2", 17500},
    {"uniform load w", "kN/m", 9.6},
    {"partition load P", "kN", 22},
    {"place of the partition a", "m", 4.1},
    {"settlement of the column", "mm", 5},
}};

using numbers = std::array<dual<double>, count>;

/// The greatest deflection and its place, both with their derivatives.
auto greatest(const numbers& given) {
    const auto line = propped_cantilever(given[span] * m, given[rigidity] * kN * m2)
                          .under(uniform_load(given[dead] * kN / m) +
                                 point_load(given[partition_load] * kN, at(given[partition_place] * m)) +
                                 settlement(end::right, given[settled] * mm));
    return greatest_deflection(line);
}

struct row {
    named_input what;
    double deflection;  // percent a percent
    double place;
};

}  // namespace

int main() {
    numbers given{};
    for (std::size_t i = 0; i < count; ++i) given[i] = inputs[i].value;
    const auto worst = greatest(given);
    const double v = (worst.value / mm).value;
    const double at_x = (worst.at / m).value;

    std::array<row, count> rows{};
    for (std::size_t i = 0; i < count; ++i) {
        numbers varied_input = given;
        varied_input[i] = varied(inputs[i].value);
        const auto answer = greatest(varied_input);
        rows[i] = {inputs[i], (answer.value / mm).derivative * inputs[i].value / v,
                   (answer.at / m).derivative * inputs[i].value / at_x};
    }
    std::sort(rows.begin(), rows.end(),
              [](const row& a, const row& b) { return std::abs(a.deflection) > std::abs(b.deflection); });

    fmt::print("An invented floor beam, clamped at the left, on a column at the right.\n");
    fmt::print("Greatest deflection {:.2f} mm at {:.3f} m.\n\n", v, at_x);
    fmt::print("percent of change for one percent more of the input\n\n");
    fmt::print("{:<26}{:>16}{:>14}{:>14}\n", "input", "value", "deflection", "its place");
    for (const auto& r : rows) {
        fmt::print("{:<26}{:>10g} {:<5}{:>+14.3f}{:>+14.3f}\n", r.what.name, r.what.value, r.what.unit, r.deflection,
                   r.place);
    }
    fmt::print(
        "\nElastic small-deflection theory under service loads; whether a beam will do is decided by the local code\n"
        "and a licensed engineer.\n");
}
