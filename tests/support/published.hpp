// Published values: how they are printed, what it takes to meet them, and the tally of a run.
//
//   const published::source roark{"Roark, Table 8.1"};
//   published::row(roark, "case 2c: x of max y").meets("0.4215", worst.at / m);
//   published::row(roark, "case 1a: theta_A").equals(W * l * l / (2 * EI), theta_A, greatest_slope);
#pragma once

#include <doctest/doctest.h>

#include <cmath>
#include <cstddef>
#include <limits>
#include <map>
#include <ostream>
#include <sstream>
#include <string>
#include <string_view>
#include <utility>

namespace published {

/// A book, a standard or a table, by the name under which its values are counted.
struct source {
    const char* name;
};

/// How a source cut its value to the digits that it prints.
enum class rounding {
    nearest,    // half a unit of the last digit either way
    truncated,  // digits dropped: the value is less than one unit larger
    raised,     // rounded up: the value is less than one unit smaller
};

/// A decimal number as a source prints it; what is left open lies below its last digit.
class printed {
public:
    /// significant: how many digits count, where trailing zeros do not (14600 to 3 digits); 0 for all of them.
    // NOLINTNEXTLINE: a text stands for its value
    printed(const char* text, int significant = 0, rounding how = rounding::nearest)
        : text_(text), value_(std::stod(text_)), last_digit_(last_digit(text_, significant)), how_(how) {}

    [[nodiscard]] const std::string& text() const { return text_; }
    [[nodiscard]] double value() const { return value_; }

    [[nodiscard]] bool admits(double x) const {
        // A value right between two printable ones may lie on either side by the rounding of a double.
        const double slack = 1e-12 * std::abs(value_);
        const double excess = value_ < 0 ? value_ - x : x - value_;
        switch (how_) {
            case rounding::truncated:
                return excess >= -slack && excess < last_digit_;
            case rounding::raised:
                return excess <= slack && excess > -last_digit_;
            case rounding::nearest:
                break;
        }
        return std::abs(excess) <= last_digit_ / 2 + slack;
    }

private:
    static double last_digit(std::string_view text, int significant) {
        if (!text.empty() && text.front() == '-') text.remove_prefix(1);
        const auto point = text.find('.');
        if (significant == 0) {
            return point == std::string_view::npos ? 1.0 : std::pow(10.0, -double(text.size() - point - 1));
        }
        const double size = std::abs(std::stod(std::string(text)));
        return std::pow(10.0, std::floor(std::log10(size)) + 1 - significant);
    }

    std::string text_;
    double value_;
    double last_digit_;
    rounding how_;
};

/// For sources that drop digits, or round up where they should round down. Every use says so in a remark.
inline printed truncated(const char* text) { return {text, 0, rounding::truncated}; }
inline printed raised(const char* text) { return {text, 0, rounding::raised}; }

/// All published values of a run, by source and label. A value compared at several places counts once and is
/// met when every comparison is.
class tally {
public:
    static tally& of_this_run() {
        static tally the_tally;
        return the_tally;
    }

    /// A value compared with the library's, by its source and label.
    void compared(const source& from, const std::string& label, bool met) {
        const auto [place, is_new] = values_[from.name].emplace(label, met);
        if (!is_new) place->second = place->second && met;
        ++comparisons_;
    }
    /// A misprint, and whether the library was shown not to meet it.
    void misprint(const source& from, const std::string& label, bool shown) {
        misprints_[std::string(from.name) + ", " + label] = shown;
    }

    void print(std::ostream& out) const {
        std::size_t of_all = 0;
        std::size_t met_of_all = 0;
        std::ostringstream lines;
        for (const auto& [name, values] : values_) {
            const std::size_t met = met_in(values);
            lines << "  " << met << " of " << values.size() << "  " << name << '\n';
            of_all += values.size();
            met_of_all += met;
        }
        out << "published values met: " << met_of_all << " of " << of_all << " (" << comparisons_
            << " comparisons), by source:\n"
            << lines.str();
        out << "misprints shown not to hold: " << met_in(misprints_) << " of " << misprints_.size() << '\n';
    }

private:
    using verdicts = std::map<std::string, bool>;

    static std::size_t met_in(const verdicts& values) {
        std::size_t met = 0;
        for (const auto& [label, is_met] : values) met += is_met ? 1 : 0;
        return met;
    }

    std::map<std::string, verdicts> values_;
    verdicts misprints_;
    std::size_t comparisons_ = 0;
};

/// One published value or formula. Its comparisons fail the test where they fail.
class row {
public:
    row(const source& from, std::string label) : from_(from), label_(std::move(label)) {}

    /// The library's value, in the printed unit, would be printed like this.
    void meets(const printed& value, double library) const {
        const bool met = value.admits(library);
        tally::of_this_run().compared(from_, label_, met);
        CHECK_MESSAGE(met, std::string(from_.name), ", ", label_, ": printed ", value.text(), ", here ", text(library));
    }

    /// The published formula, evaluated, is the library's value to 1e-12 of size, the greatest value of its
    /// kind in that beam.
    void equals(double formula, double library, double size) const {
        const bool met = std::abs(formula - library) <= 1e-12 * size;
        tally::of_this_run().compared(from_, label_, met);
        CHECK_MESSAGE(met, std::string(from_.name), ", ", label_, ": published ", text(formula), ", here ",
                      text(library), ", apart by ", text(std::abs(formula - library) / size), " of the greatest");
    }
    void equals(double formula, double library) const { equals(formula, library, std::abs(formula)); }

    /// The printed value is a known misprint: the library must not meet it.
    void is_misprint(const printed& value, double library) const {
        const bool shown = std::isfinite(library) && !value.admits(library);
        tally::of_this_run().misprint(from_, label_, shown);
        CHECK_MESSAGE(shown, std::string(from_.name), ", ", label_, ": known as a misprint, yet ", value.text(),
                      " is met by ", text(library));
    }

private:
    static std::string text(double x) {
        std::ostringstream out;
        out.precision(std::numeric_limits<double>::max_digits10);
        out << x;
        return out.str();
    }

    source from_;
    std::string label_;
};

}  // namespace published
