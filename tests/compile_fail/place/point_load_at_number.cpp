// expect: a place on the beam is expected here: write at(3.0*m)
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = point_load(22.0 * kN, 3.0);
#else
constexpr auto b = point_load(22.0 * kN, at(3.0 * m));
#endif
