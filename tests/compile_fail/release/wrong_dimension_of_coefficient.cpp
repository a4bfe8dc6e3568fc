// expect: this flexibility coefficient has the dimension of
#include "twin.hpp"

constexpr auto method = force_method(joist, translation_at(3.0 * m), rotation_at(0.0 * m));

#ifdef WRONG
constexpr auto other = method.flexibility().with<0, 1>(0.002 * mm / kN);
#else
constexpr auto other = method.flexibility().with<0, 1>(0.002 / kN);
#endif
