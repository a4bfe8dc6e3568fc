// expect the compiler's: no matching function for call to 'point_load
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = point_load(22.0 * kN);
#else
constexpr auto b = point_load(22.0 * kN, at(3.0 * m));
#endif
