// expect the compiler's: no matching function for call to 'moment_area
#include "twin.hpp"

#ifdef WRONG
const auto b = moment_area(joist, 0.0 * m, 3.6 * m);
#else
const auto b = moment_area(line, 0.0 * m, 3.6 * m);
#endif
