#include "printable_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>

namespace beam_schedule {
namespace {

/// One character of UTF-8: its number and how many bytes it takes; valid is false for a byte that starts none.
struct character {
    char32_t number = 0;
    std::size_t bytes = 1;
    bool valid = false;
};

character first_character(std::string_view text) {
    const auto byte = [&](std::size_t i) { return static_cast<unsigned char>(text[i]); };
    const unsigned lead = byte(0);
    if (lead < 0x80) return {lead, 1, true};
    const std::size_t bytes = lead >= 0xF0 ? 4 : lead >= 0xE0 ? 3 : 2;
    if (lead < 0xC2 || lead > 0xF4 || text.size() < bytes) return {};
    char32_t number = lead & (0x7Fu >> bytes);
    for (std::size_t i = 1; i < bytes; ++i) {
        if ((byte(i) & 0xC0u) != 0x80u) return {};
        number = (number << 6) | (byte(i) & 0x3Fu);
    }
    constexpr std::array<char32_t, 5> smallest{0, 0, 0x80, 0x800, 0x10000};
    const bool is_surrogate = number >= 0xD800 && number <= 0xDFFF;
    if (number < smallest[bytes] || number > 0x10FFFF || is_surrogate) return {};
    return {number, bytes, true};
}

struct range {
    char32_t first, last;
    bool contains(char32_t number) const { return number >= first && number <= last; }
};

template <std::size_t count>
bool any_contains(const std::array<range, count>& ranges, char32_t number) {
    return std::any_of(ranges.begin(), ranges.end(), [&](const range& r) { return r.contains(number); });
}

/// Control characters, line and paragraph separators, marks that turn the writing direction or have no width.
bool is_unsafe(char32_t number) {
    constexpr std::array unsafe{range{0, 0x1F},         range{0x7F, 0x9F},     range{0xAD, 0xAD},
                                range{0x61C, 0x61C},    range{0x200B, 0x200F}, range{0x2028, 0x202E},
                                range{0x2060, 0x206F},  range{0xFEFF, 0xFEFF}, range{0xFFF9, 0xFFFB},
                                range{0xE0000, 0xE0FFF}};
    return any_contains(unsafe, number);
}

std::size_t columns_of(char32_t number) {
    constexpr std::array none{range{0x300, 0x36F}, range{0x1AB0, 0x1AFF}, range{0x20D0, 0x20FF}, range{0xFE00, 0xFE2F}};
    constexpr std::array two{range{0x1100, 0x115F},   range{0x2E80, 0xA4CF},  range{0xAC00, 0xD7A3},
                             range{0xF900, 0xFAFF},   range{0xFE30, 0xFE6F},  range{0xFF00, 0xFF60},
                             range{0x1F300, 0x1FAFF}, range{0x20000, 0x3FFFD}};
    return any_contains(none, number) ? 0 : any_contains(two, number) ? 2 : 1;
}

bool is_plain_ascii(std::string_view text) {
    return std::all_of(text.begin(), text.end(), [](char c) { return c >= ' ' && c <= '~'; });
}

}  // namespace

std::string printable(std::string_view text) {
    if (is_plain_ascii(text)) return std::string(text);
    std::string out;
    while (!text.empty()) {
        const character next = first_character(text);
        const std::string_view bytes = text.substr(0, next.bytes);
        if (next.valid && !is_unsafe(next.number)) {
            out += bytes;
        } else {
            for (const char byte : bytes) {
                fmt::format_to(std::back_inserter(out), "\\x{:02x}", static_cast<unsigned char>(byte));
            }
        }
        text.remove_prefix(next.bytes);
    }
    return out;
}

std::size_t display_width(std::string_view text) {
    if (is_plain_ascii(text)) return text.size();
    std::size_t width = 0;
    while (!text.empty()) {
        const character next = first_character(text);
        width += columns_of(next.number);
        text.remove_prefix(next.bytes);
    }
    return width;
}

std::string cut_to_width(std::string_view text, std::size_t width) {
    if (display_width(text) <= width) return std::string(text);
    std::size_t kept = 0;
    std::size_t used = 1;  // of the ellipsis
    while (kept < text.size()) {
        const character next = first_character(text.substr(kept));
        if (used + columns_of(next.number) > width) break;
        used += columns_of(next.number);
        kept += next.bytes;
    }
    return std::string(text.substr(0, kept)) + "\u2026";
}

}  // namespace beam_schedule
