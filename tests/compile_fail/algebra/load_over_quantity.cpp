// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead / (2.0 * m);
#else
constexpr auto b = dead / 2.0;
#endif
