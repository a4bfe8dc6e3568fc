// expect the compiler's: boost::units::length_base_dimension
#include "twin.hpp"

#ifdef WRONG
constexpr double v = line.deflection(3.6 * m);
#else
constexpr double v = line.deflection(3.6 * m) / mm;
#endif
