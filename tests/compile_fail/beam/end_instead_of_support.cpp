// expect: a beam held like this is a mechanism
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = beam_with_ends<end::left_end, end::right_end>(7.2 * m, EI);
#else
constexpr auto b = beam_with_ends<held::pinned, held::fixed>(7.2 * m, EI);
#endif
