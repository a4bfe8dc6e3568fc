// What a printed value admits, and that the tally counts.
#include "support/published.hpp"

#include <sstream>

using published::printed;
using published::raised;
using published::truncated;

TEST_CASE("a printed value leaves half a unit of its last digit open") {
    CHECK(printed("0.0130").admits(0.01304));
    CHECK(printed("0.0130").admits(0.01296));
    CHECK_FALSE(printed("0.0130").admits(0.01306));
    CHECK_FALSE(printed("0.0130").admits(-0.01304));
    CHECK(printed("-0.050").admits(-0.0504));
    CHECK_FALSE(printed("-0.050").admits(-0.0506));
    CHECK(printed("384").admits(384.4));
    CHECK_FALSE(printed("384").admits(384.6));
    CHECK(printed("14600", 3).admits(14551));
    CHECK_FALSE(printed("14600", 3).admits(14549));
    CHECK_FALSE(printed("14600").admits(14599));
    CHECK_FALSE(printed("384").admits(std::nan("")));
}

TEST_CASE("a source that cuts digits leaves one unit open, on one side") {
    CHECK(truncated("0.928").admits(0.92857));
    CHECK_FALSE(truncated("0.928").admits(0.9279));
    CHECK_FALSE(truncated("0.928").admits(0.9291));
    CHECK(truncated("-0.00304").admits(-0.003048));
    CHECK_FALSE(truncated("-0.00304").admits(-0.003039));
    CHECK(raised("0.380").admits(0.37946));
    CHECK_FALSE(raised("0.380").admits(0.3801));
    CHECK_FALSE(raised("0.380").admits(0.3789));
    CHECK(raised("-0.00653").admits(-0.006522));
    CHECK_FALSE(raised("-0.00653").admits(-0.006531));
}

TEST_CASE("a value of several comparisons counts once, and is met when all of them are") {
    published::tally tally;
    tally.compared({"a book"}, "first", true);
    tally.compared({"a book"}, "first", false);
    tally.compared({"a book"}, "first", true);
    tally.compared({"a book"}, "second", true);
    tally.compared({"another book"}, "first", true);
    tally.misprint({"a book"}, "third", true);
    std::ostringstream out;
    tally.print(out);
    CHECK(out.str() ==
          "published values met: 2 of 3 (5 comparisons), by source:\n"
          "  1 of 2  a book\n"
          "  1 of 1  another book\n"
          "misprints shown not to hold: 1 of 1\n");
}
