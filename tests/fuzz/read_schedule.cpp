// Throws texts at the readers of the beam schedule. Whatever they hold, the readers answer with a model or with
// refusals that can be printed, each on one line: an exception that leaves them, a crash or a hang is a finding.
//
// The files of a project follow one another in the input, parted by the character FS ("file separator", 28); the last
// of them, supports.csv, may be missing.
#include <beam_schedule/findings.hpp>
#include <beam_schedule/input_table.hpp>
#include <beam_schedule/read_beams.hpp>
#include <beam_schedule/read_combinations.hpp>
#include <beam_schedule/read_loads.hpp>
#include <beam_schedule/read_supports.hpp>

#include <cmath>
#include <cstddef>
#include <cstdint>
#include <cstdlib>
#include <optional>
#include <span>
#include <string>
#include <string_view>

namespace {

using namespace beam_schedule;

/// The sanitizers show where.
void expect(bool good) {
    if (!good) std::abort();
}

class project {
public:
    project(std::string_view text, findings& found) : rest_(text), found_(found) {}

    [[nodiscard]] bool has_more() const { return !rest_.empty(); }

    /// The next file of the project; an empty one where the text has ended.
    std::optional<input_table> file(std::string_view name, std::span<const std::string_view> columns) {
        const auto length = rest_.find('\x1C');
        const std::string text(rest_.substr(0, length));
        rest_.remove_prefix(length == std::string_view::npos ? rest_.size() : length + 1);
        return input_table::of_text(text, name, columns, found_);
    }

private:
    std::string_view rest_;
    findings& found_;
};

/// What the computation takes for granted.
void expect_sound(const beam_list& beams, const combination_list& combinations, const load_table& loads,
                  const findings& found) {
    bool any_refused = false;
    for (const auto& beam : beams.beams) {
        any_refused = any_refused || beam.is_refused;
        expect(beam.is_refused || beam.beam.has_value() || beam.supported);
        expect(beam.is_refused || (beam.span.value() > 0 && std::isfinite(beam.span.value())));
        const double limit = beam.limit.over(beam.span).value();
        expect(beam.is_refused || (limit > 0 && std::isfinite(limit)));
    }
    expect(loads.loads.first.size() == beams.beams.size() + 1);
    for (std::size_t i = 0; i < beams.beams.size(); ++i) {
        for (const auto& load : loads.loads.on(i)) expect(load.load_case < combinations.cases.size());
    }
    for (const auto& combination : combinations.combinations) {
        expect(combination.is_left_out || combination.factor.size() <= combinations.cases.size());
        for (const double factor : combination.factor) expect(std::isfinite(factor));
    }
    expect(!any_refused || !found.refusals.empty());
}

void expect_one_line(const std::string& line) {
    for (const char c : line) expect(static_cast<unsigned char>(c) >= 0x20 && c != 0x7F);
}

}  // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size);
extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    findings found;
    project files({reinterpret_cast<const char*>(data), size}, found);
    const auto beams_file = files.file("beams.csv", beam_columns);
    const auto loads_file = files.file("loads.csv", load_columns);
    const auto combinations_file = files.file("combinations.csv", combination_columns);
    const bool has_supports = files.has_more();
    std::optional<input_table> supports_file;
    if (has_supports) supports_file = files.file("supports.csv", support_columns);
    if (beams_file && loads_file && combinations_file && supports_file.has_value() == has_supports) {
        auto beams = read_beams(*beams_file, supported_marks(supports_file), found);
        (void)read_supports(supports_file, beams, found);
        const auto combinations = read_combinations(*combinations_file, found);
        const auto loads = read_loads(*loads_file, beams, combinations, found);
        expect_sound(beams, combinations, loads, found);
    } else {
        expect(!found.refusals.empty());
    }
    for (const auto& refused : found.refusals) expect_one_line(line_of(refused));
    for (const auto& noted : found.notes) expect_one_line(line_of(noted));
    return 0;
}
