// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = at(end::right);
#else
constexpr auto b = at(7.2 * m);
#endif
