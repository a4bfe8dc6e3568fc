#include "read_beams.hpp"

#include "cell_values.hpp"
#include "parallel.hpp"

#include <fmt/format.h>

#include <memory>

namespace beam_schedule {
namespace {

enum column : std::size_t { mark, left, right, span, E, I, limit };

/// The closed form of one span; nothing where there is none.
std::optional<any_beam> beam_held(holding at_left, holding at_right, const span_length& L, const rigidity& EI) {
    using enum holding;
    if (at_left == pinned && at_right == pinned) return sagitta::simple_beam(L, EI);
    if (at_left == fixed && at_right == free) return sagitta::cantilever(L, EI);
    if (at_left == free && at_right == fixed) return mirrored(sagitta::cantilever(L, EI));
    if (at_left == fixed && at_right == pinned) return sagitta::propped_cantilever(L, EI);
    if (at_left == pinned && at_right == fixed) return mirrored(sagitta::propped_cantilever(L, EI));
    if (at_left == fixed && at_right == fixed) return sagitta::fixed_beam(L, EI);
    return std::nullopt;
}

template <class End>
void hold(sagitta::continuous_beam<double>& beam, End which, const span_length& at, const end_holding& held) {
    if (held.how == holding::fixed) beam.clamp(which);
    if (held.how == holding::pinned || held.how == holding::elastic) beam.support_at(at);
    if (held.how == holding::elastic) beam.turning_spring(which, held.stiffness);
}

std::unique_ptr<continuous> continuous_held(const end_holding& at_left, const end_holding& at_right,
                                            const span_length& L, const rigidity& EI) {
    auto made = std::make_unique<continuous>(continuous{sagitta::continuous_beam<double>(L, EI), {}, {}});
    hold(made->beam, sagitta::end::left, span_length(), at_left);
    hold(made->beam, sagitta::end::right, L, at_right);
    if (at_left.how != holding::free) made->supports.push_back({span_length(), at_left.how});
    if (at_right.how != holding::free) made->supports.push_back({L, at_right.how});
    return made;
}

/// Whether two ends alone carry a beam.
bool stands(holding at_left, holding at_right) {
    const auto clamps = [](holding end) { return end == holding::fixed || end == holding::elastic; };
    return clamps(at_left) || clamps(at_right) || (at_left == holding::pinned && at_right == holding::pinned);
}

beam_entry read_beam(const input_row& row, const std::unordered_set<std::string_view>& supported, findings& found) {
    const std::size_t refusals_before = found.refusals.size();
    beam_entry entry;
    entry.mark = row.cell(mark);
    entry.where = row.at(mark);
    if (row.expect_whole(found)) {
        if (entry.mark.empty()) found.refuse(row.at(mark), "nothing", "the mark of a beam");
        const auto at_left = read_holding(row, left, found);
        const auto at_right = read_holding(row, right, found);
        const auto L = read_positive<sagitta::dimension::length>(row, span, found);
        const auto modulus = read_positive<sagitta::dimension::stress>(row, E, found);
        const auto inertia = read_positive<sagitta::dimension::second_moment_of_area>(row, I, found);
        const auto allowed = read_limit(row, limit, L, found);
        if (at_left) entry.left = at_left->how;
        if (at_right) entry.right = at_right->how;
        entry.span = L.value_or(span_length());
        entry.limit = allowed.value_or(deflection_limit());
        const bool is_held = at_left && at_right;
        const bool is_supported = supported.contains(entry.mark);
        if (is_held && !is_supported && !stands(entry.left, entry.right)) {
            found.refuse(row.at(right),
                         fmt::format("'{}' behind '{}' at the left, a mechanism", row.cell(right), row.cell(left)),
                         "one fixed or elastic end, both ends pinned, or further supports in supports.csv");
        } else if (is_held && L && modulus && inertia) {
            try {
                const rigidity EI = *modulus * *inertia;
                if (is_supported || entry.left == holding::elastic || entry.right == holding::elastic) {
                    entry.supported = continuous_held(*at_left, *at_right, *L, EI);
                } else {
                    entry.beam = beam_held(entry.left, entry.right, *L, EI);
                }
            } catch (const sagitta::invalid_input& wrong) {
                found.refuse(row.at(I), wrong.what(), "E and I whose product is within the range of double");
            }
        }
    }
    entry.is_refused = found.refusals.size() != refusals_before;
    return entry;
}

}  // namespace

beam_list read_beams(const input_table& table, const std::unordered_set<std::string_view>& supported, findings& found) {
    struct part {
        std::vector<beam_entry> beams;
        findings found;
    };
    auto parts = in_parallel<part>(table.row_count(), [&](part& p, std::size_t from, std::size_t to) {
        p.beams.reserve(to - from);
        for (std::size_t i = from; i < to; ++i) p.beams.push_back(read_beam(table.row(i), supported, p.found));
    });

    beam_list list;
    list.beams.reserve(table.row_count());
    list.number_of.reserve(table.row_count());
    findings of_file;
    std::size_t row_number = 0;
    for (auto& p : parts) {
        of_file.add(std::move(p.found));
        for (auto& entry : p.beams) {
            const input_row row = table.row(row_number++);
            if (!entry.mark.empty()) {
                const auto [known, is_new] = list.number_of.try_emplace(entry.mark, list.beams.size());
                if (!is_new) {
                    beam_entry& first = list.beams[known->second];
                    first.is_refused = true;  // nobody can tell which of the two is meant
                    of_file.refuse(row.at(mark), fmt::format("{} again", quoted(entry.mark)),
                                   fmt::format("every mark once (line {} has it too)", first.where.line));
                    continue;
                }
            }
            list.beams.push_back(std::move(entry));
        }
    }
    of_file.sort_by_line();
    found.add(std::move(of_file));
    return list;
}

}  // namespace beam_schedule
