// The computation: every beam in every combination.
#pragma once

#include "findings.hpp"
#include "model.hpp"
#include "read_beams.hpp"
#include "read_combinations.hpp"

#include <cstddef>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace beam_schedule {

/// Closed forms and integration that differ by more are not to be trusted: rounding alone is below 1e-12.
inline constexpr double plausible_cross_check = 1e-9;

enum class verdict {
    ok,
    exceeds,
    refused,     // a row of the beam or of its loads cannot be accepted
    incomplete,  // within its limit, but a combination or a load may be missing
    doubtful,    // the cross-check fails: neither of the others can be said
};

[[nodiscard]] std::string_view name_of(verdict v);

/// A beam in one combination.
struct utilised {
    std::size_t combination = 0;
    double deflection_mm = 0;
    double at_m = 0;
    double utilisation = 0;
};

struct beam_outcome {
    verdict result = verdict::refused;
    std::optional<utilised> governing;  // nothing where no combination could be computed
    double cross_check = 0;             // the greatest of all combinations
    bool is_loaded = false;
};

struct schedule {
    std::vector<beam_outcome> outcomes;     // of each beam
    std::vector<std::string> results_text;  // the rows of results.csv, in parts
    std::size_t result_count = 0;
};

/// Computes all beams that are not refused. A beam whose numbers leave the range of double is refused, with its
/// reason. is_sure is false where a combination or a load may be missing: no beam is called ok then.
[[nodiscard]] schedule compute_schedule(const beam_list& beams, const beam_loads& loads,
                                        const combination_list& combinations, bool is_sure, findings& found);

}  // namespace beam_schedule
