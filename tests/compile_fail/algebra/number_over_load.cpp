// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = 2.0 / dead;
#else
constexpr auto b = dead / 2.0;
#endif
