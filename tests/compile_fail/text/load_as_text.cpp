// expect the compiler's: fmt
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{}", dead);
#else
const auto b = fmt::format("{}", sag);
#endif
