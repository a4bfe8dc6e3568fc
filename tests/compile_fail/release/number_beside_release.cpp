// expect: a force method takes a released structure and releases
#include "twin.hpp"

#ifdef WRONG
constexpr auto method = force_method(joist, translation_at(3.0 * m), 5.0);
#else
constexpr auto method = force_method(joist, translation_at(3.0 * m), translation_at(5.0 * m));
#endif
