// expect: an end is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = settlement(2, 5.0 * mm);
#else
constexpr auto b = settlement(end::right, 5.0 * mm);
#endif
