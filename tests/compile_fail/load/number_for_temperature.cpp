// expect: a temperature difference is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = temperature_gradient(12e-6 / K, 20.0, warm_side::top, 360.0 * mm);
#else
constexpr auto b = temperature_gradient(12e-6 / K, 20.0 * K, warm_side::top, 360.0 * mm);
#endif
