// Loads that move together over a beam, and the position in which they do most.
//
//     const auto lorry = load_train({{60.0*kN, 0.0*m}, {120.0*kN, 3.6*m}, {120.0*kN, 4.9*m}});
//     const auto worst = extremes_of_train(influence_of_moment(bridge, 9.0*m), lorry);
//     worst.greatest.value; worst.greatest.at;     // the moment, and where the origin of the train stands then
#pragma once

#include <sagitta/detail/expect.hpp>
#include <sagitta/detail/polynomial.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/extremes.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/piecewise.hpp>
#include <sagitta/units.hpp>

#include <algorithm>
#include <cstddef>
#include <initializer_list>
#include <limits>
#include <vector>

namespace sagitta {

/// One load of a train: a force (downward positive), and its place in the train: a length from the origin of the train,
/// to the right positive.
template <class T = double>
struct axle {
    quantity<dimension::force, T> force;
    quantity<dimension::length, T> place;
};

/// Point loads at fixed distances from each other.
template <class T = double>
class load_train {
public:
    using number = typename detail::in_order<T>::number;

    /// Throws invalid_input where a force or place is not finite, or there is no load.
    explicit load_train(const std::vector<axle<T>>& axles) : axles_(axles) {
        if (axles_.empty()) [[unlikely]]
            detail::refuse("load_train: number of axles", T(0), "must be greater than 0");
        for (const auto& each : axles_) {
            detail::require_finite("load_train: force", each.force);
            detail::require_finite("load_train: place", each.place);
        }
    }
    load_train(std::initializer_list<axle<T>> axles) : load_train(std::vector<axle<T>>(axles)) {}

    [[nodiscard]] const std::vector<axle<T>>& axles() const { return axles_; }

    /// The same train driving the other way: its loads in mirror image about the origin.
    [[nodiscard]] load_train turned_round() const {
        auto all = axles_;
        for (auto& each : all) each.place = -each.place;
        return load_train(all);
    }

    /// The loads that stand on a beam of a span L while the origin of the train is at x (lengths): those beyond either
    /// end are left out. What is beyond an end by rounding only stands right over it.
    template <class X, class L>
    [[nodiscard]] load_list<T> standing_at(const X& x, const L& span) const {
        const auto origin = detail::expect_length<T>(x);
        const auto end_of_beam = detail::expect_length<T>(span);
        load_list<T> loads;
        for (const auto& each : axles_) {
            auto place = place_near(origin, each, quantity<dimension::length, T>{});
            if (place.value() != T(0)) place = place_near(origin, each, end_of_beam);
            if (place.value() >= T(0) && place <= end_of_beam) loads += point_load(each.force, at(place));
        }
        return loads;
    }

    /// Where a load of the train stands while its origin is at x: right at a mark (a length) where only rounding lies
    /// between them.
    [[nodiscard]] static quantity<dimension::length, T> place_near(const quantity<dimension::length, T>& x,
                                                                   const axle<T>& load,
                                                                   const quantity<dimension::length, T>& mark) {
        const auto place = x + load.place;
        const auto rounding = (abs(x) + abs(load.place) + abs(mark)) * (T(4) * std::numeric_limits<T>::epsilon());
        return abs(place - mark) <= rounding ? mark : place;
    }

private:
    std::vector<axle<T>> axles_;
};

/// The effect of a train, and where its origin stands then. Where a load of it stands right at a jump of the influence
/// line, the train is just left or just right of that place: effect_of_train(influence, train, at, beside) is value. Of
/// a load right over an end of the beam it is the effect of a load just inside.
template <class Action, class T>
struct train_effect {
    quantity<dimension::length, T> at;
    quantity<Action, T> value;
    side beside;
};

/// The greatest and the least effect (with their signs) of all positions.
template <class Action, class T>
struct train_extremes {
    train_effect<Action, T> greatest;
    train_effect<Action, T> least;

    /// Whichever is greater in magnitude.
    [[nodiscard]] const train_effect<Action, T>& governing() const {
        return abs(least.value) > abs(greatest.value) ? least : greatest;
    }
};

namespace detail {

/// The effect of a train along its way: between two positions at which one of its loads passes a joint of the influence
/// line, a sum of shifted cubics.
template <class Influence>
class train_on_its_way {
    using T = typename Influence::number;
    using cubic = polynomial<T, 3>;

public:
    train_on_its_way(const Influence& influence, const load_train<T>& train) : train_(train) {
        for (const auto& segment : piecewise_form(influence.deflected())) {
            const auto c = segment.deflection_coefficients();
            pieces_.push_back(
                {segment.from().value(),
                 segment.to().value(),
                 {std::get<0>(c).value(), std::get<1>(c).value(), std::get<2>(c).value(), std::get<3>(c).value()}});
        }
    }

