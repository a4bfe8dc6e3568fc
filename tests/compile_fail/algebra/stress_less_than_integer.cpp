// expect: a plain number is not added to a quantity or compared with it
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.moment(3.6 * m) / (357.0 * cm2 * cm) < 235;
#else
constexpr auto b = line.moment(3.6 * m) / (357.0 * cm2 * cm) < 235 * MPa;
#endif
