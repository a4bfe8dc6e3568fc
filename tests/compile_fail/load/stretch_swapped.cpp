// expect in a note: must be a distance from the left end, greater than from
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = partial_uniform_load(4.5 * kN / m, between(6.0 * m, 2.0 * m));
#else
constexpr auto b = partial_uniform_load(4.5 * kN / m, between(2.0 * m, 6.0 * m));
#endif
