// expect the compiler's: no matching function for call to 'beam_with_ends
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = beam_with_ends<held::pinned>(7.2 * m, EI);
#else
constexpr auto b = beam_with_ends<held::pinned, held::fixed>(7.2 * m, EI);
#endif
