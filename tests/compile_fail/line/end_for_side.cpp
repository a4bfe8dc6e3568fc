// expect the compiler's: shear
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.shear(3.6 * m, end::left);
#else
constexpr auto b = line.shear(3.6 * m, just_left);
#endif
