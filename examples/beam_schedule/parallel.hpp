// Work on many rows by all processors.
#pragma once

#include <algorithm>
#include <atomic>
#include <cstddef>
#include <exception>
#include <mutex>
#include <system_error>
#include <thread>
#include <vector>

namespace beam_schedule {

/// Cuts count items into parts, calls work(part, from, to) for each part in some thread, and returns the parts
/// in their order. after_each() is called by the calling thread now and then. What work throws is thrown here.
template <class Part, class Work, class After>
[[nodiscard]] std::vector<Part> in_parallel(std::size_t count, const Work& work, const After& after_each) {
    constexpr std::size_t items_in_part = 256;  // some milliseconds of work
    std::vector<Part> parts((count + items_in_part - 1) / items_in_part);
    std::atomic<std::size_t> next{0};
    std::exception_ptr failure;
    std::mutex failing;
    const auto work_on_parts = [&](const auto& after_part) {
        try {
            for (std::size_t i = next++; i < parts.size(); i = next++) {
                const std::size_t from = i * items_in_part;
                work(parts[i], from, std::min(from + items_in_part, count));
                after_part();
            }
        } catch (...) {
            const std::lock_guard lock(failing);
            failure = std::current_exception();
            next = parts.size();
        }
    };
    const std::size_t processors = std::max(1u, std::thread::hardware_concurrency());
    std::vector<std::thread> threads;
    try {
        while (threads.size() + 1 < std::min(processors, parts.size())) {
            threads.emplace_back([&] { work_on_parts([] {}); });
        }
    } catch (const std::system_error&) {
        // No further thread to be had: those that run do the work.
    }
    work_on_parts(after_each);
    for (auto& other : threads) other.join();
    if (failure) std::rethrow_exception(failure);
    return parts;
}

template <class Part, class Work>
[[nodiscard]] std::vector<Part> in_parallel(std::size_t count, const Work& work) {
    return in_parallel<Part>(count, work, [] {});
}

}  // namespace beam_schedule
