// expect: a force method takes a released structure and releases
#include "twin.hpp"

#ifdef WRONG
constexpr auto method = force_method(joist);
#else
constexpr auto method = force_method(joist, rotation_at(0.0 * m));
#endif
