// expect: a load is divided by a plain number
#include "twin.hpp"

#ifdef WRONG
load_list<> part_of(const load_list<>& loads) { return loads / (2.0 * m); }
#else
load_list<> part_of(const load_list<>& loads) { return loads / 2.0; }
#endif
