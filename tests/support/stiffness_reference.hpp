// A second method for beams on any supports that shares no code with the library: direct stiffness.
//
// Nodes stand wherever anything begins, ends or acts, so that every element carries a load that is linear from end
// to end, or none. Fixed-end forces and stiffnesses are exact for such elements, shear deformation included
// (Timoshenko, parameter 12 EI/(kGA L^2)); derived for this file from equilibrium and compatibility of the element,
// the method itself is common practice. With a rational number type every answer is exact; with a wide floating
// type it is exact for the purpose of a test and quick.
//
// Signs as in reference.hpp. Slope is dv/dx; the turn of a section differs from it by V/kGA.
#pragma once

#include "reference.hpp"

#include <algorithm>
#include <array>
#include <cmath>
#include <cstddef>
#include <limits>
#include <stdexcept>
#include <vector>

namespace reference {

template <class T>
class continuous {
public:
    continuous(double span, double rigidity) : span_(span) {
        steps_.push_back({0, rigidity});
        places_ = {0, span};
    }

    // What holds the beam. A stiffness may be infinite: rigid.

    void add_spring(double at, double stiffness) {
        places_.push_back(at);
        springs_.push_back({at, stiffness});
    }
    void add_settlement(double at, double size) { settlements_.push_back({at, size}); }
    void hold_turning(bool at_left, double stiffness) { turning_[at_left ? 0 : 1] = stiffness; }
    void add_rotation(bool at_left, double size) { turned_[at_left ? 0 : 1] += T(size); }
    void add_hinge(double at) {
        places_.push_back(at);
        hinges_.push_back(at);
    }

    // What it is made of.

    void rigidity_from(double at, double rigidity) {
        places_.push_back(at);
        steps_.push_back({at, rigidity});
    }
    void shear_rigidity(double kGA) { shear_flexibility_ = std::isinf(kGA) ? T(0) : T(1) / T(kGA); }

    // What acts on it. A couple at a hinge turns the part right of it.

    void add_force(double size, double at) {
        places_.push_back(at);
        forces_.push_back({at, size});
    }
    void add_couple(double size, double at) {
        places_.push_back(at);
        couples_.push_back({at, size});
    }
    void add_line(double size_from, double size_to, double start, double stop) {
        places_.push_back(start);
        places_.push_back(stop);
        lines_.push_back({start, stop, size_from, size_to});
    }
    void add_curvature(double size, double start, double stop) {
        places_.push_back(start);
        places_.push_back(stop);
        kinks_.push_back({start, stop, size, size});
    }

    /// Two parts joined at an angle, or one lower than the other: how the part right of the place differs. At a node it
    /// is the part left of it that the node moves with, at the left end whatever holds it.
    void add_misfit(double turn, double offset, double at) {
        places_.push_back(at);
        misfits_.push_back({at, turn, offset});
    }

    /// False where the beam can move freely.
    [[nodiscard]] bool solve() {
        std::sort(places_.begin(), places_.end());
        places_.erase(std::unique(places_.begin(), places_.end()), places_.end());
        number_unknowns();
        rows_.assign(count_, std::array<T, band>{});
        right_.assign(count_, T(0));
        make_elements();
        load_and_hold();
        if (!eliminate()) return false;
        for (element& e : elements_) {
            const auto ends = forces_on(e);
            e.V = -ends[0];
            e.M = ends[1];
            e.v = moved_[e.unknown[0]] + e.jump[0];
            e.turn = moved_[e.unknown[1]] + e.jump[1];
        }
        return true;
    }

    [[nodiscard]] T value(quantity what, const T& x, from which = from::right) const {
        std::size_t i = 0;
        while (i + 1 < elements_.size() && (which == from::left ? x > elements_[i].to : x >= elements_[i].to)) ++i;
        return elements_[i].value(what, x - elements_[i].from, shear_flexibility_);
    }

