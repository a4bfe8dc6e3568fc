// expect the compiler's: conversion from 'quantity<unit<
#include "twin.hpp"

#ifdef WRONG
constexpr quantity<length> v = line.slope(3.6 * m);
#else
constexpr quantity<length> v = line.deflection(3.6 * m);
#endif
