// expect: a force method takes a released structure and releases
#include "twin.hpp"

#ifdef WRONG
constexpr auto method = force_method(joist, 3.0 * m);
#else
constexpr auto method = force_method(joist, translation_at(3.0 * m));
#endif
