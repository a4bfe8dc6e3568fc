// expect the compiler's: ::superposition<
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(4.5 * kN / m);
#else
constexpr auto b = joist.under(uniform_load(4.5 * kN / m));
#endif
