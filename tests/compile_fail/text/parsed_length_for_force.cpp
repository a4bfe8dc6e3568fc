// expect the compiler's: conversion from 'quantity<
#include "twin.hpp"

#ifdef WRONG
const quantity<dimension::force> P = parse<dimension::length>("22 kN");
#else
const quantity<dimension::force> P = parse<dimension::force>("22 kN");
#endif
