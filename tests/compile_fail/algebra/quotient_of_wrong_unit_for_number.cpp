// expect the compiler's: boost::units::mass_base_dimension
#include "twin.hpp"

#ifdef WRONG
constexpr double v = line.deflection(3.6 * m) / kN;
#else
constexpr double v = line.deflection(3.6 * m) / mm;
#endif
