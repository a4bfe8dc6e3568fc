// expect the compiler's: conversion from 'quantity<
#include "twin.hpp"

#ifdef WRONG
constexpr quantity<dimension::length> v = line.slope(3.6 * m);
#else
constexpr quantity<dimension::length> v = line.deflection(3.6 * m);
#endif
