// expect the compiler's: no matching function for call to 'uniform_load
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = uniform_load(9.0 * kN / m, between(1.2 * m, 4.8 * m));
#else
constexpr auto b = partial_uniform_load(9.0 * kN / m, between(1.2 * m, 4.8 * m));
#endif
