// expect: a load is multiplied by a plain number
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = live * dead;
#else
constexpr auto b = 1.35 * dead;
#endif
