// expect in a note: unit_of_another_dimension_in_format_string
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f kN}", line.moment(3.6 * m));
#else
const auto b = fmt::format("{:.1f kN*m}", line.moment(3.6 * m));
#endif
