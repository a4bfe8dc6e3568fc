// expect: a settlement needs an end that is held against deflection; this end is free
#include "twin.hpp"

#ifdef WRONG
constexpr auto eta = influence_of_reaction(cantilever(7.2 * m, 17.5 * MN * m2), end::right);
#else
constexpr auto eta = influence_of_reaction(cantilever(7.2 * m, 17.5 * MN * m2), end::left);
#endif
