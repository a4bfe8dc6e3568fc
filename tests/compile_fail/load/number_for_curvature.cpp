// expect: a curvature (1 per length) is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = imposed_curvature(0.0002, between(0.0 * m, 3.0 * m));
#else
constexpr auto b = imposed_curvature(0.0002 / m, between(0.0 * m, 3.0 * m));
#endif
