#include "replace_file.hpp"

#include <fmt/format.h>

#include <cerrno>
#include <cstdio>
#include <cstring>
#include <random>
#include <system_error>
#include <utility>

namespace beam_schedule {
namespace {

bool write_all(std::FILE* file, std::string_view text) {
    return std::fwrite(text.data(), 1, text.size(), file) == text.size();
}

}  // namespace

replacement::replacement(std::filesystem::path path, std::string_view head, std::span<const std::string> parts)
    : path_(std::move(path)) {
    const std::filesystem::path name = path_.string() + fmt::format(".{:08x}.part", std::random_device()());
    errno = 0;
    std::FILE* const file = std::fopen(name.string().c_str(), "wbx");  // x: never into a file that exists
    if (file == nullptr) {
        failure_ = std::strerror(errno);
        return;
    }
    temporary_ = name;
    bool good = write_all(file, head);
    for (const auto& part : parts) good = good && write_all(file, part);
    if (!good) failure_ = std::strerror(errno);
    // A full disk may show no earlier than when the buffers are emptied.
    if (std::fclose(file) != 0 && good) failure_ = std::strerror(errno);
}

replacement::~replacement() {
    std::error_code ignored;
    if (!temporary_.empty()) std::filesystem::remove(temporary_, ignored);
}

void replacement::put_in_place() {
    if (!failure_.empty()) return;
    std::error_code wrong;
    std::filesystem::rename(temporary_, path_, wrong);
    if (wrong) {
        failure_ = wrong.message();
    } else {
        temporary_.clear();
    }
}

}  // namespace beam_schedule
