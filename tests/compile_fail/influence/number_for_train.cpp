// expect: a length is expected here
#include "twin.hpp"

#ifdef WRONG
inline auto train(const load_train<>& lorry) {
    return effect_of_train(influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m), lorry, 2.0);
}
#else
inline auto train(const load_train<>& lorry) {
    return effect_of_train(influence_of_moment(simple_beam(7.2 * m, 17.5 * MN * m2), 3.0 * m), lorry, 2.0 * m);
}
#endif
