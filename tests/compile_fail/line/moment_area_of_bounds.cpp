// expect: this question puts numbers in order
#include "twin.hpp"

#include <boost/numeric/interval.hpp>

using bounds = boost::numeric::interval<double>;

#ifdef WRONG
using number = bounds;
#else
using number = double;
#endif

auto answer() {
    const auto line = simple_beam(number(6.0) * m, number(1.0e7) * N * m2).under(uniform_load(number(1.0) * kN / m));
    return moment_area(line, 0.0 * m, 1.0 * m);
}
