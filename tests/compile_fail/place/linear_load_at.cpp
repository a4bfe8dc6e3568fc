// expect: a stretch of the beam is expected here: write between(1.2*m, 4.8*m)
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = linear_load(0.0 * kN / m, 6.0 * kN / m, at(4.8 * m));
#else
constexpr auto b = linear_load(0.0 * kN / m, 6.0 * kN / m, between(4.8 * m, 7.2 * m));
#endif
