// expect the compiler's: no matching function for call to 'parse
#include "twin.hpp"

#ifdef WRONG
const auto P = parse("22 kN");
#else
const auto P = parse<dimension::force>("22 kN");
#endif
