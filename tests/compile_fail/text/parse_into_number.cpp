// expect: a dimension is expected here
#include "twin.hpp"

#ifdef WRONG
const auto P = parse<double>("22 kN");
#else
const auto P = parse<dimension::force>("22 kN");
#endif
