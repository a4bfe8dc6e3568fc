// expect: a settlement needs an end that is held against deflection
#include "twin.hpp"

#ifdef WRONG
const auto b = integrate_moment_area(arm, settlement(end::right, 5.0 * mm));
#else
const auto b = integrate_moment_area(arm, settlement(end::left, 5.0 * mm));
#endif
