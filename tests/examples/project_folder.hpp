// A folder with the input of beam_schedule, and the program run on it as a user runs it.
#pragma once

#include <beam_schedule/csv_text.hpp>

#include <doctest/doctest.h>
#include <sys/wait.h>

#include <cmath>
#include <cstddef>
#include <cstdlib>
#include <filesystem>
#include <fstream>
#include <map>
#include <random>
#include <sstream>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

namespace examples_test {

namespace fs = std::filesystem;

inline std::string text_of(const fs::path& path) {
    std::ifstream file(path, std::ios::binary);
    std::ostringstream text;
    text << file.rdbuf();
    return text.str();
}

inline void write(const fs::path& path, std::string_view text) { std::ofstream(path, std::ios::binary) << text; }

/// True where text has this line, whole.
inline bool has_line(const std::string& text, const std::string& line) {
    return ("\n" + text).find("\n" + line + "\n") != std::string::npos;
}

struct run_outcome {
    int status = -1;
    std::string out, err;
};

struct result_row {
    double greatest_deflection_mm, at_m, limit_mm, utilisation;
    std::string verdict;
    double cross_check;
};

struct span_row {
    double from_m, to_m, greatest_deflection_mm, at_m, limit_mm, utilisation;
    std::string verdict;
};

struct support_row {
    double at_m;
    std::string kind;
    double reaction_kN, moment_kNm, deflection_mm;
};

/// The line of the table that starts with this mark.
inline std::string table_line(const std::string& table, const std::string& mark) {
    const std::size_t at = ("\n" + table).find("\n" + mark + " ");
    if (at == std::string::npos) return "";
    return table.substr(at, table.find('\n', at) - at);
}

/// True where a line has this word between blanks or at its end.
inline bool says(const std::string& line, const std::string& word) {
    return (line + " ").find(" " + word + " ") != std::string::npos;
}

class project_folder {
public:
    project_folder() {
        std::random_device draw;
        folder_ = fs::temp_directory_path() / ("beam_schedule_test_" + std::to_string(draw()) + std::to_string(draw()));
        fs::create_directories(folder_);
    }
    ~project_folder() {
        std::error_code ignored;
        fs::remove_all(folder_, ignored);
    }
    project_folder(const project_folder&) = delete;
    project_folder& operator=(const project_folder&) = delete;

    [[nodiscard]] const fs::path& path() const { return folder_; }

    /// Rows below the usual headers.
    void write_rows(std::string_view beams, std::string_view loads, std::string_view combinations) const {
        write(folder_ / "beams.csv", "mark,left,right,span,E,I,limit\n" + std::string(beams));
        write(folder_ / "loads.csv", "mark,case,kind,size,size_to,from,to\n" + std::string(loads));
        write(folder_ / "combinations.csv", "combination,case,factor\n" + std::string(combinations));
    }

    void write_supports(std::string_view rows) const {
        write(folder_ / "supports.csv", "mark,at,kind,stiffness,settlement\n" + std::string(rows));
    }

    /// Runs the program with these arguments of a shell, in this folder. before goes in front of the program's name.
    [[nodiscard]] run_outcome run(const std::string& arguments = ".", const std::string& before = "") const {
        const std::string command = "cd '" + folder_.string() + "' && " + before + " '" BEAM_SCHEDULE_PROGRAM "' " +
                                    arguments + " >table.txt 2>messages.txt";
        const int status = std::system(command.c_str());
        return {WIFEXITED(status) ? WEXITSTATUS(status) : -1, text_of(folder_ / "table.txt"),
                text_of(folder_ / "messages.txt")};
    }

    [[nodiscard]] std::string results_text(const std::string& folder = ".") const {
        return text_of(folder_ / folder / "results.csv");
    }

    /// results.csv by mark and combination.
    [[nodiscard]] std::map<std::pair<std::string, std::string>, result_row> results() const {
        std::map<std::pair<std::string, std::string>, result_row> rows;
        for (const auto& cells : rows_of("results.csv", 8)) {
            const std::pair key{cells[0], cells[1]};
            CHECK(rows.count(key) == 0);
            rows[key] = {std::stod(cells[2]),
                         std::stod(cells[3]),
                         std::stod(cells[4]),
                         std::stod(cells[5]),
                         cells[6],
                         cells[7].empty() ? std::nan("") : std::stod(cells[7])};
        }
        return rows;
    }

    /// results_spans.csv by mark and combination, from left to right.
    [[nodiscard]] std::map<std::pair<std::string, std::string>, std::vector<span_row>> spans() const {
        std::map<std::pair<std::string, std::string>, std::vector<span_row>> rows;
        for (const auto& cells : rows_of("results_spans.csv", 10)) {
            auto& of_beam = rows[{cells[0], cells[1]}];
            CHECK(cells[2] == std::to_string(of_beam.size() + 1));
            of_beam.push_back({std::stod(cells[3]), std::stod(cells[4]), std::stod(cells[5]), std::stod(cells[6]),
                               std::stod(cells[7]), std::stod(cells[8]), cells[9]});
        }
        return rows;
    }

    /// results_supports.csv by mark and combination, from left to right.
    [[nodiscard]] std::map<std::pair<std::string, std::string>, std::vector<support_row>> supports() const {
        std::map<std::pair<std::string, std::string>, std::vector<support_row>> rows;
        for (const auto& cells : rows_of("results_supports.csv", 7)) {
            rows[{cells[0], cells[1]}].push_back(
                {std::stod(cells[2]), cells[3], std::stod(cells[4]), std::stod(cells[5]), std::stod(cells[6])});
        }
        return rows;
    }

private:
    [[nodiscard]] std::vector<std::vector<std::string>> rows_of(const char* name, std::size_t cell_count) const {
        const beam_schedule::csv_text csv(text_of(folder_ / name));
        std::vector<std::vector<std::string>> rows;
        for (std::size_t i = 1; i < csv.records().size(); ++i) {
            const auto cells = csv.cells(csv.records()[i]);
            REQUIRE(cells.size() == cell_count);
            rows.emplace_back(cells.begin(), cells.end());
        }
        return rows;
    }

    fs::path folder_;
};

}  // namespace examples_test
