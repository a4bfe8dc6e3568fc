// expect the compiler's: end_moment
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.end_moment(0.0 * m);
#else
constexpr auto b = line.end_moment(end::left);
#endif
