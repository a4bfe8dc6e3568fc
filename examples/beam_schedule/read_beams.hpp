// beams.csv: mark,left,right,span,E,I,limit
#pragma once

#include "findings.hpp"
#include "input_table.hpp"
#include "model.hpp"

#include <array>
#include <cstddef>
#include <string_view>
#include <unordered_map>
#include <unordered_set>
#include <vector>

namespace beam_schedule {

inline constexpr std::array<std::string_view, 7> beam_columns{"mark", "left", "right", "span", "E", "I", "limit"};

/// The beams in the order of the file, one for each mark; refused ones are entries too, also without a mark.
struct beam_list {
    std::vector<beam_entry> beams;
    std::unordered_map<std::string_view, std::size_t> number_of;  // by mark
};

/// Beams with an elastic end, and those that are supported further (by their marks), become continuous beams. Of the
/// latter their supports decide whether they stand (read_supports.hpp).
[[nodiscard]] beam_list read_beams(const input_table& table, const std::unordered_set<std::string_view>& supported,
                                   findings& found);

}  // namespace beam_schedule
