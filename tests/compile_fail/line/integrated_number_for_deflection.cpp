// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
const auto b = integrate_moment_area(joist, dead).deflection(3.6);
#else
const auto b = integrate_moment_area(joist, dead).deflection(3.6 * m);
#endif
