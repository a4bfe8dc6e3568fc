#include "read_supports.hpp"

#include "cell_values.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <cmath>
#include <unordered_map>
#include <utility>
#include <vector>

namespace beam_schedule {
namespace {

enum column : std::size_t { mark, at, kind, stiffness, settlement };

using spring_stiffness = sagitta::quantity<sagitta::dimension::spring_stiffness>;

/// Places that differ by the rounding of their units only are one.
bool is_same_place(const span_length& a, const span_length& b, const span_length& span) {
    constexpr double rounding = 1e-12;
    return std::abs((a - b).value()) <= rounding * span.value();
}

/// A row of supports.csv that was accepted.
struct placed_row {
    std::size_t line;
    span_length at;
    bool is_hinge;
};

/// Puts a row on its beam. beam is null where it is refused or unknown: the cells are checked by themselves then.
struct support_reader {
    const input_row& row;
    findings& found;
    beam_entry* beam;
    std::vector<placed_row>& rows_before;  // of the same beam

    void read() const {
        const std::string_view word = row.cell(kind);
        if (word == "hinge") {
            hinge();
        } else if (word == "pinned" || word == "spring") {
            support(word == "spring");
        } else {
            found.refuse(row.at(kind), quoted(word), "pinned, spring or hinge");
        }
    }

private:
    void expect_empty(column unused) const {
        beam_schedule::expect_empty(row, unused, fmt::format("the kind {}", row.cell(kind)), found);
    }

    void hinge() const {
        const auto place = read_place();
        expect_empty(stiffness);
        expect_empty(settlement);
        if (!place || beam == nullptr) return;
        if (*place == span_length() || *place == beam->span) {
            found.refuse(row.at(at), quoted(row.cell(at)), "a place between the ends of the beam, for a hinge");
        } else if (is_new(*place, true)) {
            beam->supported->beam.hinge_at(*place);
        }
    }

    void support(bool is_spring) const {
        const auto place = read_place();
        std::optional<spring_stiffness> k;
        if (!is_spring) {
            expect_empty(stiffness);
        } else if (row.cell(stiffness).empty()) {
            found.refuse(row.at(stiffness), "nothing", "the stiffness of the spring, such as 8 kN/mm");
        } else {
            k = read_positive<sagitta::dimension::spring_stiffness>(row, stiffness, found);
        }
        span_length settled{};
        bool is_whole = !is_spring || k;
        if (!row.cell(settlement).empty()) {
            const auto read = read_quantity<sagitta::dimension::length>(row, settlement, found);
            settled = read.value_or(settled);
            is_whole = is_whole && read;
        }
        if (!place || beam == nullptr || !is_free_end(*place) || !is_new(*place, false) || !is_whole) return;
        const holding how = is_spring ? holding::spring : holding::pinned;
        if (*place == span_length()) beam->left = how;
        if (*place == beam->span) beam->right = how;
        continuous& carried = *beam->supported;
        carried.supports.push_back({*place, how});
        if (is_spring) {
            carried.beam.spring_at(*place, *k);
        } else {
            carried.beam.support_at(*place);
        }
        carried.beam.settle_at(*place, settled);
        carried.is_settled = carried.is_settled || settled.value() != 0;
    }

    /// The place, on that of an earlier row or an end where only the rounding of units is between them.
    std::optional<span_length> read_place() const {
        const auto span = beam != nullptr ? std::optional(beam->span) : std::nullopt;
        const auto place = read_place_on_beam(row, at, span, found);
        if (!place || !span) return place;
        for (const span_length& end : {span_length(), *span}) {
            if (is_same_place(*place, end, *span)) return end;
        }
        for (const auto& before : rows_before) {
            if (is_same_place(*place, before.at, *span)) return before.at;
        }
        return place;
    }

    /// True between the ends as well; a refusal where the end is held already, by beams.csv.
    bool is_free_end(const span_length& place) const {
        for (const bool is_left : {true, false}) {
            if (place != (is_left ? span_length() : beam->span)) continue;
            const bool is_own = std::any_of(rows_before.begin(), rows_before.end(), [&](const placed_row& before) {
                return !before.is_hinge && before.at == place;
            });
            const holding how = is_left ? beam->left : beam->right;
            if (how == holding::free || is_own) continue;  // where it is a row's own, that row is told
            found.refuse(row.at(at),
                         fmt::format("{}, the {} end, which is {}", quoted(row.cell(at)), is_left ? "left" : "right",
                                     name_of(how)),
                         "a place between the ends of the beam, or a free end");
            return false;
        }
        return true;
    }

