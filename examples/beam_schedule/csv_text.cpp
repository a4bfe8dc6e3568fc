#include "csv_text.hpp"

#include <algorithm>
#include <utility>

namespace beam_schedule {

std::string_view trimmed(std::string_view text) {
    while (!text.empty() && (text.front() == ' ' || text.front() == '\t')) text.remove_prefix(1);
    while (!text.empty() && (text.back() == ' ' || text.back() == '\t')) text.remove_suffix(1);
    return text;
}

/// Walks over the text once. Doubled quotes are made single in place: a cell never grows.
class csv_text::reader {
public:
    explicit reader(csv_text& out) : out_(out), at_(out.text_->data()), end_(at_ + out.text_->size()) {}

    void read_all() {
        skip_byte_order_mark();
        while (at_ != end_) read_record();
    }

private:
    void skip_byte_order_mark() {
        const std::string_view text(at_, static_cast<std::size_t>(end_ - at_));
        if (text.starts_with("\xFF\xFE") || text.starts_with("\xFE\xFF")) {
            throw csv_error({1, 1, "UTF-16 text", "UTF-8 text (in the spreadsheet: save as CSV UTF-8)"});
        }
        if (text.starts_with("\xEF\xBB\xBF")) at_ += 3;
    }

    void read_record() {
        csv_record record{line_, out_.cells_.size(), 0};
        while (true) {
            ++record.cell_count;
            const bool is_quoted = at_ != end_ && *at_ == '"';
            out_.cells_.push_back(is_quoted ? quoted_cell(record) : plain_cell(record));
            if (at_ == end_ || *at_ != ',') break;
            ++at_;
        }
        const csv_fault* const fault = out_.fault_of(record);
        const bool may_have_swallowed_rows = fault != nullptr && line_ != record.line;
        if (may_have_swallowed_rows) throw csv_error(*fault);
        if (at_ != end_) take_line_end();
        if (fault == nullptr && is_blank(record)) {
            out_.cells_.resize(record.first_cell);
        } else {
            out_.records_.push_back(record);
        }
    }

    bool is_blank(const csv_record& record) const {
        const auto cells = out_.cells(record);
        return std::all_of(cells.begin(), cells.end(), [](std::string_view cell) { return trimmed(cell).empty(); });
    }

    std::string_view plain_cell(const csv_record& record) {
        const char* const start = at_;
        for (; !is_at_end_of_cell(); ++at_) {
            if (*at_ == '"') {
                note_fault(record, "a quote inside a cell that does not start with one",
                           "the whole cell in quotes and the quote doubled");
            }
        }
        return {start, static_cast<std::size_t>(at_ - start)};
    }

    std::string_view quoted_cell(const csv_record& record) {
        const csv_fault unterminated{line_, record.cell_count, "an opening quote whose cell never ends",
                                     "a closing quote"};
        ++at_;
        const char* const start = at_;
        char* out = at_;
        while (true) {
            if (at_ == end_) throw csv_error(unterminated);
            if (*at_ == '"') {
                ++at_;
                if (at_ == end_ || *at_ != '"') break;
            } else if (*at_ == '\n' || (*at_ == '\r' && (at_ + 1 == end_ || at_[1] != '\n'))) {
                ++line_;
            }
            *out++ = *at_++;
        }
        if (!is_at_end_of_cell()) {
            note_fault(record, "text behind the closing quote of a cell", "a comma or the end of the line there");
            while (!is_at_end_of_cell()) ++at_;
        }
        return {start, static_cast<std::size_t>(out - start)};
    }

    bool is_at_end_of_cell() const { return at_ == end_ || *at_ == ',' || *at_ == '\n' || *at_ == '\r'; }

    /// The first fault of a record counts; what follows it may come from it.
    void note_fault(const csv_record& record, const char* found, const char* expected) {
        out_.faults_.try_emplace(record.first_cell, csv_fault{line_, record.cell_count, found, expected});
    }

    void take_line_end() {
        if (*at_ == '\r' && at_ + 1 != end_ && at_[1] == '\n') ++at_;
        ++at_;
        ++line_;
    }

    csv_text& out_;
    char* at_;
    char* end_;
    std::size_t line_ = 1;
};

csv_text::csv_text(std::string text) : text_(std::make_unique<std::string>(std::move(text))) {
    const auto line_count = static_cast<std::size_t>(std::count(text_->begin(), text_->end(), '\n'));
    const auto comma_count = static_cast<std::size_t>(std::count(text_->begin(), text_->end(), ','));
    records_.reserve(line_count + 1);
    cells_.reserve(line_count + comma_count + 1);
    reader(*this).read_all();
}

const csv_fault* csv_text::fault_of(const csv_record& record) const {
    if (faults_.empty()) return nullptr;
    const auto fault = faults_.find(record.first_cell);
    return fault == faults_.end() ? nullptr : &fault->second;
}

}  // namespace beam_schedule
