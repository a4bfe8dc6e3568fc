// Files, folders, arguments and the printed table.
#include "project_folder.hpp"

#include <doctest/doctest.h>

#include <string>

namespace {

using namespace examples_test;

const std::string one_beam = "B,pinned,pinned,7.2 m,210 GPa,8356 cm4,L/250\n";
const std::string one_load = "B,dead,uniform,4.5 kN/m,,,\n";
const std::string one_combination = "all,dead,1\n";
const std::string earlier = "earlier results";
const std::string nothing_done = "beam_schedule: nothing is computed, nothing is written";

void check_that_nothing_is_done(const project_folder& project, const std::string& message) {
    write(project.path() / "results.csv", earlier);
    const auto ran = project.run();
    CAPTURE(ran.err);
    CHECK(ran.status == 2);
    CHECK(ran.out.empty());
    CHECK(has_line(ran.err, message));
    CHECK(has_line(ran.err, nothing_done));
    CHECK(project.results_text() == earlier);
}

/// No half-written file is left behind.
bool has_leftovers(const fs::path& folder) {
    for (const auto& entry : fs::directory_iterator(folder)) {
        if (entry.path().extension() == ".part") return true;
    }
    return false;
}

}  // namespace

TEST_CASE("the table of the demo is as it should be") {
    const project_folder project;
    const auto ran = project.run("'" SAGITTA_SOURCE_FOLDER "/examples/beam_schedule/demo' --out results");
    CHECK(ran.status == 0);
    CHECK(ran.err ==
          "84 results are in results/results.csv\n"
          "32 results of spans are in results/results_spans.csv\n"
          "40 results of supports are in results/results_supports.csv\n");
    CHECK(ran.out == text_of(SAGITTA_SOURCE_FOLDER "/tests/examples/expected_demo_table.txt"));
    CHECK(project.results_text("results").starts_with("mark,"));
}

TEST_CASE("the cautions are in the table and in the help") {
    const project_folder project;
    project.write_rows(one_beam, one_load, one_combination);
    for (const char* arguments : {".", "--help"}) {
        const auto ran = project.run(arguments);
        CHECK(ran.status == 0);
        for (const char* caution :
             {"elastic small-deflection theory", "service loads", "ocal codes and a licensed engineer"}) {
            CAPTURE(caution);
            std::string text = ran.out;
            for (char& c : text) {
                if (c == '\n') c = ' ';
                if (c == 'E') c = 'e';
            }
            CHECK(text.find(caution) != std::string::npos);
        }
    }
}

TEST_CASE("results go beside the input, or where --out says") {
    const project_folder project;
    project.write_rows(one_beam, one_load, one_combination);
    CHECK(project.run(".").status == 0);
    const std::string text = project.results_text();
    CHECK(text.size() > 100);
    for (const char* arguments : {". --out a/b", "--out a/b .", ". --out=a/b", "--out=a/b -- ."}) {
        fs::remove_all(project.path() / "a");
        CHECK(project.run(arguments).status == 0);
        CHECK(project.results_text("a/b") == text);
    }
    CHECK(!has_leftovers(project.path()));
}

TEST_CASE("wrong arguments are refused") {
    const project_folder project;
    project.write_rows(one_beam, one_load, one_combination);
    for (const char* arguments :
         {"", "--out x", ". . ", ". --out", ". --out=", ". --out x --out y", ". --quick", "''"}) {
        CAPTURE(arguments);
        const auto ran = project.run(arguments);
        CHECK(ran.status == 2);
        CHECK(has_line(ran.err, "usage: beam_schedule INPUT_FOLDER [--out OUTPUT_FOLDER]"));
        CHECK(ran.out.empty());
    }
    CHECK(!fs::exists(project.path() / "results.csv"));
}

