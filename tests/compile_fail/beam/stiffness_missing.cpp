// expect the compiler's: no matching function for call to 'simple_beam
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = simple_beam(7.2 * m);
#else
constexpr auto b = simple_beam(7.2 * m, EI);
#endif
