// expect the compiler's: no matching function for call to 'between
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = between(4.8 * m);
#else
constexpr auto b = between(1.2 * m, 4.8 * m);
#endif
