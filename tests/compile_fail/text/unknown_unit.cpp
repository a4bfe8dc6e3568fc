// expect in a note: unknown_unit_in_format_string
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f mmm}", sag);
#else
const auto b = fmt::format("{:.1f mm}", sag);
#endif
