// Text from cells and paths, made safe and measurable for a terminal.
#pragma once

#include <cstddef>
#include <string>
#include <string_view>

namespace beam_schedule {

/// The text with everything that would move the cursor, switch colours or turn the writing direction, and every
/// byte that is no UTF-8, written out as \xNN.
[[nodiscard]] std::string printable(std::string_view text);

/// Columns that printable text takes on a terminal.
[[nodiscard]] std::size_t display_width(std::string_view text);

/// The text, cut to at most width columns; an ellipsis shows that something is missing.
[[nodiscard]] std::string cut_to_width(std::string_view text, std::size_t width);

}  // namespace beam_schedule
