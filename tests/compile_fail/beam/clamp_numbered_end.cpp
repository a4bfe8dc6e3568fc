// expect: an end is expected here
#include "twin.hpp"

#ifdef WRONG
void hold(continuous_beam<>& girder) { girder.clamp(0); }
#else
void hold(continuous_beam<>& girder) { girder.clamp(end::left); }
#endif
