// expect: a spring stiffness (force per length) is expected here
#include "twin.hpp"

#ifdef WRONG
void hold(continuous_beam<>& girder) { girder.spring_at(3.6 * m, 8.0 * kN); }
#else
void hold(continuous_beam<>& girder) { girder.spring_at(3.6 * m, 8.0 * kN / mm); }
#endif
