// expect the compiler's: no matching function for call to 'integrate_moment_area
#include "twin.hpp"

#ifdef WRONG
const auto b = integrate_moment_area(joist, dead, [](auto) { return EI; }, {3.6});
#else
const auto b = integrate_moment_area(joist, dead, [](auto) { return EI; }, {3.6 * m});
#endif
