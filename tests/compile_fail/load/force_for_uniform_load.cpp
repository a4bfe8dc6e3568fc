// expect: a load per length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = uniform_load(4.5 * kN);
#else
constexpr auto b = uniform_load(4.5 * kN / m);
#endif
