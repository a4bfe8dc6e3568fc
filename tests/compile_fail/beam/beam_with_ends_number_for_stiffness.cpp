// expect: a flexural rigidity EI is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = beam_with_ends<held::pinned, held::fixed>(7.2 * m, 2.0e7);
#else
constexpr auto b = beam_with_ends<held::pinned, held::fixed>(7.2 * m, EI);
#endif
