// expect: a stretch of the beam is expected here: write between(1.2*m, 4.8*m)
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = imposed_curvature(0.0002 / m, at(3.0 * m));
#else
constexpr auto b = imposed_curvature(0.0002 / m, between(0.0 * m, 3.0 * m));
#endif
