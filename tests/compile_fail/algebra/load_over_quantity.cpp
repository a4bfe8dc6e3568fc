// expect: a load is divided by a plain number
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead / (2.0 * m);
#else
constexpr auto b = dead / 2.0;
#endif
