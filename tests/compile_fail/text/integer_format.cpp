// expect the compiler's: fmt
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{:d mm}", sag);
#else
const auto b = fmt::format("{:.1f mm}", sag);
#endif
