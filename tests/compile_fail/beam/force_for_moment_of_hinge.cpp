// expect: a couple (force times length) is expected here
#include "twin.hpp"

#ifdef WRONG
void hinge(continuous_beam<>& girder) { girder.hinge_at(3.6 * m, 8.0 * kN); }
#else
void hinge(continuous_beam<>& girder) { girder.hinge_at(3.6 * m, 8.0 * kN * m); }
#endif
