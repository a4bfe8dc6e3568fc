// Reads comma-separated values as RFC 4180 describes them and as spreadsheets save them.
#pragma once

#include <cstddef>
#include <map>
#include <memory>
#include <span>
#include <stdexcept>
#include <string>
#include <string_view>
#include <vector>

namespace beam_schedule {

/// What is wrong with the quotes of a text, and where. Lines and columns count from 1.
struct csv_fault {
    std::size_t line = 0;
    std::size_t column = 0;
    std::string found;
    std::string expected;
};

/// Thrown where the quotes are so wrong that nobody can tell which rows the text has.
class csv_error : public std::runtime_error {
public:
    explicit csv_error(csv_fault fault) : std::runtime_error(fault.found), fault_(std::move(fault)) {}
    [[nodiscard]] const csv_fault& fault() const { return fault_; }

private:
    csv_fault fault_;
};

/// One row: the line where it starts, and which cells are its own.
struct csv_record {
    std::size_t line = 0;
    std::size_t first_cell = 0;
    std::size_t cell_count = 0;
};

/// A text cut into records and cells. A byte-order mark in front, lines that end in LF, CRLF or CR, and quoted
/// cells with commas, newlines and doubled quotes inside are understood; records without any text are dropped.
class csv_text {
public:
    /// Throws csv_error where a quoted cell never ends, or swallowed lines before its quotes went wrong.
    explicit csv_text(std::string text);

    [[nodiscard]] const std::vector<csv_record>& records() const { return records_; }
    [[nodiscard]] std::span<const std::string_view> cells(const csv_record& record) const {
        return std::span(cells_).subspan(record.first_cell, record.cell_count);
    }
    /// What is wrong with the quotes of a record that stands on one line; nullptr where nothing is.
    [[nodiscard]] const csv_fault* fault_of(const csv_record& record) const;

private:
    class reader;

    std::unique_ptr<std::string> text_;  // on the heap, so that the cells stay valid when this is moved
    std::vector<std::string_view> cells_;
    std::vector<csv_record> records_;
    std::map<std::size_t, csv_fault> faults_;  // by the first cell of their record
};

/// Without blanks and tabs at both ends.
[[nodiscard]] std::string_view trimmed(std::string_view text);

}  // namespace beam_schedule
