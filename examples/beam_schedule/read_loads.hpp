// loads.csv: mark,case,kind,size,size_to,from,to
#pragma once

#include "findings.hpp"
#include "input_table.hpp"
#include "model.hpp"
#include "read_beams.hpp"
#include "read_combinations.hpp"

#include <array>
#include <cstddef>
#include <string_view>

namespace beam_schedule {

inline constexpr std::array<std::string_view, 7> load_columns{"mark", "case", "kind", "size", "size_to", "from", "to"};

struct load_table {
    beam_loads loads;
    std::size_t rows_of_any_beam = 0;  // refused; nobody can tell to which beam they belong
    std::size_t rows_of_no_beam = 0;   // refused; beams.csv does not have their mark
};

/// Reads the loads onto the beams. A beam with a refused load is marked as refused. Notes the cases that only
/// loads or only combinations name, and the beams without any load.
[[nodiscard]] load_table read_loads(const input_table& table, beam_list& beams, const combination_list& combinations,
                                    findings& found);

}  // namespace beam_schedule
