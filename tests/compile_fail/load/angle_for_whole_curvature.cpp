// expect: a curvature (1 per length) is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = imposed_curvature(0.2 * mrad);
#else
constexpr auto b = imposed_curvature(0.0002 / m);
#endif
