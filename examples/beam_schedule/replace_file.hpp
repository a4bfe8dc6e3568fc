// Replaces a file as a whole or not at all.
#pragma once

#include <filesystem>
#include <span>
#include <string>
#include <string_view>

namespace beam_schedule {

/// The new text of a file, beside it until it takes its place. What is not put in place is removed again.
class replacement {
public:
    /// Writes the parts one behind the other into a new file in the same folder.
    replacement(std::filesystem::path path, std::string_view head, std::span<const std::string> parts);
    ~replacement();
    replacement(const replacement&) = delete;
    replacement& operator=(const replacement&) = delete;

    /// Nothing, or what went wrong: the file is then as it was before.
    [[nodiscard]] const std::string& failure() const { return failure_; }

    /// Renames it to path, unless writing has failed.
    void put_in_place();

private:
    std::filesystem::path path_, temporary_;  // temporary_ is empty where nothing is to be removed
    std::string failure_;
};

}  // namespace beam_schedule
