// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = tangent_at(line, 3.6);
#else
constexpr auto b = tangent_at(line, 3.6 * m);
#endif
