// beams.csv: mark,left,right,span,E,I,limit
#pragma once

#include "findings.hpp"
#include "input_table.hpp"
#include "model.hpp"

#include <array>
#include <cstddef>
#include <string_view>
#include <unordered_map>
#include <vector>

namespace beam_schedule {

inline constexpr std::array<std::string_view, 7> beam_columns{"mark", "left", "right", "span", "E", "I", "limit"};

/// The beams in the order of the file, one for each mark; refused ones are entries too, also without a mark.
struct beam_list {
    std::vector<beam_entry> beams;
    std::unordered_map<std::string_view, std::size_t> number_of;  // by mark
};

[[nodiscard]] beam_list read_beams(const input_table& table, findings& found);

}  // namespace beam_schedule
