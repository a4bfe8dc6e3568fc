// expect: a flexural rigidity EI is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = cantilever(7.2 * m, 17547.6);
#else
constexpr auto b = cantilever(7.2 * m, EI);
#endif
