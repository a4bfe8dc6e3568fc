// expect: only quantities of the same dimension are added or compared
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = abs(sag) < 7.2 * kN;
#else
constexpr auto b = abs(sag) < 7.2 * m / 250;
#endif
