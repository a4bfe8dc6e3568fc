// expect the compiler's: loads::uniform<
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead + joist;
#else
constexpr auto b = dead + live;
#endif
