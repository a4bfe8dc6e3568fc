// What a user's first program does: a deflection, printed. The build hands over the version that it was promised.
#include <sagitta/sagitta.hpp>

using namespace sagitta;
using namespace sagitta::units;

int main() {
    constexpr auto joist = simple_beam(7.2 * m, 210.0 * GPa * 8356.0 * cm4);
    fmt::print("{:.2f mm}\n", joist.under(uniform_load(4.5 * kN / m)).deflection(3.6 * m));

    const auto of_header =
        fmt::format("{}.{}.{}", library_version.major_part, library_version.minor_part, library_version.patch_part);
    if (of_header == PROMISED_VERSION) return 0;
    fmt::print("version.hpp says {}, the build says {}\n", of_header, PROMISED_VERSION);
    return 1;
}
