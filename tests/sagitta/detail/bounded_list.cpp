// A list without allocation.
#include <sagitta/detail/bounded_list.hpp>

#include <doctest/doctest.h>

#include <numeric>
#include <type_traits>

using sagitta::detail::bounded_list;

TEST_CASE("what is pushed is there, in order, up to the capacity") {
    bounded_list<int, 3> list;
    CHECK(list.empty());
    CHECK(list.size() == 0);
    CHECK(list.begin() == list.end());
    list.push_back(7);
    CHECK(list.front() == 7);
    CHECK(list.back() == 7);
    list.push_back(8);
    list.push_back(9);
    CHECK(list.size() == 3);
    CHECK(list.front() == 7);
    CHECK(list[1] == 8);
    CHECK(list.back() == 9);
    list.back() = 10;
    list[0] = 6;
    CHECK(std::accumulate(list.begin(), list.end(), 0) == 24);
    const auto copy = list;
    list[1] = 0;
    CHECK(copy[1] == 8);
}

TEST_CASE("filled when compiling") {
    constexpr auto squares = [] {
        bounded_list<int, 8> list;
        for (int i = 1; i <= 5; ++i) list.push_back(i * i);
        return list;
    }();
    static_assert(squares.size() == 5 && squares.back() == 25 && !squares.empty());
    static_assert(std::is_same_v<decltype(squares)::value_type, int>);
}
