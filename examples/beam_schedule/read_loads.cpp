#include "read_loads.hpp"

#include "cell_values.hpp"
#include "parallel.hpp"

#include <fmt/format.h>

#include <optional>
#include <unordered_map>
#include <unordered_set>
#include <utility>
#include <vector>

namespace beam_schedule {
namespace {

enum column : std::size_t { mark, case_name, kind, size, size_to, from, to };

using any_load = sagitta::load_types::any_load<double>;

/// A row of loads.csv with its links to the other files.
struct load_row {
    std::optional<std::size_t> beam;
    std::optional<std::uint32_t> load_case;
    std::optional<any_load> load;
    bool names_a_beam = false;  // be it a beam that does not exist
    bool is_refused = false;
};

/// Makes the load of a row. beam is null where it is refused or unknown: nothing is checked against it then.
struct load_reader {
    const input_row& row;
    findings& found;
    const beam_entry* beam;

    std::optional<any_load> read() const {
        const std::string_view word = row.cell(kind);
        if (word == "point")
            return concentrated<sagitta::dimension::force>([](auto P, auto x) { return sagitta::point_load(P, x); });
        if (word == "couple")
            return concentrated<sagitta::dimension::moment>(
                [](auto C, auto x) { return sagitta::applied_couple(C, x); });
        if (word == "uniform") return uniform();
        if (word == "linear") return linear();
        if (word == "settlement")
            return movement<sagitta::dimension::length>([](auto end, auto v) { return sagitta::settlement(end, v); });
        if (word == "rotation") {
            return movement<sagitta::dimension::plane_angle>(
                [](auto end, auto turn) { return sagitta::support_rotation(end, turn); });
        }
        found.refuse(row.at(kind), quoted(word), "point, couple, uniform, linear, settlement or rotation");
        return std::nullopt;
    }

private:
    std::optional<span_length> span() const { return beam ? std::optional(beam->span) : std::nullopt; }

    void expect_empty(column unused) const {
        if (row.cell(unused).empty()) return;  // before the words are put together, which takes time
        beam_schedule::expect_empty(row, unused, fmt::format("a load of the kind {}", row.cell(kind)), found);
    }

    template <class Dimension, class Make>
    std::optional<any_load> concentrated(const Make& make) const {
        const auto amount = read_quantity<Dimension>(row, size, found);
        expect_empty(size_to);
        const auto place = read_place_on_beam(row, from, span(), found);
        expect_empty(to);
        if (!amount || !place) return std::nullopt;
        return make(*amount, sagitta::at(*place));
    }

    /// Both places empty: the whole beam. stop stays 0 then.
    struct stretch {
        span_length start, stop;
        bool is_whole() const { return !(start < stop); }
    };
    std::optional<stretch> loaded_stretch() const {
        if (row.cell(from).empty() && row.cell(to).empty()) return stretch{};
        const bool both = !row.cell(from).empty() && !row.cell(to).empty();
        if (!both) {
            found.refuse(row.at(row.cell(from).empty() ? from : to), "nothing",
                         "a place on the beam, or from and to both empty for the whole beam");
            return std::nullopt;
        }
        const auto start = read_place_on_beam(row, from, span(), found);
        const auto stop = read_place_on_beam(row, to, span(), found);
        if (!start || !stop) return std::nullopt;
        if (*start < *stop) return stretch{*start, *stop};
        found.refuse(row.at(to), quoted(row.cell(to)),
                     fmt::format("a place beyond from, which is {}", quoted(row.cell(from))));
        return std::nullopt;
    }

    std::optional<any_load> uniform() const {
        const auto w = read_quantity<sagitta::dimension::line_load>(row, size, found);
        expect_empty(size_to);
        const auto where = loaded_stretch();
        if (!w || !where) return std::nullopt;
        if (where->is_whole()) return sagitta::uniform_load(*w);
        return sagitta::partial_uniform_load(*w, sagitta::between(where->start, where->stop));
    }

    std::optional<any_load> linear() const {
        const auto w_from = read_quantity<sagitta::dimension::line_load>(row, size, found);
        const auto w_to = read_quantity<sagitta::dimension::line_load>(row, size_to, found);
        const auto where = loaded_stretch();
        if (!w_from || !w_to || !where) return std::nullopt;
        if (where->is_whole()) return sagitta::linear_load(*w_from, *w_to);
        return sagitta::linear_load(*w_from, *w_to, sagitta::between(where->start, where->stop));
    }