    /// Upward force of whatever holds the beam at a node.
    [[nodiscard]] T reaction(double at) const {
        const std::size_t i = node_at(at);
        T down(0);
        for (const auto& f : forces_) {
            if (f.at == at) down += T(f.size);
        }
        if (i < elements_.size()) down -= forces_on(elements_[i])[0];
        if (i > 0) down -= forces_on(elements_[i - 1])[2];
        return down;
    }
    /// Sagging moment that what holds an end passes on.
    [[nodiscard]] T end_moment(bool at_left) const {
        const double at = at_left ? 0 : span_;
        T turning = at_left ? forces_on(elements_.front())[1] : forces_on(elements_.back())[3];
        for (const auto& c : couples_) {
            if (c.at == at) turning -= T(c.size);
        }
        return at_left ? turning : -turning;
    }

    /// How far the elements are from fitting together and from balance: the values at the end of each, integrated
    /// from its start, against those of the node there; all as moments, relative to the greatest.
    [[nodiscard]] double misfit() const {
        T greatest(0), gap(0);
        const T L0(span_);
        const auto take = [](T& slot, const T& x) { slot = std::max(slot, x < T(0) ? T(-x) : x); };
        for (const element& e : elements_) {
            const T L = e.to - e.from;
            const auto ends = forces_on(e);
            const std::array<T, 4> integrated{e.value(quantity::deflection, L, shear_flexibility_), e.turn_at(L),
                                              e.value(quantity::moment, L, shear_flexibility_),
                                              e.value(quantity::shear, L, shear_flexibility_)};
            const std::array<T, 4> there{moved_[e.unknown[2]] + e.jump[2], moved_[e.unknown[3]] + e.jump[3], -ends[3],
                                         ends[2]};
            const std::array<T, 4> start{e.v, e.turn, e.M, e.V};
            const std::array<T, 4> to_moment{e.EI / (L0 * L0), e.EI / L0, T(1), L0};
            for (std::size_t q = 0; q < 4; ++q) {
                take(greatest, start[q] * to_moment[q]);
                take(greatest, there[q] * to_moment[q]);
                take(gap, (integrated[q] - there[q]) * to_moment[q]);
            }
        }
        return gap == T(0) ? 0 : static_cast<double>(T(gap / greatest));
    }

    [[nodiscard]] const std::vector<double>& places() const { return places_; }

private:
    struct sized {
        double at, size;
    };
    struct misfit_at {
        double at, turn, offset;
    };
    struct stretch {
        double from, to, size_from, size_to;
    };

    struct element {
        T from, to, EI;
        T w{0}, growth{0}, kink{0};
        std::array<std::size_t, 4> unknown{};  // v and turn at its start, v and turn at its end
        std::array<std::array<T, 4>, 4> k{};   // forces at the ends for movements of the ends
        std::array<T, 4> fixed{};              // and for loads when the ends do not move
        std::array<T, 4> jump{};               // by how much its ends have moved more than the nodes
        T v{0}, turn{0}, M{0}, V{0};           // at its start, once solved

        T turn_at(const T& s) const {
            return turn - s * (M + s * (V / T(2) - s * (w / T(6) + s * growth / T(24)))) / EI - kink * s;
        }
        T value(quantity what, const T& s, const T& shear_flexibility) const {
            const T shear = V - s * (w + s * growth / T(2));
            const T risen = s * (V - s * (w / T(2) + s * growth / T(6)));
            switch (what) {
                case quantity::deflection: {
                    const T bent = s * s * (M / T(2) + s * (V / T(6) - s * (w / T(24) + s * growth / T(120)))) / EI;
                    return v + turn * s - bent - kink * s * s / T(2) + risen * shear_flexibility;
                }
                case quantity::slope:
                    return turn_at(s) + shear * shear_flexibility;
                case quantity::moment:
                    return M + risen;
                case quantity::shear:
                    return shear;
            }
            throw std::logic_error("no such quantity");
        }
    };

