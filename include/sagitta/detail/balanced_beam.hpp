// A beam in equilibrium: its loads with their released structures, and redundant end moments once they are known.
#pragma once

#include <sagitta/detail/acting_loads.hpp>
#include <sagitta/detail/statics.hpp>
#include <sagitta/ends.hpp>

#include <vector>

namespace sagitta::detail {

template <class Left, class Right, class T>
class balanced_beam {
public:
    balanced_beam(const T& span, const acting_loads<T>& acting) : L_(span), curvatures_(acting.curvatures) {
        balanced_.reserve(acting.loads.size());
        for (const auto& load : acting.loads) {
            balanced_.emplace_back(load, carrier_of<Left, Right>(load, L_), L_);
        }
    }

    [[nodiscard]] const T& span() const { return L_; }

    /// Adds a moment that varies linearly from end to end: it keeps the balance.
    void set_redundants(const T& left, const T& right) {
        redundant_left_ = left;
        redundant_right_ = right;
    }

    /// Shear and moment, just left or just right of the section where they jump.
    [[nodiscard]] shear_and_moment<T> statics_at(const section<T>& x, side which) const {
        shear_and_moment<T> sum{(redundant_right_ - redundant_left_) / L_,
                                redundant_left_ * (x.ahead_of(L_) / L_) + redundant_right_ * (x.x() / L_)};
        for (const auto& load : balanced_) {
            const auto part = load.at(x, which);
            sum.shear += part.shear;
            sum.moment += part.moment;
        }
        return sum;
    }

    [[nodiscard]] T imposed_at(const T& x, side which) const {
        T imposed(0);
        for (const auto& each : curvatures_) {
            const bool covered =
                which == side::just_left ? x > each.from && x <= each.to : x >= each.from && x < each.to;
            if (covered) imposed += each.size;
        }
        return imposed;
    }
    /// The curvature imposed on a stretch on which none begins or ends.
    [[nodiscard]] T imposed_between(const T& from, const T& to) const {
        T imposed(0);
        for (const auto& each : curvatures_) {
            if (each.from < to && each.to > from) imposed += each.size;
        }
        return imposed;
    }
    [[nodiscard]] T load_at(const T& x, side which) const {
        T w(0);
        for (const auto& each : balanced_) w += each.intensity(x, which);
        return w;
    }

private:
    T L_;
    std::vector<balanced_load<T>> balanced_;
    std::vector<acting_curvature<T>> curvatures_;
    T redundant_left_{}, redundant_right_{};
};

}  // namespace sagitta::detail
