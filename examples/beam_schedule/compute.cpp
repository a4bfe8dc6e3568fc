#include "compute.hpp"

#include "csv_cell.hpp"
#include "parallel.hpp"
#include "progress.hpp"

#include <sagitta/core.hpp>

#include <fmt/format.h>

#include <array>
#include <atomic>
#include <cmath>
#include <iterator>
#include <utility>
#include <variant>

namespace beam_schedule {
namespace {

/// The outcomes and rows of neighbouring beams.
struct part {
    std::vector<beam_outcome> outcomes;
    std::string rows;
    std::size_t row_count = 0;
    findings found;
};

struct checked_result {
    utilised value;
    double cross_check = 0;
    bool is_finite = false;
};

template <class Beam>
checked_result compute_combination(const Beam& beam, const span_length& limit,
                                   const sagitta::load_list<double>& loads) {
    const auto line = beam.under(loads);
    const auto worst = greatest_deflection(line);
    const auto check = cross_check(line);
    checked_result out;
    out.value.deflection_mm = worst.value / sagitta::units::mm;
    out.value.at_m = worst.at / sagitta::units::m;
    out.value.utilisation = sagitta::abs(worst.value) / limit;
    out.cross_check = check.greatest();
    // Each response by itself: the greatest of several would lose a not-a-number.
    const std::array numbers{
        out.value.deflection_mm, out.value.at_m, out.value.utilisation, check.shear, check.moment, check.slope,
        check.deflection};
    out.is_finite = std::all_of(numbers.begin(), numbers.end(), [](double number) { return std::isfinite(number); });
    return out;
}

class beam_computer {
public:
    beam_computer(const combination_list& combinations, bool is_sure) : all_(combinations), is_sure_(is_sure) {
        for (const auto& c : combinations.combinations) names_.push_back(csv_cell(c.name));
    }

    beam_outcome compute(const beam_entry& entry, std::span<const case_load> loads, part& out) {
        const std::size_t rows_before = out.rows.size();
        const std::size_t row_count_before = out.row_count;
        std::size_t current = 0;
        try {
            const auto of_beam = std::visit(
                [&](const auto& beam) { return all_combinations(beam, entry, loads, out, current); }, *entry.beam);
            if (of_beam) return *of_beam;
            refuse(entry, current, "a number beyond the range of double", out);
        } catch (const sagitta::invalid_input& wrong) {
            refuse(entry, current, wrong.what(), out);
        }
        out.rows.resize(rows_before);
        out.row_count = row_count_before;
        return {};
    }

private:
    template <class Beam>
    std::optional<beam_outcome> all_combinations(const Beam& beam, const beam_entry& entry,
                                                 std::span<const case_load> loads, part& out, std::size_t& current) {
        beam_outcome outcome;
        outcome.is_loaded = !loads.empty();
        const std::string mark = csv_cell(entry.mark);
        for (current = 0; current < names_.size(); ++current) {
            const combination& combined = all_.combinations[current];
            if (combined.is_left_out) continue;
            acting_.clear();
            for (const auto& [load, load_case] : loads) {
                const double factor = combined.factor[load_case];
                if (factor == 0) continue;
                std::visit([&](const auto& single) { acting_ += factor * single; }, load);
            }
            auto result = compute_combination(beam, entry.limit, acting_);
            if (!result.is_finite) return std::nullopt;
            result.value.combination = current;
            append_row(mark, entry.limit, result, out);
            outcome.cross_check = std::max(outcome.cross_check, result.cross_check);
            if (!outcome.governing || result.value.utilisation > outcome.governing->utilisation) {
                outcome.governing = result.value;
            }
        }
        outcome.result = verdict_on(outcome);
        return outcome;
    }

    verdict verdict_on(const beam_outcome& outcome) const {
        if (!(outcome.cross_check <= plausible_cross_check)) return verdict::doubtful;
        if (outcome.governing && outcome.governing->utilisation > 1) return verdict::exceeds;
        return is_sure_ && outcome.governing ? verdict::ok : verdict::incomplete;
    }

    void append_row(const std::string& mark, const span_length& limit, const checked_result& result, part& out) const {
        out.rows += mark;
        out.rows += ',';
        out.rows += names_[result.value.combination];
        for (const double number :
             {result.value.deflection_mm, result.value.at_m, limit / sagitta::units::mm, result.value.utilisation}) {
            out.rows += ',';
            append_number(out.rows, number);
        }
        out.rows += result.value.utilisation > 1 ? ",exceeds," : ",ok,";
        append_number(out.rows, result.cross_check);
        out.rows += '\n';
        ++out.row_count;
    }

    void refuse(const beam_entry& entry, std::size_t combined, std::string_view what, part& out) const {
        out.found.refuse(entry.where,
                         fmt::format("in the beam {} under the combination {}: {}", quoted(entry.mark),
                                     quoted(all_.combinations[combined].name), what),
                         "loads and a beam that can be computed");
    }

    const combination_list& all_;
    bool is_sure_;
    std::vector<std::string> names_;
    sagitta::load_list<double> acting_;
};

void note_doubt(const beam_entry& entry, const beam_outcome& outcome, findings& found) {
    found.notes.push_back(
        {entry.where, fmt::format("the beam {} fails its cross-check: closed forms and integration differ by {:.1e}",
                                  quoted(entry.mark), outcome.cross_check)});
}

}  // namespace

std::string_view name_of(verdict v) {
    constexpr std::array<std::string_view, 5> names{"ok", "exceeds", "refused", "incomplete", "doubtful"};
    return names[static_cast<std::size_t>(v)];
}

schedule compute_schedule(const beam_list& beams, const beam_loads& loads, const combination_list& combinations,
                          bool is_sure, findings& found) {
    const beam_computer prototype(combinations, is_sure);
    std::atomic<std::size_t> done{0};
    progress shown(beams.beams.size());
    auto parts = in_parallel<part>(
        beams.beams.size(),
        [&](part& out, std::size_t from, std::size_t to) {
            beam_computer computer = prototype;
            for (std::size_t i = from; i < to; ++i) {
                const beam_entry& entry = beams.beams[i];
                const auto outcome = entry.is_refused ? beam_outcome() : computer.compute(entry, loads.on(i), out);
                if (!(outcome.cross_check <= plausible_cross_check)) note_doubt(entry, outcome, out.found);
                out.outcomes.push_back(outcome);
            }
            done += to - from;
        },
        [&] { shown.update(done); });
    shown.clear();

    schedule all;
    all.outcomes.reserve(beams.beams.size());
    for (auto& p : parts) {
        all.outcomes.insert(all.outcomes.end(), p.outcomes.begin(), p.outcomes.end());
        all.results_text.push_back(std::move(p.rows));
        all.result_count += p.row_count;
        found.add(std::move(p.found));
    }
    return all;
}

}  // namespace beam_schedule
