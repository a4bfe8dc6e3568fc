// expect the compiler's: const boost::units::quantity<boost::units::unit<
#include "twin.hpp"

#ifdef WRONG
const auto b = integrate_moment_area(joist, dead, EI).deflection(3.6 * m);
#else
const auto b = integrate_moment_area(joist, dead, [](auto) { return EI; }).deflection(3.6 * m);
#endif
