// A second opinion on beams that shares no code with the library: plain numbers, no units.
//
// EI v'''' = w is integrated from the left end (initial parameters, Macaulay brackets) and the four end
// conditions are a system of four linear equations. With boost::multiprecision::cpp_rational every answer is
// exact, since the inputs are doubles and only + - * / are used; with cpp_bin_float_100 it is exact for the
// purpose of a test and quick enough for dense sampling.
//
// x from left to right; loads, deflections and settlements downward; couples, slopes and rotations clockwise;
// moments sagging; V = dM/dx; reactions upward. Source of the method: common practice (Clebsch, Macaulay).
#pragma once

#include <array>
#include <cstddef>
#include <stdexcept>
#include <utility>
#include <vector>

namespace reference {

enum class hold { fixed, pinned, free, guided };

constexpr bool against_deflection(hold end) { return end == hold::fixed || end == hold::pinned; }
constexpr bool against_rotation(hold end) { return end == hold::fixed || end == hold::guided; }

/// Which value is meant at a jump; at the ends of the beam the outer one belongs to the support.
enum class from { left, right };

enum class quantity { deflection, slope, moment, shear };

template <class T>
class beam {
public:
    beam(hold left, hold right, double span, double rigidity) : left_(left), right_(right), L_(span), EI_(rigidity) {}

    void add_force(double size, double at) { forces_.push_back({T(size), T(at)}); }
    void add_couple(double size, double at) { couples_.push_back({T(size), T(at)}); }

    /// A line load that runs linearly from one size to the other over a stretch.
    void add_line(double size_from, double size_to, double start, double stop) {
        const T growth = (T(size_to) - T(size_from)) / (T(stop) - T(start));
        // Past its end the load is cancelled by its own continuation.
        lines_.push_back({T(size_from), growth, T(start)});
        lines_.push_back({-T(size_to), -growth, T(stop)});
    }
    /// A curvature over a stretch that sags the beam without load: EI (v'' + curvature) = -M.
    void add_curvature(double size, double start, double stop) {
        kinks_.push_back({T(size), T(start)});
        kinks_.push_back({-T(size), T(stop)});
    }
    /// Two parts joined at an angle: the slope falls by so much, as in a beam that sags.
    void add_kink(double size, double at) { turns_.push_back({T(size), T(at)}); }
    /// The part right of the place is joined so much lower.
    void add_offset(double size, double at) { offsets_.push_back({T(size), T(at)}); }
    void add_settlement(bool at_left, double size) { (at_left ? left_settlement_ : right_settlement_) += T(size); }
    void add_rotation(bool at_left, double size) { (at_left ? left_rotation_ : right_rotation_) += T(size); }

    /// Finds deflection, slope, moment and shear at x = 0, just left of whatever stands there.
    void solve() {
        // Each row: four factors of v0, r0, M0, V0, then the right side.
        std::array<std::array<T, 5>, 4> rows{};
        const T zero(0);
        const T one(1);
        const bool left_held = against_deflection(left_);
        const bool left_clamped = against_rotation(left_);
        rows[0][left_held ? 0 : 3] = one;
        rows[0][4] = left_held ? left_settlement_ : zero;
        rows[1][left_clamped ? 1 : 2] = one;
        rows[1][4] = left_clamped ? left_rotation_ : zero;

        const bool right_held = against_deflection(right_);
        const bool right_clamped = against_rotation(right_);
        if (right_held) {
            rows[2] = {one, L_, -L_ * L_ / T(2) / EI_, -L_ * L_ * L_ / T(6) / EI_,
                       right_settlement_ - particular(quantity::deflection, L_, from::right)};
        } else {
            rows[2] = {zero, zero, zero, one, -particular(quantity::shear, L_, from::right)};
        }
        if (right_clamped) {
            rows[3] = {zero, one, -L_ / EI_, -L_ * L_ / T(2) / EI_,
                       right_rotation_ - particular(quantity::slope, L_, from::right)};
        } else {
            rows[3] = {zero, zero, one, L_, -particular(quantity::moment, L_, from::right)};
        }
        eliminate(rows);
        for (std::size_t i = 0; i < 4; ++i) initial_[i] = rows[i][4];
    }

