// expect the compiler's: conversion from 'double' to
#include "twin.hpp"

#ifdef WRONG
constexpr quantity<dimension::length> L = 7.2;
#else
constexpr quantity<dimension::length> L = 7.2 * m;
#endif
