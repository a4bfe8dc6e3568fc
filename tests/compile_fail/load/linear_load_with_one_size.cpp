// expect: a load per length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = linear_load(6.0 * kN / m, between(4.8 * m, 7.2 * m));
#else
constexpr auto b = linear_load(0.0 * kN / m, 6.0 * kN / m);
#endif
