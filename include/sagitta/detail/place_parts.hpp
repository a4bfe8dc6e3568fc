// Where the parts of a continuous beam come to lie: compatibility and equilibrium at its nodes, solved in one system.
#pragma once

#include <sagitta/detail/banded_system.hpp>
#include <sagitta/detail/beam_part.hpp>
#include <sagitta/detail/mechanism.hpp>
#include <sagitta/detail/node.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/units.hpp>

#include <cstddef>
#include <limits>
#include <vector>

namespace sagitta::detail {

/// Places every part and returns the moments at the nodes; invalid_input where the beam is a mechanism, or so near to
/// one that nothing but rounding would be left.
///
/// Two unknowns a node, its moment and the deflection of the part right of it (at the last node, left of it: offsets
/// may lie between a part and the node), and two equations: the sections left and right of it turn alike, and forces
/// balance. Two more a part, the tilt of its chord and the shear at its left end: written out as
/// equations of their own, so that differences of deflections and of moments keep coefficients that are exact (a beam
/// on soft springs moves far more than it bends, and under couples its shear may be a millionth of what they are
/// apart). Scaled to a mean span and the first EI, so that every coefficient is near 1 and any stiffness k from 0 to
/// infinite enters as k/(1 + k) and 1/(1 + k).
template <class T>
std::vector<quantity<moment, T>> place_parts(const std::vector<node<T>>& nodes, std::vector<beam_part<T>>& parts) {
    if (const node<T>* const loose = loose_node(nodes)) [[unlikely]]
        refuse("continuous_beam: the place", loose->at, "can move freely: the beam is a mechanism");
    const std::size_t count = nodes.size();
    const T L0 = nodes.back().at.value() / T(static_cast<double>(parts.size()));
    const T EI0 = parts.front().EI().value();
    // Nothing is computed with an infinite stiffness: inf * 0 would spoil what a number carries besides its value.
    const auto is_rigid = [](const T& k) { return k > std::numeric_limits<T>::max(); };
    const auto stiff = [&](const T& k) {
        if (is_rigid(k)) return T(1);
        return k > T(1) ? T(1) / (T(1) + T(1) / k) : k / (T(1) + k);
    };
    const auto soft = [&](const T& k) { return is_rigid(k) ? T(0) : T(1) / (T(1) + k); };
    const auto scaled = [&](const T& k, const T& unit) { return is_rigid(k) ? k : k * unit; };
    const auto M = [](std::size_t i) { return 4 * i; };
    const auto v = [](std::size_t i) { return 4 * i + 1; };
    const auto tilt = [](std::size_t part_number) { return 4 * part_number + 2; };
    const auto V = [](std::size_t part_number) { return 4 * part_number + 3; };
    banded_system<T, 4> equations(4 * count - 2);

    // How much lower a node is than the part whose deflection is its unknown. A beam may be far from what holds it and
    // bend little: what is asked for is where the beam is.
    const auto below_part = [&](std::size_t i) {
        const auto gap = i < parts.size() ? -parts[i].offset_at_left_end() : parts.back().offset_at_right_end();
        return gap.value();
    };
    std::vector<T> turning_weight(count, T(1)), balance_weight(count, T(1));
    for (std::size_t i = 0; i < count; ++i) {
        const node<T>& here = nodes[i];
        const bool at_end = i == 0 || i + 1 == count;
        const T k_turning = scaled(here.turning, L0 / EI0);
        const T k_transverse = scaled(here.transverse, L0 * L0 * L0 / EI0);
        balance_weight[i] = soft(k_transverse);
        equations(v(i), v(i)) = -stiff(k_transverse);
        equations.right_hand_side(v(i)) = -stiff(k_transverse) * (here.settled - below_part(i)) / L0;
        if (here.is_hinge || (at_end && here.turning == T(0))) {
            turning_weight[i] = T(0);
            equations(M(i), M(i)) = T(1);
            equations.right_hand_side(M(i)) = here.passed * L0 / EI0;
        } else if (at_end) {
            // A spring resists with the moment -k (turn - imposed) at the left end, with +k at the right one.
            turning_weight[i] = stiff(k_turning);
            equations(M(i), M(i)) = -soft(k_turning);
            equations.right_hand_side(M(i)) = (i == 0 ? -turning_weight[i] : turning_weight[i]) * here.turned;
        }
    }
    std::vector<T> powers;
    powers.reserve(parts.size());
    for (std::size_t i = 0; i < parts.size(); ++i) {
        const beam_part<T>& p = parts[i];
        const auto loaded = p.simply_supported();
        const T L = p.span().value() / L0;
        const T bend = EI0 / p.EI().value() * L;
        const T slide = p.shear_flexibility().value() * EI0 / (L0 * L0);
        const T load_turn = p.shear_turn().value();
        // Tilt and shear are counted in units of 1/power, so that a short part has coefficients near 1 as well.
        const T power = power_of_two_below(L);
        equations(tilt(i), v(i + 1)) = T(1);
        equations(tilt(i), v(i)) = T(-1);
        equations(tilt(i), tilt(i)) = -L / power;
        equations.right_hand_side(tilt(i)) = i + 1 < parts.size() ? -below_part(i + 1) / L0 : T(0);
        equations(V(i), M(i + 1)) = T(1);
        equations(V(i), M(i)) = T(-1);
        equations(V(i), V(i)) = -L / power;
        equations.right_hand_side(V(i)) = (p.couples_of_loads() - p.moment_of_forces()).value() * L0 / EI0;
        powers.push_back(power);
        // One end of the part at a time: sign is 1 for its left end, -1 for its right end.
        const auto join = [&](std::size_t near, std::size_t far, int sign, const T& slope, const T& force) {
            // The turn of the section, equal on both sides of the node.
            const T w = T(-sign) * turning_weight[near];
            equations(M(near), M(near)) += w * T(sign) * bend / T(3);
            equations(M(near), M(far)) += w * T(sign) * bend / T(6);
            equations(M(near), V(i)) -= w * slide / power;
            equations(M(near), tilt(i)) += w / power;
            equations.right_hand_side(M(near)) -= w * (slope + load_turn);
            // What the part rests on the node with.
            const T b = balance_weight[near];
            equations(v(near), V(i)) += T(sign) * b / power;
            equations.right_hand_side(v(near)) -= b * force * L0 * L0 / EI0;
        };
        // A kink that stands right at a node lies between the slope of the node and that of the part.
        const quantity<length, T> start{};
        join(i, i + 1, 1, loaded.slope(start, just_left).value(), p.force_at_left_end().value());
        join(i + 1, i, -1, loaded.slope(p.span(), just_right).value(), p.force_of_loads().value());
    }

    std::vector<T> unknowns;
    const std::size_t free_unknown = equations.solve(unknowns);
    if (free_unknown < 4 * count - 2) [[unlikely]]
        refuse("continuous_beam: the place", nodes[free_unknown / 4].at,
               "gives way so much more than the rest that the beam cannot be told from a mechanism");
    // What is known beforehand is exact: the moment in a hinge, the movement of a rigid support.
    std::vector<quantity<moment, T>> node_moments;
    for (std::size_t i = 0; i < count; ++i) {
        const bool is_known = turning_weight[i] == T(0);
        node_moments.push_back(quantity<moment, T>::from_value(is_known ? nodes[i].passed : unknowns[M(i)] * EI0 / L0));
    }
    const auto moved = [&](std::size_t i, const T& of_node, const T& of_unknown) {
        const bool is_known = balance_weight[i] == T(0);
        return quantity<length, T>::from_value(is_known ? nodes[i].settled + of_node
                                                        : unknowns[v(i)] * L0 + of_unknown);
    };
    for (std::size_t i = 0; i < parts.size(); ++i) {
        const T tilted = unknowns[tilt(i)] / powers[i];
        const T shear = unknowns[V(i)] / powers[i] * EI0 / (L0 * L0);
        const bool is_last = i + 1 == parts.size();
        const T below = below_part(i + 1);
        parts[i].place(node_moments[i], node_moments[i + 1], moved(i, -below_part(i), T(0)),
                       is_last ? moved(i + 1, -below, T(0)) : moved(i + 1, T(0), below),
                       quantity<plane_angle, T>::from_value(tilted), quantity<force, T>::from_value(shear));
    }
    return node_moments;
}

}  // namespace sagitta::detail
