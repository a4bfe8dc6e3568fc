// expect: a plane angle is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto clamp = rotation_at(0.0 * m).prescribed(5.0 * mm);
#else
constexpr auto clamp = rotation_at(0.0 * m).prescribed(5.0 * mrad);
#endif
