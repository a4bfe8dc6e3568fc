// expect the compiler's: reaction
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = line.reaction(0);
#else
constexpr auto b = line.reaction(end::left);
#endif
