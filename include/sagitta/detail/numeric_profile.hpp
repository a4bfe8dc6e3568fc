// A response between two joints where it is no polynomial (stiffness that varies): the same chain of zeros, each link
// found by bracketing between the zeros of the next.
#pragma once

#include <sagitta/detail/polynomial.hpp>
#include <sagitta/piecewise.hpp>

#include <limits>
#include <vector>

namespace sagitta::detail {

template <response R, class Line>
class numeric_profile {
    using T = typename Line::number;

public:
    numeric_profile(const Line& of, const quantity<length, T>& from, const quantity<length, T>& to)
        : line_(of), from_(from), to_(to) {}

    T operator()(const T& t) const {
        const auto x = place(t);
        const side inside = x < to_ ? just_right : just_left;
        if constexpr (R == response::deflection) {
            return line_.deflection(x, inside).value();
        } else {
            return line_.slope(x, inside).value();
        }
    }

    /// What rounding can make of a value.
    T noise() const {
        T size(0);
        for (const T& t : {T(0), T(1) / T(4), T(1) / T(2), T(3) / T(4), T(1)}) {
            const T value = (*this)(t);
            size += value < T(0) ? -value : value;
        }
        return size * (T(8) * std::numeric_limits<T>::epsilon());
    }

    std::vector<root<T>> roots(const T& tolerance) const {
        std::vector<T> cuts{T(0)};
        for (const auto& turning : turning_points(*this)) cuts.push_back(turning.at);
        cuts.push_back(T(1));
        return roots_between_cuts<std::vector<root<T>>>(*this, cuts, tolerance, [&](const T& low, const T& high) {
            return bracketed_root([&](const T& t) { return (*this)(t); }, [&](const T& t) { return growth(t); }, low,
                                  high);
        });
    }

    friend std::vector<root<T>> turning_points(const numeric_profile& profile) { return profile.turning(); }

private:
    quantity<length, T> place(const T& t) const {
        const auto x = from_ + (to_ - from_) * t;
        return x < to_ ? x : to_;
    }

    T curvature_at(const T& t) const {
        const auto x = place(t);
        const auto imposed = line_.imposed_curvature(from_, just_right);
        return (line_.moment(x, x < to_ ? just_right : just_left) / line_.rigidity(x) + imposed).value();
    }

    /// The derivative with respect to t: the next response in the chain.
    T growth(const T& t) const {
        const T width = (to_ - from_).value();
        if constexpr (R == response::deflection) {
            return line_.slope(place(t)).value() * width;
        } else {
            return -curvature_at(t) * width;
        }
    }

    std::vector<root<T>> turning() const {
        if constexpr (R == response::deflection) {
            const numeric_profile<response::slope, Line> slope(line_, from_, to_);
            return slope.roots(slope.noise());
        } else {
            return zeros_of_curvature();
        }
    }

    /// Without imposed curvature it vanishes with the moment, a polynomial. With it, between the panels of the
    /// integrator, on which the stiffness varies gently.
    std::vector<root<T>> zeros_of_curvature() const {
        std::vector<root<T>> zeros;
        const auto imposed = line_.imposed_curvature(from_, just_right);
        if (imposed.value() == T(0)) {
            const auto M = normalized<response::moment>(elastic_segment<T>(line_, from_, to_));
            for (const auto& zero : roots_between_0_and_1(M, M.noise())) zeros.push_back(zero);
            return zeros;
        }
        std::vector<T> cuts{T(0)};
        for (const auto& bound : line_.panel_bounds()) {
            if (bound > from_ && bound < to_) cuts.push_back(((bound - from_) / (to_ - from_)).value());
        }
        cuts.push_back(T(1));
        // The stiffness is known by its values only: a difference serves as the derivative.
        const auto curvature = [&](const T& t) { return curvature_at(t); };
        return roots_between_cuts<std::vector<root<T>>>(curvature, cuts, T(0), [&](const T& low, const T& high) {
            const T step = (high - low) / T(1024);
            const auto difference = [&](const T& t) {
                const T before = t - step < low ? low : t - step;
                const T after = t + step > high ? high : t + step;
                return (curvature(after) - curvature(before)) / (after - before);
            };
            return bracketed_root(curvature, difference, low, high);
        });
    }

    const Line& line_;
    quantity<length, T> from_, to_;
};

}  // namespace sagitta::detail
