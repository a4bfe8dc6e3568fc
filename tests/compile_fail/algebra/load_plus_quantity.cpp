// expect: to a load only another load is added
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead + 4.5 * kN / m;
#else
constexpr auto b = dead + uniform_load(4.5 * kN / m);
#endif
