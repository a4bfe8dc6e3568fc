// beam_schedule INPUT_FOLDER [--out OUTPUT_FOLDER]
//
// The greatest deflection of every beam of a project in every load combination, against its limit.
#include "compute.hpp"
#include "findings.hpp"
#include "input_table.hpp"
#include "printable_text.hpp"
#include "read_beams.hpp"
#include "read_combinations.hpp"
#include "read_loads.hpp"
#include "read_supports.hpp"
#include "report.hpp"
#include "write_results.hpp"

#include <sagitta/version.hpp>

#include <fmt/format.h>

#include <cstdio>
#include <exception>
#include <filesystem>
#include <optional>
#include <string>
#include <string_view>
#include <system_error>

namespace {

using namespace beam_schedule;
namespace fs = std::filesystem;

constexpr int all_within_limits = 0;
constexpr int limit_exceeded = 1;
constexpr int something_refused = 2;

constexpr std::string_view usage = "usage: beam_schedule INPUT_FOLDER [--out OUTPUT_FOLDER]\n";

constexpr std::string_view help = R"(
Reads the beams of a project, their loads and the load combinations, prints the greatest deflection of each beam
against its limit, and writes every beam in every combination to results.csv in OUTPUT_FOLDER (which is made if need
be; without --out it is INPUT_FOLDER).

INPUT_FOLDER holds three or four CSV files (RFC 4180, UTF-8) with a header; their columns may stand in any order,
further columns with a name are noted and not read. Values carry their unit: 7.2 m, 12 ft 6 in, 4.5 kN/m, 8356 cm4,
29000 ksi.

  beams.csv         mark,left,right,span,E,I,limit
                    ends: fixed, pinned, free, or elastic and its stiffness: elastic 500 kN*m/rad (supported, and
                    held against rotation by that); limit: L/250 or the like, or a length
  supports.csv      mark,at,kind,stiffness,settlement
                    hinges of a beam, and supports between its ends or at a free end; this file may be missing
                    pinned             at a place, rigid
                    spring             at a place, with a stiffness: 8 kN/mm
                    hinge              at a place between the ends: no moment is passed on
                    settlement: how far a pinned support, or the ground below a spring, has moved down in every
                    combination, or empty
  loads.csv         mark,case,kind,size,size_to,from,to
                    point, couple      size, at from
                    uniform            size, between from and to (both empty: the whole beam)
                    linear             from size to size_to, between from and to (both empty: the whole beam)
                    settlement         a length size, of the end from: left or right
                    rotation           an angle size, of the fixed or elastic end from: left or right
                    cells that a kind does not use stay empty
  combinations.csv  combination,case,factor
                    a combination is the sum of factor times all loads of the case

A beam with a row in supports.csv, or with an elastic end, is a continuous one. It is held against its limit span by
span: L of L/250 is the length of the span, of an overhang beyond the last support twice its length (common practice,
no source), of a beam carried by one end alone its length. Deflections are those from the undeformed beam, so a
support that gives way moves the spans beside it. The table has a line for each span and for the reaction and moment
at each support; results_spans.csv and results_supports.csv have them in every combination.

Down and clockwise are positive, reactions upward, moments sagging; places count from the left end. The folder demo
beside the source of this program holds an invented project to start from.

A row that cannot be accepted is refused with its place on standard error, and its beam is not called ok. The input
is read as a whole or not at all where a file or a column is missing; results.csv is replaced only when whole.

exit status: 0  everything read, every beam within its limit
             1  a beam exceeds its limit
             2  something is refused, could not be read or written, or fails its cross-check

Elastic small-deflection theory of prismatic beams in bending. Limits are meant for service loads. Local codes and a
licensed engineer decide.
)";

struct arguments {
    fs::path input, output;
};

void say(std::string_view text) { fmt::print(stderr, "{}\n", text); }

std::optional<arguments> read_arguments(int count, char** texts) {
    arguments out;
    bool only_names = false;
    const auto set = [](fs::path& path, std::string_view value, std::string_view what) {
        if (value.empty() || !path.empty()) {
            say(fmt::format("beam_schedule: {} is {}", what, value.empty() ? "empty" : "given twice"));
            return false;
        }
        path = value;
        return true;
    };
    for (int i = 1; i < count; ++i) {
        const std::string_view text = texts[i];
        bool good = true;
        if (only_names || !text.starts_with('-')) {
            good = set(out.input, text, "INPUT_FOLDER");
        } else if (text == "--") {
            only_names = true;
        } else if (text.starts_with("--out=")) {
            good = set(out.output, text.substr(6), "OUTPUT_FOLDER");
        } else if (text == "--out" && i + 1 < count) {
            good = set(out.output, texts[++i], "OUTPUT_FOLDER");
        } else {
            say(fmt::format("beam_schedule: {} is {}", quoted(text),
                            text == "--out" ? "without its folder" : "unknown"));
            good = false;
        }
        if (!good) return std::nullopt;
    }
    if (out.input.empty()) {
        say("beam_schedule: INPUT_FOLDER is missing");
        return std::nullopt;
    }
    if (out.output.empty()) out.output = out.input;
    return out;
}

