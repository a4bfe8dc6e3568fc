// expect: a dimension is expected here
#include "twin.hpp"

#ifdef WRONG
const auto b = parse<quantity<dimension::force>>("22 kN");
#else
const auto b = parse<dimension::force>("22 kN");
#endif
