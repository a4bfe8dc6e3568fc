// Whether a continuous beam can move while nothing of it bends. Told from where things are and not from numbers, so
// that rounding has no say in it.
#pragma once

#include <sagitta/detail/node.hpp>

#include <vector>

namespace sagitta::detail {

/// A node that can move freely, or none where the beam is no mechanism. Nodes are in order, one a place, and hinges
/// stand between the ends.
///
/// From hinge to hinge a beam is a rigid bar. Going from left to right, it is enough to know what a bar may still do:
/// two freedoms, to move and turn; one, to turn about a pivot (or, without one, to slide without turning); or none.
template <class T>
const node<T>* loose_node(const std::vector<node<T>>& nodes) {
    int freedoms = 2;
    const node<T>* pivot = nullptr;
    const node<T>* start = &nodes.front();  // of the bar
    for (const node<T>& here : nodes) {
        if (here.turning > T(0)) {  // at an end of the beam
            freedoms = freedoms == 2 || (freedoms == 1 && pivot == nullptr) ? 1 : 0;
            pivot = nullptr;
        }
        if (here.transverse > T(0)) {
            freedoms = freedoms == 2 ? 1 : 0;
            pivot = &here;
        }
        if (here.is_hinge) {
            // The bar turns about a hinge that rests.
            if (freedoms == 2 || (freedoms == 1 && pivot == &here)) return start;
            // The next one turns about the hinge, and moves with it if that can move.
            freedoms += 1;
            pivot = start = &here;
        }
    }
    if (freedoms == 0) return nullptr;
    return freedoms == 2 || pivot == &nodes.back() ? start : &nodes.back();
}

}  // namespace sagitta::detail
