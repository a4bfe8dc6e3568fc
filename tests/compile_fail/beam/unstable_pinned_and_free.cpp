// expect: a beam held like this is a mechanism
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = beam_with_ends<held::pinned, held::free>(7.2 * m, EI);
#else
constexpr auto b = beam_with_ends<held::fixed, held::free>(7.2 * m, EI);
#endif
