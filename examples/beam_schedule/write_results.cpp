#include "write_results.hpp"

#include "printable_text.hpp"
#include "replace_file.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cstddef>
#include <memory>
#include <string_view>
#include <system_error>
#include <vector>

namespace beam_schedule {
namespace {

namespace fs = std::filesystem;

/// The files of a run, put in place one behind the other once all of them are written.
class output_files {
public:
    explicit output_files(const fs::path& folder) : folder_(folder) {
        fs::create_directories(folder_, cannot_make_folder_);
    }

    void write(std::string_view name, std::string_view what, std::string_view head, const output_rows& rows) {
        if (cannot_make_folder_) {
            files_.push_back({folder_ / name, what, rows.count, nullptr});
        } else {
            files_.push_back(
                {folder_ / name, what, rows.count, std::make_unique<replacement>(folder_ / name, head, rows.parts)});
        }
    }

    written_results put_in_place() {
        const auto failed = [&](const file& f) { return cannot_make_folder_ || !f.text->failure().empty(); };
        written_results out;
        for (const auto& f : files_) out.is_good = out.is_good && !failed(f);
        for (const auto& f : files_) {
            const bool all_well = out.is_good;
            if (all_well) f.text->put_in_place();
            const std::string name = printable(f.path.string());
            if (failed(f)) {
                out.message += fmt::format("beam_schedule: {} could not be written and is as it was: {}\n", name,
                                           cannot_make_folder_ ? cannot_make_folder_.message() : f.text->failure());
            } else if (!all_well) {
                out.message += fmt::format("beam_schedule: {} is as it was\n", name);
            } else {
                out.message += fmt::format("{} {} are in {}\n", f.count, f.what, name);
            }
            out.is_good = out.is_good && !failed(f);
        }
        return out;
    }

    [[nodiscard]] bool has(std::string_view name) const {
        std::error_code ignored;
        return fs::is_regular_file(folder_ / name, ignored);
    }

private:
    struct file {
        fs::path path;
        std::string_view what;
        std::size_t count;
        std::unique_ptr<replacement> text;
    };
    fs::path folder_;
    std::error_code cannot_make_folder_;
    std::vector<file> files_;
};

}  // namespace

written_results write_results(const std::filesystem::path& folder, const beam_list& beams, const schedule& computed) {
    constexpr std::string_view spans_name = "results_spans.csv";
    constexpr std::string_view supports_name = "results_supports.csv";
    output_files files(folder);
    const bool any_continuous = std::any_of(beams.beams.begin(), beams.beams.end(),
                                            [](const beam_entry& entry) { return entry.supported != nullptr; });
    files.write("results.csv", "results", results_head, computed.results);
    if (any_continuous || files.has(spans_name)) {
        files.write(spans_name, "results of spans", spans_head, computed.spans);
    }
    if (any_continuous || files.has(supports_name)) {
        files.write(supports_name, "results of supports", supports_head, computed.supports);
    }
    return files.put_in_place();
}

}  // namespace beam_schedule
