// Differences relative to the expected value alone (doctest::Approx adds an absolute tolerance, which would let
// small deflections pass with any value).
#pragma once

#include <cmath>

/// |computed/expected - 1|; the difference itself where 0 is expected.
inline double relative(double computed, double expected) {
    return std::abs(expected == 0 ? computed : (computed - expected) / expected);
}
