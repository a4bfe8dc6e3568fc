// expect: only quantities of the same dimension are added or compared
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = sag == line.moment(3.6 * m);
#else
constexpr auto b = sag == line.deflection(3.6 * m);
#endif
