// The same deflections written by hand in double.
#include "counted.hpp"

#include <limits>
#include <stdexcept>

namespace {

// As beam tables print them (AISC Steel Construction Manual table 3-23, diagrams 8 and 1, from memory; the
// partial load by Macaulay brackets from its end slope).
double textbook_point(double L, double EI, double P, double a, double x) {
    const double b = L - a;
    if (x <= a) return P * b * x * (L * L - b * b - x * x) / (6 * L * EI);
    return P * a * (L - x) * (2 * L * x - x * x - a * a) / (6 * L * EI);
}

double textbook_uniform(double L, double EI, double w, double x) {
    return w * x * (L * L * L - 2 * L * x * x + x * x * x) / (24 * EI);
}

double textbook_partial(double L, double EI, double q, double b, double c, double x) {
    const double R = q * (c - b) * (L - (b + c) / 2) / L;
    const double to_b = L - b;
    const double to_c = L - c;
    const double slope =
        (R * L * L * L / 6 - q * (to_b * to_b * to_b * to_b - to_c * to_c * to_c * to_c) / 24) / (L * EI);
    double v = slope * x - R * x * x * x / (6 * EI);
    if (x > b) {
        const double s = x - b;
        v += q * s * s * s * s / (24 * EI);
    }
    if (x > c) {
        const double s = x - c;
        v -= q * s * s * s * s / (24 * EI);
    }
    return v;
}

/// From the end at distance s: end slope and reaction decide the unloaded stretch.
double from_end(double slope, double R, double s, double EI) { return s * (slope - R * (s * s / (6 * EI))); }

double point(double L, double EI, double P, double a, double x) {
    const double n = a / L;
    const double f = (L - a) / L;
    const double k = P * (L * L / EI);
    if (x < a) return from_end(k * (n * f * (2 * f + n) / 6), P * f, x, EI);
    return from_end(k * (n * f * (2 * n + f) / 6), P * n, L - x, EI);
}

double uniform(double L, double EI, double w, double x) {
    const double F = w * L;
    const double s = x <= L - x ? x : L - x;
    return from_end(F * (L * L / EI) * (1.0 / 24), F / 2, s, EI) + (s * s) * (s * s) * (w / 24) / EI;
}

double partial(double L, double EI, double q, double b, double c, double x) {
    const double n = (b + c) / (2 * L);
    const double f = ((L - b) + (L - c)) / (2 * L);
    const double width = (c - b) / L;
    const double F = q * (width * L);
    const double k = F * (L * L / EI);
    const double spread = width * width / 24;
    const auto from_left = [&](double s) { return from_end(k * (n * f * (2 * f + n) / 6 - f * spread), F * f, s, EI); };
    const auto from_right = [&](double s) {
        return from_end(k * (n * f * (2 * n + f) / 6 - n * spread), F * n, s, EI);
    };
    const auto above = [&](double s) { return (s * s) * (s * s) * (q / 24) / EI; };
    if (x <= b) return from_left(x);
    if (x >= c) return from_right(L - x);
    if (x <= L - x) return from_left(x) + above(x - b);
    return from_right(L - x) + above(c - x);
}

double all_three(const floor_beam& f, double x) {
    return uniform(f.L, f.EI, f.w, x) + point(f.L, f.EI, f.P, f.a, x) + partial(f.L, f.EI, f.q, f.b, f.c, x);
}

[[noreturn, gnu::cold, gnu::noinline]] void refused(const char* what) { throw std::invalid_argument(what); }

void positive(double x, const char* what) {
    if (!(x > 0 && x <= std::numeric_limits<double>::max())) refused(what);
}
void finite(double x, const char* what) {
    if (!(x - x >= 0)) refused(what);
}

}  // namespace

extern "C" {

[[gnu::noinline]] double textbook_evaluates_one_load(double L, double EI, double P, double a, double x) {
    return textbook_point(L, EI, P, a, x);
}

[[gnu::noinline]] double textbook_evaluates_three_loads(const floor_beam& f, double x) {
    return textbook_uniform(f.L, f.EI, f.w, x) + textbook_point(f.L, f.EI, f.P, f.a, x) +
           textbook_partial(f.L, f.EI, f.q, f.b, f.c, x);
}

[[gnu::noinline]] double same_formulas_unchecked(const floor_beam& f, double x) { return all_three(f, x); }

[[gnu::noinline]] double same_formulas_checked(const floor_beam& f, double x) {
    positive(f.L, "L");
    positive(f.EI, "EI");
    finite(f.w, "w");
    finite(f.P, "P");
    if (!(f.a >= 0 && f.a <= f.L)) refused("a");
    finite(f.q, "q");
    if (!(f.b >= 0 && f.b < f.c && f.c <= f.L)) refused("b, c");
    if (!(x >= 0 && x <= f.L)) refused("x");
    return all_three(f, x);
}
}
