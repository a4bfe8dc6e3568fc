// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = at(3);
#else
constexpr auto b = at(3.0 * m);
#endif
