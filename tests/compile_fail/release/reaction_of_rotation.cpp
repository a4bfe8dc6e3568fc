// expect: only a translation has a reaction
#include "twin.hpp"

constexpr auto method = force_method(joist, translation_at(3.0 * m), rotation_at(0.0 * m));
constexpr auto solved = method.under(dead);

#ifdef WRONG
constexpr auto R = solved.reaction<1>();
#else
constexpr auto R = solved.reaction<0>();
#endif
