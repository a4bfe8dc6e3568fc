// Quantities as text, by fmt.
//
//     fmt::print("{:.1f mm} at {:.2f m}", worst.value, worst.at);
//
// A format has two parts with a space between them: how to write the number (as for any number in fmt) and the
// unit. The unit is checked against the quantity when the format string is compiled. Without a number part six
// significant digits are written; without a unit the trade's usual one is taken: kN, kN*m, kN/m, MPa, cm4,
// mrad; for a length mm below one metre, else m.
#pragma once

#include <sagitta/detail/unit_text.hpp>
#include <sagitta/units.hpp>

#include <fmt/format.h>

#include <algorithm>
#include <string_view>

namespace sagitta::detail {

// These are not constexpr: where a format string is compiled, reaching one is the error, and its name is
// what the compiler shows. A format string that is only known at run time throws fmt::format_error instead.
[[noreturn]] inline void unknown_unit_in_format_string() {
    throw fmt::format_error("unknown unit in a format string: write it as in {:.1f mm} or {:.3g kN*m}");
}
[[noreturn]] inline void number_format_not_understood_or_no_space_before_the_unit() {
    throw fmt::format_error("the format of a quantity: number part not understood, or no space before the unit");
}
[[noreturn]] inline void no_arguments_inside_the_format_of_a_quantity() {
    throw fmt::format_error("the format of a quantity takes no width or precision from an argument");
}
[[noreturn]] inline void unit_of_another_dimension_in_format_string() {
    throw fmt::format_error("the unit in a format string has another dimension than the quantity");
}

/// The spec of a quantity: [number part][ unit]. A class without the quantity in its name, for short messages.
template <class T>
class quantity_spec {
public:
    constexpr explicit quantity_spec(const dimension_powers& powers) : powers_(powers) {}

    constexpr auto parse(fmt::format_parse_context& context) {
        const auto* const begin = context.begin();
        const auto* stop = begin;
        while (stop != context.end() && *stop != '}') {
            if (*stop == '{') no_arguments_inside_the_format_of_a_quantity();
            ++stop;
        }
        const std::string_view spec(begin, static_cast<std::size_t>(stop - begin));
        const auto space = spec.rfind(' ');
        if (space != std::string_view::npos) {
            name_ = spec.substr(space + 1);
            unit_ = read_unit(name_);
            if (!unit_.known) unknown_unit_in_format_string();
            if (!(unit_.powers == powers_)) unit_of_another_dimension_in_format_string();
        }
        auto number_part = spec.substr(0, space);
        if (number_part.empty()) number_part = "g";  // six significant digits
        fmt::format_parse_context number_context(fmt::string_view(number_part.data(), number_part.size()));
        if (number_.parse(number_context) != number_context.end()) {
            number_format_not_understood_or_no_space_before_the_unit();
        }
        return stop;
    }

protected:
    dimension_powers powers_;
    fmt::formatter<T> number_;
    std::string_view name_;
    described_unit unit_;
};

/// The unit chosen where the format names none.
constexpr std::string_view default_unit(const dimension_powers& powers, bool below_one) {
    if (powers == dimension_powers{0, 1, 0}) return below_one ? "mm" : "m";
    const std::string_view usual = usual_units(powers);
    return usual.substr(0, usual.find(' '));
}

}  // namespace sagitta::detail

/// Formats a quantity. Spec: [number part][ unit], the number part as in fmt; both may be left out.
template <class D, class System, class T>
struct fmt::formatter<boost::units::quantity<boost::units::unit<D, System>, T>> : sagitta::detail::quantity_spec<T> {
    using unit_type = boost::units::unit<D, System>;
    static constexpr sagitta::detail::dimension_powers powers = sagitta::detail::powers_of<unit_type>;

    constexpr formatter() : sagitta::detail::quantity_spec<T>(powers) {}

    template <class Context>
    auto format(const boost::units::quantity<unit_type, T>& q, Context& context) const {
        using sagitta::detail::to_coherent;
        const T coherent = q.value() + T(0);  // writes -0 as 0
        auto unit = this->unit_;
        auto name = this->name_;
        if (!unit.known) {
            name = sagitta::detail::default_unit(powers, coherent < T(1) && coherent > T(-1));
            unit = sagitta::detail::read_unit(name);
        }
        auto out = this->number_.format(unit.known ? to_coherent(coherent, unit.size.inverse()) : coherent, context);
        if (unit.known) {
            *out++ = ' ';
            return std::copy(name.begin(), name.end(), out);
        }
        return write_powers(out);
    }

private:
    /// A dimension without a habit is spelled in coherent units of force, length and angle.
    template <class Out>
    static Out write_powers(Out out) {
        const auto write = [&](std::string_view symbol, int power) {
            if (power == 0) return;
            *out++ = ' ';
            out = std::copy(symbol.begin(), symbol.end(), out);
            if (power != 1) out = fmt::format_to(out, "^{}", power);
        };
        write("N", powers.force);
        write("m", powers.length);
        write("rad", powers.angle);
        return out;
    }
};
