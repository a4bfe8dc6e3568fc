// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = propped_cantilever(7.2, EI);
#else
constexpr auto b = propped_cantilever(7.2 * m, EI);
#endif
