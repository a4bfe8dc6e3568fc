// The input as the computation wants it: beams, the loads on each, and the combinations.
#pragma once

#include "findings.hpp"

#include <sagitta/core.hpp>

#include <cstddef>
#include <cstdint>
#include <optional>
#include <span>
#include <string_view>
#include <variant>
#include <vector>

namespace beam_schedule {

enum class holding { fixed, pinned, free };

[[nodiscard]] constexpr std::string_view name_of(holding end) {
    return end == holding::fixed ? "fixed" : end == holding::pinned ? "pinned" : "free";
}

using span_length = sagitta::quantity<sagitta::dimension::length>;
using rigidity = sagitta::quantity<sagitta::dimension::flexural_rigidity>;

using simple = decltype(sagitta::simple_beam(span_length(), rigidity()));
using clamped_left = decltype(sagitta::cantilever(span_length(), rigidity()));
using propped = decltype(sagitta::propped_cantilever(span_length(), rigidity()));
using clamped = decltype(sagitta::fixed_beam(span_length(), rigidity()));
using clamped_right = decltype(mirrored(std::declval<clamped_left>()));
using propped_right = decltype(mirrored(std::declval<propped>()));

/// How a beam is held is a type in sagitta; these are the ways that stand.
using any_beam = std::variant<simple, clamped_left, clamped_right, propped, propped_right, clamped>;

struct beam_entry {
    std::string_view mark;
    place where;  // of its mark in the file
    holding left{}, right{};
    std::optional<any_beam> beam;
    span_length span{};
    span_length limit{};
    bool is_refused = false;
};

/// A load and the number of its case.
struct case_load {
    sagitta::load_types::any_load<double> load;
    std::uint32_t load_case;
};

/// The loads of all beams, beam by beam.
struct beam_loads {
    std::vector<case_load> loads;
    std::vector<std::size_t> first;  // of each beam, and one past the last

    [[nodiscard]] std::span<const case_load> on(std::size_t beam) const {
        return std::span(loads).subspan(first[beam], first[beam + 1] - first[beam]);
    }
};

struct combination {
    std::string_view name;
    std::vector<double> factor;  // by the number of the case; 0 where the combination does not name it
    bool is_left_out = false;
};

}  // namespace beam_schedule
