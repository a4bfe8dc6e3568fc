// expect: a plane angle is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = imposed_kink(0.002, at(3.0 * m));
#else
constexpr auto b = imposed_kink(0.002 * rad, at(3.0 * m));
#endif
