// expect: a plain number is not added to a quantity or compared with it
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = 5.0 - sag;
#else
constexpr auto b = 5.0 * mm - sag;
#endif
