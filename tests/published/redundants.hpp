// More supports than two by compatibility: the force method, done with nothing but deflections and loads of
// the library's single-span beams.
#pragma once

#include "published/plain.hpp"

#include <cmath>
#include <cstddef>
#include <utility>
#include <vector>

namespace published {

/// Solves A x = b by elimination with row exchange.
inline std::vector<double> solved(std::vector<std::vector<double>> A, std::vector<double> b) {
    const std::size_t n = b.size();
    for (std::size_t k = 0; k < n; ++k) {
        std::size_t pivot = k;
        for (std::size_t i = k + 1; i < n; ++i) {
            if (std::abs(A[i][k]) > std::abs(A[pivot][k])) pivot = i;
        }
        std::swap(A[k], A[pivot]);
        std::swap(b[k], b[pivot]);
        for (std::size_t i = k + 1; i < n; ++i) {
            const double factor = A[i][k] / A[k][k];
            for (std::size_t j = k; j < n; ++j) A[i][j] -= factor * A[k][j];
            b[i] -= factor * b[k];
        }
    }
    for (std::size_t k = n; k-- > 0;) {
        for (std::size_t j = k + 1; j < n; ++j) b[k] -= A[k][j] * b[j];
        b[k] /= A[k][k];
    }
    return b;
}

/// The upward reactions of supports that a beam has besides those of its ends. Released, the beam deflects
/// there under the loads; the reactions push it back, down to the settlement of each support (none if omitted).
/// Line makes an elastic line of the released beam from a load list.
template <class Line>
std::vector<double> redundant_reactions(const Line& line_under, const loads& acting,
                                        const std::vector<double>& supports,
                                        const std::vector<double>& settlements = {}) {
    const std::size_t n = supports.size();
    std::vector<std::vector<double>> flexibility(n, std::vector<double>(n));
    std::vector<double> gap(n);
    const auto released = line_under(acting);
    for (std::size_t j = 0; j < n; ++j) {
        const auto unit = line_under(point(1, supports[j]));
        for (std::size_t i = 0; i < n; ++i) flexibility[i][j] = deflection(unit, supports[i]);
        gap[j] = deflection(released, supports[j]) - (settlements.empty() ? 0.0 : settlements[j]);
    }
    return solved(flexibility, gap);
}

/// A prismatic beam supported at its ends and at further places: the released beam under the loads and the
/// redundant reactions together.
template <class Beam>
struct beam_on_supports {
    std::vector<double> inner_reactions;
    decltype(std::declval<Beam>().under(loads{})) line;
};

template <class Beam>
beam_on_supports<Beam> on_supports(const Beam& released, const loads& acting, const std::vector<double>& supports,
                                   const std::vector<double>& settlements = {}) {
    const auto line_under = [&](const loads& list) { return released.under(list); };
    const auto reactions = redundant_reactions(line_under, acting, supports, settlements);
    loads all = acting;
    for (std::size_t i = 0; i < supports.size(); ++i) all += point(-reactions[i], supports[i]);
    return {reactions, released.under(all)};
}

/// A beam with an overhang, supported at 0 and l, free at l + a: a cantilever of that length whose clamp is
/// turned until it carries no moment. Statics give the reaction at l, the deflection there gives the turn.
struct overhanging {
    overhanging(double l, double a, double EI, const loads& acting)
        : beam(sagitta::cantilever((l + a) * m, stiffness(EI))),
          outer_reaction(-end_moment(beam.under(acting), left) / l),
          line(beam.under(held(l, acting))) {}

    sagitta::prismatic_beam<sagitta::held::fixed, sagitta::held::free> beam;
    double outer_reaction;
    sagitta::elastic_line<decltype(beam), loads> line;

private:
    loads held(double l, const loads& acting) const {
        const loads balanced = acting + point(-outer_reaction, l);
        const double turn = -deflection(beam.under(balanced), l) / l;
        return balanced + sagitta::support_rotation(left, turn * rad);
    }
};

}  // namespace published
