#include "report.hpp"

#include "parallel.hpp"
#include "printable_text.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <iterator>
#include <string_view>
#include <vector>

namespace beam_schedule {
namespace {

struct table_column {
    std::string_view name;
    std::string_view unit;
    bool is_number;
};

constexpr std::array columns{
    table_column{"mark", "", false},       table_column{"held", "", false},       table_column{"span", "m", true},
    table_column{"governing", "", false},  table_column{"greatest", "mm", true},  table_column{"at", "m", true},
    table_column{"limit", "mm", true},     table_column{"utilisation", "", true}, table_column{"verdict", "", false},
    table_column{"cross-check", "", true},
};
using table_line = std::array<std::string, columns.size()>;
using widths = std::array<std::size_t, columns.size()>;

/// With so many decimals, or as a power of ten where that would be a long row of digits.
std::string decimals(double value, int places) {
    if (std::abs(value) >= 1e7) return fmt::format("{:.4e}", value);
    std::string text = fmt::format("{:.{}f}", value, places);
    const bool is_zero = text.find_first_not_of("-0.") == std::string::npos;
    if (is_zero && text.front() == '-') text.erase(0, 1);
    return text;
}

/// Three decimals, and more where three would hide that a limit is exceeded.
std::string utilisation_text(double utilisation) {
    for (int places = 3; places < 15; ++places) {
        std::string text = decimals(utilisation, places);
        if (utilisation <= 1 || text > fmt::format("{:.{}f}", 1.0, places)) return text;
    }
    return "> 1";
}

/// Rounding as a bound, since its digits say nothing.
std::string cross_check_text(double residual) {
    if (!(residual <= plausible_cross_check)) return fmt::format("! {:.0e}", residual);
    return residual < 1e-12 ? "< 1e-12" : fmt::format("{:.0e}", residual);
}

std::string mark_text(const beam_entry& entry) {
    constexpr std::size_t widest = 24;
    if (entry.mark.empty()) return fmt::format("(line {})", entry.where.line);
    return cut_to_width(printable(entry.mark), widest);
}

std::string combination_text(const combination& named) {
    constexpr std::size_t widest = 28;
    return cut_to_width(printable(named.name), widest);
}

table_line line_of(const beam_entry& entry, const beam_outcome& outcome, const std::vector<std::string>& names) {
    table_line line;
    line.fill("-");
    line[0] = mark_text(entry);
    line[8] = name_of(outcome.result);
    if (outcome.result == verdict::refused) return line;
    line[1] = fmt::format("{}-{}", name_of(entry.left), name_of(entry.right));
    line[2] = decimals(entry.span / sagitta::units::m, 3);
    line[6] = decimals(entry.limit / sagitta::units::mm, 2);
    if (!outcome.governing) return line;
    line[3] = outcome.is_loaded ? names[outcome.governing->combination] : "(no load)";
    line[4] = decimals(outcome.governing->deflection_mm, 2);
    line[5] = decimals(outcome.governing->at_m, 3);
    line[7] = utilisation_text(outcome.governing->utilisation);
    line[9] = cross_check_text(outcome.cross_check);
    return line;
}

void widen(widths& width, const table_line& line) {
    for (std::size_t i = 0; i < width.size(); ++i) width[i] = std::max(width[i], display_width(line[i]));
}

void append(std::string& out, const table_line& line, const widths& width) {
    for (std::size_t i = 0; i < width.size(); ++i) {
        const std::size_t pad = width[i] - std::min(width[i], display_width(line[i]));
        if (columns[i].is_number) out.append(pad, ' ');
        out += line[i];
        const bool is_last = i + 1 == width.size();
        if (!is_last) out.append((columns[i].is_number ? 0 : pad) + 2, ' ');
    }
    while (out.back() == ' ') out.pop_back();
    out += '\n';
}

std::string counted(std::size_t count, std::string_view one, std::string_view many) {
    return fmt::format("{} {}", count, count == 1 ? one : many);
}

struct tally {
    std::array<std::size_t, 5> of{};
    const beam_outcome* most_utilised = nullptr;
    std::size_t most_utilised_beam = 0;

