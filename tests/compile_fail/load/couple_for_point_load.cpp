// expect: a force is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = point_load(22.0 * kN * m, at(3.0 * m));
#else
constexpr auto b = point_load(22.0 * kN, at(3.0 * m));
#endif