TEST_CASE("a missing file or column, or no rows: nothing is overwritten") {
    const project_folder project;
    const auto write_all = [&] { project.write_rows(one_beam, one_load, one_combination); };
    write_all();
    fs::remove(project.path() / "loads.csv");
    check_that_nothing_is_done(
        project,
        "loads.csv: found no readable file in the folder '.' (No such file or directory), expected a CSV file");
    fs::create_directory(project.path() / "loads.csv");
    check_that_nothing_is_done(
        project, "loads.csv: found no readable file in the folder '.' (Is a directory), expected a CSV file");
    fs::remove(project.path() / "loads.csv");

    write_all();
    write(project.path() / "loads.csv", "mark,case,kind,size,from,to\n");
    check_that_nothing_is_done(project,
                               "loads.csv: line 1: found no column size_to, expected a header with the columns "
                               "mark,case,kind,size,size_to,from,to");
    write(project.path() / "loads.csv", "mark,case,kind,size,size_to,from,to,from\n");
    check_that_nothing_is_done(
        project, "loads.csv: line 1, column 8 (from): found the same column again, expected every column once");
    write(project.path() / "loads.csv", "");
    check_that_nothing_is_done(
        project,
        "loads.csv: found an empty file, expected a header with the columns mark,case,kind,size,size_to,from,to");

    write_all();
    write(project.path() / "combinations.csv", "combination;case;factor\nall;dead;1\n");
    check_that_nothing_is_done(
        project,
        "combinations.csv: line 1: found no column combination, expected a header with the columns "
        "combination,case,factor (separated by commas, not by semicolons)");
    write(project.path() / "combinations.csv", "combination,case,factor\n");
    check_that_nothing_is_done(project, "combinations.csv: found no row below the header, expected at least one");
    write(project.path() / "combinations.csv", "combination,case,factor\nall,\"dead,1\n");
    check_that_nothing_is_done(
        project,
        "combinations.csv: line 2, column 2: found an opening quote whose cell never ends, expected a closing quote");
}

TEST_CASE("supports.csv may be missing, or without rows; what stands there must be readable") {
    const project_folder project;
    project.write_rows(one_beam, one_load, one_combination);
    const auto without = project.run();
    const std::string results = project.results_text();
    CHECK(without.status == 0);
    CHECK(!fs::exists(project.path() / "results_spans.csv"));
    CHECK(!fs::exists(project.path() / "results_supports.csv"));
    project.write_supports("");
    const auto with_none = project.run();
    CHECK(with_none.status == 0);
    CHECK(with_none.out == without.out);
    CHECK(with_none.err == without.err);
    CHECK(project.results_text() == results);
    CHECK(!fs::exists(project.path() / "results_spans.csv"));

    write(project.path() / "supports.csv", "mark,at,kind,stiffness\n");
    check_that_nothing_is_done(project,
                               "supports.csv: line 1: found no column settlement, expected a header with the columns "
                               "mark,at,kind,stiffness,settlement");
    write(project.path() / "supports.csv", "");
    check_that_nothing_is_done(
        project,
        "supports.csv: found an empty file, expected a header with the columns mark,at,kind,stiffness,settlement");
    fs::remove(project.path() / "supports.csv");
    fs::create_directory(project.path() / "supports.csv");
    check_that_nothing_is_done(
        project, "supports.csv: found no readable file in the folder '.' (Is a directory), expected a CSV file");
}

