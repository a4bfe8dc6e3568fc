// The version of the library: the one place where it is written (CMake reads it from here).
#pragma once

#include <compare>

#define SAGITTA_VERSION_MAJOR 0
#define SAGITTA_VERSION_MINOR 1
#define SAGITTA_VERSION_PATCH 0

namespace sagitta {

/// The version as numbers, for comparison in code.
struct version_number {
    int major_part;
    int minor_part;
    int patch_part;
    friend constexpr auto operator<=>(const version_number&, const version_number&) = default;
};

inline constexpr version_number library_version{SAGITTA_VERSION_MAJOR, SAGITTA_VERSION_MINOR, SAGITTA_VERSION_PATCH};

}  // namespace sagitta
