// expect: a spring stiffness (force per length) is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto pier = translation_at(3.0 * m).on_spring(8.0 * kN * m / rad);
#else
constexpr auto pier = translation_at(3.0 * m).on_spring(8.0 * kN / mm);
#endif
