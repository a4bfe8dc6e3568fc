// expect the compiler's: ::superposition<
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(arm);
#else
constexpr auto b = joist.under(dead);
#endif
