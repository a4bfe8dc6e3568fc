// Units as text: "kN*m", "kip/ft", "cm4", "N/mm^2". One table, used by the formatter and by the parser; the
// sizes come from the unit constants.
#pragma once

#include <sagitta/detail/scale.hpp>
#include <sagitta/units.hpp>

#include <array>
#include <string_view>

namespace sagitta::detail {

/// The dimension of a unit of beam theory as powers of force, length and angle.
struct dimension_powers {
    int force = 0;
    int length = 0;
    int angle = 0;

    friend constexpr bool operator==(const dimension_powers&, const dimension_powers&) = default;
};

/// A unit as its dimension and size. known is false where the text named no unit.
struct described_unit {
    dimension_powers powers;
    scale size;
    bool known = false;
};

constexpr described_unit times(const described_unit& a, const described_unit& b, int power) {
    described_unit product = a;
    const described_unit factor = b;
    for (int i = 0; i < (power < 0 ? -power : power); ++i) {
        const int sign = power < 0 ? -1 : 1;
        product.powers.force += sign * factor.powers.force;
        product.powers.length += sign * factor.powers.length;
        product.powers.angle += sign * factor.powers.angle;
        product.size = sign < 0 ? product.size / factor.size : product.size * factor.size;
    }
    product.known = a.known && b.known;
    return product;
}

/// The powers of a Boost.Units dimension: mass stands for force (kg = N s2/m).
template <class List>
struct powers_of_list {
    static constexpr dimension_powers value{};
};
template <class Base, boost::units::integer_type N, boost::units::integer_type D, class Next>
struct powers_of_list<boost::units::list<boost::units::dim<Base, boost::units::static_rational<N, D>>, Next>> {
    static constexpr dimension_powers value = [] {
        static_assert(D == 1, "sagitta: only whole powers of a unit can be written as text");
        dimension_powers powers = powers_of_list<Next>::value;
        const int n = static_cast<int>(N);
        if constexpr (std::is_same_v<Base, boost::units::length_base_dimension>) powers.length += n;
        if constexpr (std::is_same_v<Base, boost::units::plane_angle_base_dimension>) powers.angle += n;
        if constexpr (std::is_same_v<Base, boost::units::mass_base_dimension>) {
            powers.force += n;
            powers.length -= n;
        }
        return powers;
    }();
};
template <class Dimension>
inline constexpr dimension_powers powers_of =
    powers_of_list<typename boost::units::get_dimension<Dimension>::type>::value;

struct named_unit {
    std::string_view name;
    described_unit unit;
};

template <class Dimension, scale Size>
constexpr described_unit describe(unit_constant<Dimension, Size>) {
    return {powers_of<Dimension>, Size, true};
}

/// Every unit that has a name of its own in text.
inline constexpr std::array unit_names{
    named_unit{"m", describe(units::m)},       named_unit{"cm", describe(units::cm)},
    named_unit{"mm", describe(units::mm)},     named_unit{"km", describe(units::km)},
    named_unit{"in", describe(units::in)},     named_unit{"ft", describe(units::ft)},
    named_unit{"N", describe(units::N)},       named_unit{"kN", describe(units::kN)},
    named_unit{"MN", describe(units::MN)},     named_unit{"lbf", describe(units::lbf)},
    named_unit{"kip", describe(units::kip)},   named_unit{"Pa", describe(units::Pa)},
    named_unit{"kPa", describe(units::kPa)},   named_unit{"MPa", describe(units::MPa)},
    named_unit{"GPa", describe(units::GPa)},   named_unit{"psi", describe(units::psi)},
    named_unit{"ksi", describe(units::ksi)},   named_unit{"rad", describe(units::rad)},
    named_unit{"mrad", describe(units::mrad)}, named_unit{"deg", describe(units::deg)},
};

constexpr bool is_letter(char c) { return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z'); }
constexpr bool is_digit(char c) { return c >= '0' && c <= '9'; }

/// Takes a sign off the front of a text; false where it does not stand there.
constexpr bool take(std::string_view& text, std::string_view sign) {
    if (!text.starts_with(sign)) return false;
    text.remove_prefix(sign.size());
    return true;
}

/// Takes a power off the front: 4, ^4 or a raised 2, 3, 4. 1 where none stands there, 0 where it is wrong.
constexpr int take_power(std::string_view& text) {
    constexpr std::array raised{std::string_view("\u00b2"), std::string_view("\u00b3"), std::string_view("\u2074")};
    for (std::size_t i = 0; i < raised.size(); ++i) {
        if (take(text, raised[i])) return static_cast<int>(i) + 2;
    }
    const bool announced = take(text, "^");
    if (text.empty() || !is_digit(text.front())) return announced ? 0 : 1;
    const int power = text.front() - '0';
    text.remove_prefix(1);
    return power;
}

/// Reads a product of named units: factors joined by * (or a raised dot) and /, each with an optional power as
/// in cm4, mm^2. A / divides by the one factor behind it; "1/m" is allowed.
constexpr described_unit read_unit(std::string_view text) {
    described_unit product{{}, {}, true};
    int sign = take(text, "1/") ? -1 : 1;
    while (true) {
        std::size_t letters = 0;
        while (letters < text.size() && is_letter(text[letters])) ++letters;
        described_unit factor;
        for (const auto& candidate : unit_names) {
            if (candidate.name == text.substr(0, letters)) factor = candidate.unit;
        }
        text.remove_prefix(letters);
        const int power = take_power(text);
        if (!factor.known || power == 0) return {};
        product = times(product, factor, sign * power);

        if (text.empty()) return product;
        sign = take(text, "/") ? -1 : 1;
        if (sign == 1 && !take(text, "*") && !take(text, "\u00b7")) return {};
    }
}

/// The units that the trade writes for a dimension, the usual one first; empty for a dimension without habit.
constexpr std::string_view usual_units(const dimension_powers& powers) {
    struct habit {
        dimension_powers powers;
        std::string_view units;
    };
    constexpr std::array habits{
        habit{{0, 1, 0}, "m mm cm ft in"},
        habit{{0, 2, 0}, "m2 cm2 mm2 in2"},
        habit{{0, 3, 0}, "cm3 mm3 in3"},
        habit{{0, 4, 0}, "cm4 mm4 in4"},
        habit{{1, 0, 0}, "kN N MN lbf kip"},
        habit{{1, 1, 0}, "kN*m N*m kip*ft lbf*ft kip*in"},
        habit{{1, -1, 0}, "kN/m N/m kip/ft lbf/ft"},
        habit{{1, -2, 0}, "MPa GPa kPa N/mm2 ksi psi"},
        habit{{1, 2, 0}, "kN*m2 N*m2 kip*in2 kip*ft2"},
        habit{{1, 1, -1}, "kN*m/rad N*m/rad kip*ft/rad kip*in/rad"},
        habit{{0, 0, 1}, "mrad rad deg"},
        habit{{-1, 1, 0}, "mm/kN m/N in/kip"},
        habit{{-1, 0, 0}, "1/kN 1/kip"},
        habit{{-1, 0, 1}, "rad/kN mrad/kN"},
        habit{{-1, -1, 1}, "mrad/kN/m rad/N/m"},
        habit{{0, -1, 0}, "1/m 1/ft"},
        habit{{0, -1, 1}, "mrad/m rad/m"},
    };
    for (const auto& h : habits) {
        if (h.powers == powers) return h.units;
    }
    return {};
}

}  // namespace sagitta::detail
