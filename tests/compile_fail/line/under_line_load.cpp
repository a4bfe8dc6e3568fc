// expect: a load is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(4.5 * kN / m);
#else
constexpr auto b = joist.under(uniform_load(4.5 * kN / m));
#endif
