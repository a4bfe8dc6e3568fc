// expect: a load is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(4.5);
#else
constexpr auto b = joist.under(dead);
#endif
