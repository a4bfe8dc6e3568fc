// expect the compiler's: sagitta::detail::superposition<sagitta::beam<
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = joist.under(arm);
#else
constexpr auto b = joist.under(dead);
#endif
