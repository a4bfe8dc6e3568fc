// The force method as one would write it: release, compute displacements and flexibilities, close, superpose.
//
//     constexpr auto method = force_method(simple_beam(12.0*m, EI), translation_at(4.0*m), rotation_at(0.0*m));
//     constexpr auto solved = method.under(uniform_load(8.0*kN/m));
//     solved.displacement<0>()   solved.flexibility<0, 1>()   solved.redundant<0>()   solved.line().moment(4.0*m)
//
// Source: the general method of redundants (Maxwell 1864, Mohr 1874; Mueller-Breslau), as in any book on structures.
#pragma once

#include <sagitta/detail/compatibility_equations.hpp>
#include <sagitta/detail/flexibility_matrix.hpp>
#include <sagitta/detail/refuse.hpp>
#include <sagitta/detail/released_structure.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/release.hpp>
#include <sagitta/units.hpp>

#include <cstddef>
#include <type_traits>
#include <utility>

namespace sagitta {

template <class Released, class Releases, class Loads>
class force_method_solution;

namespace detail {

template <class Released>
inline constexpr bool is_structure = requires(const Released& released) {
    released.span();
};

template <class R>
inline constexpr bool is_release_list = false;
template <class T>
inline constexpr bool is_release_list<release_list<T>> = true;

/// One by one as a pack, or the list. What is wrong is answered by one sentence, and replaced by something harmless.
template <class Released, class... R>
constexpr auto releases_of(const R&... each) {
    constexpr bool one_by_one = sizeof...(R) > 0 && (... && release_types::is_release<R>);
    constexpr bool in_a_list = sizeof...(R) == 1 && (... && is_release_list<R>);
    constexpr bool right = one_by_one || in_a_list;
    static_assert(right,
                  "sagitta: a force method takes a released structure and releases, such as translation_at(6.0*m), or "
                  "one release_list");
    constexpr bool has_the_hinges = (... && takes_release<Released, R>);
    static_assert(has_the_hinges,
                  "sagitta: a relative rotation needs a hinge, which of the released structures only a continuous_beam "
                  "has");
    if constexpr (!right || !has_the_hinges) {
        return release_types::release_pack(release_types::release_at<release_types::kind::rotation>(0.0 * units::m));
    } else if constexpr (one_by_one) {
        return release_types::release_pack<R...>(each...);
    } else {
        return (each, ...);
    }
}

}  // namespace detail

/// A released structure and its releases. Released is any beam of the library that answers under(loads):
/// prismatic_beam, shear_flexible_beam, continuous_beam. The releases are named one by one (their number is known when
/// compiling, nothing allocates, and all of it is constexpr if the beam is) or come in a release_list.
///
/// In a beam that deforms in shear a rotation is that of the section, as a clamp or a couple meets it: dv/dx - V/kGA.
template <class Released, class Releases>
class force_method {
    static constexpr bool is_structure = detail::is_structure<Released>;
    static_assert(is_structure,
                  "sagitta: a released structure is expected here: a simple_beam, a cantilever, a continuous_beam ...");

public:
    using number =
        std::common_type_t<typename detail::in_order<typename Released::number>::number, typename Releases::number>;

    /// Throws invalid_input, which names the release, where a place does not lie on the beam, is no hinge for a
    /// relative rotation, or cannot be released: held in the released structure already, or not independent of the
    /// releases before it.
    template <class... R>
    constexpr explicit force_method(const Released& released, const R&... releases)
        : released_(released),
          f_(detail::releases_of<Released>(releases...)),
          equations_(f_.releases(), coefficients()) {
        if (equations_.undetermined() < f_.releases().size()) [[unlikely]] {
            f_.releases().for_each([&](std::size_t i, const auto& r) {
                if (i == equations_.undetermined())
                    refuse_release(r, "is not independent: the other releases, if held, hold it as well");
            });
        }
    }

    /// Loads and the prescribed movements, solved. Loads: a load case, a composition, or a load_list.
    template <class Loads>
    [[nodiscard]] constexpr auto under(const Loads& loads) const {
        constexpr bool right = load_types::is_loads<Loads>;
        static_assert(right, "sagitta: a load is expected here, such as uniform_load(4.5*kN/m) or a load_list");
        if constexpr (right) return force_method_solution<Released, Releases, Loads>(*this, loads);
    }

    [[nodiscard]] constexpr const Released& released() const { return released_; }
    [[nodiscard]] constexpr const Releases& releases() const { return f_.releases(); }
    [[nodiscard]] constexpr const flexibility_matrix<Releases, number>& flexibility() const { return f_; }
    [[nodiscard]] constexpr const auto& equations() const { return equations_; }

