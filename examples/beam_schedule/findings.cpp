#include "findings.hpp"

#include "printable_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <iterator>

namespace beam_schedule {
namespace {

std::string text_of(const place& where) {
    std::string text(where.file);
    if (where.line != 0) text += fmt::format(": line {}", where.line);
    if (where.column != 0) text += fmt::format(", column {}", where.column);
    if (!where.column_name.empty()) text += fmt::format(" ({})", where.column_name);
    return printable(text);
}

}  // namespace

void findings::add(findings&& others) {
    std::move(others.refusals.begin(), others.refusals.end(), std::back_inserter(refusals));
    std::move(others.notes.begin(), others.notes.end(), std::back_inserter(notes));
}

void findings::sort_by_line() {
    const auto earlier = [](const auto& a, const auto& b) { return a.where.line < b.where.line; };
    std::stable_sort(refusals.begin(), refusals.end(), earlier);
    std::stable_sort(notes.begin(), notes.end(), earlier);
}

std::string quoted(std::string_view cell) {
    constexpr std::size_t longest = 60;  // a cell may hold a whole page
    if (cell.empty()) return "nothing";
    return fmt::format("'{}'", cut_to_width(printable(cell.substr(0, 8 * longest)), longest));
}

std::string line_of(const refusal& refused) {
    return fmt::format("{}: found {}, expected {}", text_of(refused.where), printable(refused.found),
                       printable(refused.expected));
}

std::string line_of(const note& noted) {
    return fmt::format("note: {}: {}", text_of(noted.where), printable(noted.text));
}

}  // namespace beam_schedule
