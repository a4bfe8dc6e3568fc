// The input as the computation wants it: beams, the loads on each, and the combinations.
#pragma once

#include "findings.hpp"

#include <sagitta/core.hpp>

#include <cstddef>
#include <cstdint>
#include <memory>
#include <optional>
#include <span>
#include <string_view>
#include <variant>
#include <vector>

namespace beam_schedule {

/// How a beam is held at an end, or at a support between its ends. Elastic is supported and held against rotation by
/// a spring; spring is supported by one, free to rotate.
enum class holding { fixed, pinned, elastic, spring, free };

[[nodiscard]] constexpr std::string_view name_of(holding end) {
    constexpr std::string_view names[]{"fixed", "pinned", "elastic", "spring", "free"};
    return names[static_cast<std::size_t>(end)];
}

using span_length = sagitta::quantity<sagitta::dimension::length>;
using rigidity = sagitta::quantity<sagitta::dimension::flexural_rigidity>;

using simple = decltype(sagitta::simple_beam(span_length(), rigidity()));
using clamped_left = decltype(sagitta::cantilever(span_length(), rigidity()));
using propped = decltype(sagitta::propped_cantilever(span_length(), rigidity()));
using clamped = decltype(sagitta::fixed_beam(span_length(), rigidity()));
using clamped_right = decltype(mirrored(std::declval<clamped_left>()));
using propped_right = decltype(mirrored(std::declval<propped>()));

/// How a beam of one span is held is a type in sagitta; these are the ways that stand.
using any_beam = std::variant<simple, clamped_left, clamped_right, propped, propped_right, clamped>;

/// The allowed deflection: a length, or a fraction of a span.
struct deflection_limit {
    span_length length{};
    double divisor = 0;  // 0: the length counts

    [[nodiscard]] span_length over(const span_length& span) const { return divisor > 0 ? span / divisor : length; }
};

struct beam_support {
    span_length at;
    holding how;
};

/// A stretch between neighbouring supports, or from the last one to a free end.
struct beam_span {
    span_length from, to;
    holding left, right;
    span_length limit;
};

/// A beam for which there is no closed form of one span: on supports of supports.csv, or with an elastic end.
struct continuous {
    sagitta::continuous_beam<double> beam;
    std::vector<beam_support> supports;  // from left to right, held ends included
    std::vector<beam_span> spans;
    bool is_settled = false;  // supports.csv moves a support
};

struct beam_entry {
    std::string_view mark;
    place where;  // of its mark in the file
    holding left{}, right{};
    std::optional<any_beam> beam;  // nothing for a continuous beam
    std::unique_ptr<continuous> supported;
    span_length span{};
    deflection_limit limit;
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
