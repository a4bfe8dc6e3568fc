// expect the compiler's: no matching function for call to 'support_rotation
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = support_rotation(0.5 * mrad);
#else
constexpr auto b = support_rotation(end::left, 0.5 * mrad);
#endif
