// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead + joist;
#else
constexpr auto b = dead + live;
#endif
