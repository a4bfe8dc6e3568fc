// expect: to a load only another load is added
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead + joist;
#else
constexpr auto b = dead + live;
#endif