    template <class Dimension, class Make>
    std::optional<any_load> movement(const Make& make) const {
        constexpr bool turns = std::is_same_v<Dimension, sagitta::dimension::plane_angle>;
        const auto amount = read_quantity<Dimension>(row, size, found);
        expect_empty(size_to);
        const std::string_view end = row.cell(from);
        const bool is_left = end == "left";
        const bool is_end = is_left || end == "right";
        if (!is_end) {
            found.refuse(row.at(from), quoted(end), "left or right");
        } else if (beam != nullptr) {
            const holding held = is_left ? beam->left : beam->right;
            const bool can_turn = held == holding::fixed || held == holding::elastic;
            const bool can_move = turns ? can_turn : held != holding::free;
            if (!can_move) {
                found.refuse(row.at(from), fmt::format("{}, an end that is {}", quoted(end), name_of(held)),
                             turns ? "an end that is fixed or elastic" : "an end that is fixed, elastic or pinned");
            }
        }
        expect_empty(to);
        if (!amount || !is_end) return std::nullopt;
        if (is_left) return make(sagitta::end::left, *amount);
        return make(sagitta::end::right, *amount);
    }
};

load_row read_row(const input_row& row, const beam_list& beams, const combination_list& combinations, findings& found) {
    const std::size_t refusals_before = found.refusals.size();
    const std::string_view name = row.cell(mark);
    const std::string_view load_case = row.cell(case_name);
    load_row out;
    if (const auto known = beams.number_of.find(name); known != beams.number_of.end()) out.beam = known->second;
    if (const auto known = combinations.number_of_case.find(load_case); known != combinations.number_of_case.end()) {
        out.load_case = known->second;
    }
    if (row.expect_whole(found)) {
        out.names_a_beam = !name.empty();
        if (!out.beam) found.refuse(row.at(mark), quoted(name), "the mark of a beam in beams.csv");
        if (load_case.empty()) found.refuse(row.at(case_name), "nothing", "the name of a load case");
        const beam_entry* beam = out.beam ? &beams.beams[*out.beam] : nullptr;
        const bool can_check = beam != nullptr && !beam->is_refused;
        out.load = load_reader{row, found, can_check ? beam : nullptr}.read();
    }
    out.is_refused = found.refusals.size() != refusals_before;
    return out;
}

struct part {
    std::vector<load_row> rows;
    findings found;
};

/// Loads side by side for each beam, in the order of the file.
beam_loads sorted_by_beam(const std::vector<part>& parts, std::size_t beam_count) {
    beam_loads out;
    out.first.assign(beam_count + 1, 0);
    const auto for_each_load = [&](const auto& take) {
        for (const auto& p : parts) {
            for (const auto& row : p.rows) {
                if (!row.is_refused && row.beam && row.load && row.load_case) take(row);
            }
        }
    };
    for_each_load([&](const load_row& row) { ++out.first[*row.beam + 1]; });
    for (std::size_t i = 0; i < beam_count; ++i) out.first[i + 1] += out.first[i];
    out.loads.resize(out.first.back(), {sagitta::uniform_load(sagitta::quantity<sagitta::dimension::line_load>()), 0});
    std::vector<std::size_t> next(out.first.begin(), out.first.end() - 1);
    for_each_load([&](const load_row& row) { out.loads[next[*row.beam]++] = {*row.load, *row.load_case}; });
    return out;
}

}  // namespace

load_table read_loads(const input_table& table, beam_list& beams, const combination_list& combinations,
                      findings& found) {
    auto parts = in_parallel<part>(table.row_count(), [&](part& p, std::size_t first, std::size_t last) {
        p.rows.reserve(last - first);
        for (std::size_t i = first; i < last; ++i)
            p.rows.push_back(read_row(table.row(i), beams, combinations, p.found));
    });

    load_table out;
    std::vector<bool> has_load(beams.beams.size());
    std::vector<bool> case_has_load(combinations.cases.size());
    std::unordered_set<std::string_view> unused_cases;
    std::size_t row_number = 0;
    for (auto& p : parts) {
        found.add(std::move(p.found));
        for (const auto& loaded : p.rows) {
            const input_row row = table.row(row_number++);
            if (loaded.beam) {
                has_load[*loaded.beam] = true;
                if (loaded.is_refused) beams.beams[*loaded.beam].is_refused = true;
            } else {
                ++(loaded.names_a_beam ? out.rows_of_no_beam : out.rows_of_any_beam);
            }
            const std::string_view load_case = row.cell(case_name);
            if (loaded.load_case) {
                case_has_load[*loaded.load_case] = true;
            } else if (!load_case.empty() && unused_cases.insert(load_case).second) {
                found.notes.push_back(
                    {row.at(case_name), fmt::format("no combination uses the case {}", quoted(load_case))});
            }
        }
    }
    for (std::size_t i = 0; i < case_has_load.size(); ++i) {
        const named_case& named = combinations.cases[i];
        if (!case_has_load[i]) {
            found.notes.push_back({named.first_named, fmt::format("no load has the case {}", quoted(named.name))});
        }
    }
    for (std::size_t i = 0; i < has_load.size(); ++i) {
        const beam_entry& beam = beams.beams[i];
        if (!has_load[i] && !beam.is_refused) {
            found.notes.push_back({beam.where, fmt::format("the beam {} has no load", quoted(beam.mark))});
        }
    }
    out.loads = sorted_by_beam(parts, beams.beams.size());
    return out;
}

}  // namespace beam_schedule
