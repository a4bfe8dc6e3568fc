// expect: a plain number is not added to a quantity or compared with it
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = sag + 5.0;
#else
constexpr auto b = sag + 5.0 * mm;
#endif
