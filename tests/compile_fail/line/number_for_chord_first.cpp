// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = chord_between(line, 0, 3.6 * m);
#else
constexpr auto b = chord_between(line, 0.0 * m, 3.6 * m);
#endif
