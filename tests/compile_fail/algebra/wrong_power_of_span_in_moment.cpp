// expect the compiler's: conversion from 'quantity<
#include "twin.hpp"

#ifdef WRONG
constexpr quantity<dimension::moment> M = 4.5 * kN / m * 7.2 * m / 8.0;
#else
constexpr quantity<dimension::moment> M = 4.5 * kN / m * 7.2 * m * 7.2 * m / 8.0;
#endif
