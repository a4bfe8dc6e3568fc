// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = simple_beam(m, EI);
#else
constexpr auto b = simple_beam(1.0 * m, EI);
#endif
