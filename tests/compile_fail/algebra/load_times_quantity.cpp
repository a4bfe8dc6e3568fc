// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead * (1.35 * m);
#else
constexpr auto b = dead * 1.35;
#endif
