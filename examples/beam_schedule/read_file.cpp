#include "read_file.hpp"

#include <array>
#include <cerrno>
#include <cstdio>
#include <cstring>
#include <memory>

namespace beam_schedule {

std::optional<std::string> read_file(const std::filesystem::path& path, std::string& why_not) {
    const auto close = [](std::FILE* file) { std::fclose(file); };
    errno = 0;
    const std::unique_ptr<std::FILE, decltype(close)> file(std::fopen(path.string().c_str(), "rb"), close);
    if (!file) {
        why_not = std::strerror(errno);
        return std::nullopt;
    }
    std::string text;
    std::error_code unknown_size;
    const auto size = std::filesystem::file_size(path, unknown_size);
    if (!unknown_size) text.reserve(static_cast<std::size_t>(size) + 1);
    std::array<char, 1 << 16> block;
    while (const std::size_t count = std::fread(block.data(), 1, block.size(), file.get())) {
        text.append(block.data(), count);
    }
    if (std::ferror(file.get())) {
        why_not = std::strerror(errno);
        return std::nullopt;
    }
    return text;
}

}  // namespace beam_schedule
