#include "replace_file.hpp"

#include <fmt/format.h>

#include <cerrno>
#include <cstdio>
#include <cstring>
#include <random>
#include <system_error>

namespace beam_schedule {
namespace {

bool write_all(std::FILE* file, std::string_view text) {
    return std::fwrite(text.data(), 1, text.size(), file) == text.size();
}

}  // namespace

std::string replace_file(const std::filesystem::path& path, std::string_view head, std::span<const std::string> parts) {
    const std::filesystem::path temporary = path.string() + fmt::format(".{:08x}.part", std::random_device()());
    errno = 0;
    std::FILE* const file = std::fopen(temporary.string().c_str(), "wbx");  // x: never into a file that exists
    if (file == nullptr) return std::strerror(errno);

    bool good = write_all(file, head);
    for (const auto& part : parts) good = good && write_all(file, part);
    std::string failure = good ? "" : std::strerror(errno);
    // A full disk may show no earlier than when the buffers are emptied.
    if (std::fclose(file) != 0 && good) failure = std::strerror(errno);

    std::error_code wrong;
    if (failure.empty()) {
        std::filesystem::rename(temporary, path, wrong);
        if (wrong) failure = wrong.message();
    }
    if (!failure.empty()) std::filesystem::remove(temporary, wrong);
    return failure;
}

}  // namespace beam_schedule