    /// The positions at which a load passes a joint, ascending.
    [[nodiscard]] std::vector<T> turning_positions() const {
        std::vector<T> positions;
        positions.reserve(train_.axles().size() * (pieces_.size() + 1));
        for (const auto& axle : train_.axles()) {
            positions.push_back(pieces_.front().from - axle.place.value());
            for (const auto& each : pieces_) positions.push_back(each.to - axle.place.value());
        }
        std::sort(positions.begin(), positions.end());
        return positions;
    }

    /// The effect between two neighbouring ones, in t from 0 to 1.
    [[nodiscard]] cubic between(const T& from, const T& to) const {
        cubic sum;
        const T width = to - from;
        for (const auto& axle : train_.axles()) {
            const T place = axle.place.value();
            const auto* const here = piece_at((from + to) / T(2) + place);
            if (here == nullptr) continue;
            const auto& c = here->c;
            const T s = from + place - here->from;
            const T shifted[] = {c[0] + s * (c[1] + s * (c[2] + s * c[3])),
                                 c[1] + s * (T(2) * c[2] + s * (T(3) * c[3])), c[2] + T(3) * s * c[3], c[3]};
            T power = axle.force.value();
            for (std::size_t k = 0; k < 4; ++k) {
                sum.c[k] += shifted[k] * power;
                power *= width;
            }
        }
        return sum;
    }

private:
    struct piece {
        T from, to;
        std::array<T, 4> c;
    };

    /// None where the place is not on the beam.
    const piece* piece_at(const T& x) const {
        if (x < pieces_.front().from || x > pieces_.back().to) return nullptr;
        const auto behind = std::upper_bound(pieces_.begin(), pieces_.end(), x,
                                             [](const T& place, const piece& p) { return place < p.from; });
        return &*(behind - 1);
    }

    load_train<T> train_;
    std::vector<piece> pieces_;
};

}  // namespace detail

/// The effect of a train whose origin stands at x (a length; loads beyond the beam have none).
template <class Influence, class X>
[[nodiscard]] auto effect_of_train(const Influence& influence, const load_train<typename Influence::number>& train,
                                   const X& x) {
    return influence.effect_of(train.standing_at(x, influence.deflected().supported().span()));
}
/// The same just left or just right of x, which matters where a load stands right at the section of a shear.
template <class Influence, class X>
[[nodiscard]] auto effect_of_train(const Influence& influence, const load_train<typename Influence::number>& train,
                                   const X& x, side beside) {
    using T = typename Influence::number;
    const auto origin = detail::expect_length<T>(x);
    quantity<typename Influence::action_unit, T> sum{};
    const auto span = influence.deflected().supported().span();
    for (const auto& single : train.axles()) {
        const auto mark = [&](const auto& place) { return load_train<T>::place_near(origin, single, place) == place; };
        // Just beside an end of the beam a load is either on it or off it.
        const bool is_off = beside == side::just_left ? mark(quantity<dimension::length, T>{}) : mark(span);
        if (is_off) continue;
        if (mark(influence.section())) {
            sum += influence.ordinate(influence.section(), beside) * single.force;
        } else {
            sum += effect_of_train(influence, load_train<T>{single}, origin);
        }
    }
    return sum;
}

/// The greatest and the least effect of a train over all positions, that before it comes onto the beam (effect 0)
/// included. A train that may drive either way is asked twice, the second time turned_round(). No position is tried
/// that is not a turning point of one of the cubics, or an end of one: none can be missed. Accuracy: that of the
/// influence line; the place as for extremes.
template <class Influence>
[[nodiscard]] auto extremes_of_train(const Influence& influence, const load_train<typename Influence::number>& train) {
    using T = typename Influence::number;
    using effect = train_effect<typename Influence::action_unit, T>;
    const detail::train_on_its_way<Influence> way(influence, train);
    const auto positions = way.turning_positions();
    detail::greatest_of<effect, T> greatest, least;
    const auto offer = [&](const T& x, const T& value, side which, bool turns) {
        const effect found{quantity<dimension::length, T>::from_value(x),
                           quantity<typename Influence::action_unit, T>::from_value(value), which};
        greatest.offer(found, value, turns);
        least.offer(found, -value, turns);
    };
    offer(positions.front(), T(0), just_left, false);
    for (std::size_t i = 1; i < positions.size(); ++i) {
        const T& from = positions[i - 1];
        const T& to = positions[i];
        if (!(from < to)) continue;
        const auto sum = way.between(from, to);
        offer(from, sum(T(0)), just_right, false);
        for (const auto& turning : detail::turning_points(sum)) {
            offer(from + (to - from) * turning.at, sum(turning.at), just_right, true);
        }
        offer(to, sum(T(1)), just_left, false);
    }
    return train_extremes<typename Influence::action_unit, T>{greatest.found(), least.found()};
}

}  // namespace sagitta
