// What both translation units of the program do with the library. Included behind all headers, in either order.
#pragma once

#include <string>

/// Must come out the same in both units: values, and the places of objects that the whole program shares.
struct answers {
    double deflection = 0;
    double discrepancy = 0;
    std::string text;
    const void* metre = nullptr;
    const void* left = nullptr;
    const void* version = nullptr;
    const void* parse = nullptr;

    friend bool operator==(const answers&, const answers&) = default;
};

inline answers answers_of_this_unit() {
    using namespace sagitta;
    using namespace sagitta::units;
    const auto joist = simple_beam(7.2 * m, 210.0 * GPa * 8356.0 * cm4);
    const auto line = joist.under(uniform_load(4.5 * kN / m) + point_load(22.0 * kN, at(3.0 * m)));
    const auto worst = greatest_deflection(line);
    return {worst.value / mm,
            cross_check(line).greatest(),
            fmt::format("{:.1f mm}", worst.value),
            &units::m,
            &end::left,
            &sagitta::library_version,
            reinterpret_cast<const void*>(&parse<dimension::length>)};
}

answers answers_in_order();
answers answers_in_reverse();
