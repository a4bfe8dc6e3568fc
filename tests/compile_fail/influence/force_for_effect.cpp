// expect: a load is expected here
#include "twin.hpp"

#ifdef WRONG
inline auto effect() { return influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m).effect_of(2.0 * kN); }
#else
inline auto effect() {
    return influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m)
        .effect_of(point_load(2.0 * kN, at(1.0 * m)));
}
#endif
