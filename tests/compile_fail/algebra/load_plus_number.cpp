// expect: to a load only another load is added
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead + 4.5;
#else
constexpr auto b = dead + live;
#endif
