// expect: there is no such release
#include "twin.hpp"

constexpr auto method = force_method(joist, translation_at(3.0 * m), rotation_at(0.0 * m));
constexpr auto solved = method.under(dead);

#ifdef WRONG
constexpr auto f = solved.flexibility<0, 2>();
#else
constexpr auto f = solved.flexibility<0, 1>();
#endif
