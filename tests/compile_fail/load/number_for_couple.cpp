// expect: a couple (force times length) is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = applied_couple(8.0, at(3.0 * m));
#else
constexpr auto b = applied_couple(8.0 * kN * m, at(3.0 * m));
#endif
