#include "read_combinations.hpp"

#include "cell_values.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <optional>
#include <utility>

namespace beam_schedule {
namespace {

enum column : std::size_t { combination_name, case_name, factor };

/// Combinations and cases by name, made where they first occur.
class builder {
public:
    explicit builder(combination_list& list) : list_(list) {}

    std::size_t number_of(std::string_view name) {
        const auto [known, is_new] = number_of_.try_emplace(name, list_.combinations.size());
        if (is_new) {
            list_.combinations.push_back({name, {}});
            lines_.emplace_back();
        }
        return known->second;
    }

    std::uint32_t number_of_case(std::string_view name, const place& where) {
        const auto number = static_cast<std::uint32_t>(list_.cases.size());
        const auto [known, is_new] = list_.number_of_case.try_emplace(name, number);
        if (is_new) list_.cases.push_back({name, where});
        return known->second;
    }

    /// The line that has this case of this combination already; else notes that line does.
    std::optional<std::size_t> earlier_line(std::size_t number, std::uint32_t load_case, std::size_t line) {
        const auto [known, is_new] = lines_[number].try_emplace(load_case, line);
        return is_new ? std::nullopt : std::optional(known->second);
    }

    void set_factor(std::size_t number, std::uint32_t load_case, double value) {
        auto& factors = list_.combinations[number].factor;
        if (factors.size() <= load_case) factors.resize(load_case + 1);
        factors[load_case] = value;
    }

private:
    combination_list& list_;
    std::unordered_map<std::string_view, std::size_t> number_of_;
    std::vector<std::unordered_map<std::uint32_t, std::size_t>> lines_;
};

void read_row(const input_row& row, builder& out, combination_list& list, findings& found) {
    const std::size_t refusals_before = found.refusals.size();
    const std::string_view name = row.cell(combination_name);
    const std::string_view load_case = row.cell(case_name);
    const bool is_whole = row.expect_whole(found);
    std::optional<std::size_t> number;
    std::optional<std::uint32_t> case_number;
    if (!name.empty()) {
        number = out.number_of(name);
    } else if (is_whole) {
        found.refuse(row.at(combination_name), "nothing", "the name of a combination, in every row");
    }
    if (!load_case.empty()) {
        case_number = out.number_of_case(load_case, row.at(case_name));
    } else if (is_whole) {
        found.refuse(row.at(case_name), "nothing", "the name of a load case");
    }
    if (is_whole) {
        const auto value = read_factor(row, factor, found);
        if (number && case_number) {
            if (const auto earlier = out.earlier_line(*number, *case_number, row.line())) {
                found.refuse(row.at(case_name), fmt::format("{} in {} again", quoted(load_case), quoted(name)),
                             fmt::format("every case once in a combination (line {} has it too)", *earlier));
            } else if (value) {
                out.set_factor(*number, *case_number, *value);
            }
        }
    }
    if (found.refusals.size() == refusals_before) return;
    list.is_complete = false;
    if (number) {
        list.combinations[*number].is_left_out = true;
    }
}

}  // namespace

std::size_t combination_list::left_out() const {
    return static_cast<std::size_t>(
        std::count_if(combinations.begin(), combinations.end(), [](const combination& c) { return c.is_left_out; }));
}

combination_list read_combinations(const input_table& table, findings& found) {
    combination_list list;
    builder out(list);
    bool is_attributed = true;
    for (std::size_t i = 0; i < table.row_count(); ++i) {
        const input_row row = table.row(i);
        read_row(row, out, list, found);
        is_attributed = is_attributed && !row.cell(combination_name).empty();
    }
    for (auto& c : list.combinations) {
        c.factor.resize(list.cases.size());
        c.is_left_out = c.is_left_out || !is_attributed;
    }
    return list;
}

}  // namespace beam_schedule
