// The line developed from an end: values at the end, and the chain of derivatives.
#include <sagitta/detail/end_state.hpp>

#include <doctest/doctest.h>

#include <type_traits>

using namespace sagitta;
using namespace sagitta::units;
using namespace sagitta::detail;

namespace {

constexpr auto EI = 8.0 * N * m2;

/// The four responses at s; binary fractions, so that the polynomials below are exact.
template <class End>
void check(const end_state<End, double>& state, double v0, double r0, double M0, double V0) {
    for (const double s : {0.0, 0.5, 2.0, 3.0}) {
        CAPTURE(s);
        const auto at_s = s * m;
        // EI v'' = -M with M = M0 + V0 s.
        CHECK(state.template at<response::shear>(at_s, EI).value() == V0);
        CHECK(state.template at<response::moment>(at_s, EI).value() == M0 + V0 * s);
        CHECK(state.template at<response::slope>(at_s, EI).value() == r0 - (M0 * s + V0 * s * s / 2) / 8);
        CHECK(state.template at<response::deflection>(at_s, EI).value() ==
              v0 + r0 * s - (M0 * s * s / 2 + V0 * s * s * s / 6) / 8);
    }
}

}  // namespace

TEST_CASE("a clamped end has a moment and a shear") {
    check(end_state<held::fixed, double>{3.0 * 16 * N, -5.0 * 16 * N * m}, 0, 0, -80, 48);
}
TEST_CASE("a pinned end has a slope and a shear") {
    check(end_state<held::pinned, double>{48.0 * N, 0.25 * rad}, 0, 0.25, 0, 48);
}
TEST_CASE("a guided end has a deflection and a moment") {
    check(end_state<held::guided, double>{2.0 * m, -80.0 * N * m}, 2, 0, -80, 0);
}
TEST_CASE("a free end has a deflection and a slope") {
    check(end_state<held::free, double>{2.0 * m, 0.25 * rad}, 2, 0.25, 0, 0);
}

TEST_CASE("states add") {
    end_state<held::fixed, double> state{1.0 * N, 2.0 * N * m};
    state += {4.0 * N, -8.0 * N * m};
    CHECK(state.across == 5.0 * N);
    CHECK(state.turning == -6.0 * N * m);
}

TEST_CASE("scales of a force have the dimensions of the responses") {
    constexpr auto L = 2.0 * m;
    static_assert(scale_of_force<response::deflection>(3.0 * N, L, EI) == 3.0 * m);
    static_assert(scale_of_force<response::slope>(3.0 * N, L, EI) == 1.5 * rad);
    static_assert(scale_of_force<response::moment>(3.0 * N, L, EI) == 6.0 * N * m);
    static_assert(scale_of_force<response::shear>(3.0 * N, L, EI) == 3.0 * N);
    static_assert(std::is_same_v<response_quantity<response::slope, float>, quantity<dimension::plane_angle, float>>);
}
