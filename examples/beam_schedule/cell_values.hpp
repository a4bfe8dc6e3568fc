// Cells to values. Each function returns nothing, and adds a refusal, where the cell is not what it should be.
#pragma once

#include "findings.hpp"
#include "input_table.hpp"
#include "model.hpp"

#include <sagitta/parse.hpp>

#include <fmt/format.h>

#include <cmath>
#include <optional>
#include <string_view>

namespace beam_schedule {

/// A number without a unit.
[[nodiscard]] std::optional<double> to_number(std::string_view text);

/// What was found in a cell, and what of it was wrong.
[[nodiscard]] std::string what_was_found(std::string_view cell, const sagitta::parse_failure& failure);

template <class Dimension>
[[nodiscard]] std::optional<sagitta::quantity<Dimension>> read_quantity(const input_row& row, std::size_t column,
                                                                        findings& found) {
    const std::string_view cell = row.cell(column);
    sagitta::parse_failure failure;
    const auto value = sagitta::try_parse<Dimension>(cell, failure);
    if (!value) {
        found.refuse(row.at(column), what_was_found(cell, failure), std::move(failure.expected));
        return std::nullopt;
    }
    if (!std::isfinite(value->value())) {
        found.refuse(row.at(column), quoted(cell), "a number within the range of double");
        return std::nullopt;
    }
    return value;
}

template <class Dimension>
[[nodiscard]] std::optional<sagitta::quantity<Dimension>> read_positive(const input_row& row, std::size_t column,
                                                                        findings& found) {
    auto value = read_quantity<Dimension>(row, column, found);
    if (value && !(value->value() > 0)) {
        found.refuse(row.at(column), quoted(row.cell(column)), "more than 0");
        return std::nullopt;
    }
    return value;
}

/// How an end is held; its stiffness where it is elastic.
struct end_holding {
    holding how;
    sagitta::quantity<sagitta::dimension::rotational_stiffness> stiffness{};
};

/// fixed, pinned, free, or elastic with its stiffness behind it.
[[nodiscard]] std::optional<end_holding> read_holding(const input_row& row, std::size_t column, findings& found);

/// L/250 or a length. Without a span (it was refused) only the shape of L/250 is checked.
[[nodiscard]] std::optional<deflection_limit> read_limit(const input_row& row, std::size_t column,
                                                         const std::optional<span_length>& span, findings& found);

/// Refuses a cell that is not empty; user is what does not use it, such as "a load of the kind point".
void expect_empty(const input_row& row, std::size_t column, std::string_view user, findings& found);

/// A finite number.
[[nodiscard]] std::optional<double> read_factor(const input_row& row, std::size_t column, findings& found);

/// A distance from the left end, on the beam where its span is known. The right end may be spelled in another
/// unit than the span: what exceeds it by rounding alone is the end itself.
[[nodiscard]] std::optional<span_length> read_place_on_beam(const input_row& row, std::size_t column,
                                                            const std::optional<span_length>& span, findings& found);

}  // namespace beam_schedule
