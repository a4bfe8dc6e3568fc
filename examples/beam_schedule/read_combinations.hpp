// combinations.csv: combination,case,factor
#pragma once

#include "findings.hpp"
#include "input_table.hpp"
#include "model.hpp"

#include <array>
#include <cstddef>
#include <cstdint>
#include <string_view>
#include <unordered_map>
#include <vector>

namespace beam_schedule {

inline constexpr std::array<std::string_view, 3> combination_columns{"combination", "case", "factor"};

/// A load case as the combinations name it.
struct named_case {
    std::string_view name;
    place first_named;
};

/// The combinations in the order of the file. One with a refused row is left out as a whole, since without that
/// row it would be another combination. A row that names no combination may belong to any, so that then all are.
struct combination_list {
    std::vector<combination> combinations;
    std::vector<named_case> cases;
    std::unordered_map<std::string_view, std::uint32_t> number_of_case;
    bool is_complete = true;

    [[nodiscard]] std::size_t left_out() const;
};

[[nodiscard]] combination_list read_combinations(const input_table& table, findings& found);

}  // namespace beam_schedule
