// The functions whose instructions are counted, one pair a question. Plain numbers in coherent SI go in, so
// that both sides of a pair have the same signature.
#pragma once

#include <sagitta/core.hpp>

// A floor beam: simple span L, uniform load w, point load P at a, partial load q from b to c; deflection at x.
struct floor_beam {
    double L, EI, w, P, a, q, b, c;
};

inline constexpr auto one_load_line(double L, double EI, double P, double a) {
    using namespace sagitta::units;
    return sagitta::simple_beam(L * m, EI * N * m2).under(sagitta::point_load(P * N, sagitta::at(a * m)));
}
inline constexpr auto three_load_line(const floor_beam& f) {
    using namespace sagitta::units;
    return sagitta::simple_beam(f.L * m, f.EI * N * m2)
        .under(sagitta::uniform_load(f.w * N / m) + sagitta::point_load(f.P * N, sagitta::at(f.a * m)) +
               sagitta::partial_uniform_load(f.q * N / m, sagitta::between(f.b * m, f.c * m)));
}
using one_load = decltype(one_load_line(1, 1, 1, 1));
using three_loads = decltype(three_load_line({}));

extern "C" {
double library_evaluates_one_load(const one_load& line, double x);
double library_evaluates_three_loads(const three_loads& line, double x);
double library_composes_and_evaluates(const floor_beam& f, double x);

// by_hand.cpp. Textbook: each load's formula as beam tables print it, nothing checked. Same formulas: what the
// library computes (seen from the end that keeps the digits); checked: the same inputs refused.
double textbook_evaluates_one_load(double L, double EI, double P, double a, double x);
double textbook_evaluates_three_loads(const floor_beam& f, double x);
double same_formulas_unchecked(const floor_beam& f, double x);
double same_formulas_checked(const floor_beam& f, double x);
}
