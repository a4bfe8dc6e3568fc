// expect: a plane angle is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = support_rotation(end::left, 0.5 * mm);
#else
constexpr auto b = support_rotation(end::left, 0.5 * mrad);
#endif
