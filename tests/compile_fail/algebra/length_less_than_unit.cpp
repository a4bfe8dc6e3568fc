// expect: a unit alone is not added to a quantity or compared with it
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = abs(sag) < mm;
#else
constexpr auto b = abs(sag) < 20.0 * mm;
#endif