    /// The line of the released structure under the unit redundant i alone: 1 N or 1 N*m.
    template <std::size_t i>
    [[nodiscard]] constexpr auto unit_line() const {
        detail::expect_release<Releases, i>();
        return detail::line_under_unit<number>(detail::unmoved(released_), releases().template get<i>());
    }
    template <release_types::kind K>
    [[nodiscard]] auto unit_line(const release_index<K>& i) const {
        return detail::line_under_unit<number>(detail::unmoved(released_), releases().get(i));
    }

private:
    template <class R>
    [[noreturn]] static void refuse_release(const R& r, const char* why) {
        detail::refuse(release_types::name_of<R::released>, r.at(), why);
    }

    /// Fills the flexibility matrix, and adds to its diagonal what the springs give way.
    constexpr auto coefficients() {
        auto sum = releases().template table<number>();
        if constexpr (is_structure) measure(sum);
        return sum;
    }
    template <class Sum>
    constexpr void measure(Sum& sum) {
        const Released resting = detail::unmoved(released_);
        const std::size_t n = releases().size();
        releases().for_each([&](std::size_t, const auto& r) { detail::require_place(released_, r); });
        detail::for_each_release<Released>(releases(), [&](std::size_t j, const auto& redundant) {
            const auto line = detail::line_under_unit<number>(resting, redundant);
            if (!detail::moves(line, redundant)) [[unlikely]]
                refuse_release(redundant, "cannot be released: the released structure holds it");
            detail::for_each_release<Released>(releases(), [&](std::size_t i, const auto& r) {
                f_.number(i, j) = static_cast<number>(detail::displacement_in(line, r).value());
                sum[i * n + j] = f_.number(i, j);
            });
            sum[j * n + j] += static_cast<number>(redundant.spring_flexibility().value());
        });
    }

    Released released_;
    flexibility_matrix<Releases, number> f_;
    detail::compatibility_equations<number, Releases> equations_;
};

template <class Released, class... R>
force_method(const Released&, const R&...)
    -> force_method<Released, decltype(detail::releases_of<Released>(std::declval<const R&>()...))>;

/// What method.under(loads) returns: the steps of the calculation, in the order in which they are written down. The
/// releases are counted from 0 (solved.redundant<0>()), or given by their index in a release_list.
///
/// Accuracy in double: rounding of what the released structure and the redundants do each, of which the answer is the
/// sum. Random beams released at random stay within 1e-11 of the greatest value of each response, nearly always; digits
/// are lost where the released structure is far softer than the original one: supports taken away from a long beam of
/// 20 equal spans leave 1e-11, of 100 spans 1e-8, whereas hinges over them lose none.
template <class Released, class Releases, class Loads>
class force_method_solution {
    using method = force_method<Released, Releases>;
    using kind = release_types::kind;

public:
    using number = std::common_type_t<typename method::number, typename Loads::number>;
    static_assert(std::is_same_v<number, typename method::number>,
                  "sagitta: the loads have a wider number type than the released structure and the releases: give "
                  "these that number type too");

    constexpr force_method_solution(const method& described, const Loads& loads)
        : method_(described),
          loads_(loads),
          displacements_(described.releases().template values<number>()),
          required_(displacements_),
          redundants_(displacements_) {
        const auto line = released_line();
        detail::for_each_release<Released>(releases(), [&](std::size_t i, const auto& r) {
            displacements_[i] = static_cast<number>(detail::displacement_in(line, r).value());
            required_[i] = static_cast<number>(r.movement().value()) - displacements_[i];
        });
        redundants_ = method_.equations().solve(required_);
        for (const auto& X : redundants_) {
            if (!detail::is_finite(X)) [[unlikely]]
                detail::refuse("force_method: redundant", X, "must come out as a finite number");
        }
    }

    /// 1. The released structure under the loads alone.
    [[nodiscard]] constexpr auto released_line() const { return method_.released().under(loads_); }

    /// 2. The displacement of a release in it: a length or a plane angle, positive as release.hpp says.
    template <std::size_t i>
    [[nodiscard]] constexpr auto displacement() const {
        return fixed<i, release_types::displacement<kind_of<i>()>>(displacements_);
    }
    template <kind K>
    [[nodiscard]] auto displacement(const release_index<K>& i) const {
        return listed<release_types::displacement<K>>(i, displacements_);
    }

