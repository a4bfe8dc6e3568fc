// expect: a place on the beam is expected here: write at(3.0*m)
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = applied_couple(8.0 * kN * m, 3.0 * m);
#else
constexpr auto b = applied_couple(8.0 * kN * m, at(3.0 * m));
#endif
