// expect: only quantities of the same dimension are added or compared
#include "twin.hpp"

constexpr auto method = force_method(joist, translation_at(3.0 * m), rotation_at(0.0 * m));
constexpr auto solved = method.under(dead);

#ifdef WRONG
constexpr auto difference = solved.flexibility<0, 1>() - solved.flexibility<1, 0>();
#else
constexpr auto difference = solved.flexibility<0, 1>() * rad - solved.flexibility<1, 0>();
#endif