    /// 3. The flexibility coefficient f_ij: the displacement i for each unit of redundant j; and all of them.
    template <std::size_t i, std::size_t j>
    [[nodiscard]] constexpr auto flexibility() const {
        return method_.flexibility().template coefficient<i, j>();
    }
    template <kind I, kind J>
    [[nodiscard]] auto flexibility(const release_index<I>& i, const release_index<J>& j) const {
        return method_.flexibility().coefficient(i, j);
    }
    [[nodiscard]] constexpr const auto& flexibility() const { return method_.flexibility(); }

    /// 4. The check of reciprocal displacements: see flexibility_matrix.
    [[nodiscard]] constexpr number reciprocity_residual() const { return method_.flexibility().reciprocity_residual(); }

    /// 5. What the redundants have to close: the prescribed movement less the displacement. Sum over j of f_ij X_j,
    /// and X_i/k_i where i stands on a spring, equals it.
    template <std::size_t i>
    [[nodiscard]] constexpr auto required() const {
        return fixed<i, release_types::displacement<kind_of<i>()>>(required_);
    }
    template <kind K>
    [[nodiscard]] auto required(const release_index<K>& i) const {
        return listed<release_types::displacement<K>>(i, required_);
    }

    /// 6. The redundant: a force (downward) or a couple (clockwise; in a hinge the sagging moment).
    template <std::size_t i>
    [[nodiscard]] constexpr auto redundant() const {
        return fixed<i, release_types::redundant<kind_of<i>()>>(redundants_);
    }
    template <kind K>
    [[nodiscard]] auto redundant(const release_index<K>& i) const {
        return listed<release_types::redundant<K>>(i, redundants_);
    }
    /// The force that the support of a translation exerts on the beam, upward positive.
    template <std::size_t i>
    [[nodiscard]] constexpr auto reaction() const {
        static_assert(kind_of<i>() == kind::translation,
                      "sagitta: only a translation has a reaction; ask for the redundant of this release");
        return -redundant<i>();
    }
    template <kind K>
    [[nodiscard]] auto reaction(const release_index<K>& i) const {
        static_assert(K == kind::translation,
                      "sagitta: only a translation has a reaction; ask for the redundant of this release");
        return -redundant(i);
    }

    /// 7. The response of the original structure: the released one under the loads and the redundants at once.
    [[nodiscard]] constexpr auto line() const { return with_hinges_closed().under(acting()); }

    /// The loads, and as further loads the redundants, but for moments in hinges.
    [[nodiscard]] constexpr auto acting() const {
        if constexpr (Releases::is_fixed && load_types::load_expression<Loads>) {
            return acting_from<0>(loads_);
        } else {
            load_list<number> all;
            all += loads_;
            releases().for_each([&](std::size_t i, const auto& r) {
                if constexpr (std::decay_t<decltype(r)>::released != kind::relative_rotation)
                    all += detail::redundant_load(r, redundants_[i]);
            });
            return all;
        }
    }

    [[nodiscard]] constexpr const Releases& releases() const { return method_.releases(); }
    [[nodiscard]] constexpr const Loads& loads() const { return loads_; }

private:
    using numbers = decltype(std::declval<const Releases&>().template values<number>());

    template <std::size_t i>
    static constexpr kind kind_of() {
        detail::expect_release<Releases, i>();
        return Releases::template kind_of<i>;
    }
    template <std::size_t i, class Dimension>
    static constexpr auto fixed(const numbers& from) {
        // An i beyond has been answered, and must not add errors of its own.
        return quantity<Dimension, number>::from_value(from[i < Releases::size() ? i : 0]);
    }
    template <class Dimension, kind K>
    auto listed(const release_index<K>& i, const numbers& from) const {
        static_cast<void>(releases().get(i));
        return quantity<Dimension, number>::from_value(from[i.value]);
    }

    template <std::size_t i, class Sum>
    constexpr auto acting_from(const Sum& sum) const {
        if constexpr (i == Releases::size()) {
            return sum;
        } else if constexpr (kind_of<i>() == kind::relative_rotation) {
            return acting_from<i + 1>(sum);
        } else {
            return acting_from<i + 1>(sum + detail::redundant_load(releases().template get<i>(), redundants_[i]));
        }
    }

    constexpr Released with_hinges_closed() const {
        Released closed = method_.released();
        detail::for_each_release<Released>(releases(), [&](std::size_t i, const auto& r) {
            if constexpr (std::decay_t<decltype(r)>::released == kind::relative_rotation) {
                detail::pass_on(closed, detail::coherent<dimension::length, number>(r.at()), redundants_[i]);
            }
        });
        return closed;
    }

    method method_;
    Loads loads_;
    numbers displacements_, required_, redundants_;
};

}  // namespace sagitta
