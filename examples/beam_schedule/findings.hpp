// What the program has to say about its input: refusals and notes, each with its place.
#pragma once

#include <cstddef>
#include <string>
#include <string_view>
#include <vector>

namespace beam_schedule {

/// A place in an input file. Lines and columns count from 1; 0 means the whole file or the whole line.
struct place {
    std::string_view file;
    std::size_t line = 0;
    std::size_t column = 0;
    std::string_view column_name;
};

/// Something that cannot be accepted.
struct refusal {
    place where;
    std::string found;
    std::string expected;
};

/// Something that is accepted, but that nobody should miss.
struct note {
    place where;
    std::string text;
};

struct findings {
    std::vector<refusal> refusals;
    std::vector<note> notes;

    void refuse(const place& where, std::string found, std::string expected) {
        refusals.push_back({where, std::move(found), std::move(expected)});
    }
    void add(findings&& others);
    void sort_by_line();
};

/// A cell between quotation marks, or "nothing".
[[nodiscard]] std::string quoted(std::string_view cell);

/// One printable line each, without its newline:
///     beams.csv: line 7, column 5 (E): found '210 kN': the unit 'kN', expected one of the units MPa, GPa ...
///     note: loads.csv: line 3, column 2 (case): ...
[[nodiscard]] std::string line_of(const refusal& refused);
[[nodiscard]] std::string line_of(const note& noted);

}  // namespace beam_schedule
