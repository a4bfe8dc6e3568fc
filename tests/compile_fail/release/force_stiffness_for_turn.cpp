// expect: a rotational stiffness (moment per angle) is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto clamp = rotation_at(0.0 * m).on_spring(8.0 * kN / mm);
#else
constexpr auto clamp = rotation_at(0.0 * m).on_spring(8.0 * kN * m / rad);
#endif
