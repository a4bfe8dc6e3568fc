// One beam in one combination.
#pragma once

#include "model.hpp"

#include <sagitta/core.hpp>

#include <cstddef>
#include <vector>

namespace beam_schedule {

/// The greatest deflection of a beam, or of a span of it, against its limit.
struct utilised {
    std::size_t combination = 0;
    std::size_t span = 0;  // of a continuous beam, from 0
    double deflection_mm = 0;
    double at_m = 0;
    double limit_mm = 0;
    double utilisation = 0;
};

/// What a continuous beam does at a support. The reaction is upward, the moment sagging positive: at an end what the
/// support passes on, elsewhere that of the beam (where a couple stands there, the greater one of both sides).
struct support_forces {
    double reaction_kN = 0;
    double moment_kNm = 0;
    double deflection_mm = 0;
};

struct combination_result {
    utilised governing;
    std::vector<utilised> spans;           // of a continuous beam only
    std::vector<support_forces> supports;  // likewise
    double cross_check = 0;                // greatest discrepancy of an independent integration
    bool is_finite = false;
};

/// The beam under loads that act together. Throws sagitta::invalid_input where it cannot be computed.
[[nodiscard]] combination_result compute_combination(const beam_entry& entry, const sagitta::load_list<double>& loads);

}  // namespace beam_schedule