TEST_CASE("the files for continuous beams go with those beams") {
    const project_folder project;
    project.write_rows(one_beam, one_load, one_combination);
    project.write_supports("B,3 m,pinned,,\n");
    CHECK(project.run().status == 0);
    CHECK(project.spans().at({"B", "all"}).size() == 2);
    CHECK(project.supports().at({"B", "all"}).size() == 3);

    // One of three cannot be put in place: what stands before it is new, what stands behind it is as it was.
    const std::string supports = text_of(project.path() / "results_supports.csv");
    fs::remove(project.path() / "results_spans.csv");
    fs::create_directories(project.path() / "results_spans.csv" / "inside");
    project.write_supports("B,4 m,pinned,,\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err, "1 results are in ./results.csv"));
    CHECK(ran.err.find("beam_schedule: ./results_spans.csv could not be written and is as it was: ") !=
          std::string::npos);
    CHECK(has_line(ran.err, "beam_schedule: ./results_supports.csv is as it was"));
    CHECK(text_of(project.path() / "results_supports.csv") == supports);
    CHECK(!has_leftovers(project.path()));
    fs::remove_all(project.path() / "results_spans.csv");

    // No beam is continuous any more: rows of an earlier run would belong to nothing.
    CHECK(project.run().status == 0);
    project.write_supports("");
    CHECK(project.run().status == 0);
    CHECK(text_of(project.path() / "results_spans.csv") ==
          "mark,combination,span,from_m,to_m,greatest_deflection_mm,at_m,limit_mm,utilisation,verdict\n");
    CHECK(text_of(project.path() / "results_supports.csv") ==
          "mark,combination,at_m,support,reaction_kN,moment_kNm,deflection_mm\n");
}

TEST_CASE("a full disk leaves all files of continuous beams as they were") {
    const project_folder project;
    std::string beams, loads, supports;
    for (int i = 0; i < 500; ++i) {
        const std::string mark = "B" + std::to_string(i);
        beams += mark + one_beam.substr(1);
        loads += mark + one_load.substr(1);
        supports += mark + ",3 m,pinned,,\n";
    }
    project.write_rows(beams, loads, one_combination);
    project.write_supports(supports);
    for (const char* name : {"results.csv", "results_spans.csv", "results_supports.csv"}) {
        write(project.path() / name, earlier);
    }
    // results.csv would still fit.
    const auto ran = project.run(". >/dev/null 2>said.txt #", "trap '' XFSZ; ulimit -f 100;");
    CHECK(ran.status == 2);
    CHECK(text_of(project.path() / "said.txt") ==
          "beam_schedule: ./results.csv is as it was\n"
          "beam_schedule: ./results_spans.csv could not be written and is as it was: File too large\n"
          "beam_schedule: ./results_supports.csv could not be written and is as it was: File too large\n");
    for (const char* name : {"results.csv", "results_spans.csv", "results_supports.csv"}) {
        CHECK(text_of(project.path() / name) == earlier);
    }
    CHECK(!has_leftovers(project.path()));
}

TEST_CASE("results.csv is replaced as a whole or not at all") {
    const project_folder project;
    std::string beams, loads;
    for (int i = 0; i < 500; ++i) {
        const std::string mark = "B" + std::to_string(i);
        beams += mark + one_beam.substr(1);
        loads += mark + one_load.substr(1);
    }
    project.write_rows(beams, loads, one_combination);
    write(project.path() / "results.csv", earlier);

    SUBCASE("where the file grows beyond what the system allows") {
        const auto ran = project.run(". >/dev/null 2>said.txt #", "trap '' XFSZ; ulimit -f 16;");
        CHECK(ran.status == 2);
        CHECK(text_of(project.path() / "said.txt") ==
              "beam_schedule: ./results.csv could not be written and is as it was: File too large\n");
        CHECK(project.results_text() == earlier);
    }
    SUBCASE("where its name belongs to a folder") {
        fs::create_directories(project.path() / "taken" / "results.csv" / "inside");
        const auto ran = project.run(". --out taken");
        CHECK(ran.status == 2);
        CHECK(ran.err.find("taken/results.csv could not be written and is as it was: ") != std::string::npos);
        CHECK(fs::exists(project.path() / "taken" / "results.csv" / "inside"));
        CHECK(!has_leftovers(project.path() / "taken"));
        CHECK(ran.out.find("500 beams: 500 ok.") != std::string::npos);
    }
    SUBCASE("where the folder cannot be made") {
        write(project.path() / "file", "");
        const auto ran = project.run(". --out file/below");
        CHECK(ran.status == 2);
        CHECK(ran.err.find("file/below/results.csv could not be written and is as it was: ") != std::string::npos);
    }
    SUBCASE("and it is replaced where all is well") {
        CHECK(project.run().status == 0);
        CHECK(project.results().size() == 500);
    }
    CHECK(!has_leftovers(project.path()));
}

TEST_CASE("a table that cannot be printed is an error") {
    if (!fs::exists("/dev/full")) return;
    const project_folder project;
    project.write_rows(one_beam, one_load, one_combination);
    const auto ran = project.run(". >/dev/full 2>said.txt #");
    CHECK(ran.status == 2);
    CHECK(text_of(project.path() / "said.txt").find("beam_schedule: the table could not be printed\n") == 0);
}

TEST_CASE("formulas in cells are disarmed in results.csv") {
    const project_folder project;
    std::string beams, loads;
    for (const std::string mark : {"=1+1", "+1", "-1", "@x"}) {
        beams += mark + one_beam.substr(1);
        loads += mark + one_load.substr(1);
    }
    project.write_rows(beams, loads, "=all,dead,1\n");
    CHECK(project.run().status == 0);
    const std::string text = project.results_text();
    for (const char* start : {"\n\"'=1+1\",\"'=all\",", "\n\"'+1\",", "\n\"'-1\",", "\n\"'@x\","}) {
        CHECK(text.find(start) != std::string::npos);
    }
    // Numbers stay numbers.
    project.write_rows(one_beam, "B,dead,point,-1 kN,,1 m,\n", one_combination);
    CHECK(project.run().status == 0);
    CHECK(project.results_text().find("\nB,all,-0.") != std::string::npos);
}

TEST_CASE("cells cannot steer the terminal") {
    const project_folder project;
    project.write_rows("\x1b]0;title\x07" + one_beam.substr(1) + "\"\x1b[2J\rok\"" + one_beam.substr(1) +
                           "C,\x1b[31mfixed,free,1 m,1 GPa,1 cm4,L/250\n",
                       "\x1b]0;title\x07" + one_load.substr(1) + "B\x08,dead\x1b,point,1 kN,,1 m,\n",
                       "\x9b"
                       "all,dead,1\nall\x7f,de\x1b"
                       "ad,1\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    for (const std::string& text : {ran.out, ran.err}) {
        CHECK(!text.empty());
        for (const char c : text) {
            const auto byte = static_cast<unsigned char>(c);
            CHECK((c == '\n' || (byte >= 0x20 && byte < 0x7F)));
        }
    }
}

TEST_CASE("a mark as long as a page is cut in the table, not in the results") {
    const project_folder project;
    const std::string mark(5000, 'M');
    project.write_rows(mark + one_beam.substr(1), mark + one_load.substr(1), one_combination);
    const auto ran = project.run();
    CHECK(ran.status == 0);
    CHECK(ran.out.find(std::string(23, 'M') + "… ") != std::string::npos);
    CHECK(ran.out.find(std::string(24, 'M')) == std::string::npos);
    CHECK(project.results().count({mark, "all"}) == 1);
}

TEST_CASE("the exact limit is within the limit, and a table never rounds an exceeded one down to it") {
    const project_folder project;
    // The settlement is the greatest deflection.
    project.write_rows(
        "even,pinned,pinned,7 m,210 GPa,8356 cm4,10 mm\nover,pinned,pinned,7 m,210 GPa,8356 cm4,9.9999 mm\n",
        "even,dead,settlement,10 mm,,left,\nover,dead,settlement,10 mm,,left,\n", one_combination);
    const auto ran = project.run();
    CHECK(ran.status == 1);
    CHECK(ran.out.find(" 1.000  ok ") != std::string::npos);
    CHECK(ran.out.find(" 1.00001  exceeds ") != std::string::npos);
}
