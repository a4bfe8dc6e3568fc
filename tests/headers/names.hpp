// Globals as they stand in a calculation script. No #pragma once and no includes: this is pasted where it is
// wanted, in front of the library or behind it.
const double L = 7.2, EI = 1.7e7, E = 2.1e11, I = 8.356e-5, P = 22.0, F = 5.0, R = 11.0, w = 4.5, q = 3.0, C = 8.0;
const double M = 9.0, V = 10.0, T = 1.5, A = 0.01, W = 5.6e-4, x = 3.6, y = 0.1, z = 0.2, a = 1.2, b = 6.0, c = 0.5;
const double d = 0.3, h = 0.2, s = 0.4, t = 0.02, u = 0.1, v = 0.01, xi = 0.5, alpha = 0.25, phi = 0.1, theta = 0.2;
const double span = 7.2, from = 1.2, to = 4.8, at_ = 3.0, place = 2.0, size = 1.0, value = 1.0, number = 1.0;
const double load = 4.5, dead = 1.35, live = 1.5, joist = 1.0, line = 1.0, worst = 1.0, check = 1.0, left = 0.0;
const double right = 7.2, result = 0.0, factor = 1.0, limit = 250.0, EI_ = 1.0, span_ = 1.0, n = 2.0, i = 1.0;
