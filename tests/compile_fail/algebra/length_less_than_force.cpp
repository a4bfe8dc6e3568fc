// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = abs(sag) < 7.2 * kN;
#else
constexpr auto b = abs(sag) < 7.2 * m / 250;
#endif
