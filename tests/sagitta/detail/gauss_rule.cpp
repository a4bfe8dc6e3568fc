#include <sagitta/detail/gauss_rule.hpp>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <doctest/doctest.h>

namespace mp = boost::multiprecision;
using wide = mp::number<mp::cpp_bin_float<50>, mp::et_off>;

namespace {

/// Monomials up to degree 2 n - 1 are integrated exactly: the definition of the rule of n points.
template <class T, std::size_t points>
T greatest_miss() {
    using rule = sagitta::detail::gauss_rule<T, points>;
    T greatest(0);
    for (std::size_t degree = 0; degree < 2 * points; ++degree) {
        T sum(0);
        for (std::size_t i = 0; i < rule::abscissa().size(); ++i) {
            T power(1);
            for (std::size_t k = 0; k < degree; ++k) power *= rule::abscissa()[i];
            const bool mirrored = rule::abscissa()[i] != T(0);
            const T both = degree % 2 == 0 ? T(mirrored ? 2 : 1) * power : (mirrored ? T(0) : power);
            sum += rule::weights()[i] * both;
        }
        const T exact = degree % 2 == 0 ? T(2) / T(static_cast<int>(degree) + 1) : T(0);
        const T miss = sum < exact ? exact - sum : sum - exact;
        if (miss != miss) return miss;  // no number, which no bound admits
        if (miss > greatest) greatest = miss;
    }
    return greatest;
}

}  // namespace

TEST_CASE("the rules of two, three and twenty points integrate what they should") {
    CHECK(greatest_miss<double, 2>() < 1e-15);
    CHECK(greatest_miss<double, 3>() < 1e-15);
    CHECK(greatest_miss<double, 20>() < 4e-15);
    CHECK(greatest_miss<wide, 2>() < wide("1e-48"));
    CHECK(greatest_miss<wide, 3>() < wide("1e-48"));
    CHECK(greatest_miss<wide, 20>() < wide("1e-48"));
}
