// Continuous beams that can move, and wrong values in their description: refused in words.
#include <support/refusal.hpp>

#include <sagitta/continuous_beam.hpp>

#include <doctest/doctest.h>

#include <cmath>
#include <initializer_list>
#include <limits>
#include <string>

using namespace sagitta;
using namespace sagitta::units;

namespace {

constexpr double not_a_number = std::numeric_limits<double>::quiet_NaN();
constexpr double infinity = std::numeric_limits<double>::infinity();

bool holds(const std::string& text, std::initializer_list<const char*> parts) {
    std::size_t at = 0;
    for (const char* part : parts) {
        at = text.find(part, at);
        if (at == std::string::npos) return false;
    }
    return true;
}

#define CHECK_REFUSED(expression, ...)                                 \
    do {                                                               \
        const std::string said = refusal([&] { (void)(expression); }); \
        CAPTURE(said);                                                 \
        CHECK(holds(said, {__VA_ARGS__}));                             \
    } while (false)

const auto EI = 1.0e4 * kN * m2;
const auto load = uniform_load(1.0 * kN / m);
continuous_beam<> bare() { return continuous_beam(10.0 * m, EI); }
continuous_beam<> sound() { return bare().support_at(0.0 * m).support_at(10.0 * m); }

}  // namespace

TEST_CASE("mechanisms: held nowhere, or at one place only") {
    CHECK_REFUSED(bare().under(load), "place = ", " m", "freely", "mechanism");
    CHECK_REFUSED(bare().support_at(4.0 * m).under(load), "place = ", " m", "freely", "mechanism");
    CHECK_REFUSED(bare().support_at(0.0 * m).under(load), "place = ", " m", "freely", "mechanism");
    CHECK_REFUSED(bare().spring_at(10.0 * m, 5.0 * kN / m).under(load), "place = ", "freely", "mechanism");
    CHECK_REFUSED(bare().support_at(0.0 * m).spring_at(10.0 * m, 0.0 * kN / m).under(load), "place = ", "freely",
                  "mechanism");
    // Also where nothing acts.
    CHECK_REFUSED(bare().support_at(4.0 * m).under(load_list{}), "place = ", "freely", "mechanism");
}

TEST_CASE("mechanisms: guided ends alone hold no force") {
    CHECK_REFUSED(bare().guide(end::left).under(load), "place = ", "move freely", "mechanism");
    CHECK_REFUSED(bare().guide(end::left).guide(end::right).under(load), "place = ", "move freely", "mechanism");
    CHECK_NOTHROW((void)bare().guide(end::left).support_at(4.0 * m).under(load));
    CHECK_NOTHROW((void)bare().guide(end::left).spring_at(4.0 * m, 1.0 * N / m).under(load));
}

TEST_CASE("mechanisms: too many hinges, the place is named") {
    // Beams of two nodes besides the ends, so that only the hinge's place can be meant.
    CHECK_REFUSED(sound().hinge_at(6.0 * m).under(load), "place = ", " m", "freely", "mechanism");
    const auto two_in_a_span = bare().clamp(end::left).clamp(end::right);
    CHECK_NOTHROW((void)continuous_beam(two_in_a_span).hinge_at(3.0 * m).hinge_at(7.0 * m).under(load));
    CHECK_REFUSED(continuous_beam(two_in_a_span).hinge_at(2.0 * m).hinge_at(5.0 * m).hinge_at(8.0 * m).under(load),
                  "place = ", "freely", "mechanism");
    // Four spans, the third with two hinges too many: what is named lies in the loose stretch.
    continuous_beam<> b(40.0 * m, EI);
    for (const double x : {0.0, 10.0, 20.0, 30.0, 40.0}) b.support_at(x * m);
    b.hinge_at(20.5 * m).hinge_at(24.0 * m).hinge_at(29.0 * m);
    const std::string said = refusal([&] { (void)b.under(load); });
    CAPTURE(said);
    REQUIRE(holds(said, {"place = ", " m can ", "freely", "mechanism"}));
    const double place = std::stod(said.substr(said.find("place = ") + 8));
    CHECK(place >= 20.5);
    CHECK(place <= 29);
}

TEST_CASE("an overhang beyond a hinge turns freely about it") {
    CHECK_REFUSED(sound().support_at(5.0 * m).hinge_at(7.0 * m).spring_at(10.0 * m, 0.0 * N / m).under(load),
                  "place = ", "freely", "mechanism");
}

