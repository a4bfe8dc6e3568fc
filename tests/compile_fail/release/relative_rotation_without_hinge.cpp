// expect: a relative rotation needs a hinge
#include "twin.hpp"

#ifdef WRONG
constexpr auto method = force_method(joist, relative_rotation_at(3.0 * m));
#else
constexpr auto method = force_method(joist, rotation_at(3.0 * m));
#endif
