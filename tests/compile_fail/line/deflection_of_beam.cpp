// expect the compiler's: no member named 'deflection'
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.deflection(3.6 * m);
#else
constexpr auto b = joist.under(dead).deflection(3.6 * m);
#endif
