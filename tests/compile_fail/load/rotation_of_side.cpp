// expect: an end is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = support_rotation(just_left, 1.0 * mrad);
#else
constexpr auto b = support_rotation(end::left, 1.0 * mrad);
#endif
