#include "compute_combination.hpp"

#include <algorithm>
#include <cmath>
#include <initializer_list>
#include <variant>

namespace beam_schedule {
namespace {

using length = span_length;

bool all_finite(std::initializer_list<double> numbers) {
    return std::all_of(numbers.begin(), numbers.end(), [](double number) { return std::isfinite(number); });
}

template <class Extreme>
utilised utilisation_of(const Extreme& worst, const length& limit) {
    utilised out;
    out.deflection_mm = worst.value / sagitta::units::mm;
    out.at_m = worst.at / sagitta::units::m;
    out.limit_mm = limit / sagitta::units::mm;
    out.utilisation = sagitta::abs(worst.value) / limit;
    return out;
}

bool is_finite(const utilised& value) { return all_finite({value.deflection_mm, value.at_m, value.utilisation}); }

template <class Beam>
combination_result compute_single(const Beam& beam, const length& limit, const sagitta::load_list<double>& loads) {
    const auto line = beam.under(loads);
    combination_result out;
    out.governing = utilisation_of(greatest_deflection(line), limit);
    out.cross_check = cross_check(line).greatest();
    out.is_finite = is_finite(out.governing) && all_finite({out.cross_check});
    return out;
}

support_forces forces_at(const sagitta::continuous_line<double>& line, const length& place) {
    using sagitta::abs;
    const auto left = line.moment(place, sagitta::just_left);
    const auto right = line.moment(place, sagitta::just_right);
    // Beyond an end of the beam it is the moment that the support passes on, at both sides of the end.
    const bool is_end = place == length() || place == line.supported().span();
    const auto beyond = place == length() ? left : right;
    const auto moment = is_end ? beyond : abs(right) > abs(left) ? right : left;
    return {line.reaction_at(place) / sagitta::units::kN, moment / (sagitta::units::kN * sagitta::units::m),
            line.deflection(place) / sagitta::units::mm};
}

combination_result compute_continuous(const continuous& carried, const sagitta::load_list<double>& loads) {
    const auto line = carried.beam.under(loads);
    combination_result out;
    out.cross_check = cross_check(line).greatest();
    out.is_finite = all_finite({out.cross_check});
    for (const auto& span : carried.spans) {
        const auto worst = extremes_of_deflection(line, sagitta::between(span.from, span.to)).governing();
        utilised value = utilisation_of(worst, span.limit);
        value.span = out.spans.size();
        out.spans.push_back(value);
        out.is_finite = out.is_finite && is_finite(value);
        if (value.span == 0 || value.utilisation > out.governing.utilisation) out.governing = value;
    }
    for (const auto& support : carried.supports) {
        const support_forces forces = forces_at(line, support.at);
        out.supports.push_back(forces);
        out.is_finite = out.is_finite && all_finite({forces.reaction_kN, forces.moment_kNm, forces.deflection_mm});
    }
    return out;
}

}  // namespace

combination_result compute_combination(const beam_entry& entry, const sagitta::load_list<double>& loads) {
    if (entry.supported) return compute_continuous(*entry.supported, loads);
    return std::visit([&](const auto& beam) { return compute_single(beam, entry.limit.over(entry.span), loads); },
                      *entry.beam);
}

}  // namespace beam_schedule
