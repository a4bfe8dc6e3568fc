// expect in a note: no_arguments_inside_the_format_of_a_quantity
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.{}f mm}", sag, 1);
#else
const auto b = fmt::format("{:.1f mm}", sag);
#endif
