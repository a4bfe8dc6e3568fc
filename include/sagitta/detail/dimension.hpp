// The dimensions of beam theory, and quantities: values of one dimension, kept in coherent SI by Boost.Units.
#pragma once

#include <boost/units/base_units/angle/radian.hpp>
#include <boost/units/base_units/si/kelvin.hpp>
#include <boost/units/base_units/si/kilogram.hpp>
#include <boost/units/base_units/si/meter.hpp>
#include <boost/units/base_units/si/second.hpp>
#include <boost/units/make_system.hpp>
#include <boost/units/physical_dimensions/area.hpp>
#include <boost/units/physical_dimensions/energy.hpp>
#include <boost/units/physical_dimensions/force.hpp>
#include <boost/units/physical_dimensions/pressure.hpp>
#include <boost/units/physical_dimensions/surface_tension.hpp>
#include <boost/units/physical_dimensions/wavenumber.hpp>
#include <boost/units/pow.hpp>
#include <boost/units/quantity.hpp>
#include <boost/units/unit.hpp>

namespace sagitta {

/// The dimensions of beam theory, each as its coherent SI unit. A moment is force times length: the torque of
/// Boost.Units is divided by an angle and is another thing. (In a namespace of their own, so that a program may call
/// its variables length, area or moment.)
namespace dimension {

/// Coherent SI, as far as beams need it. A type with a name of its own, because compilers spell out the system in
/// every unit that they mention, and that of boost::units::si is a list of nine base units. Quantities of either
/// system convert to the other implicitly.
struct si : boost::units::make_system<boost::units::si::meter_base_unit, boost::units::si::kilogram_base_unit,
                                      boost::units::si::second_base_unit, boost::units::si::kelvin_base_unit,
                                      boost::units::angle::radian_base_unit>::type::type {};

/// The coherent unit of a dimension of Boost.Units, such as boost::units::length_dimension.
template <class Dimension>
using si_unit = boost::units::unit<Dimension, boost::units::homogeneous_system<si>>;

using dimensionless = si_unit<boost::units::dimensionless_type>;
using length = si_unit<boost::units::length_dimension>;
using plane_angle = si_unit<boost::units::plane_angle_dimension>;
using force = si_unit<boost::units::force_dimension>;
using moment = si_unit<boost::units::energy_dimension>;
using line_load = si_unit<boost::units::surface_tension_dimension>;
using stress = si_unit<boost::units::pressure_dimension>;
using area = si_unit<boost::units::area_dimension>;
using second_moment_of_area = boost::units::power_typeof_helper<length, boost::units::static_rational<4>>::type;
using curvature = si_unit<boost::units::wavenumber_dimension>;
using temperature = si_unit<boost::units::temperature_dimension>;
using expansion_coefficient = boost::units::divide_typeof_helper<dimensionless, temperature>::type;
using flexural_rigidity = boost::units::multiply_typeof_helper<stress, second_moment_of_area>::type;
using spring_stiffness = boost::units::divide_typeof_helper<force, length>::type;
using rotational_stiffness = boost::units::divide_typeof_helper<moment, plane_angle>::type;

}  // namespace dimension

/// A value of one dimension: quantity<dimension::length>, quantity<dimension::moment, float>.
template <class Dimension, class T = double>
using quantity = boost::units::quantity<Dimension, T>;

}  // namespace sagitta
