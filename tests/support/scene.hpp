// Loads as plain data, from which both a load_list of the library and the loads of the reference are made.
#pragma once

#include "reference.hpp"

#include <sagitta/core.hpp>

#include <algorithm>
#include <cstdint>
#include <random>
#include <string>
#include <vector>

namespace scene {

enum class kind {
    point,
    couple,
    uniform,
    partial_uniform,
    linear_whole,
    linear,
    settlement_left,
    settlement_right,
    rotation_left,
    rotation_right,
    curvature,
    partial_curvature,
    kink,
    offset
};

inline bool is_concentrated(kind what) {
    return what == kind::point || what == kind::couple || what == kind::kink || what == kind::offset;
}

struct load {
    kind what;
    double size = 0;
    double size_to = 0;  // linear loads
    double from = 0;     // place of concentrated loads
    double to = 0;
};

inline std::string text(const load& l) {
    const char* const names[] = {"point",         "couple",         "uniform",         "partial uniform",
                                 "linear whole",  "linear",         "settlement left", "settlement right",
                                 "rotation left", "rotation right", "curvature",       "partial curvature",
                                 "kink",          "offset"};
    return std::string(names[static_cast<int>(l.what)]) + " " + std::to_string(l.size) + ", " +
           std::to_string(l.size_to) + " from " + std::to_string(l.from) + " to " + std::to_string(l.to);
}

inline bool can_act(const load& l, reference::hold left, reference::hold right) {
    switch (l.what) {
        case kind::settlement_left:
            return against_deflection(left);
        case kind::settlement_right:
            return against_deflection(right);
        case kind::rotation_left:
            return against_rotation(left);
        case kind::rotation_right:
            return against_rotation(right);
        default:
            return true;
    }
}

template <class T>
void add(sagitta::load_list<T>& list, const load& l) {
    const T size = static_cast<T>(l.size), size_to = static_cast<T>(l.size_to);
    const T from = static_cast<T>(l.from), to = static_cast<T>(l.to);
    using namespace sagitta;
    using namespace sagitta::units;
    switch (l.what) {
        case kind::point:
            list += point_load(size * N, at(from * m));
            return;
        case kind::couple:
            list += applied_couple(size * N * m, at(from * m));
            return;
        case kind::uniform:
            list += uniform_load(size * N / m);
            return;
        case kind::partial_uniform:
            list += partial_uniform_load(size * N / m, between(from * m, to * m));
            return;
        case kind::linear_whole:
            list += linear_load(size * N / m, size_to * N / m);
            return;
        case kind::linear:
            list += linear_load(size * N / m, size_to * N / m, between(from * m, to * m));
            return;
        case kind::settlement_left:
            list += settlement(end::left, size * m);
            return;
        case kind::settlement_right:
            list += settlement(end::right, size * m);
            return;
        case kind::rotation_left:
            list += support_rotation(end::left, size * rad);
            return;
        case kind::rotation_right:
            list += support_rotation(end::right, size * rad);
            return;
        case kind::curvature:
            list += imposed_curvature(size / m);
            return;
        case kind::partial_curvature:
            list += imposed_curvature(size / m, between(from * m, to * m));
            return;
        case kind::kink:
            list += imposed_kink(size * rad, at(from * m));
            return;
        case kind::offset:
            list += imposed_offset(size * m, at(from * m));
            return;
    }
}

template <class T = double>
sagitta::load_list<T> list_of(const std::vector<load>& all) {
    sagitta::load_list<T> list;
    for (const auto& l : all) add(list, l);
    return list;
}

template <class T>
reference::beam<T> reference_of(reference::hold left, reference::hold right, double L, double EI,
                                const std::vector<load>& all) {
    reference::beam<T> b(left, right, L, EI);
    for (const auto& l : all) {
        switch (l.what) {
            case kind::point:
                b.add_force(l.size, l.from);
                break;
            case kind::couple:
                b.add_couple(l.size, l.from);
                break;
            case kind::uniform:
                b.add_line(l.size, l.size, 0, L);
                break;
            case kind::partial_uniform:
                b.add_line(l.size, l.size, l.from, l.to);
                break;
            case kind::linear_whole:
                b.add_line(l.size, l.size_to, 0, L);
                break;
            case kind::linear:
                b.add_line(l.size, l.size_to, l.from, l.to);
                break;
            case kind::settlement_left:
            case kind::settlement_right:
                b.add_settlement(l.what == kind::settlement_left, l.size);
                break;
            case kind::rotation_left:
            case kind::rotation_right:
                b.add_rotation(l.what == kind::rotation_left, l.size);
                break;
            case kind::curvature:
                b.add_curvature(l.size, 0, L);
                break;
            case kind::partial_curvature:
                b.add_curvature(l.size, l.from, l.to);
                break;
            case kind::kink:
                b.add_kink(l.size, l.from);
                break;
            case kind::offset:
                b.add_offset(l.size, l.from);
                break;
        }
    }
    b.solve();
    return b;
}

/// The places where loads begin, stand or end, and both ends of the beam.
inline std::vector<double> joints_of(double L, const std::vector<load>& all) {
    std::vector<double> places{0, L};
    for (const auto& l : all) {
        if (is_concentrated(l.what)) places.push_back(l.from);
        if (l.what == kind::partial_uniform || l.what == kind::linear || l.what == kind::partial_curvature) {
            places.push_back(l.from);
            places.push_back(l.to);
        }
    }
    std::sort(places.begin(), places.end());
    return places;
}

/// Calls f(name, beam, left, right) for each way to hold a beam.
template <class F>
void with_each_beam(double span, double rigidity, const F& f) {
    using reference::hold;
    using namespace sagitta;
    const auto L = span * units::m;
    const auto EI = quantity<dimension::flexural_rigidity>::from_value(rigidity);
    f(std::string("simple"), simple_beam(L, EI), hold::pinned, hold::pinned);
    f(std::string("cantilever"), cantilever(L, EI), hold::fixed, hold::free);
    f(std::string("mirrored cantilever"), mirrored(cantilever(L, EI)), hold::free, hold::fixed);
    f(std::string("propped"), propped_cantilever(L, EI), hold::fixed, hold::pinned);
    f(std::string("mirrored propped"), mirrored(propped_cantilever(L, EI)), hold::pinned, hold::fixed);
    f(std::string("fixed"), fixed_beam(L, EI), hold::fixed, hold::fixed);
}
/// The same with those that have an end that slides without turning.
template <class F>
void with_each_beam_and_guided(double span, double rigidity, const F& f) {
    using reference::hold;
    using namespace sagitta;
    const auto L = span * units::m;
    const auto EI = quantity<dimension::flexural_rigidity>::from_value(rigidity);
    with_each_beam(span, rigidity, f);
    f(std::string("guided, pinned"), beam_with_ends<held::guided, held::pinned>(L, EI), hold::guided, hold::pinned);
    f(std::string("pinned, guided"), beam_with_ends<held::pinned, held::guided>(L, EI), hold::pinned, hold::guided);
    f(std::string("guided, fixed"), beam_with_ends<held::guided, held::fixed>(L, EI), hold::guided, hold::fixed);
    f(std::string("fixed, guided"), beam_with_ends<held::fixed, held::guided>(L, EI), hold::fixed, hold::guided);
}

/// Numbers that are the same on every platform; the seed is named where it is used.
class chance {
public:
    explicit chance(std::uint64_t seed) : engine_(seed) {}
    /// From low up to high.
    double in(double low, double high) {
        return low + (high - low) * (static_cast<double>(engine_() >> 11U) * 0x1p-53);
    }
    int whole(int low, int high) { return std::min(high, static_cast<int>(in(low, high + 1))); }
    bool toss() { return in(0, 1) < 0.5; }

private:
    std::mt19937_64 engine_;
};

/// A load of any kind, of either sign, anywhere on a span; the deflections of all kinds are of a like size.
inline load random_load(chance& random, double L, double EI) {
    // A curvature over the whole beam is left out: alone on a fixed beam nothing of it is left but rounding.
    const int number = random.whole(0, 12);
    const auto what = static_cast<kind>(number < 10 ? number : number + 1);
    const double sign = random.toss() ? 1 : -1;
    load l{what};
    switch (what) {
        case kind::point:
            l.size = sign * random.in(1, 10) * EI / L / L / L;
            l.from = random.in(0, L);
            break;
        case kind::couple:
            l.size = sign * random.in(1, 10) * EI / L / L;
            l.from = random.in(0, L);
            break;
        case kind::settlement_left:
        case kind::settlement_right:
        case kind::rotation_left:
        case kind::rotation_right:
            l.size = sign * random.in(0.01, 0.1) * (what >= kind::rotation_left ? 1 : L) / L;
            break;
        case kind::kink:
        case kind::offset:
            l.size = sign * random.in(0.01, 0.1) * (what == kind::offset ? L : 1) / L;
            l.from = random.in(0, L);
            break;
        default: {
            const bool bends = what >= kind::curvature;
            l.size = sign * random.in(1, 10) / L / L * (bends ? 0.1 : EI / L / L);
            l.size_to = random.in(-10, 10) * EI / L / L / L / L;
            const double a = random.in(0, L);
            const double b = random.in(0, L);
            l.from = std::min(a, b);
            l.to = std::max(a, b);
            break;
        }
    }
    return l;
}

inline std::vector<load> random_loads(chance& random, int count, double L, double EI, reference::hold left,
                                      reference::hold right) {
    std::vector<load> all;
    while (static_cast<int>(all.size()) < count) {
        const auto l = random_load(random, L, EI);
        if (can_act(l, left, right)) all.push_back(l);
    }
    return all;
}

}  // namespace scene