    explicit tally(const schedule& computed) {
        for (std::size_t i = 0; i < computed.outcomes.size(); ++i) {
            const beam_outcome& outcome = computed.outcomes[i];
            ++of[static_cast<std::size_t>(outcome.result)];
            if (!outcome.governing || !outcome.is_loaded) continue;
            if (most_utilised == nullptr || outcome.governing->utilisation > most_utilised->governing->utilisation) {
                most_utilised = &outcome;
                most_utilised_beam = i;
            }
        }
    }
    std::size_t count(verdict v) const { return of[static_cast<std::size_t>(v)]; }
};

void append_summary(std::string& out, const tally& count, const beam_list& beams,
                    const std::vector<std::string>& names) {
    out += counted(beams.beams.size(), "beam: ", "beams: ");
    std::string_view separator;
    for (const auto v : {verdict::ok, verdict::exceeds, verdict::doubtful, verdict::incomplete, verdict::refused}) {
        if (count.count(v) == 0) continue;
        out += fmt::format("{}{} {}", separator, count.count(v), name_of(v));
        separator = ", ";
    }
    out += '.';
    if (count.most_utilised != nullptr) {
        const utilised& most = *count.most_utilised->governing;
        out += fmt::format(" Greatest utilisation: {} of {} in {}.", utilisation_text(most.utilisation),
                           mark_text(beams.beams[count.most_utilised_beam]), names[most.combination]);
    }
    out += '\n';
}

void append_reasons(std::string& out, const tally& count, const load_table& loads, const combination_list& combinations,
                    const std::vector<std::string>& names) {
    if (count.count(verdict::refused) != 0) {
        out += "refused: a row of the beam or of its loads is not accepted; the reasons stand on standard error.\n";
    }
    if (const std::size_t left_out = combinations.left_out(); left_out != 0) {
        constexpr std::size_t most_named = 3;
        out += fmt::format("incomplete: {} left out, since combinations.csv has refused rows:",
                           counted(left_out, "combination is", "combinations are"));
        std::size_t named = 0;
        for (std::size_t i = 0; i < names.size() && named < most_named; ++i) {
            if (combinations.combinations[i].is_left_out)
                out += fmt::format("{} {}", named++ == 0 ? "" : ",", names[i]);
        }
        out += left_out > most_named ? ", ...\n" : ".\n";
    } else if (!combinations.is_complete) {
        out += "incomplete: combinations.csv has a refused row.\n";
    }
    if (loads.rows_of_any_beam != 0) {
        out += fmt::format(
            "incomplete: {}; nobody can tell of which beam.\n",
            counted(loads.rows_of_any_beam, "row of loads.csv is refused", "rows of loads.csv are refused"));
    }
    if (loads.rows_of_no_beam != 0) {
        out += fmt::format(
            "{}: beams.csv does not have the mark.\n",
            counted(loads.rows_of_no_beam, "row of loads.csv is on no beam", "rows of loads.csv are on no beam"));
    }
    if (count.count(verdict::doubtful) != 0) {
        out += "doubtful: closed forms and integration differ by more than rounding (!); do not use these results.\n";
    }
}

}  // namespace

std::string report_of(const beam_list& beams, const load_table& loads, const combination_list& combinations,
                      const schedule& computed) {
    std::vector<std::string> names;
    for (const auto& named : combinations.combinations) names.push_back(combination_text(named));

    table_line head, units, rule;
    for (std::size_t i = 0; i < columns.size(); ++i) {
        head[i] = columns[i].name;
        units[i] = columns[i].unit;
    }
    struct part {
        std::vector<table_line> lines;
        widths width{};
    };
    auto parts = in_parallel<part>(beams.beams.size(), [&](part& p, std::size_t from, std::size_t to) {
        for (std::size_t i = from; i < to; ++i) {
            p.lines.push_back(line_of(beams.beams[i], computed.outcomes[i], names));
            widen(p.width, p.lines.back());
        }
    });
    widths width{};
    widen(width, head);
    for (const auto& p : parts) {
        for (std::size_t i = 0; i < width.size(); ++i) width[i] = std::max(width[i], p.width[i]);
    }
    for (std::size_t i = 0; i < columns.size(); ++i) rule[i] = std::string(width[i], '-');

    std::string out = fmt::format(
        "Beam schedule: the greatest deflection of {} in {}\n\n", counted(beams.beams.size(), "beam", "beams"),
        counted(combinations.combinations.size() - combinations.left_out(), "combination", "combinations"));
    append(out, head, width);
    append(out, units, width);
    append(out, rule, width);
    for (const auto& p : parts) {
        for (const auto& line : p.lines) append(out, line, width);
    }
    out += '\n';
    const tally count(computed);
    append_summary(out, count, beams, names);
    append_reasons(out, count, loads, combinations, names);
    out +=
        "\n"
        "Deflection is positive downward, 'at' is measured from the left end, utilisation = |greatest| / limit.\n"
        "Cross-check: greatest relative difference between the closed forms and an independent integration.\n"
        "Caution: elastic small-deflection theory of prismatic beams in bending; loads and factors as given, limits "
        "for\n"
        "service loads. Local codes and a licensed engineer decide; this table does not.\n";
    return out;
}

}  // namespace beam_schedule
