// expect in a note: unit_of_another_dimension_in_format_string
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f kN}", sag);
#else
const auto b = fmt::format("{:.1f mm}", sag);
#endif
