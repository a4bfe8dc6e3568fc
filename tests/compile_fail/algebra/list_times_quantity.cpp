// expect: a load is multiplied by a plain number
#include "twin.hpp"

#ifdef WRONG
void build(load_list<>& loads) { loads *= 1.35 * m; }
#else
void build(load_list<>& loads) { loads *= 1.35; }
#endif
