// expect: a stretch of the beam is expected here: write between(1.2*m, 4.8*m)
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = partial_uniform_load(9.0 * kN / m, at(4.8 * m));
#else
constexpr auto b = partial_uniform_load(9.0 * kN / m, between(1.2 * m, 4.8 * m));
#endif
