// expect: a unit alone is not added to a quantity or compared with it
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = sag - mm;
#else
constexpr auto b = sag - 1.0 * mm;
#endif
