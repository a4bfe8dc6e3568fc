// supports.csv: mark,at,kind,stiffness,settlement. A project may do without this file.
#pragma once

#include "findings.hpp"
#include "input_table.hpp"
#include "read_beams.hpp"

#include <array>
#include <cstddef>
#include <optional>
#include <string_view>
#include <unordered_set>

namespace beam_schedule {

inline constexpr std::array<std::string_view, 5> support_columns{"mark", "at", "kind", "stiffness", "settlement"};

struct support_table {
    std::size_t rows_of_any_beam = 0;  // refused; nobody can tell to which beam they belong
    std::size_t rows_of_no_beam = 0;   // refused; beams.csv does not have their mark
};

/// The marks in the file; none without a file.
[[nodiscard]] std::unordered_set<std::string_view> supported_marks(const std::optional<input_table>& table);

/// Puts supports and hinges on the beams that read_beams was told of, and completes all continuous beams. A beam with
/// a refused row, and one that is a mechanism, is marked as refused.
[[nodiscard]] support_table read_supports(const std::optional<input_table>& table, beam_list& beams, findings& found);

}  // namespace beam_schedule