void say_all(const findings& found) {
    std::string text;
    for (const auto& refused : found.refusals) text += line_of(refused) + '\n';
    for (const auto& noted : found.notes) text += line_of(noted) + '\n';
    std::fwrite(text.data(), 1, text.size(), stderr);
}

bool is_without_rows(const std::optional<input_table>& table, findings& found) {
    if (!table || table->row_count() != 0) return false;
    found.refuse({table->file_name(), 0, 0, {}}, "no row below the header", "at least one");
    return true;
}

bool print_report(const std::string& text) {
    const bool good = std::fwrite(text.data(), 1, text.size(), stdout) == text.size() && std::fflush(stdout) == 0;
    if (!good) say("beam_schedule: the table could not be printed");
    return good;
}

/// Also where it is no file that can be read, which has to be said then.
bool is_there(const fs::path& path) {
    std::error_code wrong;
    const auto status = fs::symlink_status(path, wrong);
    return status.type() != fs::file_type::not_found && status.type() != fs::file_type::none;
}

int run(const arguments& folders) {
    findings found;
    const auto beams_file = input_table::open(folders.input, "beams.csv", beam_columns, found);
    const auto loads_file = input_table::open(folders.input, "loads.csv", load_columns, found);
    const auto combinations_file = input_table::open(folders.input, "combinations.csv", combination_columns, found);
    const bool has_supports = is_there(folders.input / "supports.csv");
    std::optional<input_table> supports_file;
    if (has_supports) supports_file = input_table::open(folders.input, "supports.csv", support_columns, found);
    const bool no_beams = is_without_rows(beams_file, found);
    const bool no_combinations = is_without_rows(combinations_file, found);
    const bool is_readable = beams_file && loads_file && combinations_file && supports_file.has_value() == has_supports;
    if (!is_readable || no_beams || no_combinations) {
        say_all(found);
        say("beam_schedule: nothing is computed, nothing is written");
        return something_refused;
    }
    auto beams = read_beams(*beams_file, supported_marks(supports_file), found);
    const auto supports = read_supports(supports_file, beams, found);
    const auto combinations = read_combinations(*combinations_file, found);
    const auto loads = read_loads(*loads_file, beams, combinations, found);
    const bool is_sure = combinations.is_complete && loads.rows_of_any_beam == 0 && supports.rows_of_any_beam == 0;
    const auto computed = compute_schedule(beams, loads.loads, combinations, is_sure, found);

    say_all(found);
    // The results come first: whoever reads the table may stop reading.
    const auto written = write_results(folders.output, beams, computed);
    const bool is_printed = print_report(report_of(beams, supports, loads, combinations, computed));
    fmt::print(stderr, "{}", written.message);

    const auto any = [&](verdict v) {
        for (const auto& outcome : computed.outcomes) {
            if (outcome.result == v) return true;
        }
        return false;
    };
    if (!found.refusals.empty() || any(verdict::doubtful) || !written.is_good || !is_printed) return something_refused;
    return any(verdict::exceeds) ? limit_exceeded : all_within_limits;
}

}  // namespace

int main(int count, char** texts) {
    for (int i = 1; i < count; ++i) {
        const std::string_view text = texts[i];
        if (text == "--") break;
        if (text == "--help" || text == "-h") return print_report(std::string(usage) + std::string(help)) ? 0 : 2;
        if (text == "--version") {
            return print_report(fmt::format("beam_schedule of sagitta {}.{}.{}\n", SAGITTA_VERSION_MAJOR,
                                            SAGITTA_VERSION_MINOR, SAGITTA_VERSION_PATCH))
                       ? 0
                       : 2;
        }
    }
    const auto folders = read_arguments(count, texts);
    if (!folders) {
        say(usage.substr(0, usage.size() - 1));
        return something_refused;
    }
    try {
        return run(*folders);
    } catch (const std::exception& failure) {
        say(fmt::format("beam_schedule: {}", printable(failure.what())));
        return something_refused;
    }
}
