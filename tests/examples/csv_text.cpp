#include <beam_schedule/csv_text.hpp>

#include <doctest/doctest.h>

#include <string>
#include <vector>

namespace {

using beam_schedule::csv_error;
using beam_schedule::csv_text;
using cells = std::vector<std::string>;

std::vector<cells> records_of(const csv_text& csv) {
    std::vector<cells> out;
    for (const auto& record : csv.records()) {
        const auto span = csv.cells(record);
        out.emplace_back(span.begin(), span.end());
    }
    return out;
}
std::vector<cells> records_of(const std::string& text) { return records_of(csv_text(text)); }

std::vector<std::size_t> lines_of(const std::string& text) {
    const csv_text csv(text);
    std::vector<std::size_t> lines;
    for (const auto& record : csv.records()) lines.push_back(record.line);
    return lines;
}

const std::vector<cells> two_by_two{{"a", "b"}, {"c", "d"}};

}  // namespace

TEST_CASE("lines end in LF, CRLF or CR, the last one also without") {
    CHECK(records_of("a,b\nc,d\n") == two_by_two);
    CHECK(records_of("a,b\r\nc,d\r\n") == two_by_two);
    CHECK(records_of("a,b\rc,d\r") == two_by_two);
    CHECK(records_of("a,b\nc,d") == two_by_two);
    CHECK(records_of("a,b\r\nc,d") == two_by_two);
}

TEST_CASE("a byte-order mark belongs to no cell") {
    CHECK(records_of("\xEF\xBB\xBF"
                     "a,b\nc,d\n") == two_by_two);
    CHECK(records_of("\xEF\xBB\xBF\"a\",b\nc,d\n") == two_by_two);
    CHECK(records_of("\xEF\xBB\xBF").empty());
}

TEST_CASE("UTF-16 is refused in words") {
    CHECK_THROWS_WITH_AS(csv_text(std::string("\xFF\xFE"
                                              "a\0,\0",
                                              6)),
                         "UTF-16 text", csv_error);
    CHECK_THROWS_AS(csv_text(std::string("\xFE\xFF\0a", 4)), csv_error);
}

TEST_CASE("quoted cells hold commas, doubled quotes and line ends of every kind") {
    CHECK(records_of("\"a,b\",c\n") == std::vector<cells>{{"a,b", "c"}});
    CHECK(records_of("\"a\"\"b\",\"\"\"\"\n") == std::vector<cells>{{"a\"b", "\""}});
    CHECK(records_of("\"a\nb\",\"c\r\nd\",\"e\rf\"\n") == std::vector<cells>{{"a\nb", "c\r\nd", "e\rf"}});
    CHECK(records_of("\"\",b\n") == std::vector<cells>{{"", "b"}});
    CHECK(records_of("\"a\"") == std::vector<cells>{{"a"}});
}

TEST_CASE("empty cells are cells, also at the end of a line and of the text") {
    CHECK(records_of("a,,\n,b,\n") == std::vector<cells>{{"a", "", ""}, {"", "b", ""}});
    CHECK(records_of("a,") == std::vector<cells>{{"a", ""}});
}

TEST_CASE("blanks belong to the cell") { CHECK(records_of(" a , b\n") == std::vector<cells>{{" a ", " b"}}); }

TEST_CASE("records without any text are dropped wherever they stand") {
    CHECK(records_of("a,b\nc,d\n\n\n") == two_by_two);
    CHECK(records_of("a,b\r\n\r\nc,d\r\n,\r\n \t,\"\"\r\n") == two_by_two);
    CHECK(records_of("").empty());
    CHECK(records_of("\n\n").empty());
}

TEST_CASE("a record is numbered by the line where it starts") {
    CHECK(lines_of("a\nb\nc\n") == std::vector<std::size_t>{1, 2, 3});
    CHECK(lines_of("a\r\n\r\nb\rc\n") == std::vector<std::size_t>{1, 3, 4});
    CHECK(lines_of("\"a\n\r\n\r\"\nb\n") == std::vector<std::size_t>{1, 5});
    CHECK(lines_of("\xEF\xBB\xBF\n\na\n") == std::vector<std::size_t>{3});
}

TEST_CASE("a quoted cell that never ends is refused with the place of its opening quote") {
    try {
        const csv_text csv("a,b\n\"c\n\",d,\"e\nf,g\n");
        FAIL("no fault was found");
    } catch (const csv_error& error) {
        CHECK(error.fault().line == 3);
        CHECK(error.fault().column == 3);
        CHECK(error.fault().found == "an opening quote whose cell never ends");
    }
    CHECK_THROWS_AS(csv_text("\""), csv_error);
    CHECK_THROWS_AS(csv_text("a,\"b\"\""), csv_error);
}

TEST_CASE("a wrong quote on one line is the fault of its record only") {
    const csv_text csv("a,b\nc,5\" d\n\"e\" x,\"f\"\ng,h\n");
    CHECK(records_of(csv) == std::vector<cells>{{"a", "b"}, {"c", "5\" d"}, {"e", "f"}, {"g", "h"}});
    const auto& records = csv.records();
    CHECK(csv.fault_of(records[0]) == nullptr);
    REQUIRE(csv.fault_of(records[1]) != nullptr);
    CHECK(csv.fault_of(records[1])->line == 2);
    CHECK(csv.fault_of(records[1])->column == 2);
    REQUIRE(csv.fault_of(records[2]) != nullptr);
    CHECK(csv.fault_of(records[2])->line == 3);
    CHECK(csv.fault_of(records[2])->column == 1);
    CHECK(csv.fault_of(records[3]) == nullptr);
}

TEST_CASE("a wrong quote behind swallowed lines is the fault of the text") {
    CHECK_THROWS_AS(csv_text("\"a,b\nc,d\n\"e\",f\n"), csv_error);  // the first cell should have ended in line 1
    CHECK_THROWS_AS(csv_text("a\"b,\"c\nd\"\n"), csv_error);
}

TEST_CASE("cells stay valid when their text is moved") {
    csv_text first("a,b\n");  // short enough to be kept inside a std::string
    const csv_text second = std::move(first);
    CHECK(records_of(second) == std::vector<cells>{{"a", "b"}});
}

TEST_CASE("trimmed takes blanks and tabs from both ends only") {
    CHECK(beam_schedule::trimmed(" \ta b\t ") == "a b");
    CHECK(beam_schedule::trimmed(" \t").empty());
}
