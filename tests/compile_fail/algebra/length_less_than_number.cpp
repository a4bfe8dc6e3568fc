// expect the compiler's: and 'double')
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = abs(sag) < 0.02;
#else
constexpr auto b = abs(sag) < 7.2 * m / 250;
#endif
