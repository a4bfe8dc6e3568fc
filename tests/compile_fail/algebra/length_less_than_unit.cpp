// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = abs(sag) < mm;
#else
constexpr auto b = abs(sag) < 20.0 * mm;
#endif
