// expect: a settlement needs an end that is held against deflection; this end is free
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = arm.under(settlement(end::right, 5.0 * mm));
#else
constexpr auto b = arm.under(settlement(end::left, 5.0 * mm));
#endif
