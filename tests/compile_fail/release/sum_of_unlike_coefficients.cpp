// expect: only quantities of the same dimension are added or compared
#include "twin.hpp"

constexpr auto method = force_method(joist, translation_at(3.0 * m), rotation_at(0.0 * m));
constexpr auto solved = method.under(dead);

#ifdef WRONG
constexpr auto sum = solved.flexibility<0, 0>() + solved.flexibility<0, 1>();
#else
constexpr auto sum = solved.flexibility<0, 0>() * (1.0 * kN) + solved.flexibility<0, 1>() * (1.0 * kN * m);
#endif
