// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.load(3.6, just_left);
#else
constexpr auto b = line.load(3.6 * m, just_left);
#endif