    static constexpr std::size_t reach = 5;  // a node has up to three unknowns
    static constexpr std::size_t band = 2 * reach + 1;

    std::size_t node_at(double at) const {
        return static_cast<std::size_t>(std::lower_bound(places_.begin(), places_.end(), at) - places_.begin());
    }
    T& coefficient(std::size_t row, std::size_t column) { return rows_[row][column + reach - row]; }

    void number_unknowns() {
        count_ = 0;
        nodes_.clear();
        for (const double at : places_) {
            const bool hinged = std::find(hinges_.begin(), hinges_.end(), at) != hinges_.end();
            nodes_.push_back({count_, count_ + 1, count_ + (hinged ? 2 : 1)});
            count_ += hinged ? 3 : 2;
        }
    }

    void make_elements() {
        elements_.clear();
        for (std::size_t i = 0; i + 1 < places_.size(); ++i) {
            const double from = places_[i];
            const double to = places_[i + 1];
            element e;
            e.from = T(from);
            e.to = T(to);
            double behind = -1;
            for (const auto& step : steps_) {
                if (step.at <= from && step.at >= behind) {
                    behind = step.at;
                    e.EI = T(step.size);
                }
            }
            for (const auto& l : lines_) {
                if (!(l.from <= from && to <= l.to)) continue;
                const T growth = (T(l.size_to) - T(l.size_from)) / (T(l.to) - T(l.from));
                e.w += T(l.size_from) + growth * (T(from) - T(l.from));
                e.growth += growth;
            }
            for (const auto& k : kinks_) {
                if (k.from <= from && to <= k.to) e.kink += T(k.size_from);
            }
            for (const auto& each : misfits_) {
                if (each.at == from) {
                    e.jump[0] += T(each.offset);
                    e.jump[1] += T(each.turn);
                } else if (each.at == to && to == span_) {
                    e.jump[2] -= T(each.offset);
                    e.jump[3] -= T(each.turn);
                }
            }
            e.unknown = {nodes_[i][0], nodes_[i][2], nodes_[i + 1][0], nodes_[i + 1][1]};
            stiffen(e);
            for (std::size_t a = 0; a < 4; ++a) {
                for (std::size_t b = 0; b < 4; ++b) {
                    coefficient(e.unknown[a], e.unknown[b]) += e.k[a][b];
                    right_[e.unknown[a]] -= e.k[a][b] * e.jump[b];
                }
                right_[e.unknown[a]] -= e.fixed[a];
            }
            elements_.push_back(e);
        }
    }

    /// Ends: downward force and clockwise couple on the element at its start, then at its end, that is
    /// -V, M and V, -M there.
    void stiffen(element& e) const {
        const T L = e.to - e.from;
        const T phi = T(12) * e.EI * shear_flexibility_ / (L * L);
        const T c = e.EI / (L * L * L * (T(1) + phi));
        const T near = (T(4) + phi) * L * L;
        const T far = (T(2) - phi) * L * L;
        const T six = T(6) * L;
        e.k = {{{T(12) * c, six * c, T(-12) * c, six * c},
                {six * c, near * c, -six * c, far * c},
                {T(-12) * c, -six * c, T(12) * c, -six * c},
                {six * c, far * c, -six * c, near * c}}};
        // The load is its mean and a part that is odd about the middle. Clamped at both ends the odd part makes the
        // moments +-d L^2/(60 (1 + phi)); the mean is the textbook case, which shear does not change.
        const T d = e.growth * L / T(2);
        const T mean = e.w + d;
        const T M_mean = -mean * L * L / T(12);
        const T M_odd = d * L * L / (T(60) * (T(1) + phi));
        const T V_odd = T(-2) * M_odd / L - d * L / T(6);
        const T M_kink = -e.EI * e.kink;
        e.fixed = {-(mean * L / T(2) + V_odd), M_mean + M_odd + M_kink, -mean * L / T(2) + V_odd,
                   -(M_mean - M_odd + M_kink)};
    }

