// expect: a spring stiffness (force per length) is expected here
#include "twin.hpp"

#ifdef WRONG
constexpr auto pier = translation_at(3.0 * m).on_spring(8.0e6);
#else
constexpr auto pier = translation_at(3.0 * m).on_spring(8.0e6 * N / m);
#endif
