// expect: only quantities of the same dimension are added or compared
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = sag + 5.0 * kN;
#else
constexpr auto b = sag + 5.0 * mm;
#endif
