// expect: a support rotation needs a clamped end; this end turns freely
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = mirrored(arm).under(support_rotation(end::left, 0.5 * mrad));
#else
constexpr auto b = arm.under(support_rotation(end::left, 0.5 * mrad));
#endif
