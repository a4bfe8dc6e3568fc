// Continuous beams as plain data, from which both the beam of the library and that of the reference are made.
#pragma once

#include "scene.hpp"
#include "stiffness_reference.hpp"

#include <sagitta/continuous_beam.hpp>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <string>
#include <utility>
#include <vector>

namespace scene {

constexpr double rigid = std::numeric_limits<double>::infinity();

struct support {
    double at, stiffness;
    double settled = 0;
};

struct step {
    double from, EI;
};

struct continuous {
    double L = 1, EI = 1;
    std::vector<support> supports;
    std::array<double, 2> turning{0, 0};  // what holds the ends against rotation
    std::vector<double> hinges;
    std::vector<step> steps;
    double kGA = rigid;
    std::vector<load> loads;
    double mean_span = 1;
};

inline std::string text(const continuous& c) {
    std::string s = "L " + std::to_string(c.L) + " EI " + std::to_string(c.EI);
    for (const auto& each : c.supports) {
        s += "; support at " + std::to_string(each.at) + " k " + std::to_string(each.stiffness) + " settled " +
             std::to_string(each.settled);
    }
    s += "; turning " + std::to_string(c.turning[0]) + ", " + std::to_string(c.turning[1]);
    for (const double at : c.hinges) s += "; hinge at " + std::to_string(at);
    for (const auto& each : c.steps) s += "; from " + std::to_string(each.from) + " EI " + std::to_string(each.EI);
    s += "; kGA " + std::to_string(c.kGA);
    for (const auto& each : c.loads) s += "; " + text(each);
    return s;
}

template <class T = double>
sagitta::continuous_beam<T> beam_of(const continuous& c) {
    using namespace sagitta;
    using namespace sagitta::units;
    const auto t = [](double x) { return static_cast<T>(x); };
    sagitta::continuous_beam<T> b(t(c.L) * m, t(c.EI) * N * m2);
    for (const auto& each : c.supports) {
        if (std::isinf(each.stiffness)) {
            b.support_at(t(each.at) * m);
        } else {
            b.spring_at(t(each.at) * m, t(each.stiffness) * N / m);
        }
        if (each.settled != 0) b.settle_at(t(each.at) * m, t(each.settled) * m);
    }
    const auto hold = [&](auto which, double k) {
        if (std::isinf(k)) {
            b.guide(which);
        } else if (k != 0) {
            b.turning_spring(which, t(k) * N * m / rad);
        }
    };
    hold(end::left, c.turning[0]);
    hold(end::right, c.turning[1]);
    for (const double at : c.hinges) b.hinge_at(t(at) * m);
    for (const auto& each : c.steps) b.rigidity_from(t(each.from) * m, t(each.EI) * N * m2);
    if (!std::isinf(c.kGA)) b.shear_rigidity(t(c.kGA) * N);
    return b;
}

/// Described, not yet solved.
template <class T>
reference::continuous<T> reference_of(const continuous& c) {
    reference::continuous<T> b(c.L, c.EI);
    for (const auto& each : c.supports) {
        b.add_spring(each.at, each.stiffness);
        b.add_settlement(each.at, each.settled);
    }
    b.hold_turning(true, c.turning[0]);
    b.hold_turning(false, c.turning[1]);
    for (const double at : c.hinges) b.add_hinge(at);
    for (const auto& each : c.steps) b.rigidity_from(each.from, each.EI);
    b.shear_rigidity(c.kGA);
    for (const auto& l : c.loads) {
        switch (l.what) {
            case kind::point:
                b.add_force(l.size, l.from);
                break;
            case kind::couple:
                b.add_couple(l.size, l.from);
                break;
            case kind::uniform:
                b.add_line(l.size, l.size, 0, c.L);
                break;
            case kind::partial_uniform:
                b.add_line(l.size, l.size, l.from, l.to);
                break;
            case kind::linear_whole:
                b.add_line(l.size, l.size_to, 0, c.L);
                break;
            case kind::linear:
                b.add_line(l.size, l.size_to, l.from, l.to);
                break;
            case kind::settlement_left:
                b.add_settlement(0, l.size);
                break;
            case kind::settlement_right:
                b.add_settlement(c.L, l.size);
                break;
            case kind::rotation_left:
            case kind::rotation_right:
                b.add_rotation(l.what == kind::rotation_left, l.size);
                break;
            case kind::curvature:
                b.add_curvature(l.size, 0, c.L);
                break;
            case kind::partial_curvature:
                b.add_curvature(l.size, l.from, l.to);
                break;
            case kind::kink:
                b.add_misfit(-l.size, 0, l.from);
                break;
            case kind::offset:
                b.add_misfit(0, l.size, l.from);
                break;
        }
    }
    return b;
}

/// How a random beam is drawn.
struct continuous_kind {
    int spans_most = 6;
    double shortest_part = 0.02;  // of the mean span, between neighbouring nodes
    double spring_decades = 6;    // stiffnesses from 10^-this to 10^this of EI/L^3
    double rigid_share = 0.6;     // of the supports
    double hinge_share = 0.3;     // of the spans
    bool may_shear = true;
    bool may_move = true;  // settlements, rotations, curvatures
};

class random_continuous {
public:
    random_continuous(chance& random, const continuous_kind& how) : random_(random), how_(how) {}

