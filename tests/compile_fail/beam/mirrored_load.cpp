// expect the compiler's: no matching function for call to 'mirrored
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = mirrored(dead);
#else
constexpr auto b = mirrored(arm);
#endif
