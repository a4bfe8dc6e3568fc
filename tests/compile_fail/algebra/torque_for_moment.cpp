// expect the compiler's: conversion from 'quantity<
#include "twin.hpp"

#ifdef WRONG
constexpr quantity<dimension::moment> M = 8.0e3 * boost::units::si::newton_meter;
#else
constexpr quantity<dimension::moment> M = 8.0 * kN * m;
#endif
