// expect the compiler's: conversion from 'quantity<
#include "twin.hpp"

#ifdef WRONG
constexpr quantity<dimension::length> v = 22.0 * kN * 7.2 * m * 7.2 * m / (48.0 * EI);
#else
constexpr quantity<dimension::length> v = 22.0 * kN * 7.2 * m * 7.2 * m * 7.2 * m / (48.0 * EI);
#endif
