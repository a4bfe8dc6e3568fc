// How far the work is, for whoever waits at a terminal.
#pragma once

#include <fmt/format.h>

#include <chrono>
#include <cstddef>
#include <cstdio>

#if __has_include(<unistd.h>)
#include <unistd.h>
#endif

namespace beam_schedule {

/// Writes to standard error, only where that is a terminal and the work takes more than a second.
class progress {
public:
    explicit progress(std::size_t total) : total_(total), next_(clock::now() + std::chrono::seconds(1)) {}

    void update(std::size_t done) {
        if (!is_terminal_ || clock::now() < next_) return;
        next_ = clock::now() + std::chrono::milliseconds(200);
        fmt::print(stderr, "\r{} of {} beams computed ", done, total_);
        std::fflush(stderr);
        is_shown_ = true;
    }

    void clear() {
        if (!is_shown_) return;
        fmt::print(stderr, "\r{:50}\r", "");
        std::fflush(stderr);
        is_shown_ = false;
    }

private:
    using clock = std::chrono::steady_clock;

    static bool stderr_is_terminal() {
#if __has_include(<unistd.h>)
        return isatty(STDERR_FILENO) == 1;
#else
        return false;
#endif
    }

    std::size_t total_;
    clock::time_point next_;
    bool is_terminal_ = stderr_is_terminal();
    bool is_shown_ = false;
};

}  // namespace beam_schedule
