#include "report.hpp"

#include "parallel.hpp"
#include "printable_text.hpp"
#include "text_table.hpp"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <iterator>
#include <string_view>
#include <utility>
#include <vector>

namespace beam_schedule {
namespace {

constexpr std::array columns{
    table_column{"mark", "", false},       table_column{"held", "", false},       table_column{"span", "m", true},
    table_column{"governing", "", false},  table_column{"greatest", "mm", true},  table_column{"at", "m", true},
    table_column{"limit", "mm", true},     table_column{"utilisation", "", true}, table_column{"verdict", "", false},
    table_column{"cross-check", "", true},
};
using beam_line = table_line<columns.size()>;

constexpr std::array support_columns_shown{
    table_column{"mark", "", false},  table_column{"support", "", false},
    table_column{"at", "m", true},    table_column{"reaction from", "kN", true},
    table_column{"to", "kN", true},   table_column{"moment from", "kN*m", true},
    table_column{"to", "kN*m", true},
};
using support_line = table_line<support_columns_shown.size()>;

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
std::string cross_check_text(const beam_outcome& outcome) {
    const double residual = outcome.cross_check;
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

void fill_in(const utilised& worst, beam_line& line) {
    line[4] = decimals(worst.deflection_mm, 2);
    line[5] = decimals(worst.at_m, 3);
    line[6] = decimals(worst.limit_mm, 2);
    line[7] = utilisation_text(worst.utilisation);
}

beam_line line_of(const beam_entry& entry, const beam_outcome& outcome, const std::vector<std::string>& names) {
    beam_line line;
    line.fill("-");
    line[0] = mark_text(entry);
    line[8] = name_of(outcome.result);
    if (outcome.result == verdict::refused) return line;
    line[1] = fmt::format("{}-{}", name_of(entry.left), name_of(entry.right));
    line[2] = decimals(entry.span / sagitta::units::m, 3);
    if (!entry.supported) line[6] = decimals(entry.limit.over(entry.span) / sagitta::units::mm, 2);
    if (!outcome.governing) return line;
    line[3] = outcome.is_loaded ? names[outcome.governing->combination] : "(no load)";
    fill_in(*outcome.governing, line);
    line[9] = cross_check_text(outcome);
    return line;
}

/// The spans of a beam that has several, below its own line.
std::vector<beam_line> span_lines(const beam_entry& entry, const beam_outcome& outcome,
                                  const std::vector<std::string>& names) {
    std::vector<beam_line> lines;
    if (outcome.spans.size() < 2) return lines;
    for (const utilised& worst : outcome.spans) {
        const beam_span& span = entry.supported->spans[worst.span];
        beam_line& line = lines.emplace_back();
        line[0] = fmt::format("  {}", worst.span + 1);
        line[1] = fmt::format("{}-{}", name_of(span.left), name_of(span.right));
        line[2] = decimals((span.to - span.from) / sagitta::units::m, 3);
        line[3] = outcome.is_loaded ? names[worst.combination] : "(no load)";
        fill_in(worst, line);
        // Whatever makes the whole beam doubtful or incomplete does so to each span.
        const bool can_tell = outcome.result == verdict::ok || outcome.result == verdict::exceeds;
        line[8] = name_of(!can_tell ? outcome.result : worst.utilisation > 1 ? verdict::exceeds : verdict::ok);
    }
    return lines;
}

/// A table of what the supports of continuous beams carry; nothing where there are none.
std::string supports_of(const beam_list& beams, const schedule& computed) {
    std::vector<support_line> lines;
    text_table<support_columns_shown.size()> table(support_columns_shown);
    for (std::size_t i = 0; i < computed.outcomes.size(); ++i) {
        const auto& ranges = computed.outcomes[i].supports;
        for (std::size_t j = 0; j < ranges.size(); ++j) {
            const beam_support& support = beams.beams[i].supported->supports[j];
            lines.push_back({mark_text(beams.beams[i]), std::string(name_of(support.how)),
                             decimals(support.at / sagitta::units::m, 3), decimals(ranges[j].least_reaction_kN, 2),
                             decimals(ranges[j].greatest_reaction_kN, 2), decimals(ranges[j].least_moment_kNm, 2),
                             decimals(ranges[j].greatest_moment_kNm, 2)});
            table.widen(lines.back());
        }
    }
    if (lines.empty()) return {};
    std::string out = "\nSupports of continuous beams: reactions and moments from least to greatest\n\n";
    table.append_head(out);
    for (const auto& line : lines) table.append(out, line);
    return out;
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

void append_lost_rows(std::string& out, std::size_t of_any_beam, std::size_t of_no_beam, std::string_view file) {
    if (of_any_beam != 0) {
        out += fmt::format("incomplete: {} of {} {} refused; nobody can tell of which beam.\n",
                           counted(of_any_beam, "row", "rows"), file, of_any_beam == 1 ? "is" : "are");
    }
    if (of_no_beam != 0) {
        out += fmt::format("{} of {} {} on no beam: beams.csv does not have the mark.\n",
                           counted(of_no_beam, "row", "rows"), file, of_no_beam == 1 ? "is" : "are");
    }
}

void append_reasons(std::string& out, const tally& count, const support_table& supports, const load_table& loads,
                    const combination_list& combinations, const std::vector<std::string>& names) {
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
    append_lost_rows(out, supports.rows_of_any_beam, supports.rows_of_no_beam, "supports.csv");
    append_lost_rows(out, loads.rows_of_any_beam, loads.rows_of_no_beam, "loads.csv");
    if (count.count(verdict::doubtful) != 0) {
        out += "doubtful: closed forms and integration differ by more than rounding (!); do not use these results.\n";
    }
}

}  // namespace

std::string report_of(const beam_list& beams, const support_table& supports, const load_table& loads,
                      const combination_list& combinations, const schedule& computed) {
    std::vector<std::string> names;
    for (const auto& named : combinations.combinations) names.push_back(combination_text(named));

    text_table<columns.size()> table(columns);
    struct part {
        std::vector<beam_line> lines;
        text_table<columns.size()> table{columns};
        bool has_spans = false;
    };
    auto parts = in_parallel<part>(beams.beams.size(), [&](part& p, std::size_t from, std::size_t to) {
        for (std::size_t i = from; i < to; ++i) {
            const beam_outcome& outcome = computed.outcomes[i];
            p.lines.push_back(line_of(beams.beams[i], outcome, names));
            p.table.widen(p.lines.back());
            for (auto& line : span_lines(beams.beams[i], outcome, names)) {
                p.table.widen(line);
                p.lines.push_back(std::move(line));
                p.has_spans = true;
            }
        }
    });
    bool has_spans = false;
    for (const auto& p : parts) {
        table.widen(p.table);
        has_spans = has_spans || p.has_spans;
    }

    std::string out = fmt::format(
        "Beam schedule: the greatest deflection of {} in {}\n\n", counted(beams.beams.size(), "beam", "beams"),
        counted(combinations.combinations.size() - combinations.left_out(), "combination", "combinations"));
    table.append_head(out);
    for (const auto& p : parts) {
        for (const auto& line : p.lines) table.append(out, line);
    }
    out += '\n';
    const tally count(computed);
    append_summary(out, count, beams, names);
    append_reasons(out, count, supports, loads, combinations, names);
    const std::string of_supports = supports_of(beams, computed);
    out += of_supports;
    out +=
        "\n"
        "Deflection is positive downward, 'at' is measured from the left end, utilisation = |greatest| / limit.\n";
    if (has_spans) {
        out +=
            "The spans of a continuous beam stand below it, the governing one decides. L of a limit L/n is the span, "
            "of "
            "an\n"
            "overhang twice its length (common practice, no source).\n";
    }
    if (!of_supports.empty()) {
        out +=
            "Reactions are positive upward (a support with one below 0 must hold the beam down), moments where the "
            "beam "
            "sags.\n";
    }
    out += "Cross-check: greatest relative difference between the closed forms and an independent integration.\n";
    out +=
        "Caution: elastic small-deflection theory of prismatic beams in bending; loads and factors as given, limits "
        "for\n"
        "service loads. Local codes and a licensed engineer decide; this table does not.\n";
    return out;
}

}  // namespace beam_schedule
