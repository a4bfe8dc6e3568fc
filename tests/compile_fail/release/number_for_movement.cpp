// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto pier = translation_at(3.0 * m).prescribed(0.005);
#else
constexpr auto pier = translation_at(3.0 * m).prescribed(0.005 * m);
#endif
