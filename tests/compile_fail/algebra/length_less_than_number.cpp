// expect: a plain number is not added to a quantity or compared with it
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = abs(sag) < 0.02;
#else
constexpr auto b = abs(sag) < 7.2 * m / 250;
#endif
