// A part of a longer beam between two neighbouring nodes: a simple beam under its share of the loads, whose ends
// carry moments and move. End moments are couples on it; how its ends have moved is a straight line.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/detail/end_state.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>

#include <algorithm>
#include <optional>
#include <vector>

namespace sagitta::detail {

template <class T>
class beam_part {
public:
    using simple = prismatic_beam<held::pinned, held::pinned, T>;
    using couple = load_types::concentrated<load_types::action::couple, T>;
    using inverse_force = typename boost::units::divide_typeof_helper<dimensionless, force>::type;

    beam_part(const quantity<length, T>& from, const quantity<length, T>& to, const quantity<flexural_rigidity, T>& EI,
              const quantity<inverse_force, T>& shear_flexibility)
        : from_(from), to_(to), beam_(to - from, EI), shear_flexibility_(shear_flexibility) {}

    [[nodiscard]] const quantity<length, T>& from() const { return from_; }
    [[nodiscard]] const quantity<length, T>& to() const { return to_; }
    [[nodiscard]] quantity<length, T> span() const { return beam_.span(); }
    [[nodiscard]] const quantity<flexural_rigidity, T>& EI() const { return beam_.EI(); }
    [[nodiscard]] const quantity<inverse_force, T>& shear_flexibility() const { return shear_flexibility_; }

    // Loads that act on this part, in coordinates of the whole beam; stretches are cut to the part.

    template <load_types::action Action, class N>
    void add(const load_types::concentrated<Action, N>& load) {
        const auto place = load_types::position<T>{coherent<length, T>(load.at()) - from_};
        const auto size = coherent<typename load_types::concentrated<Action, N>::unit, T>(load.size());
        if constexpr (Action == load_types::action::offset) {
            // At an end the whole part is lower than what holds it, and nothing is bent.
            const bool is_left = !(place.x > quantity<length, T>{});
            if (is_left || !(place.x < span())) {
                (is_left ? offset_at_left_end_ : offset_at_right_end_) += size;
                return;
            }
        }
        loads_ += load_types::concentrated<Action, T>(size, place);
        if constexpr (Action == load_types::action::couple) {
            couples_.push_back({place.x, size});
        } else if constexpr (Action == load_types::action::point_force) {
            // What stands right at the left end goes into the node.
            if (place.x > quantity<length, T>{}) {
                add_resultant(size, span() - place.x);
            } else {
                force_at_left_end_ += size;
            }
        }
    }
    template <class Load>
    requires requires { Load::is_uniform; }
    void add(const Load& load) {
        const auto w_from = coherent<line_load, T>(load.size_from());
        const auto w_to = coherent<line_load, T>(load.size_to());
        const auto a = coherent<length, T>(load.where().from);
        const auto b = coherent<length, T>(load.where().to);
        const auto from = std::max(a, from_);
        const auto to = std::min(b, to_);
        if (!(from < to)) return;
        const auto w_at = [&](const quantity<length, T>& x) -> quantity<line_load, T> {
            if (x == a) return w_from;
            if (x == b) return w_to;
            return w_from + (w_to - w_from) * ((x - a) / (b - a));
        };
        const load_types::stretch<T> where{from - from_, to - from_};
        if constexpr (Load::is_uniform) {
            loads_ += load_types::uniform<T, load_types::stretch<T>>(w_from, where);
        } else {
            loads_ += load_types::linear<T, load_types::stretch<T>>(w_at(from), w_at(to), where);
        }
        // As two triangles.
        const auto width = to - from;
        const auto beyond = to_ - to;
        add_resultant(w_at(from) * width / T(2), beyond + width * (T(2) / T(3)));
        add_resultant((Load::is_uniform ? w_from : w_at(to)) * width / T(2), beyond + width / T(3));
    }
    template <class N, class Where>
    void add(const load_types::imposed_curvature<N, Where>& load) {
        const auto from = std::max(coherent<length, T>(load.where().from), from_);
        const auto to = std::min(coherent<length, T>(load.where().to), to_);
        if (!(from < to)) return;
        loads_ += load_types::imposed_curvature<T, load_types::stretch<T>>(coherent<curvature, T>(load.size()),
                                                                           {from - from_, to - from_});
    }

    /// The part as a simple beam under its loads alone.
    [[nodiscard]] auto simply_supported() const { return beam_.under(loads_); }

    /// The forces right at its left end; all the others, and their moment about its right end.
    [[nodiscard]] const quantity<force, T>& force_at_left_end() const { return force_at_left_end_; }
    [[nodiscard]] const quantity<force, T>& force_of_loads() const { return force_of_loads_; }
    [[nodiscard]] const quantity<moment, T>& moment_of_forces() const { return moment_of_forces_; }
    /// Offsets right at its ends: how much lower it is than the node left of it, and the node right of it than it.
    [[nodiscard]] const quantity<length, T>& offset_at_left_end() const { return offset_at_left_end_; }
    [[nodiscard]] const quantity<length, T>& offset_at_right_end() const { return offset_at_right_end_; }
    [[nodiscard]] quantity<moment, T> couples_of_loads() const { return sum_of_couples(span(), side::just_right); }

    /// What shear adds to the turning of a section: how much less the mean shear is than that at the left end.
    [[nodiscard]] quantity<plane_angle, T> shear_turn() const { return as_angle(shear_drop() * shear_flexibility_); }

