// expect: to a load only another load is added
#include "twin.hpp"

#ifdef WRONG
void build(load_list<>& loads) { loads = loads + 4.5 * kN / m; }
#else
void build(load_list<>& loads) { loads = loads + dead; }
#endif
