// expect the compiler's: fmt
#include "twin.hpp"

#ifdef WRONG
const auto b = fmt::format("{}", mm);
#else
const auto b = fmt::format("{}", 1.0 * mm);
#endif
