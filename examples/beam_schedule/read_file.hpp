// A whole file as text.
#pragma once

#include <filesystem>
#include <optional>
#include <string>

namespace beam_schedule {

/// The bytes of a file; nothing, and the system's reason in why_not, where it cannot be read to its end.
[[nodiscard]] std::optional<std::string> read_file(const std::filesystem::path& path, std::string& why_not);

}  // namespace beam_schedule
