// Dual numbers through single-span beams: the derivative of any answer with respect to any input.
#include <support/differences.hpp>

#include <sagitta/core.hpp>

using namespace sagitta;
using namespace sagitta::units;

namespace {

template <class T, class Line>
std::vector<differences::answer<T>> answers_of_line(const Line& line, const T& at_x) {
    const auto x = at_x * m;
    const auto worst = greatest_deflection(line);
    const auto moments = extremes_of_moment(line);
    const auto steepest = extremes_of_slope(line).governing();
    std::vector<differences::answer<T>> answers{
        {"deflection", line.deflection(x).value()},
        {"slope", line.slope(x).value()},
        {"moment", line.moment(x).value()},
        {"shear", line.shear(x).value()},
        {"left reaction", line.reaction(end::left).value()},
        {"right reaction", line.reaction(end::right).value()},
        {"greatest deflection", worst.value.value()},
        {"its place", worst.at.value()},
        {"greatest moment", moments.greatest.value.value()},
        {"its place", moments.greatest.at.value()},
        {"steepest slope", steepest.value.value()},
        {"from the chord", deflection_from_chord(line, T(0) * m, line.supported().span(), x).value()},
    };
    if (line.end_moment(end::left).value() < T(-1)) {
        answers.push_back({"left end moment", line.end_moment(end::left).value()});
    }
    for (const auto& place : points_of_contraflexure(line)) {
        answers.push_back({"contraflexure", place.from.value()});
    }
    for (const auto& piece : piecewise_form(line)) {
        answers.push_back({"a piece", piece.deflection(piece.from() + (piece.to() - piece.from()) / T(3)).value()});
    }
    return answers;
}

constexpr std::array names{"P", "a", "w", "L", "EI", "x", "to", "settlement"};
constexpr std::array inputs{22000.0, 3.1, 4500.0, 7.2, 1.75e7, 2.9, 6.3, 0.004};

/// The beam that make(L, EI) holds, under a point load, uniform and linear loads and a settlement.
template <class Make>
void check(const Make& make) {
    differences::compare(names, inputs, [&](const auto& given) {
        using T = typename std::decay_t<decltype(given)>::value_type;
        const auto& [P, a, w, L, EI, x, to, sunk] = given;
        const auto loads = point_load(P * N, at(a * m)) + uniform_load(w * N / m) +
                           linear_load(w * N / m, T(2) * w * N / m, between(T(1.25) * m, to * m)) +
                           settlement(end::left, sunk * m);
        const auto b = make(L * m, EI * N * m2);
        auto answers = answers_of_line<T>(b.under(loads), x);
        load_list<T> list;
        list += loads;
        answers.push_back({"by a list", b.under(list).deflection(x * m).value()});
        answers.push_back({"tangential deviation", moment_area(b.under(list), T(0) * m, x * m).deviation.value()});
        return answers;
    });
}

}  // namespace

TEST_CASE("dual numbers through a propped cantilever") {
    check([](const auto& L, const auto& EI) { return propped_cantilever(L, EI); });
}
TEST_CASE("dual numbers through a fixed beam") {
    check([](const auto& L, const auto& EI) { return fixed_beam(L, EI); });
}
TEST_CASE("dual numbers through a simple beam") {
    check([](const auto& L, const auto& EI) { return simple_beam(L, EI); });
}
