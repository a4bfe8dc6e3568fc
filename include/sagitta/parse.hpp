// Text to quantities: the inverse of format.hpp for text that arrives at run time.
//
//     parse<length>("12 ft 6 in")    parse<second_moment_of_area>("8356 cm4")    parse<stress>("29000 ksi")
#pragma once

#include <sagitta/detail/unit_text.hpp>
#include <sagitta/invalid_input.hpp>
#include <sagitta/units.hpp>

#include <fmt/format.h>

#include <array>
#include <charconv>
#include <cmath>
#include <optional>
#include <string>
#include <string_view>

namespace sagitta {

/// What was wrong with a text: what was found, what was expected, and where in the text (bytes from 0).
struct parse_failure {
    std::size_t offset = 0;
    std::string found;
    std::string expected;
};

namespace detail {

constexpr std::string_view without_leading_blanks(std::string_view text) {
    while (!text.empty() && (text.front() == ' ' || text.front() == '\t')) text.remove_prefix(1);
    return text;
}

constexpr std::string_view without_blanks(std::string_view text) {
    text = without_leading_blanks(text);
    while (!text.empty() && (text.back() == ' ' || text.back() == '\t')) text.remove_suffix(1);
    return text;
}

inline std::string quoted(std::string_view text) {
    return text.empty() ? std::string("nothing") : fmt::format("'{}'", text);
}

inline std::string units_that_would_do(const dimension_powers& powers) {
    std::string list(usual_units(powers));
    for (std::size_t at = 0; (at = list.find(' ', at)) != std::string::npos; at += 2) list.replace(at, 1, ", ");
    return list;
}

/// A value that someone might write for a dimension.
inline std::string number_with_unit(const dimension_powers& powers) {
    struct instance {
        dimension_powers powers;
        std::string_view text;
    };
    constexpr std::array instances{
        instance{{0, 1, 0}, "7.2 m"},    instance{{0, 4, 0}, "8356 cm4"},  instance{{1, 0, 0}, "22 kN"},
        instance{{1, 1, 0}, "8 kN*m"},   instance{{1, -1, 0}, "4.5 kN/m"}, instance{{1, -2, 0}, "210 GPa"},
        instance{{0, 0, 1}, "0.5 mrad"},
    };
    for (const auto& each : instances) {
        if (each.powers == powers) return fmt::format("a number with a unit, such as '{}'", each.text);
    }
    const std::string_view usual = usual_units(powers);
    return fmt::format("a number with a unit, such as '1 {}'", usual.substr(0, usual.find(' ')));
}

/// A number and its unit.
struct text_term {
    double value = 0;
    std::string_view unit_name;
    described_unit unit;
};

/// Reads one term from the front of rest; throws nothing, returns what was wrong.
inline std::optional<parse_failure> read_term(std::string_view whole, std::string_view& rest,
                                              const dimension_powers& powers, text_term& term) {
    const auto offset = [&] { return static_cast<std::size_t>(rest.data() - whole.data()); };
    std::string_view number = rest;
    if (number.size() > 1 && number.front() == '+' && number[1] != '-') number.remove_prefix(1);
    const auto [stop, error] = std::from_chars(number.data(), number.data() + number.size(), term.value);
    const auto digits = static_cast<std::size_t>(stop - number.data());
    if (error == std::errc::result_out_of_range) {
        return parse_failure{offset(), quoted(without_blanks(rest)), "a number within the range of double"};
    }
    const bool is_word = error == std::errc{} && is_letter(number[digits - 1]);  // inf, nan
    if (error != std::errc{} || is_word) {
        return parse_failure{offset(), quoted(without_blanks(rest)), number_with_unit(powers)};
    }
    rest = without_leading_blanks(number.substr(digits));
    term.unit_name = rest.substr(0, rest.find_first_of(" \t"));
    term.unit = read_unit(term.unit_name);
    if (!term.unit.known || !(term.unit.powers == powers)) {
        return parse_failure{offset(),
                             term.unit_name.empty() ? "no unit" : fmt::format("the unit {}", quoted(term.unit_name)),
                             fmt::format("one of the units {}", units_that_would_do(powers))};
    }
    rest = without_leading_blanks(rest.substr(term.unit_name.size()));
    return std::nullopt;
}

}  // namespace detail

/// Reads a quantity of the given dimension from a text: a number and a unit, or feet and inches ("12 ft 6 in";
/// a sign counts for both). Where the text is wrong, returns nothing and says why in failure.
template <class Dimension>
[[nodiscard]] std::optional<quantity<Dimension>> try_parse(std::string_view text, parse_failure& failure) {
    constexpr bool right = requires { typename boost::units::get_dimension<Dimension>::type; }
    &&!detail::is_quantity<Dimension> && !std::is_arithmetic_v<Dimension>;
    static_assert(right, "sagitta: a dimension is expected here: parse<dimension::force>(\"22 kN\")");
    constexpr auto powers = detail::powers_of<Dimension>;
    std::string_view rest = detail::without_leading_blanks(text);
    detail::text_term first;
    if (auto wrong = detail::read_term(text, rest, powers, first)) {
        failure = *std::move(wrong);
        return std::nullopt;
    }
    double coherent = detail::to_coherent(first.value, first.unit.size);
    if (!rest.empty()) {
        const auto offset = static_cast<std::size_t>(rest.data() - text.data());
        const std::string_view added = detail::without_blanks(rest);
        detail::text_term inches;
        if (first.unit_name != "ft" || detail::read_term(text, rest, powers, inches) || inches.unit_name != "in" ||
            !(inches.value >= 0 && inches.value < 12) || !rest.empty()) {
            failure = {offset, detail::quoted(added), "nothing more, or inches from 0 to 12 behind feet"};
            return std::nullopt;
        }
        const double further = detail::to_coherent(inches.value, inches.unit.size);
        coherent += std::signbit(first.value) ? -further : further;
    }
    if (!std::isfinite(coherent)) {
        failure = {0, detail::quoted(detail::without_blanks(text)), "a number within the range of double"};
        return std::nullopt;
    }
    return quantity<Dimension>::from_value(coherent);
}

/// The same; throws invalid_input that says what was found and which units would do.
template <class Dimension>
[[nodiscard]] quantity<Dimension> parse(std::string_view text) {
    parse_failure failure;
    if (const auto value = try_parse<Dimension>(text, failure)) return *value;
    throw invalid_input(
        fmt::format("{}: found {}, expected {}", detail::quoted(text), failure.found, failure.expected));
}

}  // namespace sagitta
