// Every formula of the library. Nothing else is allowed to know one.
#pragma once

#include <sagitta/detail/shape.hpp>
#include <sagitta/ends.hpp>

#include <concepts>
#include <type_traits>

namespace sagitta::detail {

/// What a unit force, standing at a distance near from the end Here and far from the end There (as fractions
/// of the span), causes at the end Here, seen with x running away from Here:
///   deflection in F L^3/EI and slope in F L^2/EI where the end can make them,
///   moment in F L (sagging positive) and shear in F where the end holds them.
///
/// The elastic line between Here and the force follows from these two values alone, and by the reciprocal
/// theorem (Maxwell, Betti) each of them is also a deflected shape: the shear's when the end Here settles by
/// 1, the moment's, negated, when it is turned by 1. Couples and line loads are derivatives and integrals.
///
/// The coefficients belong to f^N, n f^(N-1), ..., n^N. Source: solved from EI v'''' = w with the end
/// conditions; the same values stand in the usual beam tables (AISC Steel Construction Manual table 3-23,
/// Roark's Formulas table 8.1 case 1).
template <class Here, class There>
struct influence;

template <>
struct influence<held::pinned, held::pinned> {
    using slope = shape<6, 0, 2, 1, 0>;  // n f (2f + n) / 6
    using shear = shape<1, 1, 0>;        // f
};

template <>
struct influence<held::pinned, held::fixed> {
    using slope = shape<4, 0, 1, 0, 0>;  // n f^2 / 4
    using shear = shape<2, 2, 3, 0, 0>;  // f^2 (2f + 3n) / 2
};

template <>
struct influence<held::fixed, held::pinned> {
    using moment = shape<-2, 0, 2, 1, 0>;  // -n f (2f + n) / 2
    using shear = shape<2, 2, 6, 3, 0>;    // f (2f^2 + 6 n f + 3 n^2) / 2
};

template <>
struct influence<held::fixed, held::fixed> {
    using moment = shape<-1, 0, 1, 0, 0>;  // -n f^2
    using shear = shape<1, 1, 3, 0, 0>;    // f^2 (f + 3n)
};

template <>
struct influence<held::fixed, held::free> {
    using moment = shape<-1, 0, 1>;  // -n
    using shear = shape<1, 1>;       // 1
};

template <>
struct influence<held::free, held::fixed> {
    using deflection = shape<6, 2, 3, 0, 0>;  // f^2 (2f + 3n) / 6
    using slope = shape<-2, 1, 0, 0>;         // -f^2 / 2
};

template <>
struct influence<held::guided, held::fixed> {
    using deflection = shape<12, 1, 3, 0, 0>;  // f^2 (f + 3n) / 12
    using moment = shape<2, 1, 0, 0>;          // f^2 / 2
};

template <>
struct influence<held::fixed, held::guided> {
    using moment = shape<-2, 0, 2, 1>;  // -n (2f + n) / 2
    using shear = shape<1, 1>;          // 1
};

template <>
struct influence<held::guided, held::pinned> {
    using deflection = shape<6, 2, 6, 3, 0>;  // f (2f^2 + 6 n f + 3 n^2) / 6
    using moment = shape<1, 1, 0>;            // f
};

template <>
struct influence<held::pinned, held::guided> {
    using slope = shape<2, 0, 2, 1>;  // n (2f + n) / 2
    using shear = shape<1, 1>;        // 1
};

/// A pair of ends that has no rows cannot carry load: it is a mechanism.
template <class Left, class Right>
concept stable_ends = requires {
    sizeof(influence<Left, Right>);
    sizeof(influence<Right, Left>);
};

/// The row of the end's transverse unknown: shear where it is held against deflection, else deflection.
template <class Here, class There>
constexpr auto across_row() {
    if constexpr (Here::against_deflection) {
        return typename influence<Here, There>::shear{};
    } else {
        return typename influence<Here, There>::deflection{};
    }
}

/// The row of the end's turning unknown: moment where it is held against rotation, else slope.
template <class Here, class There>
constexpr auto turning_row() {
    if constexpr (Here::against_rotation) {
        return typename influence<Here, There>::moment{};
    } else {
        return typename influence<Here, There>::slope{};
    }
}

}  // namespace sagitta::detail
