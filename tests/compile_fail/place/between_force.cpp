// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = between(1.2 * m, 4.8 * kN);
#else
constexpr auto b = between(1.2 * m, 4.8 * m);
#endif