    bool is_new(const span_length& place, bool is_hinge) const {
        const auto before = std::find_if(rows_before.begin(), rows_before.end(), [&](const placed_row& earlier) {
            return earlier.is_hinge == is_hinge && earlier.at == place;
        });
        if (before != rows_before.end()) {
            found.refuse(row.at(at), fmt::format("another {} at {}", is_hinge ? "hinge" : "support", row.cell(at)),
                         fmt::format("one at a place (line {} has it too)", before->line));
            return false;
        }
        rows_before.push_back({row.line(), place, is_hinge});
        return true;
    }
};

/// Cuts the beam into spans. Where it overhangs its last support, the limit is that of a span of twice the length
/// (common practice, no source). A beam that is one overhang, a cantilever, has the limit that beams.csv says.
void make_spans(const beam_entry& entry, continuous& carried) {
    std::sort(carried.supports.begin(), carried.supports.end(),
              [](const beam_support& a, const beam_support& b) { return a.at < b.at; });
    std::vector<beam_support> bounds = carried.supports;
    if (bounds.empty() || bounds.front().at > span_length()) bounds.insert(bounds.begin(), {{}, holding::free});
    if (bounds.back().at < entry.span) bounds.push_back({entry.span, holding::free});
    const bool is_cantilever = bounds.size() == 2;
    for (std::size_t i = 1; i < bounds.size(); ++i) {
        const auto& [from, left] = bounds[i - 1];
        const auto& [to, right] = bounds[i];
        const bool overhangs = !is_cantilever && (left == holding::free || right == holding::free);
        carried.spans.push_back({from, to, left, right, entry.limit.over((overhangs ? 2.0 : 1.0) * (to - from))});
    }
}

/// Says which place could move, where nothing keeps it from moving.
void expect_stable(beam_entry& entry, findings& found) {
    try {
        (void)entry.supported->beam.under(sagitta::load_list<double>());
    } catch (const sagitta::invalid_input& wrong) {
        found.refuse(entry.where, fmt::format("in the beam {} on its supports: {}", quoted(entry.mark), wrong.what()),
                     "ends and supports that hold every part of it");
        entry.is_refused = true;
    }
}

}  // namespace

std::unordered_set<std::string_view> supported_marks(const std::optional<input_table>& table) {
    std::unordered_set<std::string_view> marks;
    for (std::size_t i = 0; table && i < table->row_count(); ++i) marks.insert(table->row(i).cell(mark));
    marks.erase(std::string_view());
    return marks;
}

support_table read_supports(const std::optional<input_table>& table, beam_list& beams, findings& found) {
    support_table out;
    std::unordered_map<std::size_t, std::vector<placed_row>> rows_of;
    std::vector<std::size_t> faulty;
    for (std::size_t i = 0; table && i < table->row_count(); ++i) {
        const input_row row = table->row(i);
        const std::size_t refusals_before = found.refusals.size();
        const std::string_view name = row.cell(mark);
        const auto known = beams.number_of.find(name);
        const bool is_known = known != beams.number_of.end();
        bool names_a_beam = false;
        if (row.expect_whole(found)) {
            names_a_beam = !name.empty();
            if (!is_known) found.refuse(row.at(mark), quoted(name), "the mark of a beam in beams.csv");
            beam_entry* beam = is_known ? &beams.beams[known->second] : nullptr;
            if (beam != nullptr && beam->is_refused) beam = nullptr;
            support_reader{row, found, beam, rows_of[is_known ? known->second : beams.beams.size()]}.read();
        }
        if (!is_known) ++(names_a_beam ? out.rows_of_no_beam : out.rows_of_any_beam);
        if (is_known && found.refusals.size() != refusals_before) faulty.push_back(known->second);
    }
    // Only now, so that every row of a beam is checked against it.
    for (const std::size_t number : faulty) beams.beams[number].is_refused = true;
    for (auto& entry : beams.beams) {
        if (entry.is_refused || !entry.supported) continue;
        make_spans(entry, *entry.supported);
        expect_stable(entry, found);
    }
    return out;
}

}  // namespace beam_schedule
