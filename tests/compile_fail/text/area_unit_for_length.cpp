// expect in a note: unit_of_another_dimension_in_format_string
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f mm2}", sag);
#else
const auto b = fmt::format("{:.1f mm}", sag);
#endif
