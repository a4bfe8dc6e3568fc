// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto hinge = relative_rotation_at(3.0 * rad);
#else
constexpr auto hinge = relative_rotation_at(3.0 * m);
#endif