TEST_CASE("a mechanism is one however close its nodes stand") {
    // A hinge in a simple beam, a step of EI 26 nm from it on an 18 mm beam: found by random search.
    CHECK_REFUSED(continuous_beam(0.018127516174399002 * m, 35969919.757767469 * N * m2)
                      .support_at(0.0 * m)
                      .support_at(0.018127516174399002 * m)
                      .hinge_at(0.010305478786735557 * m)
                      .rigidity_from(0.010305452900136616 * m, 66274623.407666467 * N * m2)
                      .rigidity_from(0.0082879466949373568 * m, 29819208.274326842 * N * m2)
                      .shear_rigidity(342308631109.20599 * N)
                      .under(load_list{}),
                  "freely", "mechanism");
    // Two hinges between the last supports, a step of EI close to one of them.
    CHECK_REFUSED(continuous_beam(0.070831572929939052 * m, 37.969387997758197 * N * m2)
                      .support_at(0.02823918212004066 * m)
                      .support_at(0.049513982892411115 * m)
                      .support_at(0.070831572929939052 * m)
                      .hinge_at(0.066251145715375853 * m)
                      .hinge_at(0.069554704225481143 * m)
                      .rigidity_from(0.069554686396907137 * m, 38.306440139656253 * N * m2)
                      .under(load_list{}),
                  "freely", "mechanism");
}

TEST_CASE("barely held is held") {
    // From a billionth of the beam's own stiffness on.
    const auto line = bare()
                          .support_at(0.0 * m)
                          .spring_at(10.0 * m, 1e-8 * EI / (10.0 * m) / (10.0 * m) / (10.0 * m) * 1.0)
                          .under(point_load(1.0 * kN, at(5.0 * m)));
    CHECK(std::abs(line.reaction(end::right) / kN - 0.5) < 1e-6);
}

TEST_CASE("what is held by less than rounding of the beam's own stiffness is told apart from a mechanism") {
    const auto on_softest = [](double at) { return bare().support_at(0.0 * m).spring_at(at * m, 1e-16 * kN / m); };
    // At the last node, and at one before it.
    CHECK_REFUSED(on_softest(10).under(load), "place = 10 m", "cannot be told from a mechanism");
    CHECK_REFUSED(on_softest(4).under(load), "place = ", "cannot be told from a mechanism");
}

TEST_CASE("the beam itself") {
    CHECK_REFUSED(continuous_beam(0.0 * m, EI), "span = 0 m", "greater than 0 m");
    CHECK_REFUSED(continuous_beam(-2.0 * m, EI), "span = -2 m", "greater than 0 m");
    CHECK_REFUSED(continuous_beam(not_a_number * m, EI), "span = nan m");
    CHECK_REFUSED(continuous_beam(infinity * m, EI), "span = inf m", "finite");
    CHECK_REFUSED(continuous_beam(1.0 * m, 0.0 * EI), "EI = 0 N*m^2", "greater than 0 N*m^2");
    CHECK_REFUSED(continuous_beam(1.0 * m, not_a_number * EI), "EI = nan N*m^2");
    CHECK_REFUSED(bare().rigidity_from(1.0 * m, -2.0 * N * m2), "EI = -2 N*m^2", "greater than 0 N*m^2");
    CHECK_REFUSED(bare().rigidity_from(1.0 * m, infinity * EI), "EI = inf N*m^2", "finite");
}

