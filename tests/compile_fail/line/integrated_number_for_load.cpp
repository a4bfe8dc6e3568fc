// expect: a load is expected here
#include "twin.hpp"

#ifdef WRONG
const auto b = integrate_moment_area(joist, 4.5);
#else
const auto b = integrate_moment_area(joist, dead);
#endif
