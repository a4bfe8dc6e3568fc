// expect in a note: unit_of_another_dimension_in_format_string
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f mm}", line.reaction(end::left));
#else
const auto b = fmt::format("{:.1f kN}", line.reaction(end::left));
#endif
