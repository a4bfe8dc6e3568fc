// Real roots of polynomials of low degree, by walking the chain of derivatives: between two neighbouring roots
// of the derivative a polynomial is monotone and has at most one root, so that none can be missed.
#pragma once

#include <sagitta/detail/bounded_list.hpp>

#include <array>
#include <cstddef>
#include <limits>

namespace sagitta::detail {

/// c[0] + c[1] t + ... + c[Degree] t^Degree
template <class T, std::size_t Degree>
struct polynomial {
    std::array<T, Degree + 1> c{};

    constexpr T operator()(const T& t) const {
        T value = c[Degree];
        for (std::size_t i = Degree; i-- > 0;) value = value * t + c[i];
        return value;
    }

    constexpr polynomial<T, Degree - 1> derivative() const requires(Degree > 0) {
        polynomial<T, Degree - 1> d;
        for (std::size_t i = 1; i <= Degree; ++i) d.c[i - 1] = T(static_cast<int>(i)) * c[i];
        return d;
    }

    constexpr bool is_zero() const {
        for (const T& each : c) {
            if (each != T(0)) return false;
        }
        return true;
    }

    /// What rounding can make of a value on [0, 1]: the sum of the magnitudes times a few units in the last place.
    constexpr T noise() const {
        T sum(0);
        for (const T& each : c) sum += each < T(0) ? -each : each;
        return sum * (T(4) * std::numeric_limits<T>::epsilon());
    }
};

/// A root: where, and whether the polynomial changes its sign there or only touches zero.
template <class T>
struct root {
    T at{};
    bool crosses = true;
};

/// The root in [low, high] of a function p whose derivative is slope, where p changes sign and is monotone. Newton
/// steps, kept inside the bracket.
template <class T, class Function, class Derivative>
constexpr T bracketed_root(const Function& p, const Derivative& slope, T low, T high) {
    const bool rising = p(low) < T(0);
    const T resolution = T(2) * std::numeric_limits<T>::epsilon();
    constexpr int safe_step_count = 4 * std::numeric_limits<T>::digits;  // bisection alone would need a quarter
    T t = (low + high) / T(2);
    for (int i = 0; i < safe_step_count; ++i) {
        const T value = p(t);
        if (value == T(0)) break;
        ((value < T(0)) == rising ? low : high) = t;
        T next = t - value / slope(t);
        if (!(next > low && next < high)) next = (low + high) / T(2);
        const T step = next < t ? t - next : next - t;
        t = next;
        if (step <= resolution * t) break;
    }
    // A last step changes nothing but what a number carries along besides its value (a derivative).
    const T last = t - p(t) / slope(t);
    return last >= low && last <= high ? last : t;
}

/// The roots of a function between cuts from 0 to 1 that part it into monotone stretches, ascending. Values up to
/// tolerance count as zero: a cut with such a value is one root, without a crossing if the function has the same sign
/// on both sides; at 0 and 1 they are left to the caller. solve(low, high) finds the root of a stretch that has one.
template <class Roots, class Function, class Cuts, class T, class Solve>
constexpr Roots roots_between_cuts(const Function& f, const Cuts& cuts, const T& tolerance, const Solve& solve) {
    const auto sign_at = [&](const T& t) {
        const T value = f(t);
        return value > tolerance ? 1 : value < -tolerance ? -1 : 0;
    };
    Roots roots;
    int sign = sign_at(cuts[0]);
    int before = sign;  // the last sign that was not zero
    for (std::size_t i = 1; i < cuts.size(); ++i) {
        const int next = sign_at(cuts[i]);
        const bool inside = i + 1 < cuts.size();
        if (sign * next < 0) {
            roots.push_back({solve(cuts[i - 1], cuts[i]), true});
        } else if (next == 0 && inside && (sign != 0 || i == 1)) {
            roots.push_back({cuts[i], false});
        } else if (sign == 0 && next * before < 0 && !roots.empty()) {
            roots.back().crosses = true;  // a flat passage through zero
        }
        sign = next;
        if (sign != 0) before = sign;
    }
    return roots;
}

/// All roots in the open interval (0, 1), ascending. Values up to tolerance count as zero.
template <class T, std::size_t Degree>
constexpr bounded_list<root<T>, Degree> roots_between_0_and_1(const polynomial<T, Degree>& p, const T& tolerance) {
    bounded_list<T, Degree + 1> cuts;
    cuts.push_back(T(0));
    if constexpr (Degree > 1) {
        const auto d = p.derivative();
        for (const auto& turning : roots_between_0_and_1(d, d.noise())) cuts.push_back(turning.at);
    }
    cuts.push_back(T(1));
    return roots_between_cuts<bounded_list<root<T>, Degree>>(
        p, cuts, tolerance, [&](const T& low, const T& high) { return bracketed_root(p, p.derivative(), low, high); });
}

/// The places in (0, 1) where p turns.
template <class T, std::size_t Degree>
constexpr auto turning_points(const polynomial<T, Degree>& p) {
    const auto d = p.derivative();
    return roots_between_0_and_1(d, d.noise());
}

}  // namespace sagitta::detail
