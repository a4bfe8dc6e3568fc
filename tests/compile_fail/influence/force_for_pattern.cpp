// expect: a load per length is expected here
#include "twin.hpp"

#ifdef WRONG
inline auto pattern(const continuous_beam<>& b) {
    return governing_patterns(influence_of_moment(b, 3.0 * m), 2.0 * kN);
}
#else
inline auto pattern(const continuous_beam<>& b) {
    return governing_patterns(influence_of_moment(b, 3.0 * m), 2.0 * kN / m);
}
#endif
