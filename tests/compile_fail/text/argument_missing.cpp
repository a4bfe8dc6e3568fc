// expect the compiler's: fmt
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f mm} at {:.2f m}", sag);
#else
const auto b = fmt::format("{:.1f mm} at {:.2f m}", sag, 3.6 * m);
#endif
