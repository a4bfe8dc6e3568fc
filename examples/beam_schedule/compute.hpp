// The computation: every beam in every combination.
#pragma once

#include "compute_combination.hpp"
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

inline constexpr std::string_view results_head =
    "mark,combination,greatest_deflection_mm,at_m,limit_mm,utilisation,verdict,cross_check\n";
inline constexpr std::string_view spans_head =
    "mark,combination,span,from_m,to_m,greatest_deflection_mm,at_m,limit_mm,utilisation,verdict\n";
inline constexpr std::string_view supports_head =
    "mark,combination,at_m,support,reaction_kN,moment_kNm,deflection_mm\n";

enum class verdict {
    ok,
    exceeds,
    refused,     // a row of the beam or of its loads cannot be accepted
    incomplete,  // within its limit, but a combination or a load may be missing
    doubtful,    // the cross-check fails: neither of the others can be said
};

[[nodiscard]] std::string_view name_of(verdict v);

/// Least and greatest of the forces of a support in all combinations.
struct support_range {
    double least_reaction_kN, greatest_reaction_kN;
    double least_moment_kNm, greatest_moment_kNm;
};

struct beam_outcome {
    verdict result = verdict::refused;
    std::optional<utilised> governing;    // nothing where no combination could be computed
    std::vector<utilised> spans;          // of a continuous beam: what governs each span
    std::vector<support_range> supports;  // likewise
    double cross_check = 0;               // the greatest of all combinations
    bool is_loaded = false;
};

/// Rows of an output file in parts, one behind the other.
struct output_rows {
    std::vector<std::string> parts;
    std::size_t count = 0;
};

struct schedule {
    std::vector<beam_outcome> outcomes;  // of each beam
    output_rows results;                 // a row for a beam and combination
    output_rows spans;                   // of continuous beams: for a span and combination
    output_rows supports;                // for a support and combination
};

/// Computes all beams that are not refused. A beam whose numbers leave the range of double is refused, with its
/// reason. is_sure is false where a combination or a load may be missing: no beam is called ok then.
[[nodiscard]] schedule compute_schedule(const beam_list& beams, const beam_loads& loads,
                                        const combination_list& combinations, bool is_sure, findings& found);

}  // namespace beam_schedule
