// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = simple_beam(7.2 * m2, EI);
#else
constexpr auto b = simple_beam(7.2 * m, EI);
#endif