    [[nodiscard]] T value(quantity what, const T& x, from which = from::right) const {
        const auto& [v0, r0, M0, V0] = initial_;
        const T p = particular(what, x, which);
        switch (what) {
            case quantity::deflection:
                return v0 + x * (r0 - x * (M0 / T(2) + V0 * x / T(6)) / EI_) + p;
            case quantity::slope:
                return r0 - x * (M0 + V0 * x / T(2)) / EI_ + p;
            case quantity::moment:
                return M0 + V0 * x + p;
            case quantity::shear:
                return V0 + p;
        }
        throw std::logic_error("no such quantity");
    }

    [[nodiscard]] T reaction_left() const { return initial_[3]; }
    [[nodiscard]] T reaction_right() const { return -value(quantity::shear, L_, from::right); }
    [[nodiscard]] T end_moment_left() const { return initial_[2]; }
    [[nodiscard]] T end_moment_right() const { return value(quantity::moment, L_, from::right); }
    [[nodiscard]] const T& span() const { return L_; }

private:
    struct concentrated {
        T size, at;
    };
    struct ramp {
        T size, growth, at;
    };

    /// What the loads alone add to the answer at x.
    T particular(quantity what, const T& x, from which) const {
        T sum(0);
        for (const auto& force : forces_) {
            if (!acts(x, force.at, which)) continue;
            const T s = x - force.at;
            switch (what) {
                case quantity::deflection:
                    sum += force.size * s * s * s / (T(6) * EI_);
                    break;
                case quantity::slope:
                    sum += force.size * s * s / (T(2) * EI_);
                    break;
                case quantity::moment:
                    sum -= force.size * s;
                    break;
                case quantity::shear:
                    sum -= force.size;
                    break;
            }
        }
        for (const auto& couple : couples_) {
            if (!acts(x, couple.at, which)) continue;
            const T s = x - couple.at;
            switch (what) {
                case quantity::deflection:
                    sum -= couple.size * s * s / (T(2) * EI_);
                    break;
                case quantity::slope:
                    sum -= couple.size * s / EI_;
                    break;
                case quantity::moment:
                    sum += couple.size;
                    break;
                case quantity::shear:
                    break;
            }
        }
        for (const auto& kink : kinks_) {
            if (!(x > kink.at)) continue;
            const T s = x - kink.at;
            if (what == quantity::deflection) sum -= kink.size * s * s / T(2);
            if (what == quantity::slope) sum -= kink.size * s;
        }
        for (const auto& turn : turns_) {
            if (!acts(x, turn.at, which)) continue;
            if (what == quantity::deflection) sum -= turn.size * (x - turn.at);
            if (what == quantity::slope) sum -= turn.size;
        }
        for (const auto& offset : offsets_) {
            if (acts(x, offset.at, which) && what == quantity::deflection) sum += offset.size;
        }
        for (const auto& line : lines_) {
            if (!(x > line.at)) continue;
            const T s = x - line.at;
            switch (what) {
                case quantity::deflection:
                    sum += s * s * s * s * (line.size / T(24) + line.growth * s / T(120)) / EI_;
                    break;
                case quantity::slope:
                    sum += s * s * s * (line.size / T(6) + line.growth * s / T(24)) / EI_;
                    break;
                case quantity::moment:
                    sum -= s * s * (line.size / T(2) + line.growth * s / T(6));
                    break;
                case quantity::shear:
                    sum -= s * (line.size + line.growth * s / T(2));
                    break;
            }
        }
        return sum;
    }

    static bool acts(const T& x, const T& at, from which) { return which == from::left ? x > at : x >= at; }

    static void eliminate(std::array<std::array<T, 5>, 4>& rows) {
        for (std::size_t k = 0; k < 4; ++k) {
            std::size_t pivot = k;
            while (pivot < 4 && rows[pivot][k] == T(0)) ++pivot;
            if (pivot == 4) throw std::logic_error("a mechanism");
            std::swap(rows[k], rows[pivot]);
            const T divisor = rows[k][k];
            for (T& entry : rows[k]) entry /= divisor;
            for (std::size_t i = 0; i < 4; ++i) {
                const T factor = rows[i][k];
                if (i == k || factor == T(0)) continue;
                for (std::size_t j = 0; j < 5; ++j) rows[i][j] -= factor * rows[k][j];
            }
        }
    }

    hold left_, right_;
    T L_, EI_;
    std::vector<concentrated> forces_;
    std::vector<concentrated> couples_;
    std::vector<ramp> lines_;
    std::vector<concentrated> kinks_;
    std::vector<concentrated> turns_, offsets_;
    T left_settlement_{0}, right_settlement_{0}, left_rotation_{0}, right_rotation_{0};
    std::array<T, 4> initial_{};
};

}  // namespace reference
