// expect: an elastic line is expected here
#include "twin.hpp"

#ifdef WRONG
const auto b = stationary_points(joist);
#else
const auto b = stationary_points(line);
#endif
