// expect: a load is multiplied by a plain number
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist * dead;
#else
constexpr auto b = joist.under(dead);
#endif
