#include "read_beams.hpp"

#include "cell_values.hpp"
#include "parallel.hpp"

#include <fmt/format.h>

namespace beam_schedule {
namespace {

enum column : std::size_t { mark, left, right, span, E, I, limit };

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

beam_entry read_beam(const input_row& row, findings& found) {
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
        entry.left = at_left.value_or(entry.left);
        entry.right = at_right.value_or(entry.right);
        entry.span = L.value_or(span_length());
        entry.limit = allowed.value_or(span_length());
        const bool is_held = at_left && at_right;
        const rigidity any_EI = rigidity::from_value(1);
        if (is_held && !beam_held(*at_left, *at_right, L.value_or(span_length::from_value(1)), any_EI)) {
            found.refuse(row.at(right),
                         fmt::format("'{}' behind '{}' at the left, a mechanism", row.cell(right), row.cell(left)),
                         "one fixed end, or both ends pinned or fixed");
        } else if (is_held && L && modulus && inertia) {
            try {
                entry.beam = beam_held(*at_left, *at_right, *L, *modulus * *inertia);
            } catch (const sagitta::invalid_input& wrong) {
                found.refuse(row.at(I), wrong.what(), "E and I whose product is within the range of double");
            }
        }
    }
    entry.is_refused = found.refusals.size() != refusals_before;
    return entry;
}

}  // namespace

beam_list read_beams(const input_table& table, findings& found) {
    struct part {
        std::vector<beam_entry> beams;
        findings found;
    };
    auto parts = in_parallel<part>(table.row_count(), [&](part& p, std::size_t from, std::size_t to) {
        p.beams.reserve(to - from);
        for (std::size_t i = from; i < to; ++i) p.beams.push_back(read_beam(table.row(i), p.found));
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
