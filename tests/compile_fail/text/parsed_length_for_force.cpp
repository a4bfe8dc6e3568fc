// expect the compiler's: conversion from 'quantity<
#include "twin.hpp"

#ifdef WRONG
const quantity<force> P = parse<length>("22 kN");
#else
const quantity<force> P = parse<force>("22 kN");
#endif
