#include <sagitta/version.hpp>

#include <doctest/doctest.h>

// The build hands over the version that CMake read from the header.
TEST_CASE("the version is the one that the package states") {
    CHECK(sagitta::library_version.major_part == SAGITTA_VERSION_MAJOR);
    CHECK(sagitta::library_version >= sagitta::version_number{0, 1, 0});
}
