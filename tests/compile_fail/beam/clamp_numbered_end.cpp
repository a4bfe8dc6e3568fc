// expect the compiler's: end_node
#include "twin.hpp"

#ifdef WRONG
void hold(continuous_beam<>& girder) { girder.clamp(0); }
#else
void hold(continuous_beam<>& girder) { girder.clamp(end::left); }
#endif
