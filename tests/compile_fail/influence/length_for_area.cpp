// expect: a stretch of the beam is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto area = influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m).area(2.0 * m);
#else
constexpr auto area =
    influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m).area(between(0.0 * m, 2.0 * m));
#endif
