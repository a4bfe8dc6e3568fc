// The two ends of a beam and the ways in which an end can be held.
#pragma once

namespace sagitta {

/// Which end: end::left, end::right. Two types, so that a wrong end can be refused when compiling.
namespace end {

struct left_end {};
struct right_end {};

inline constexpr left_end left{};
inline constexpr right_end right{};

}  // namespace end

/// Which of two values is meant at a place where a concentrated load makes the shear or the moment jump.
enum class side {
    just_left,
    just_right,
};
inline constexpr side just_left = side::just_left;
inline constexpr side just_right = side::just_right;

/// The ways to hold an end. Whoever adds one states the two facts below and adds its rows to
/// detail/influence.hpp.
namespace held {

/// Clamped: neither deflects nor rotates.
struct fixed {
    static constexpr bool against_deflection = true;
    static constexpr bool against_rotation = true;
};

/// Rests on a support that lets it rotate; uplift is held too.
struct pinned {
    static constexpr bool against_deflection = true;
    static constexpr bool against_rotation = false;
};

/// Free to move, not to rotate.
struct guided {
    static constexpr bool against_deflection = false;
    static constexpr bool against_rotation = true;
};

/// Not held at all.
struct free {
    static constexpr bool against_deflection = false;
    static constexpr bool against_rotation = false;
};

}  // namespace held
}  // namespace sagitta
