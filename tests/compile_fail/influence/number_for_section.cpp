// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto eta = influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0);
#else
constexpr auto eta = influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m);
#endif
