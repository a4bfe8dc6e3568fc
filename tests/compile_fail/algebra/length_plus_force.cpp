// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = sag + 5.0 * kN;
#else
constexpr auto b = sag + 5.0 * mm;
#endif
