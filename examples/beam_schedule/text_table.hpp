// A table in columns as wide as their widest cell.
#pragma once

#include "printable_text.hpp"

#include <algorithm>
#include <array>
#include <cstddef>
#include <string>
#include <string_view>

namespace beam_schedule {

struct table_column {
    std::string_view name;
    std::string_view unit;
    bool is_number;  // to the right then
};

template <std::size_t count>
using table_line = std::array<std::string, count>;

template <std::size_t count>
class text_table {
public:
    explicit text_table(const std::array<table_column, count>& columns) : columns_(columns) {
        for (std::size_t i = 0; i < count; ++i) {
            width_[i] = std::max(display_width(columns[i].name), display_width(columns[i].unit));
        }
    }

    void widen(const table_line<count>& line) {
        for (std::size_t i = 0; i < count; ++i) width_[i] = std::max(width_[i], display_width(line[i]));
    }
    void widen(const text_table& other) {
        for (std::size_t i = 0; i < count; ++i) width_[i] = std::max(width_[i], other.width_[i]);
    }

    void append_head(std::string& out) const {
        table_line<count> names, units, rule;
        for (std::size_t i = 0; i < count; ++i) {
            names[i] = columns_[i].name;
            units[i] = columns_[i].unit;
            rule[i] = std::string(width_[i], '-');
        }
        for (const auto& line : {names, units, rule}) append(out, line);
    }

    void append(std::string& out, const table_line<count>& line) const {
        for (std::size_t i = 0; i < count; ++i) {
            const std::size_t pad = width_[i] - std::min(width_[i], display_width(line[i]));
            if (columns_[i].is_number) out.append(pad, ' ');
            out += line[i];
            const bool is_last = i + 1 == count;
            if (!is_last) out.append((columns_[i].is_number ? 0 : pad) + 2, ' ');
        }
        while (out.back() == ' ') out.pop_back();
        out += '\n';
    }

private:
    std::array<table_column, count> columns_;
    std::array<std::size_t, count> width_{};
};

}  // namespace beam_schedule
