// expect the compiler's: and 'double')
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = sag + 5.0;
#else
constexpr auto b = sag + 5.0 * mm;
#endif