    continuous draw() {
        c_ = {};
        const double unit = std::pow(10, random_.in(-2, 2));
        c_.mean_span = unit;
        c_.EI = std::pow(10, random_.in(0, 8));
        const int spans = random_.whole(1, how_.spans_most);
        std::vector<double> places;
        double x = random_.in(0, 1) < 0.25 ? unit * random_.in(0.1, 0.8) : 0;  // an overhang
        places.push_back(x);
        for (int i = 0; i < spans; ++i) {
            x += unit * (how_.shortest_part < 0.02 && random_.in(0, 1) < 0.2 ? how_.shortest_part * random_.in(1, 3)
                                                                             : random_.in(0.4, 1.6));
            places.push_back(x);
        }
        c_.L = random_.in(0, 1) < 0.25 ? x + unit * random_.in(0.1, 0.8) : x;
        nodes_ = places;
        nodes_.push_back(0);
        nodes_.push_back(c_.L);
        for (const double at : places) {
            c_.supports.push_back({at, stiffness(c_.EI / (unit * unit * unit))});
            if (how_.may_move && random_.in(0, 1) < 0.2) c_.supports.back().settled = random_.in(-0.1, 0.1) * unit;
        }
        for (double& k : c_.turning) {
            const double die = random_.in(0, 1);
            k = die < 0.5 ? 0 : die < 0.8 ? rigid : stiffness(c_.EI / unit);
        }
        // An end may be guided only: held against rotation, free to move.
        if (c_.turning[0] != 0 && random_.in(0, 1) < 0.2 && c_.supports.front().at == 0) {
            c_.supports.erase(c_.supports.begin());
        }
        for (int i = 0; i < spans; ++i) {
            if (random_.in(0, 1) < how_.hinge_share) {
                // Now and then over a support.
                const double at = random_.in(0, 1) < 0.1 ? places[static_cast<std::size_t>(i)] : free_place();
                if (at > 0 && at < c_.L && !holds(c_.hinges, at)) c_.hinges.push_back(at);
            }
        }
        for (int i = random_.whole(-2, 3); i > 0; --i) {
            const double at = free_place();
            if (at > 0) c_.steps.push_back({at, c_.EI * std::pow(10, random_.in(-0.5, 0.5))});
        }
        if (how_.may_shear && random_.in(0, 1) < 0.4) {
            c_.kGA = c_.EI / (unit * unit) * std::pow(10, random_.in(-1, 4));
        }
        draw_loads(unit);
        return c_;
    }

private:
    static bool holds(const std::vector<double>& all, double x) {
        return std::find(all.begin(), all.end(), x) != all.end();
    }
    double stiffness(double unit) {
        const double die = random_.in(0, 1);
        if (die < how_.rigid_share) return rigid;
        if (die < how_.rigid_share + 0.07) return 0;
        return unit * std::pow(10, random_.in(-how_.spring_decades, how_.spring_decades));
    }
    /// A place for a further node, not too near to another; -1 where none was found.
    double free_place() {
        const double apart = how_.shortest_part * c_.mean_span;
        for (int i = 0; i < 20; ++i) {
            double at = random_.in(0, c_.L);
            if (random_.in(0, 1) < 0.3) {
                // As near to another node as allowed.
                const auto near = static_cast<std::size_t>(random_.whole(0, static_cast<int>(nodes_.size()) - 1));
                at = nodes_[near] + (random_.toss() ? 1.001 : -1.001) * apart;
            }
            bool free = at > 0 && at < c_.L;
            for (const double other : nodes_) free = free && std::abs(other - at) >= apart;
            if (free) {
                nodes_.push_back(at);
                return at;
            }
        }
        return -1;
    }
    double load_place() {
        if (random_.in(0, 1) < 0.2) {  // right at a node
            return nodes_[static_cast<std::size_t>(random_.whole(0, static_cast<int>(nodes_.size()) - 1))];
        }
        return random_.in(0, c_.L);
    }
    bool can_act_here(kind what) const {
        const auto held = [&](double at) {
            for (const auto& s : c_.supports) {
                if (s.at == at && s.stiffness != 0) return true;
            }
            return false;
        };
        switch (what) {
            case kind::settlement_left:
                return how_.may_move && held(0);
            case kind::settlement_right:
                return how_.may_move && held(c_.L);
            case kind::rotation_left:
                return how_.may_move && c_.turning[0] != 0;
            case kind::rotation_right:
                return how_.may_move && c_.turning[1] != 0;
            case kind::curvature:
            case kind::partial_curvature:
            case kind::kink:
            case kind::offset:
                return how_.may_move;
            default:
                return true;
        }
    }
    void draw_loads(double unit) {
        const int count = random_.whole(1, 5);
        while (static_cast<int>(c_.loads.size()) < count) {
            const auto what = static_cast<kind>(random_.whole(0, c_.loads.empty() ? 5 : 13));
            if (!can_act_here(what)) continue;
            const double w = random_.in(0.5, 5) * (random_.toss() ? 1 : -1) * c_.EI / (unit * unit * unit);
            load l{what};
            l.from = load_place();
            l.to = load_place();
            if (l.from > l.to) std::swap(l.from, l.to);
            if (!(l.from < l.to) && !is_concentrated(what)) continue;
            switch (what) {
                case kind::point:
                    l.size = w * 0.01;
                    break;
                case kind::couple:
                    l.size = w * 0.01 * unit;
                    break;
                case kind::settlement_left:
                case kind::settlement_right:
                    l.size = random_.in(-0.05, 0.05) * unit;
                    break;
                case kind::rotation_left:
                case kind::rotation_right:
                    l.size = random_.in(-0.05, 0.05);
                    break;
                case kind::curvature:
                case kind::partial_curvature:
                    l.size = random_.in(-0.05, 0.05) / unit;
                    break;
                case kind::kink:
                    l.size = random_.in(-0.05, 0.05);
                    break;
                case kind::offset:
                    l.size = random_.in(-0.05, 0.05) * unit;
                    break;
                default:
                    l.size = w * 0.01 / unit;
                    l.size_to = random_.in(-0.05, 0.05) * c_.EI / (unit * unit * unit * unit);
                    break;
            }
            c_.loads.push_back(l);
        }
    }

    chance& random_;
    continuous_kind how_;
    continuous c_;
    std::vector<double> nodes_;
};

}  // namespace scene
