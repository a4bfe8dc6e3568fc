// The equations of the nodes of a continuous beam between the states of the parts that meet there, in pure numbers.
#pragma once

#include <sagitta/detail/banded_system.hpp>

#include <array>
#include <cstddef>
#include <limits>
#include <vector>

namespace sagitta::detail {

/// Deflection, turn, moment and shear.
inline constexpr std::size_t entries_of_state = 4;

/// One entry of the state at an end of a part, by the unknowns of that part.
template <class T>
struct state_entry {
    std::size_t part;
    std::array<T, entries_of_state> of{};
    T constant = T(0);
};

template <class T>
struct state_entries {
    state_entry<T> deflection, turn, moment, shear;
};

/// One equation at a time: what is added to it makes zero. The equations of a node come together, and the nodes in the
/// order of the parts.
template <class T>
class node_equations {
public:
    explicit node_equations(std::size_t parts) : equations_(entries_of_state * parts), unknowns_of_(parts) {}

    node_equations& add(const T& factor, const state_entry<T>& e) {
        for (std::size_t k = 0; k < entries_of_state; ++k) {
            equations_(row_, entries_of_state * e.part + k) += factor * e.of[k];
        }
        return add(factor * e.constant);
    }
    node_equations& add(const T& known) {
        equations_.right_hand_side(row_) -= known;
        return *this;
    }
    void next() { ++row_; }

    /// The unknowns of every part; not-a-number where the equations do not determine them.
    [[nodiscard]] std::vector<std::array<T, entries_of_state>> solve() {
        std::vector<T> all;
        if (equations_.solve(all) < entries_of_state * unknowns_of_) {
            all.assign(entries_of_state * unknowns_of_, std::numeric_limits<T>::quiet_NaN());
        }
        std::vector<std::array<T, entries_of_state>> by_part(unknowns_of_);
        for (std::size_t i = 0; i < all.size(); ++i) by_part[i / entries_of_state][i % entries_of_state] = all[i];
        return by_part;
    }

private:
    // An equation of a node and an unknown of a part that meets it are never further apart.
    static constexpr std::size_t reach = 5;

    banded_system<T, reach> equations_;
    std::size_t unknowns_of_;
    std::size_t row_ = 0;
};

/// force = stiffness (movement - imposed), divided by the greater of 1 and the stiffness.
template <class T>
struct spring_law {
    T movement, force;  // their coefficients

    /// The stiffness (infinite: rigid) times the unit that makes it a pure number.
    static spring_law of(const T& stiffness, const T& unit) {
        if (stiffness > std::numeric_limits<T>::max()) return {T(1), T(0)};
        const T k = stiffness * unit;
        return k > T(1) ? spring_law{T(1), T(1) / k} : spring_law{k, T(1)};
    }
};

}  // namespace sagitta::detail
