// expect the compiler's: no matching function for call to 'cross_check
#include "twin.hpp"

#ifdef WRONG
const auto b = cross_check(joist);
#else
const auto b = cross_check(line);
#endif
