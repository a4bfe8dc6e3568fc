// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto clamp = rotation_at(0);
#else
constexpr auto clamp = rotation_at(0.0 * m);
#endif
