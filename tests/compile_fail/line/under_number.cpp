// expect the compiler's: ::superposition<
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(4.5);
#else
constexpr auto b = joist.under(dead);
#endif
