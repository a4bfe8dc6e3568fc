// expect the compiler's: no member named '
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = greatest_deflection(joist);
#else
constexpr auto b = greatest_deflection(line);
#endif
