// expect the compiler's: operand
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist * dead;
#else
constexpr auto b = joist.under(dead);
#endif
