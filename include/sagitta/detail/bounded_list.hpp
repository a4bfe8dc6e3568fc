// A list whose capacity is known when compiling, for results that must not allocate.
#pragma once

#include <array>
#include <cstddef>

namespace sagitta::detail {

/// At most Capacity values. The interface is the part of std::vector that results need.
template <class Value, std::size_t Capacity>
class bounded_list {
public:
    using value_type = Value;

    constexpr void push_back(const Value& value) { values_[size_++] = value; }
    [[nodiscard]] constexpr std::size_t size() const { return size_; }
    [[nodiscard]] constexpr bool empty() const { return size_ == 0; }
    [[nodiscard]] constexpr const Value& operator[](std::size_t i) const { return values_[i]; }
    [[nodiscard]] constexpr Value& operator[](std::size_t i) { return values_[i]; }
    [[nodiscard]] constexpr const Value& front() const { return values_[0]; }
    [[nodiscard]] constexpr const Value& back() const { return values_[size_ - 1]; }
    [[nodiscard]] constexpr Value& back() { return values_[size_ - 1]; }
    [[nodiscard]] constexpr const Value* begin() const { return values_.data(); }
    [[nodiscard]] constexpr const Value* end() const { return values_.data() + size_; }

private:
    std::array<Value, Capacity> values_{};
    std::size_t size_ = 0;
};

}  // namespace sagitta::detail
