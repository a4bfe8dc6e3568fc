// Building the sentence of an invalid_input. Kept out of line and cold: the checks stay cheap.
#pragma once

#include <sagitta/invalid_input.hpp>
#include <sagitta/units.hpp>

#include <array>
#include <charconv>
#include <string>

namespace sagitta::detail {

template <class Dimension>
inline constexpr const char* coherent_symbol = "";
template <>
inline constexpr const char* coherent_symbol<length> = " m";
template <>
inline constexpr const char* coherent_symbol<plane_angle> = " rad";
template <>
inline constexpr const char* coherent_symbol<force> = " N";
template <>
inline constexpr const char* coherent_symbol<moment> = " N*m";
template <>
inline constexpr const char* coherent_symbol<line_load> = " N/m";
template <>
inline constexpr const char* coherent_symbol<flexural_rigidity> = " N*m^2";

template <class T>
std::string number_text(const T& number) {
    std::array<char, 40> text{};
    const auto end = std::to_chars(text.data(), text.data() + text.size(), static_cast<double>(number),
                                   std::chars_format::general, 9);
    return {text.data(), end.ptr};
}

template <class Dimension, class T>
std::string with_unit(const quantity<Dimension, T>& q) {
    return number_text(q.value()) + coherent_symbol<Dimension>;
}

template <class T>
requires number_type<T> std::string with_unit(const T& number) { return number_text(number); }

/// Throws "<argument> = <value> <bound><limit>", for instance "span = -1 m must be greater than 0".
template <class Value>
[[noreturn, gnu::cold, gnu::noinline]] void refuse(const char* argument, const Value& value, const char* bound) {
    throw invalid_input(std::string(argument) + " = " + with_unit(value) + " " + bound);
}
template <class Value, class Limit>
[[noreturn, gnu::cold, gnu::noinline]] void refuse(const char* argument, const Value& value, const char* bound,
                                                   const Limit& limit) {
    throw invalid_input(std::string(argument) + " = " + with_unit(value) + " " + bound + with_unit(limit));
}

/// Neither infinite nor not-a-number.
template <class T>
constexpr bool is_finite(const T& x) {
    return x - x == T(0);
}

template <class Dimension, class T>
constexpr void require_finite(const char* argument, const quantity<Dimension, T>& q) {
    if (!is_finite(q.value())) [[unlikely]]
        refuse(argument, q, "must be a finite number");
}

}  // namespace sagitta::detail
