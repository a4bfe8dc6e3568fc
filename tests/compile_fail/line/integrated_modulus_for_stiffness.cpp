// expect: a flexural rigidity EI is expected here
#include "twin.hpp"

#ifdef WRONG
const auto b = integrate_moment_area(joist, dead, [](auto) { return 210.0 * GPa; }).deflection(3.6 * m);
#else
const auto b = integrate_moment_area(joist, dead, [](auto) { return EI; }).deflection(3.6 * m);
#endif
