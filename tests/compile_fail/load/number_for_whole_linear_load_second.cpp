// expect: a load per length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = linear_load(0.0 * kN / m, 6.0);
#else
constexpr auto b = linear_load(0.0 * kN / m, 6.0 * kN / m);
#endif
