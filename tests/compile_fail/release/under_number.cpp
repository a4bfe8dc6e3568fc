// expect: a load is expected here
#include "twin.hpp"

constexpr auto method = force_method(joist, translation_at(3.0 * m), rotation_at(0.0 * m));

#ifdef WRONG
constexpr auto solved = method.under(4.5);
#else
constexpr auto solved = method.under(4.5 * dead);
#endif
