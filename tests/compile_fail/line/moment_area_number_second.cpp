// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
const auto b = moment_area(line, 0.0 * m, 3.6);
#else
const auto b = moment_area(line, 0.0 * m, 3.6 * m);
#endif
