#include <beam_schedule/csv_cell.hpp>
#include <beam_schedule/printable_text.hpp>

#include <doctest/doctest.h>

#include <string>

using beam_schedule::csv_cell;
using beam_schedule::cut_to_width;
using beam_schedule::display_width;
using beam_schedule::printable;

TEST_CASE("text of people is printed as it is") {
    for (const char* text : {"", "B 12", "Träger 5", "桁 A", "ligne d'appui – 3 °", "\xF0\x9F\x8F\xA0"}) {
        CHECK(printable(text) == text);
    }
}

TEST_CASE("what would steer a terminal is written out") {
    CHECK(printable("\x1b[31mred") == "\\x1b[31mred");
    CHECK(printable("a\nb\rc\td\x7f") == "a\\x0ab\\x0dc\\x09d\\x7f");
    CHECK(printable(std::string("a\0b", 3)) == "a\\x00b");
    CHECK(printable("\xC2\x9B"
                    "31m") == "\\xc2\\x9b31m");             // the 8-bit control sequence introducer
    CHECK(printable("\xE2\x80\xAE") == "\\xe2\\x80\\xae");  // right-to-left override
    CHECK(printable("\xE2\x80\x8B") == "\\xe2\\x80\\x8b");  // zero-width space
}

TEST_CASE("bytes that are no UTF-8 are written out") {
    CHECK(printable("Tr\xE4ger") == "Tr\\xe4ger");                   // Latin-1
    CHECK(printable("\xC3") == "\\xc3");                             // cut off
    CHECK(printable("\xC0\xAF") == "\\xc0\\xaf");                    // longer than need be
    CHECK(printable("\xED\xA0\x80") == "\\xed\\xa0\\x80");           // a surrogate
    CHECK(printable("\xF5\x80\x80\x80") == "\\xf5\\x80\\x80\\x80");  // beyond the last character
}

TEST_CASE("widths are those of a terminal") {
    CHECK(display_width("abc") == 3);
    CHECK(display_width("Träger") == 6);
    CHECK(display_width("桁") == 2);
    CHECK(display_width("e\xCC\x81") == 1);  // combining accent
}

TEST_CASE("what is cut shows it") {
    CHECK(cut_to_width("abcdef", 6) == "abcdef");
    CHECK(cut_to_width("abcdefg", 6) == "abcde…");
    CHECK(cut_to_width("桁桁桁桁", 6) == "桁桁…");
}

TEST_CASE("cells are quoted where RFC 4180 wants it") {
    CHECK(csv_cell("B 1") == "B 1");
    CHECK(csv_cell("a,b") == "\"a,b\"");
    CHECK(csv_cell("5\"") == "\"5\"\"\"");
    CHECK(csv_cell("a\nb") == "\"a\nb\"");
    CHECK(csv_cell("") == "");
}

TEST_CASE("cells that a spreadsheet would run are disarmed") {
    CHECK(csv_cell("=1+1") == "\"'=1+1\"");
    CHECK(csv_cell("+A1") == "\"'+A1\"");
    CHECK(csv_cell("-A1") == "\"'-A1\"");
    CHECK(csv_cell("@sum") == "\"'@sum\"");
    CHECK(csv_cell("\tx") == "\"'\tx\"");
    CHECK(csv_cell("\rx") == "\"'\rx\"");
    CHECK(csv_cell("=\"x\"") == "\"'=\"\"x\"\"\"");
    CHECK(csv_cell("a=b") == "a=b");
}
