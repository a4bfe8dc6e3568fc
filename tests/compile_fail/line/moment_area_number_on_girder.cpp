// expect: a length is expected here
#include "twin.hpp"

const auto girder = continuous_beam(7.2 * m, EI).support_at(0.0 * m).support_at(7.2 * m).under(dead);

#ifdef WRONG
const auto b = moment_area(girder, 0.0 * m, 3.6);
#else
const auto b = moment_area(girder, 0.0 * m, 3.6 * m);
#endif
