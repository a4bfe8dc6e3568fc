// expect in a note: number_format_not_understood_or_no_space_before_the_unit
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1fmm}", sag);
#else
const auto b = fmt::format("{:.1f mm}", sag);
#endif
