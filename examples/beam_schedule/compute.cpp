#include "compute.hpp"

#include "csv_cell.hpp"
#include "parallel.hpp"
#include "progress.hpp"

#include <sagitta/core.hpp>

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <atomic>
#include <initializer_list>
#include <iterator>
#include <utility>
#include <variant>

namespace beam_schedule {
namespace {

struct rows {
    std::string text;
    std::size_t count = 0;
};

/// The outcomes and rows of neighbouring beams.
struct part {
    std::vector<beam_outcome> outcomes;
    rows results, spans, supports;
    findings found;
};

/// Takes the rows of a beam back unless they are kept.
class rows_of_beam {
public:
    explicit rows_of_beam(part& out) : of_{&out.results, &out.spans, &out.supports} {
        for (std::size_t i = 0; i < of_.size(); ++i) before_[i] = {of_[i]->text.size(), of_[i]->count};
    }
    ~rows_of_beam() {
        for (std::size_t i = 0; i < of_.size() && !is_kept_; ++i) {
            of_[i]->text.resize(before_[i].first);
            of_[i]->count = before_[i].second;
        }
    }
    rows_of_beam(const rows_of_beam&) = delete;
    rows_of_beam& operator=(const rows_of_beam&) = delete;
    void keep() { is_kept_ = true; }

private:
    std::array<rows*, 3> of_;
    std::array<std::pair<std::size_t, std::size_t>, 3> before_;
    bool is_kept_ = false;
};

void append_cells(std::string& out, std::initializer_list<double> numbers) {
    for (const double number : numbers) {
        out += ',';
        append_number(out, number);
    }
}

std::string_view verdict_cell(const utilised& value) { return value.utilisation > 1 ? ",exceeds" : ",ok"; }

class beam_computer {
public:
    beam_computer(const combination_list& combinations, bool is_sure) : all_(combinations), is_sure_(is_sure) {
        for (const auto& c : combinations.combinations) names_.push_back(csv_cell(c.name));
    }

    beam_outcome compute(const beam_entry& entry, std::span<const case_load> loads, part& out) {
        rows_of_beam added(out);
        std::size_t current = 0;
        try {
            auto of_beam = all_combinations(entry, loads, out, current);
            if (of_beam) {
                added.keep();
                return *std::move(of_beam);
            }
            refuse(entry, current, "a number beyond the range of double", out);
        } catch (const sagitta::invalid_input& wrong) {
            refuse(entry, current, wrong.what(), out);
        }
        return {};
    }

private:
    std::optional<beam_outcome> all_combinations(const beam_entry& entry, std::span<const case_load> loads, part& out,
                                                 std::size_t& current) {
        beam_outcome outcome;
        outcome.is_loaded = !loads.empty() || (entry.supported && entry.supported->is_settled);
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
            auto result = compute_combination(entry, acting_);
            if (!result.is_finite) return std::nullopt;
            result.governing.combination = current;
            for (auto& span : result.spans) span.combination = current;
            append_rows(mark, entry, result, out);
            gather(result, outcome);
        }
        outcome.result = verdict_on(outcome);
        return outcome;
    }

    static void gather(const combination_result& result, beam_outcome& outcome) {
        outcome.cross_check = std::max(outcome.cross_check, result.cross_check);
        const bool is_first = !outcome.governing;
        if (is_first || result.governing.utilisation > outcome.governing->utilisation) {
            outcome.governing = result.governing;
        }
        if (is_first) outcome.spans = result.spans;
        for (std::size_t i = 0; i < result.spans.size(); ++i) {
            if (result.spans[i].utilisation > outcome.spans[i].utilisation) outcome.spans[i] = result.spans[i];
        }
        for (std::size_t i = 0; i < result.supports.size(); ++i) {
            const support_forces& here = result.supports[i];
            if (is_first) {
                outcome.supports.push_back({here.reaction_kN, here.reaction_kN, here.moment_kNm, here.moment_kNm});
            }
            support_range& range = outcome.supports[i];
            range.least_reaction_kN = std::min(range.least_reaction_kN, here.reaction_kN);
            range.greatest_reaction_kN = std::max(range.greatest_reaction_kN, here.reaction_kN);
            range.least_moment_kNm = std::min(range.least_moment_kNm, here.moment_kNm);
            range.greatest_moment_kNm = std::max(range.greatest_moment_kNm, here.moment_kNm);
        }
    }

    verdict verdict_on(const beam_outcome& outcome) const {
        if (!(outcome.cross_check <= plausible_cross_check)) return verdict::doubtful;
        if (outcome.governing && outcome.governing->utilisation > 1) return verdict::exceeds;
        return is_sure_ && outcome.governing ? verdict::ok : verdict::incomplete;
    }

    void start_row(rows& out, const std::string& mark, std::size_t combined) const {
        out.text += mark;
        out.text += ',';
        out.text += names_[combined];
        ++out.count;
    }

    void append_rows(const std::string& mark, const beam_entry& entry, const combination_result& result,
                     part& out) const {
        const std::size_t combined = result.governing.combination;
        const utilised& worst = result.governing;
        start_row(out.results, mark, combined);
        append_cells(out.results.text, {worst.deflection_mm, worst.at_m, worst.limit_mm, worst.utilisation});
        out.results.text += verdict_cell(worst);
        out.results.text += ',';
        append_number(out.results.text, result.cross_check);
        out.results.text += '\n';
        for (const utilised& value : result.spans) {
            const beam_span& span = entry.supported->spans[value.span];
            start_row(out.spans, mark, combined);
            append_cells(out.spans.text, {static_cast<double>(value.span + 1), span.from / sagitta::units::m,
                                          span.to / sagitta::units::m, value.deflection_mm, value.at_m, value.limit_mm,
                                          value.utilisation});
            out.spans.text += verdict_cell(value);
            out.spans.text += '\n';
        }
        for (std::size_t i = 0; i < result.supports.size(); ++i) {
            const beam_support& support = entry.supported->supports[i];
            const support_forces& forces = result.supports[i];
            start_row(out.supports, mark, combined);
            append_cells(out.supports.text, {support.at / sagitta::units::m});
            out.supports.text += ',';
            out.supports.text += name_of(support.how);
            append_cells(out.supports.text, {forces.reaction_kN, forces.moment_kNm, forces.deflection_mm});
            out.supports.text += '\n';
        }
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

void take(output_rows& all, rows& added) {
    all.parts.push_back(std::move(added.text));
    all.count += added.count;
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
                auto outcome = entry.is_refused ? beam_outcome() : computer.compute(entry, loads.on(i), out);
                if (!(outcome.cross_check <= plausible_cross_check)) note_doubt(entry, outcome, out.found);
                out.outcomes.push_back(std::move(outcome));
            }
            done += to - from;
        },
        [&] { shown.update(done); });
    shown.clear();

    schedule all;
    all.outcomes.reserve(beams.beams.size());
    for (auto& p : parts) {
        std::move(p.outcomes.begin(), p.outcomes.end(), std::back_inserter(all.outcomes));
        take(all.results, p.results);
        take(all.spans, p.spans);
        take(all.supports, p.supports);
        found.add(std::move(p.found));
    }
    return all;
}

}  // namespace beam_schedule
