// An input file with its columns found by name.
#pragma once

#include "csv_text.hpp"
#include "findings.hpp"

#include <cstddef>
#include <filesystem>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace beam_schedule {

class input_table;

/// A row below the header. Columns are numbered as in the list of names that the table was opened with.
class input_row {
public:
    input_row(const input_table& table, const csv_record& record) : table_(table), record_(record) {}

    [[nodiscard]] std::size_t line() const { return record_.line; }
    /// The cell without blanks around it; empty where the row is too short to have it.
    [[nodiscard]] std::string_view cell(std::size_t column) const;
    [[nodiscard]] place at(std::size_t column) const;

    /// False, with a refusal, where the row has a wrong number of cells, a wrong quote, or a value in a column
    /// without a name.
    bool expect_whole(findings& found) const;

private:
    const input_table& table_;
    const csv_record& record_;
};

/// A file of the input folder. Columns may stand in any order; others than the expected ones are noted and not
/// read; columns without a name must be empty.
class input_table {
public:
    /// Nothing, with refusals, where the file cannot be read, its quotes are beyond repair, or a column is
    /// missing or there twice. file_name and column_names must outlive the table.
    [[nodiscard]] static std::optional<input_table> open(const std::filesystem::path& folder,
                                                         std::string_view file_name,
                                                         std::span<const std::string_view> column_names,
                                                         findings& found);
    /// The same of the text of a file.
    [[nodiscard]] static std::optional<input_table> of_text(std::string text, std::string_view file_name,
                                                            std::span<const std::string_view> column_names,
                                                            findings& found);

    [[nodiscard]] std::size_t row_count() const { return csv_.records().size() - 1; }
    [[nodiscard]] input_row row(std::size_t i) const { return {*this, csv_.records()[i + 1]}; }
    [[nodiscard]] std::string_view file_name() const { return file_name_; }

private:
    friend class input_row;

    input_table(std::string_view file_name, std::span<const std::string_view> column_names, csv_text csv)
        : file_name_(file_name), column_names_(column_names), csv_(std::move(csv)) {}

    bool find_columns(findings& found);
    [[nodiscard]] const csv_record& header() const { return csv_.records().front(); }

    std::string_view file_name_;
    std::span<const std::string_view> column_names_;
    csv_text csv_;
    std::vector<std::size_t> positions_;  // of the expected columns, from 0
    std::vector<std::size_t> nameless_;
};

}  // namespace beam_schedule
