// Dual numbers through a stiffness that varies: the derivative of integrated answers with respect to any input.
#include <support/differences.hpp>

#include <sagitta/core.hpp>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr std::array names{"P", "a", "w", "L", "EI", "taper", "x", "curvature"};
constexpr std::array inputs{22000.0, 3.1, 4500.0, 7.2, 1.75e7, 0.7, 2.9, 0.0004};

/// A beam whose depth grows along it, loaded, with and without an imposed curvature.
template <class Make>
void check(const Make& make, bool curved) {
    differences::compare(names, inputs, [&](const auto& given) {
        using T = typename std::decay_t<decltype(given)>::value_type;
        const auto& [P, a, w, span, EI, taper, x, kappa] = given;
        const auto L = span * m;
        const auto stiffness = [L, EI = EI, taper = taper](const quantity<dimension::length, T>& s) {
            const T depth = T(1) + taper * (s / L).value();
            return EI * depth * depth * depth * N * m2;
        };
        load_list<T> loads;
        loads += point_load(P * N, at(a * m)) + uniform_load(w * N / m);
        if (curved) loads += imposed_curvature(kappa / m);
        const auto line = integrate_moment_area(make(L, EI * N * m2), loads, stiffness);
        const auto worst = greatest_deflection(line);
        const auto steepest = extremes_of_slope(line).governing();
        return std::vector<differences::answer<T>>{
            {"deflection", line.deflection(x * m).value()},
            {"slope", line.slope(x * m).value()},
            {"moment", line.moment(x * m).value()},
            {"greatest deflection", worst.value.value()},
            {"its place", worst.at.value()},
            {"steepest slope", steepest.value.value()},
            {"its place", steepest.at.value()},
            {"tangential deviation", line.between(T(0) * m, x * m).deviation.value()},
        };
    });
}

}  // namespace

TEST_CASE("dual numbers through a tapered fixed beam") {
    check([](const auto& L, const auto& EI) { return fixed_beam(L, EI); }, false);
}
TEST_CASE("dual numbers through a tapered simple beam with an imposed curvature") {
    check([](const auto& L, const auto& EI) { return simple_beam(L, EI); }, true);
}
TEST_CASE("dual numbers through a tapered propped cantilever with an imposed curvature") {
    check([](const auto& L, const auto& EI) { return propped_cantilever(L, EI); }, true);
}
