// Dual numbers through continuous beams.
#include <support/differences.hpp>

#include <sagitta/core.hpp>

using namespace sagitta;
using namespace sagitta::units;

TEST_CASE("dual numbers through a continuous beam with a step of stiffness, a spring and a settlement") {
    constexpr std::array names{"first span", "length", "EI", "EI of the second part", "spring", "settlement",
                               "P",          "a",      "w"};
    constexpr std::array inputs{6.0, 14.5, 2.0e7, 3.1e7, 8.0e6, 0.006, 31000.0, 8.7, 7200.0};
    differences::compare(names, inputs, [](const auto& given) {
        using T = typename std::decay_t<decltype(given)>::value_type;
        const auto& [l1, L, EI, EI2, k, sunk, P, a, w] = given;
        auto b = continuous_beam(L * m, EI * N * m2);
        b.clamp(end::left).support_at(l1 * m).spring_at(L * m, k * N / m).rigidity_from(l1 * m, EI2 * N * m2);
        b.settle_at(l1 * m, sunk * m);
        const auto line = b.under(point_load(P * N, at(a * m)) + uniform_load(w * N / m));
        const auto worst = greatest_deflection(line);
        return std::vector<differences::answer<T>>{
            {"support moment", line.moment(l1 * m).value()},
            {"end moment", line.end_moment(end::left).value()},
            {"reaction of the middle support", line.reaction_at(l1 * m).value()},
            {"reaction of the spring", line.reaction(end::right).value()},
            {"deflection", line.deflection(T(10.5) * m).value()},
            {"deflection of the spring", line.deflection(L * m).value()},
            {"slope", line.slope(T(3) * m).value()},
            {"greatest deflection", worst.value.value()},
            {"its place", worst.at.value()},
        };
    });
}

TEST_CASE("dual numbers through symmetric spans, where coefficients vanish that still have derivatives") {
    constexpr std::array names{"first span", "second span", "w", "EI"};
    constexpr std::array inputs{4.0, 4.0, 1000.0, 1.0e6};
    differences::compare(names, inputs, [](const auto& given) {
        using T = typename std::decay_t<decltype(given)>::value_type;
        const auto& [l1, l2, w, EI] = given;
        const auto line = continuous_beam((l1 + l2) * m, EI * N * m2)
                              .support_at(T(0) * m)
                              .support_at(l1 * m)
                              .support_at((l1 + l2) * m)
                              .under(uniform_load(w * N / m));
        return std::vector<differences::answer<T>>{
            {"support moment", line.moment(l1 * m).value()},
            {"left reaction", line.reaction(end::left).value()},
            {"right reaction", line.reaction(end::right).value()},
            {"deflection", line.deflection(T(2.5) * m).value()},
        };
    });
}
