// expect: a load per length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = uniform_load(4.5 * kPa);
#else
constexpr auto b = uniform_load(4.5 * kPa * 1.2 * m);
#endif
