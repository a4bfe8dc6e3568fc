#include "input_table.hpp"

#include "read_file.hpp"

#include <fmt/format.h>
#include <fmt/ranges.h>

#include <algorithm>
#include <utility>

namespace beam_schedule {

std::string_view input_row::cell(std::size_t column) const {
    const std::size_t position = table_.positions_[column];
    return position < record_.cell_count ? trimmed(table_.csv_.cells(record_)[position]) : std::string_view();
}

place input_row::at(std::size_t column) const {
    return {table_.file_name_, record_.line, table_.positions_[column] + 1, table_.column_names_[column]};
}

bool input_row::expect_whole(findings& found) const {
    const auto name_of = [&](std::size_t position) {
        const auto names = table_.csv_.cells(table_.header());
        return position < names.size() ? trimmed(names[position]) : std::string_view();
    };
    if (const csv_fault* fault = table_.csv_.fault_of(record_)) {
        found.refuse({table_.file_name_, fault->line, fault->column, name_of(fault->column - 1)}, fault->found,
                     fault->expected);
        return false;
    }
    const std::size_t expected = table_.header().cell_count;
    if (record_.cell_count != expected) {
        const std::size_t first_wrong = std::min(record_.cell_count, expected);
        found.refuse({table_.file_name_, record_.line, first_wrong + 1, name_of(first_wrong)},
                     fmt::format("{} cell{}", record_.cell_count, record_.cell_count == 1 ? "" : "s"),
                     fmt::format("{} as in the header", expected));
        return false;
    }
    for (const std::size_t position : table_.nameless_) {
        const std::string_view cell = trimmed(table_.csv_.cells(record_)[position]);
        if (cell.empty()) continue;
        found.refuse({table_.file_name_, record_.line, position + 1, {}}, quoted(cell),
                     "nothing in a column without a name");
        return false;
    }
    return true;
}

bool input_table::find_columns(findings& found) {
    const auto names = csv_.cells(header());
    const std::size_t line = header().line;
    if (const csv_fault* fault = csv_.fault_of(header())) {
        found.refuse({file_name_, fault->line, fault->column, {}}, fault->found, fault->expected);
        return false;
    }
    bool good = true;
    positions_.assign(column_names_.size(), names.size());
    for (std::size_t i = 0; i < names.size(); ++i) {
        const std::string_view name = trimmed(names[i]);
        const auto known = std::find(column_names_.begin(), column_names_.end(), name);
        if (name.empty()) {
            nameless_.push_back(i);
        } else if (known == column_names_.end()) {
            found.notes.push_back(
                {{file_name_, line, i + 1, {}}, fmt::format("the column {} is not read", quoted(name))});
        } else if (auto& position = positions_[static_cast<std::size_t>(known - column_names_.begin())];
                   position == names.size()) {
            position = i;
        } else {
            found.refuse({file_name_, line, i + 1, *known}, "the same column again", "every column once");
            good = false;
        }
    }
    for (std::size_t i = 0; i < positions_.size(); ++i) {
        if (positions_[i] != names.size()) continue;
        const bool semicolons = names.size() == 1 && names[0].find(';') != std::string_view::npos;
        found.refuse({file_name_, line, 0, {}}, fmt::format("no column {}", column_names_[i]),
                     fmt::format("a header with the columns {}{}", fmt::join(column_names_, ","),
                                 semicolons ? " (separated by commas, not by semicolons)" : ""));
        good = false;
        if (semicolons) break;
    }
    return good;
}

std::optional<input_table> input_table::open(const std::filesystem::path& folder, std::string_view file_name,
                                             std::span<const std::string_view> column_names, findings& found) {
    std::string why_not;
    auto text = read_file(folder / file_name, why_not);
    if (!text) {
        found.refuse({file_name, 0, 0, {}},
                     fmt::format("no readable file in the folder '{}' ({})", folder.string(), why_not), "a CSV file");
        return std::nullopt;
    }
    return of_text(*std::move(text), file_name, column_names, found);
}

std::optional<input_table> input_table::of_text(std::string text, std::string_view file_name,
                                                std::span<const std::string_view> column_names, findings& found) {
    try {
        input_table table(file_name, column_names, csv_text(std::move(text)));
        if (table.csv_.records().empty()) {
            found.refuse({file_name, 0, 0, {}}, "an empty file",
                         fmt::format("a header with the columns {}", fmt::join(column_names, ",")));
            return std::nullopt;
        }
        if (!table.find_columns(found)) return std::nullopt;
        return table;
    } catch (const csv_error& error) {
        const csv_fault& fault = error.fault();
        found.refuse({file_name, fault.line, fault.column, {}}, fault.found, fault.expected);
        return std::nullopt;
    }
}

}  // namespace beam_schedule
