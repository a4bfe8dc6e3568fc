// A place of a continuous beam where something holds it, or where it changes.
#pragma once

#include <sagitta/units.hpp>

namespace sagitta::detail {

/// What holds a beam at one place. Stiffness 0 holds nothing, infinite stiffness holds rigidly.
template <class T>
struct node {
    quantity<dimension::length, T> at{};
    T transverse = T(0);      // N/m
    T turning = T(0);         // N*m/rad, at the ends of the beam only
    T settled = T(0);         // m, downward
    T turned = T(0);          // rad, clockwise
    T passed = T(0);          // N*m, sagging: what a hinge passes on
    bool is_support = false;  // has a reaction to report
    bool is_hinge = false;
};

}  // namespace sagitta::detail
