// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.shear(3.6);
#else
constexpr auto b = line.shear(3.6 * m);
#endif
