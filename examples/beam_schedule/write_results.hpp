// The files that a run leaves behind.
#pragma once

#include "compute.hpp"
#include "read_beams.hpp"

#include <filesystem>
#include <string>

namespace beam_schedule {

struct written_results {
    bool is_good = true;
    std::string message;  // lines, a file each
};

/// Writes results.csv into a folder, which is made if need be, and for continuous beams results_spans.csv and
/// results_supports.csv. These are written too where an earlier run has left them: with their head alone they say that
/// no beam is continuous any more. None is replaced before all are written, and none behind one that cannot be.
[[nodiscard]] written_results write_results(const std::filesystem::path& folder, const beam_list& beams,
                                            const schedule& computed);

}  // namespace beam_schedule
