// expect: a released structure is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto method = force_method(dead, translation_at(3.0 * m));
#else
constexpr auto method = force_method(joist, translation_at(3.0 * m));
#endif
