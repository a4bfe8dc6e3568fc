// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.slope(end::left);
#else
constexpr auto b = line.slope(0.0 * m);
#endif
