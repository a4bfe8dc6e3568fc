// Replaces a file as a whole or not at all.
#pragma once

#include <filesystem>
#include <span>
#include <string>
#include <string_view>

namespace beam_schedule {

/// Writes the parts one behind the other into a new file in the same folder, and renames it to path once all of it
/// is written. Returns nothing, or what went wrong: path is then as it was before.
[[nodiscard]] std::string replace_file(const std::filesystem::path& path, std::string_view head,
                                       std::span<const std::string> parts);

}  // namespace beam_schedule
