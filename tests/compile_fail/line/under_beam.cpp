// expect: a load is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(arm);
#else
constexpr auto b = joist.under(dead);
#endif
