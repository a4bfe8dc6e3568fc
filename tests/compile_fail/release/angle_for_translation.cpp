// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto pier = translation_at(3.0 * m).prescribed(5.0 * mrad);
#else
constexpr auto pier = translation_at(3.0 * m).prescribed(5.0 * mm);
#endif
