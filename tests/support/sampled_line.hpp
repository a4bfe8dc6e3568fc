// The elastic line of the reference as polynomials between joints, cheap to sample densely: what the questions of
// the library (zeros, extremes, piecewise form) are checked against.
#pragma once

#include "reference.hpp"
#include "scene.hpp"

#include <algorithm>
#include <array>
#include <cmath>
#include <cstddef>
#include <cstdlib>
#include <string>
#include <vector>

namespace scene {

using real = long double;

struct sampled_segment {
    double from = 0, to = 0;
    // Powers of s = x - from: deflection, slope, moment, shear, load.
    std::array<std::array<real, 6>, 5> c{};

    [[nodiscard]] real value(std::size_t response, real s) const {
        const auto& p = c[response];
        return p[0] + s * (p[1] + s * (p[2] + s * (p[3] + s * (p[4] + s * p[5]))));
    }
    /// The derivative of a response with respect to x.
    [[nodiscard]] real rate(std::size_t response, real s) const {
        const auto& p = c[response];
        return p[1] + s * (2 * p[2] + s * (3 * p[3] + s * (4 * p[4] + s * 5 * p[5])));
    }
    [[nodiscard]] real second_rate(std::size_t response, real s) const {
        const auto& p = c[response];
        return 2 * p[2] + s * (6 * p[3] + s * (12 * p[4] + s * 20 * p[5]));
    }
};

class sampled_line {
public:
    sampled_line(reference::hold left, reference::hold right, double L, double EI, const std::vector<load>& loads)
        : sampled_line(reference_of<real>(left, right, L, EI, loads), L, EI, loads) {}

    /// From a reference solved in any number type: wider ones where long double itself is in doubt.
    template <class T>
    sampled_line(const reference::beam<T>& exact, double L, double EI, const std::vector<load>& loads) {
        using reference::quantity;
        auto joints = joints_of(L, loads);
        joints.erase(std::unique(joints.begin(), joints.end()), joints.end());
        for (std::size_t i = 1; i < joints.size(); ++i) {
            sampled_segment s;
            s.from = joints[i - 1];
            s.to = joints[i];
            const real x = s.from;
            const auto at_start = [&](quantity what) { return static_cast<real>(exact.value(what, T(s.from))); };
            const real v = at_start(quantity::deflection);
            const real r = at_start(quantity::slope);
            const real M = at_start(quantity::moment);
            const real V = at_start(quantity::shear);
            real w = 0, growth = 0, kink = 0;
            for (const auto& l : loads) {
                const bool whole = l.what == kind::uniform || l.what == kind::linear_whole || l.what == kind::curvature;
                const real a = whole ? 0 : l.from;
                const real b = whole ? L : l.to;
                if (!(a <= s.from && s.to <= b)) continue;
                if (l.what == kind::uniform || l.what == kind::partial_uniform) w += l.size;
                if (l.what == kind::linear || l.what == kind::linear_whole) {
                    const real slope = (real(l.size_to) - l.size) / (b - a);
                    w += l.size + slope * (x - a);
                    growth += slope;
                }
                if (l.what == kind::curvature || l.what == kind::partial_curvature) kink += l.size;
            }
            const real bend = M / EI + kink;
            s.c[0] = {v, r, -bend / 2, -V / 6 / EI, w / 24 / EI, growth / 120 / EI};
            s.c[1] = {r, -bend, -V / 2 / EI, w / 6 / EI, growth / 24 / EI, 0};
            s.c[2] = {M, V, -w / 2, -growth / 6, 0, 0};
            s.c[3] = {V, -w, -growth / 2, 0, 0, 0};
            s.c[4] = {w, growth, 0, 0, 0, 0};
            segments_.push_back(s);
        }
    }

    [[nodiscard]] const std::vector<sampled_segment>& segments() const { return segments_; }

    /// Calls visit(segment, x, value) at so many places a segment, both of its ends included.
    template <class Visit>
    void sample(std::size_t response, int places, const Visit& visit) const {
        for (const auto& s : segments_) {
            const double width = s.to - s.from;
            for (int i = 0; i <= places; ++i) {
                const double t = width * i / places;
                visit(s, i == places ? s.to : s.from + t, static_cast<double>(s.value(response, t)));
            }
        }
    }

    /// The segment at a place, at a joint the one left or right of it.
    [[nodiscard]] const sampled_segment& at(double x, bool from_left) const {
        for (const auto& s : segments_) {
            if (from_left ? x <= s.to : x < s.to) return s;
        }
        return segments_.back();
    }

private:
    std::vector<sampled_segment> segments_;
};

inline std::string text(const std::vector<load>& all) {
    std::string whole;
    for (const auto& l : all) whole += text(l) + "; ";
    return whole;
}

/// How many rounds of random beams: three times more where SAGITTA_LONG is set in the environment.
inline int rounds(int usual) {
    const char* const wanted = std::getenv("SAGITTA_LONG");
    return wanted != nullptr && std::string(wanted) == "1" ? usual * 10 / 3 : usual;
}

}  // namespace scene
