// expect: a force is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.with_shear_rigidity(81.0 * GPa);
#else
constexpr auto b = joist.with_shear_rigidity(81.0 * GPa * 20.0 * cm2);
#endif
