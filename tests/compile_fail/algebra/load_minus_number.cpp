// expect the compiler's: and 'double')
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = dead - 4.5;
#else
constexpr auto b = dead - live;
#endif
