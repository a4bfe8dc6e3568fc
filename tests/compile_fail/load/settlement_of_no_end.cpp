// expect the compiler's: no matching function for call to 'settlement
#include "twin.hpp"

#ifdef WRONG
constexpr auto b = settlement(5.0 * mm);
#else
constexpr auto b = settlement(end::right, 5.0 * mm);
#endif
