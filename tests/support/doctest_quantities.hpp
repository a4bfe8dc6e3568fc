// Lets doctest print quantities with their usual unit instead of as bytes.
#pragma once

#include <sagitta/format.hpp>

#include <doctest/doctest.h>

namespace doctest {

template <class Unit, class T>
struct StringMaker<boost::units::quantity<Unit, T>> {
    static String convert(const boost::units::quantity<Unit, T>& q) { return fmt::format("{:.17g}", q).c_str(); }
};

}  // namespace doctest
