// Cells as they are written.
#pragma once

#include <charconv>
#include <string>
#include <string_view>

namespace beam_schedule {

/// A text as a CSV cell: in quotes where it needs them, and with an apostrophe in front where a spreadsheet would
/// else run it as a formula.
inline std::string csv_cell(std::string_view text) {
    constexpr std::string_view starts_formula = "=+-@\t\r\n";
    const bool is_formula = !text.empty() && starts_formula.find(text.front()) != std::string_view::npos;
    const bool is_padded = !text.empty() && (text.front() == ' ' || text.back() == ' ');
    if (!is_formula && !is_padded && text.find_first_of(",\"\r\n") == std::string_view::npos) return std::string(text);
    std::string cell = is_formula ? "\"'" : "\"";
    for (const char c : text) {
        if (c == '"') cell += '"';
        cell += c;
    }
    return cell += '"';
}

/// Twelve significant digits; trailing zeros are left out.
inline void append_number(std::string& out, double value) {
    char digits[32];
    const auto end = std::to_chars(digits, digits + sizeof digits, value, std::chars_format::general, 12).ptr;
    out.append(digits, end);
}

}  // namespace beam_schedule
