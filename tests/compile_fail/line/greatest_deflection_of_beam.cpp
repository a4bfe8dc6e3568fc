// expect: an elastic line is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = greatest_deflection(joist);
#else
constexpr auto b = greatest_deflection(line);
#endif
