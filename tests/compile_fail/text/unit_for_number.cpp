// expect the compiler's: fmt
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:.1f mm}", sag / mm);
#else
const auto b = fmt::format("{:.1f}", sag / mm);
#endif
