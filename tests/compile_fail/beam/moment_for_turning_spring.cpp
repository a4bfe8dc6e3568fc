// expect: a rotational stiffness (moment per angle) is expected here
#include "twin.hpp"

#ifdef WRONG
void hold(continuous_beam<>& girder) { girder.turning_spring(end::left, 500.0 * kN * m); }
#else
void hold(continuous_beam<>& girder) { girder.turning_spring(end::left, 500.0 * kN * m / rad); }
#endif
