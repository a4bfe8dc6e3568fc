#include "cell_values.hpp"

#include <sagitta/format.hpp>

#include <charconv>
#include <utility>

namespace beam_schedule {

std::optional<double> to_number(std::string_view text) {
    if (text.size() > 1 && text.front() == '+' && text[1] != '-') text.remove_prefix(1);
    double value = 0;
    const char* const stop = text.data() + text.size();
    const auto [end, error] = std::from_chars(text.data(), stop, value);
    if (error != std::errc{} || end != stop || !std::isfinite(value)) return std::nullopt;
    return value;
}

std::string what_was_found(std::string_view cell, const sagitta::parse_failure& failure) {
    constexpr std::size_t longest = 80;
    const bool says_the_cell_again = failure.offset == 0 && failure.found.starts_with('\'');
    if (cell.empty() || says_the_cell_again) return quoted(cell);
    return fmt::format("{}: {}", quoted(cell), failure.found.substr(0, longest));
}

std::optional<end_holding> read_holding(const input_row& row, std::size_t column, findings& found) {
    constexpr std::string_view elastic = "elastic";
    const std::string_view cell = row.cell(column);
    for (const auto candidate : {holding::fixed, holding::pinned, holding::free}) {
        if (cell == name_of(candidate)) return end_holding{candidate};
    }
    const std::string_view behind = cell.starts_with(elastic) ? cell.substr(elastic.size()) : std::string_view("?");
    const std::string_view text = trimmed(behind);
    if (!behind.empty() && text.size() == behind.size()) {
        found.refuse(row.at(column), quoted(cell), "fixed, pinned, free, or elastic and its stiffness");
        return std::nullopt;
    }
    sagitta::parse_failure failure;
    const auto stiffness = sagitta::try_parse<sagitta::dimension::rotational_stiffness>(text, failure);
    if (stiffness && stiffness->value() > 0 && std::isfinite(stiffness->value())) {
        return end_holding{holding::elastic, *stiffness};
    }
    const bool is_number = !stiffness && failure.offset != 0;  // what follows it is wrong
    found.refuse(row.at(column), is_number ? fmt::format("{}: {}", quoted(cell), failure.found) : quoted(cell),
                 is_number ? std::move(failure.expected)
                           : "a rotational stiffness of more than 0 behind elastic, such as elastic 500 kN*m/rad");
    return std::nullopt;
}

std::optional<deflection_limit> read_limit(const input_row& row, std::size_t column,
                                           const std::optional<span_length>& span, findings& found) {
    const std::string_view cell = row.cell(column);
    std::string_view ratio = cell;
    if (ratio.starts_with('L')) {
        ratio = trimmed(ratio.substr(1));
        const auto divisor = ratio.starts_with('/') ? to_number(trimmed(ratio.substr(1))) : std::nullopt;
        if (divisor && *divisor > 0) {
            if (!span) return std::nullopt;
            const deflection_limit limit{.divisor = *divisor};
            if (limit.over(*span).value() > 0 && std::isfinite(limit.over(*span).value())) return limit;
        }
        found.refuse(row.at(column), quoted(cell), "L/ and a number greater than 0, such as L/250");
        return std::nullopt;
    }
    sagitta::parse_failure failure;
    const auto limit = sagitta::try_parse<sagitta::dimension::length>(cell, failure);
    if (limit && limit->value() > 0 && std::isfinite(limit->value())) return deflection_limit{.length = *limit};
    found.refuse(row.at(column), limit ? quoted(cell) : what_was_found(cell, failure),
                 "L/250 or the like, or a length greater than 0, such as 20 mm");
    return std::nullopt;
}

void expect_empty(const input_row& row, std::size_t column, std::string_view user, findings& found) {
    if (row.cell(column).empty()) return;
    found.refuse(row.at(column), quoted(row.cell(column)), fmt::format("nothing, since {} does not use it", user));
}

std::optional<double> read_factor(const input_row& row, std::size_t column, findings& found) {
    const auto factor = to_number(row.cell(column));
    if (!factor) found.refuse(row.at(column), quoted(row.cell(column)), "a number without a unit, such as 1.35");
    return factor;
}

std::optional<span_length> read_place_on_beam(const input_row& row, std::size_t column,
                                              const std::optional<span_length>& span, findings& found) {
    const auto place = read_quantity<sagitta::dimension::length>(row, column, found);
    if (!place) return std::nullopt;
    constexpr double rounding = 1e-12;
    const bool behind_start = place->value() >= 0;
    if (behind_start && (!span || *place <= *span)) return place;
    if (behind_start && place->value() <= span->value() * (1 + rounding)) return span;
    found.refuse(row.at(column), quoted(row.cell(column)),
                 span ? fmt::format("a place on the beam, from 0 m to {:.6g m}", *span)
                      : std::string("a distance from the left end, not less than 0 m"));
    return std::nullopt;
}

}  // namespace beam_schedule
