// A list of load cases whose length is known only at run time.
#pragma once

#include <sagitta/detail/load_case.hpp>

#include <variant>
#include <vector>

namespace sagitta {
namespace load_types {

/// Any one load case, held by value.
template <class T>
using any_load =
    std::variant<concentrated<action::point_force, T>, concentrated<action::couple, T>, concentrated<action::kink, T>,
                 concentrated<action::offset, T>, uniform<T, whole_beam>, uniform<T, stretch<T>>, linear<T, whole_beam>,
                 linear<T, stretch<T>>, movement<end::left_end, motion::settlement, T>,
                 movement<end::right_end, motion::settlement, T>, movement<end::left_end, motion::rotation, T>,
                 movement<end::right_end, motion::rotation, T>, imposed_curvature<T, whole_beam>,
                 imposed_curvature<T, stretch<T>>>;

}  // namespace load_types

/// Load cases acting together, their number known at run time. The same vector space as the compositions of
/// load.hpp: += - * / and beam.under(list).
template <class T = double>
class load_list {
public:
    using number = T;

    load_list() = default;

    /// A list that starts with a load case or a composition of them.
    template <load_types::load_expression L>
    load_list(const L& load) {  // NOLINT(google-explicit-constructor): so that lists and compositions add up
        *this += load;
    }

    /// Adds a load case, a composition of them, or another list.
    template <load_types::load_expression L>
    load_list& operator+=(const L& load) {
        std::apply([this](const auto&... single) { (cases_.emplace_back(single), ...); }, load_types::cases_of(load));
        return *this;
    }
    load_list& operator+=(const load_list& other) {
        if (this == &other) return *this *= T(2);
        cases_.insert(cases_.end(), other.cases_.begin(), other.cases_.end());
        return *this;
    }
    load_list& operator-=(const load_list& other) { return *this += other * T(-1); }
    load_list& operator*=(const T& factor) {
        detail::require_load_factor(factor);
        for (auto& any : cases_) {
            std::visit([&](auto& single) { single = single.scaled(factor); }, any);
        }
        return *this;
    }
    load_list& operator/=(const T& divisor) { return *this *= T(1) / divisor; }

    [[nodiscard]] friend load_list operator+(load_list a, const load_list& b) { return a += b; }
    [[nodiscard]] friend load_list operator-(load_list a, const load_list& b) { return a -= b; }
    [[nodiscard]] friend load_list operator-(load_list list) { return list *= T(-1); }
    [[nodiscard]] friend load_list operator*(load_list list, const T& factor) { return list *= factor; }
    [[nodiscard]] friend load_list operator*(const T& factor, load_list list) { return list *= factor; }
    [[nodiscard]] friend load_list operator/(load_list list, const T& divisor) { return list /= divisor; }

    template <load_types::not_a_load X>
    load_list& operator+=(const X&) {
        load_types::expect_load_to_add<X>();
        return *this;
    }
    template <load_types::not_a_load X>
    load_list& operator-=(const X&) {
        load_types::expect_load_to_subtract<X>();
        return *this;
    }
    template <load_types::not_a_number X>
    load_list& operator*=(const X&) {
        load_types::expect_factor<X>();
        return *this;
    }
    template <load_types::not_a_number X>
    load_list& operator/=(const X&) {
        load_types::expect_divisor<X>();
        return *this;
    }
    template <load_types::not_a_load X>
    friend load_list operator+(load_list list, const X& x) {
        return list += x;
    }
    template <load_types::not_a_load X>
    friend load_list operator-(load_list list, const X& x) {
        return list -= x;
    }
    template <load_types::not_a_number X>
    friend load_list operator*(load_list list, const X& x) {
        return list *= x;
    }
    template <load_types::not_a_number X>
    friend load_list operator/(load_list list, const X& x) {
        return list /= x;
    }

    [[nodiscard]] const std::vector<load_types::any_load<T>>& cases() const { return cases_; }
    void reserve(std::size_t count) { cases_.reserve(count); }
    void clear() { cases_.clear(); }

private:
    std::vector<load_types::any_load<T>> cases_;
};

template <load_types::load_expression L>
load_list(const L&) -> load_list<typename L::number>;

template <class T>
inline constexpr bool load_types::is_loads<load_list<T>> = true;

}  // namespace sagitta
