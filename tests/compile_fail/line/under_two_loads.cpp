// expect the compiler's: under
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(dead, live);
#else
constexpr auto b = joist.under(dead + live);
#endif