    /// Fixes the part in the whole beam: sagging moments at its ends and how far these have moved down, offsets
    /// included; and, as solved for and not as a difference of those, the tilt of its chord and the shear at its left
    /// end, behind the loads that stand right there.
    void place(const quantity<moment, T>& M_left, const quantity<moment, T>& M_right, const quantity<length, T>& v_left,
               const quantity<length, T>& v_right, const quantity<plane_angle, T>& tilt,
               const quantity<force, T>& shear) {
        loaded_.emplace(beam_, loads_);
        bent_.emplace(beam_, couple(M_left, {quantity<length, T>{}}) + couple(-M_right, {span()}));
        M_left_ = M_left;
        v_left_ = v_left;
        v_right_ = v_right;
        tilt_ = tilt;
        shear_ = shear;
    }

    /// A response at x of the whole beam. At the ends of the part moment and shear are those inside it; outside it
    /// deflections are those of the nodes.
    template <response R>
    [[nodiscard]] response_quantity<R, T> at(const quantity<length, T>& x, side which) const {
        const auto s = std::min(x - from_, span());
        const auto& loaded = *loaded_;
        const auto& bent = *bent_;
        if constexpr (R == response::deflection) {
            if (which == side::just_left && !(s > quantity<length, T>{})) return v_left_ - offset_at_left_end_;
            if (which == side::just_right && !(s < span())) return v_right_ + offset_at_right_end_;
            const auto chord = v_left_ * ((span() - s) / span()) + v_right_ * (s / span());
            return chord + (loaded.deflection(s, which) + bent.deflection(s) + shear_deflection(s));
        } else if constexpr (R == response::slope) {
            const auto sliding = shear_gained(s, which) + shear_drop();
            return tilt_ + (loaded.slope(s, which) + bent.slope(s) + as_angle(sliding * shear_flexibility_));
        } else if constexpr (R == response::moment) {
            return loaded.moment(s, inside(s, which)) + bent.moment(s);
        } else {
            return shear_ + shear_gained(s, which);
        }
    }
    [[nodiscard]] quantity<line_load, T> load(const quantity<length, T>& x, side which) const {
        return loaded_->load(std::min(x - from_, span()), which);
    }
    [[nodiscard]] quantity<curvature, T> imposed_curvature(const quantity<length, T>& x, side which) const {
        return loaded_->imposed_curvature(std::min(x - from_, span()), which);
    }
    /// Shear at the ends of the part, loads that stand right there included.
    [[nodiscard]] quantity<force, T> outer_shear_left() const { return shear_ + force_at_left_end_; }
    [[nodiscard]] quantity<force, T> outer_shear_right() const { return shear_ - force_of_loads_; }

    [[nodiscard]] auto joints() const { return loaded_->joints(); }

private:
    struct couple_at {
        quantity<length, T> at;
        quantity<moment, T> size;
    };

    side inside(const quantity<length, T>& s, side which) const {
        if (!(s > quantity<length, T>{})) return side::just_right;
        return s < span() ? which : side::just_left;
    }

    quantity<moment, T> sum_of_couples(const quantity<length, T>& s, side which) const {
        quantity<moment, T> sum{};
        for (const auto& c : couples_) {
            if (which == side::just_left ? c.at < s : c.at <= s) sum += c.size;
        }
        return sum;
    }

    void add_resultant(const quantity<force, T>& size, const quantity<length, T>& to_right_end) {
        force_of_loads_ += size;
        moment_of_forces_ += size * to_right_end;
    }

    /// By how much the shear at s exceeds that at the left end. What couples make of the simple beam's own shear
    /// cancels exactly: it may be a million times what is left of it in the whole beam.
    quantity<force, T> shear_gained(const quantity<length, T>& s, side which) const {
        return loaded_->shear(s, inside(s, which)) - loaded_->shear(quantity<length, T>{});
    }
    quantity<force, T> shear_drop() const { return moment_of_forces_ / span(); }
    quantity<force, T> mean_shear() const { return shear_ - shear_drop(); }

    /// The integral of (shear - mean shear)/kGA up to s. Zero at both ends of the part.
    quantity<length, T> shear_deflection(const quantity<length, T>& s) const {
        const auto M = loaded_->moment(s, inside(s, side::just_right)) + bent_->moment(s);
        const auto risen = M - M_left_ - sum_of_couples(s, inside(s, side::just_right));
        return (risen - mean_shear() * s) * shear_flexibility_;
    }

    quantity<length, T> from_, to_;
    simple beam_;
    quantity<inverse_force, T> shear_flexibility_;
    load_list<T> loads_;
    std::vector<couple_at> couples_;
    quantity<force, T> force_at_left_end_{}, force_of_loads_{};
    quantity<moment, T> moment_of_forces_{};
    quantity<length, T> offset_at_left_end_{}, offset_at_right_end_{};
    // Once placed: under the loads, and under the end moments.
    std::optional<elastic_line<simple, load_list<T>>> loaded_;
    std::optional<elastic_line<simple, load_types::load_sum<couple, couple>>> bent_;
    quantity<moment, T> M_left_{};
    quantity<length, T> v_left_{}, v_right_{};
    quantity<plane_angle, T> tilt_{};
    quantity<force, T> shear_{};
};

}  // namespace sagitta::detail
