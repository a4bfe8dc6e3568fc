// Prints the tally of published values when the tests have run.
#include "support/published.hpp"

#include <iostream>

namespace {

struct published_report : doctest::IReporter {
    explicit published_report(const doctest::ContextOptions& options) : out(options.cout ? *options.cout : std::cout) {}

    void test_run_end(const doctest::TestRunStats&) override { published::tally::of_this_run().print(out); }

    void report_query(const doctest::QueryData&) override {}
    void test_run_start() override {}
    void test_case_start(const doctest::TestCaseData&) override {}
    void test_case_reenter(const doctest::TestCaseData&) override {}
    void test_case_end(const doctest::CurrentTestCaseStats&) override {}
    void test_case_exception(const doctest::TestCaseException&) override {}
    void subcase_start(const doctest::SubcaseSignature&) override {}
    void subcase_end() override {}
    void log_assert(const doctest::AssertData&) override {}
    void log_message(const doctest::MessageData&) override {}
    void test_case_skipped(const doctest::TestCaseData&) override {}

    std::ostream& out;
};

}  // namespace

REGISTER_LISTENER("published values", 1, published_report);
