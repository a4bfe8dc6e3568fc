// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = imposed_offset(2.0 * mrad, at(3.0 * m));
#else
constexpr auto b = imposed_offset(2.0 * mm, at(3.0 * m));
#endif
