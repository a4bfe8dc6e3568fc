// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
void hold(continuous_beam<>& girder) { girder.support_at(3.6); }
#else
void hold(continuous_beam<>& girder) { girder.support_at(3.6 * m); }
#endif
