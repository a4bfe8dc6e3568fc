// The table that people read.
#pragma once

#include "compute.hpp"
#include "read_beams.hpp"
#include "read_combinations.hpp"
#include "read_loads.hpp"
#include "read_supports.hpp"

#include <string>

namespace beam_schedule {

/// The schedule as text: one line a beam and one for each of several spans, a summary, what the supports of
/// continuous beams carry, and what has to be said about the numbers.
[[nodiscard]] std::string report_of(const beam_list& beams, const support_table& supports, const load_table& loads,
                                    const combination_list& combinations, const schedule& computed);

}  // namespace beam_schedule
