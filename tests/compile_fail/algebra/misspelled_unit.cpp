// expect the compiler's: 'mmm'
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = 7.2 * mmm;
#else
constexpr auto b = 7.2 * mm;
#endif