    void load_and_hold() {
        for (const auto& f : forces_) right_[nodes_[node_at(f.at)][0]] += T(f.size);
        for (const auto& c : couples_) right_[nodes_[node_at(c.at)][2]] += T(c.size);
        // The last description of a place counts, as for the beam of the library.
        std::vector<sized> held;
        for (const auto& s : springs_) {
            std::erase_if(held, [&](const sized& h) { return h.at == s.at; });
            held.push_back(s);
        }
        for (const auto& s : held) {
            T settled(0);
            for (const auto& each : settlements_) {
                if (each.at == s.at) settled += T(each.size);
            }
            hold(nodes_[node_at(s.at)][0], s.size, settled);
        }
        hold(nodes_.front()[2], turning_[0], turned_[0]);
        hold(nodes_.back()[1], turning_[1], turned_[1]);
    }

    void hold(std::size_t unknown, double stiffness, const T& imposed) {
        if (std::isinf(stiffness)) {
            const std::size_t first = unknown > reach ? unknown - reach : 0;
            const std::size_t last = std::min(count_ - 1, unknown + reach);
            for (std::size_t j = first; j <= last; ++j) {
                right_[j] -= coefficient(j, unknown) * imposed;
                coefficient(j, unknown) = T(0);
                coefficient(unknown, j) = T(0);
            }
            coefficient(unknown, unknown) = T(1);
            right_[unknown] = imposed;
        } else {
            coefficient(unknown, unknown) += T(stiffness);
            right_[unknown] += T(stiffness) * imposed;
        }
    }

    /// The matrix is symmetric and not negative, so that no rows need to be exchanged and a pivot that vanishes
    /// is a free movement.
    bool eliminate() {
        std::vector<T> smallest(count_);
        for (std::size_t k = 0; k < count_; ++k) {
            smallest[k] = std::numeric_limits<T>::is_exact ? T(0) : coefficient(k, k) * T(1e-30);
        }
        for (std::size_t k = 0; k < count_; ++k) {
            if (!(coefficient(k, k) > smallest[k])) return false;
            const std::size_t last = std::min(count_ - 1, k + reach);
            for (std::size_t i = k + 1; i <= last; ++i) {
                if (coefficient(i, k) == T(0)) continue;
                const T factor = coefficient(i, k) / coefficient(k, k);
                for (std::size_t j = k; j <= last; ++j) coefficient(i, j) -= factor * coefficient(k, j);
                right_[i] -= factor * right_[k];
            }
        }
        moved_.assign(count_, T(0));
        for (std::size_t k = count_; k-- > 0;) {
            T sum = right_[k];
            const std::size_t last = std::min(count_ - 1, k + reach);
            for (std::size_t j = k + 1; j <= last; ++j) sum -= coefficient(k, j) * moved_[j];
            moved_[k] = sum / coefficient(k, k);
        }
        return true;
    }

    std::array<T, 4> forces_on(const element& e) const {
        std::array<T, 4> ends = e.fixed;
        for (std::size_t a = 0; a < 4; ++a) {
            for (std::size_t b = 0; b < 4; ++b) ends[a] += e.k[a][b] * (moved_[e.unknown[b]] + e.jump[b]);
        }
        return ends;
    }

    double span_;
    T shear_flexibility_{0};
    std::vector<double> places_, hinges_;
    std::vector<sized> steps_, springs_, settlements_, forces_, couples_;
    std::vector<stretch> lines_, kinks_;
    std::vector<misfit_at> misfits_;
    std::array<double, 2> turning_{0, 0};
    std::array<T, 2> turned_{};

    std::size_t count_ = 0;
    std::vector<std::array<std::size_t, 3>> nodes_;  // v, turn of the element left, turn of the element right
    std::vector<element> elements_;
    std::vector<std::array<T, band>> rows_;
    std::vector<T> right_, moved_;
};

}  // namespace reference
