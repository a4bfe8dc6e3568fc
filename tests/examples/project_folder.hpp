// A folder with the input of beam_schedule, and the program run on it as a user runs it.
#pragma once

#include <beam_schedule/csv_text.hpp>

#include <doctest/doctest.h>
#include <sys/wait.h>

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
        const beam_schedule::csv_text csv(results_text());
        std::map<std::pair<std::string, std::string>, result_row> rows;
        for (std::size_t i = 1; i < csv.records().size(); ++i) {
            const auto cells = csv.cells(csv.records()[i]);
            REQUIRE(cells.size() == 8);
            const auto number = [&](std::size_t column) { return std::stod(std::string(cells[column])); };
            const std::pair key{std::string(cells[0]), std::string(cells[1])};
            CHECK(rows.count(key) == 0);
            rows[key] = {number(2), number(3), number(4), number(5), std::string(cells[6]), number(7)};
        }
        return rows;
    }

private:
    fs::path folder_;
};

}  // namespace examples_test
