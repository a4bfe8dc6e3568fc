// expect in a note: unknown_unit_in_format_string
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f KN}", line.shear(0.0 * m));
#else
const auto b = fmt::format("{:.1f kN}", line.shear(0.0 * m));
#endif
