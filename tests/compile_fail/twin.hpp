// What every twin starts from. A twin is one source that is compiled twice: as it stands it must compile, and
// with WRONG defined it must not, and the first error must hold the sentence that its first line announces.
#pragma once

#include <sagitta/sagitta.hpp>

#include <boost/numeric/interval.hpp>
#include <boost/units/systems/si/torque.hpp>

#include <string>

using namespace sagitta;
using namespace sagitta::units;

inline constexpr auto EI = 210.0 * GPa * 8356.0 * cm4;
inline constexpr auto joist = simple_beam(7.2 * m, EI);
inline constexpr auto arm = cantilever(2.0 * m, EI);
inline constexpr auto dead = uniform_load(4.5 * kN / m);
inline constexpr auto live = point_load(22.0 * kN, at(3.0 * m));
inline constexpr auto line = joist.under(dead);
inline constexpr auto sag = line.deflection(3.6 * m);
