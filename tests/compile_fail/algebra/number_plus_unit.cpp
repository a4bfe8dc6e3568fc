// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = 7.2 + m;
#else
constexpr auto b = 7.2 * m;
#endif
