// expect: a flexural rigidity EI is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = simple_beam(7.2 * m, 8356.0 * cm4);
#else
constexpr auto b = simple_beam(7.2 * m, 210.0 * GPa * 8356.0 * cm4);
#endif