TEST_CASE("places on the beam") {
    for (const double wrong : {-0.5, 10.5, not_a_number, infinity}) {
        CAPTURE(wrong);
        CHECK_REFUSED(bare().support_at(wrong * m), "x = ", " m", "on the beam", "0 m", "10 m");
        CHECK_REFUSED(bare().spring_at(wrong * m, 1.0 * N / m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(bare().settle_at(wrong * m, 1.0 * mm), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(bare().hinge_at(wrong * m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(bare().rigidity_from(wrong * m, EI), "x = ", " m", "on the beam", "10 m");
        const auto line = sound().under(load);
        CHECK_REFUSED(line.deflection(wrong * m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(line.slope(wrong * m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(line.moment(wrong * m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(line.shear(wrong * m, just_left), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(line.load(wrong * m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(line.rigidity(wrong * m), "x = ", " m", "on the beam", "10 m");
        CHECK_REFUSED(line.reaction_at(wrong * m), "x = ", " m", "on the beam", "10 m");
    }
}

TEST_CASE("hinges lie between the ends") {
    CHECK_REFUSED(bare().hinge_at(0.0 * m), "hinge_at: x = 0 m", "between the ends", "10 m");
    CHECK_REFUSED(bare().hinge_at(10.0 * m), "hinge_at: x = 10 m", "between the ends", "10 m");
    CHECK_REFUSED(bare().hinge_at(0.0 * m, 1.0 * kN * m), "hinge_at: x = 0 m", "between the ends", "10 m");
    CHECK_REFUSED(bare().hinge_at(5.0 * m, not_a_number * N * m), "hinge_at: passing = nan N*m", "finite");
    CHECK_REFUSED(bare().hinge_at(5.0 * m, infinity * N * m), "hinge_at: passing = inf N*m", "finite");
}

TEST_CASE("settlements of supports") {
    CHECK_REFUSED(sound().settle_at(5.0 * m, 1.0 * mm), "settle_at: x = 5 m", "where the beam is supported");
    CHECK_REFUSED(bare().guide(end::left).settle_at(0.0 * m, 1.0 * mm), "settle_at: x = 0 m",
                  "where the beam is supported");
    CHECK_REFUSED(sound().hinge_at(5.0 * m).settle_at(5.0 * m, 1.0 * mm), "settle_at: x = 5 m", "supported");
    CHECK_REFUSED(sound().settle_at(10.0 * m, not_a_number * mm), "settle_at: by = nan m", "finite");
    CHECK_REFUSED(sound().settle_at(10.0 * m, infinity * mm), "settle_at: by = inf m", "finite");
    CHECK_REFUSED(sound().under(load).reaction_at(5.0 * m), "reaction_at: x = 5 m", "supported");
}

TEST_CASE("stiffnesses") {
    CHECK_REFUSED(bare().spring_at(1.0 * m, -2.0 * N / m), "stiffness = -2", "not be less than 0");
    CHECK_REFUSED(bare().spring_at(1.0 * m, not_a_number * N / m), "stiffness = nan", "not be less than 0");
    CHECK_REFUSED(bare().turning_spring(end::left, -3.0 * N * m / rad), "stiffness = -3", "not be less than 0");
    CHECK_REFUSED(bare().turning_spring(end::right, not_a_number * N * m / rad), "stiffness = nan",
                  "not be less than 0");
    // With its unit, as every value.
    CHECK_REFUSED(bare().spring_at(1.0 * m, -2.0 * N / m), "stiffness = -2 N/m");
    CHECK_REFUSED(bare().turning_spring(end::left, -3.0 * N * m / rad), "stiffness = -3 N*m/rad");
    CHECK_REFUSED(bare().shear_rigidity(0.0 * N), "shear_rigidity: kGA = 0 N", "greater than 0 N");
    CHECK_REFUSED(bare().shear_rigidity(-1.0 * kN), "shear_rigidity: kGA = -1000 N", "greater than 0 N");
    CHECK_REFUSED(bare().shear_rigidity(not_a_number * N), "shear_rigidity: kGA = nan N", "greater than 0 N");
}

TEST_CASE("loads that the beam cannot take") {
    const auto b = sound();
    CHECK_REFUSED(b.under(point_load(1.0 * kN, at(10.5 * m))), "at = 10.5 m", "beyond the span", "10 m");
    CHECK_REFUSED(b.under(applied_couple(1.0 * kN * m, at(11.0 * m))), "at = 11 m", "beyond the span", "10 m");
    CHECK_REFUSED(b.under(partial_uniform_load(1.0 * kN / m, between(1.0 * m, 10.5 * m))), "between: to = 10.5 m",
                  "beyond the span", "10 m");
    CHECK_REFUSED(b.under(imposed_curvature(1.0 / m, between(11.0 * m, 12.0 * m))), "between: to = 12 m",
                  "beyond the span", "10 m");
    CHECK_REFUSED(b.under(support_rotation(end::left, 1.0 * mrad)), "support_rotation = 0.001 rad", "clamped end");
    CHECK_REFUSED(bare().clamp(end::left).under(settlement(end::right, 1.0 * mm)), "settlement = 0.001 m", "free");
    CHECK_REFUSED(bare().clamp(end::left).guide(end::right).under(settlement(end::right, 1.0 * mm)),
                  "settlement = 0.001 m", "held against deflection");
    CHECK_NOTHROW((void)bare().clamp(end::left).under(support_rotation(end::left, 1.0 * mrad)));
}

TEST_CASE("what is said twice") {
    // The later description of a support and of a step counts; a place is one node, however often it is named.
    const auto loads = point_load(1.0 * kN, at(3.0 * m));
    const auto twice = sound()
                           .spring_at(5.0 * m, 7.0 * N / m)
                           .support_at(5.0 * m)
                           .rigidity_from(2.0 * m, 3.0 * EI)
                           .rigidity_from(2.0 * m, 2.0 * EI);
    const auto once = sound().support_at(5.0 * m).rigidity_from(2.0 * m, 2.0 * EI);
    CHECK(twice.nodes().size() == once.nodes().size());
    CHECK(twice.under(loads).deflection(4.0 * m) == once.under(loads).deflection(4.0 * m));
    // In any order, and from the left end on.
    const auto other = bare()
                           .rigidity_from(2.0 * m, 2.0 * EI)
                           .support_at(5.0 * m)
                           .support_at(10.0 * m)
                           .support_at(0.0 * m)
                           .rigidity_from(0.0 * m, EI);
    CHECK(other.under(loads).deflection(4.0 * m) == once.under(loads).deflection(4.0 * m));
    CHECK(other.rigidity_after(1.0 * m) == EI);
    CHECK(other.rigidity_after(2.0 * m) == 2.0 * EI);
}
