// expect: a load is multiplied by a plain number
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead * (1.35 * m);
#else
constexpr auto b = dead * 1.35;
#endif
