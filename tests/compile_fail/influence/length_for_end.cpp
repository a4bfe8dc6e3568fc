// expect: a single span is supported at its ends: write end::left or end::right
#include "twin.hpp"

#ifdef WRONG
constexpr auto eta = influence_of_reaction(simple_beam(7.2 * m, 17.5 * MN * m2), 0.0 * m);
#else
constexpr auto eta = influence_of_reaction(simple_beam(7.2 * m, 17.5 * MN * m2), end::left);
#endif
