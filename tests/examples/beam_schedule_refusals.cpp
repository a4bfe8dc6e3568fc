// What cannot be accepted: said with its place, never called ok, and never in the way of the other beams.
#include "project_folder.hpp"

#include <doctest/doctest.h>

#include <string>

namespace {

using namespace examples_test;

const std::string good_beams =
    "GOOD,pinned,pinned,7.2 m,210 GPa,8356 cm4,L/250\n"
    "FF,fixed,fixed,4 m,210 GPa,8356 cm4,L/250\n"
    "CF,fixed,free,4 m,210 GPa,8356 cm4,20 mm\n";
const std::string good_loads =
    "GOOD,dead,uniform,4.5 kN/m,,,\n"
    "FF,dead,uniform,4.5 kN/m,,,\n"
    "CF,dead,uniform,4.5 kN/m,,,\n";
const std::string good_combinations = "all,dead,1\n";

void check_good_beam(const project_folder& project, const run_outcome& ran, const std::string& verdict = "ok") {
    CHECK(says(table_line(ran.out, "GOOD"), verdict));
    const auto results = project.results();
    REQUIRE(results.count({"GOOD", "all"}) == 1);
    CHECK(results.at({"GOOD", "all"}).verdict == "ok");
}

/// A bad row behind three good beams is refused with this message; the beam is not computed, the others are.
void check_bad_beam(const std::string& row, const std::string& message, const std::string& mark = "X") {
    CAPTURE(row);
    const project_folder project;
    project.write_rows(good_beams + row + "\n", good_loads + "X,dead,point,1 kN,,1 m,\n", good_combinations);
    const auto ran = project.run();
    CAPTURE(ran.err);
    CHECK(ran.status == 2);
    // One line for the fault, one for the results: the load of X is not complained about a second time.
    CHECK(ran.err == "beams.csv: line 5, column " + message + "\n3 results are in ./results.csv\n");
    CHECK(says(table_line(ran.out, mark), "refused"));
    check_good_beam(project, ran);
}

void check_bad_load(const std::string& row, const std::string& message, const std::string& mark = "CF") {
    CAPTURE(row);
    const project_folder project;
    project.write_rows(good_beams, good_loads + row + "\n", good_combinations);
    const auto ran = project.run();
    CAPTURE(ran.err);
    CHECK(ran.status == 2);
    CHECK(ran.err == "loads.csv: line 5, column " + message + "\n2 results are in ./results.csv\n");
    CHECK(says(table_line(ran.out, mark), "refused"));
    CHECK(project.results().count({mark, "all"}) == 0);
    check_good_beam(project, ran);
}

}  // namespace

TEST_CASE("refused beams") {
    check_bad_beam("X,fixd,free,2 m,210 GPa,8356 cm4,L/250",
                   "2 (left): found 'fixd', expected fixed, pinned, free, or elastic and its stiffness");
    check_bad_beam("X,fixed,,2 m,210 GPa,8356 cm4,L/250",
                   "3 (right): found nothing, expected fixed, pinned, free, or elastic and its stiffness");
    check_bad_beam("X,pinned,free,2 m,210 GPa,8356 cm4,L/250",
                   "3 (right): found 'free' behind 'pinned' at the left, a mechanism, "
                   "expected one fixed or elastic end, both ends pinned, or further supports in supports.csv");
    check_bad_beam("X,free,free,2 m,210 GPa,8356 cm4,L/250",
                   "3 (right): found 'free' behind 'free' at the left, a mechanism, "
                   "expected one fixed or elastic end, both ends pinned, or further supports in supports.csv");
    check_bad_beam("X,fixed,free,2,210 GPa,8356 cm4,L/250",
                   "4 (span): found '2': no unit, expected one of the units m, mm, cm, ft, in");
    check_bad_beam("X,fixed,free,2 kN,210 GPa,8356 cm4,L/250",
                   "4 (span): found '2 kN': the unit 'kN', expected one of the units m, mm, cm, ft, in");
    check_bad_beam("X,fixed,free,-2 m,210 GPa,8356 cm4,L/250", "4 (span): found '-2 m', expected more than 0");
    check_bad_beam("X,fixed,free,0 m,210 GPa,8356 cm4,L/250", "4 (span): found '0 m', expected more than 0");
    check_bad_beam("X,fixed,free,1e308 km,210 GPa,8356 cm4,L/250",
                   "4 (span): found '1e308 km', expected a number within the range of double");
    check_bad_beam("X,fixed,free,2 m,0 GPa,8356 cm4,L/250", "5 (E): found '0 GPa', expected more than 0");
    check_bad_beam("X,fixed,free,2 m,210 GPa,-1 cm4,L/250", "6 (I): found '-1 cm4', expected more than 0");
    check_bad_beam("X,fixed,free,2 m,210 GPa,8356 cm4,L/0",
                   "7 (limit): found 'L/0', expected L/ and a number greater than 0, such as L/250");
    check_bad_beam("X,fixed,free,2 m,210 GPa,8356 cm4,L/-250",
                   "7 (limit): found 'L/-250', expected L/ and a number greater than 0, such as L/250");
    check_bad_beam("X,fixed,free,2 m,210 GPa,8356 cm4,L/inf",
                   "7 (limit): found 'L/inf', expected L/ and a number greater than 0, such as L/250");
    check_bad_beam(
        "X,fixed,free,2 m,210 GPa,8356 cm4,250",
        "7 (limit): found '250': no unit, expected L/250 or the like, or a length greater than 0, such as 20 mm");
    check_bad_beam("X,fixed,free,2 m,210 GPa,8356 cm4,0 mm",
                   "7 (limit): found '0 mm', expected L/250 or the like, or a length greater than 0, such as 20 mm");
    check_bad_beam(",fixed,free,2 m,210 GPa,8356 cm4,L/250\nX,fixed,free,-2 m,210 GPa,8356 cm4,L/250",
                   "1 (mark): found nothing, expected the mark of a beam\n"
                   "beams.csv: line 6, column 4 (span): found '-2 m', expected more than 0",
                   "(line 5)");
}

TEST_CASE("numbers that are none are refused") {
    for (const std::string text : {"nan m", "inf m", "-inf m", "seven m", "1,5 m", "--1 m", "0x10 m", "1e400 m"}) {
        CAPTURE(text);
        const project_folder project;
        project.write_rows(good_beams + "X,fixed,free,\"" + text + "\",210 GPa,8356 cm4,L/250\n", good_loads,
                           good_combinations);
        const auto ran = project.run();
        CHECK(ran.status == 2);
        CHECK(ran.err.starts_with("beams.csv: line 5, column 4 (span): found '" + text + "'"));
        CHECK(says(table_line(ran.out, "X"), "refused"));
        check_good_beam(project, ran);
    }
}

TEST_CASE("rows with a wrong number of cells or wrong quotes are refused") {
    check_bad_beam("X,fixed,free,2 m", "5 (E): found 4 cells, expected 7 as in the header");
    check_bad_beam("X,fixed,free,2 m,210 GPa,8356 cm4,L/250,", "8: found 8 cells, expected 7 as in the header");
    check_bad_beam(
        "X,fixed,free,2 m,210 GPa,\"8356\" cm4,L/250",
        "6 (I): found text behind the closing quote of a cell, expected a comma or the end of the line there");
    check_bad_beam("X,fixed,free,6' 7\",210 GPa,8356 cm4,L/250",
                   "4 (span): found a quote inside a cell that does not start with one, "
                   "expected the whole cell in quotes and the quote doubled");
    check_bad_load("CF,dead,point,1 kN", "5 (size_to): found 4 cells, expected 7 as in the header");
}

TEST_CASE("every fault of a row is told at once") {
    check_bad_beam("X,fixd,free,-2 m,210 kN,8356 cm4,L/250",
                   "2 (left): found 'fixd', expected fixed, pinned, free, or elastic and its stiffness\n"
                   "beams.csv: line 5, column 4 (span): found '-2 m', expected more than 0\n"
                   "beams.csv: line 5, column 5 (E): found '210 kN': the unit 'kN', "
                   "expected one of the units MPa, GPa, kPa, N/mm2, ksi, psi");
}

TEST_CASE("a mark that stands twice is refused in both rows") {
    const project_folder project;
    project.write_rows(good_beams + "FF,fixed,fixed,5 m,210 GPa,8356 cm4,L/250\n", good_loads, good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(ran.err ==
          "beams.csv: line 5, column 1 (mark): found 'FF' again, expected every mark once (line 3 has it too)\n"
          "2 results are in ./results.csv\n");
    CHECK(says(table_line(ran.out, "FF"), "refused"));
    CHECK(project.results().count({"FF", "all"}) == 0);
    check_good_beam(project, ran);
}

TEST_CASE("refused loads") {
    check_bad_load("CF,dead,pont,1 kN,,1 m,",
                   "3 (kind): found 'pont', expected point, couple, uniform, linear, settlement or rotation");
    check_bad_load("CF,,point,1 kN,,1 m,", "2 (case): found nothing, expected the name of a load case");
    check_bad_load("CF,dead,point,1 kN/m,,1 m,",
                   "4 (size): found '1 kN/m': the unit 'kN/m', expected one of the units kN, N, MN, lbf, kip");
    check_bad_load("CF,dead,point,1 kN,,4.1 m,",
                   "6 (from): found '4.1 m', expected a place on the beam, from 0 m to 4 m");
    check_bad_load("CF,dead,point,1 kN,,-1 mm,",
                   "6 (from): found '-1 mm', expected a place on the beam, from 0 m to 4 m");
    check_bad_load("CF,dead,uniform,1 kN/m,,3 m,401 cm",
                   "7 (to): found '401 cm', expected a place on the beam, from 0 m to 4 m");
    check_bad_load("CF,dead,uniform,1 kN/m,,3 m,3000 mm",
                   "7 (to): found '3000 mm', expected a place beyond from, which is '3 m'");
    check_bad_load("CF,dead,uniform,1 kN/m,,3 m,",
                   "7 (to): found nothing, expected a place on the beam, or from and to both empty for the whole beam");
    check_bad_load(
        "CF,dead,uniform,1 kN/m,,,3 m",
        "6 (from): found nothing, expected a place on the beam, or from and to both empty for the whole beam");
    check_bad_load("CF,dead,rotation,5 mm,,left,",
                   "4 (size): found '5 mm': the unit 'mm', expected one of the units mrad, rad, deg");
}

TEST_CASE("a value that a kind of load does not use is refused") {
    check_bad_load("CF,dead,point,1 kN,,1 m,2 m",
                   "7 (to): found '2 m', expected nothing, since a load of the kind point does not use it");
    check_bad_load("CF,dead,point,1 kN,2 kN,1 m,",
                   "5 (size_to): found '2 kN', expected nothing, since a load of the kind point does not use it");
    check_bad_load("CF,dead,couple,1 kN*m,0,1 m,",
                   "5 (size_to): found '0', expected nothing, since a load of the kind couple does not use it");
    check_bad_load("CF,dead,uniform,1 kN/m,2 kN/m,,",
                   "5 (size_to): found '2 kN/m', expected nothing, since a load of the kind uniform does not use it");
    check_bad_load("CF,dead,settlement,1 mm,,left,right",
                   "7 (to): found 'right', expected nothing, since a load of the kind settlement does not use it");
}

TEST_CASE("a linear load needs both sizes, a concentrated one its place") {
    const project_folder project;
    project.write_rows(good_beams, good_loads + "CF,dead,linear,1 kN/m,,,\nFF,dead,point,1 kN,,,\n", good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(ran.err.find("loads.csv: line 5, column 5 (size_to): found nothing, expected a number with a unit") == 0);
    CHECK(ran.err.find("\nloads.csv: line 6, column 6 (from): found nothing, expected a number with a unit") !=
          std::string::npos);
    check_good_beam(project, ran);
}

TEST_CASE("ends that cannot be moved are not moved") {
    check_bad_load("CF,dead,settlement,5 mm,,right,",
                   "6 (from): found 'right', an end that is free, expected an end that is fixed, elastic or pinned");
    check_bad_load("CF,dead,rotation,1 mrad,,right,",
                   "6 (from): found 'right', an end that is free, expected an end that is fixed or elastic");
    check_bad_load("CF,dead,settlement,5 mm,,middle,", "6 (from): found 'middle', expected left or right");
    const project_folder project;
    project.write_rows(good_beams, good_loads + "GOOD,dead,rotation,1 mrad,,left,\n", good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err,
                   "loads.csv: line 5, column 6 (from): found 'left', an end that is pinned, expected an end that is "
                   "fixed or elastic"));
    CHECK(says(table_line(ran.out, "GOOD"), "refused"));
}

TEST_CASE("a load of a beam that does not exist is refused, and the table says so") {
    const project_folder project;
    project.write_rows(good_beams, good_loads + "G00D,dead,point,1 kN,,1 m,\n", good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err,
                   "loads.csv: line 5, column 1 (mark): found 'G00D', expected the mark of a beam in beams.csv"));
    CHECK(ran.out.find("\n1 row of loads.csv is on no beam: beams.csv does not have the mark.\n") != std::string::npos);
    check_good_beam(project, ran);
}

TEST_CASE("a load without a mark may belong to any beam: none is called ok") {
    const project_folder project;
    project.write_rows(good_beams, good_loads + ",dead,point,1 kN,,1 m,\n", good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err,
                   "loads.csv: line 5, column 1 (mark): found nothing, expected the mark of a beam in beams.csv"));
    CHECK(ran.out.find("incomplete: 1 row of loads.csv is refused; nobody can tell of which beam.") !=
          std::string::npos);
    check_good_beam(project, ran, "incomplete");
}

TEST_CASE("a combination with a refused row is left out, and what would be ok is incomplete") {
    struct bad_row {
        const char *row, *message;
    };
    for (const auto& bad : {
             bad_row{"more,dead,x", "3 (factor): found 'x', expected a number without a unit, such as 1.35"},
             bad_row{"more,dead,1.5 kN", "3 (factor): found '1.5 kN', expected a number without a unit, such as 1.35"},
             bad_row{"more,dead,nan", "3 (factor): found 'nan', expected a number without a unit, such as 1.35"},
             bad_row{"more,dead,", "3 (factor): found nothing, expected a number without a unit, such as 1.35"},
             bad_row{"more,,1", "2 (case): found nothing, expected the name of a load case"},
             bad_row{"more,dead", "3 (factor): found 2 cells, expected 3 as in the header"},
             bad_row{"more,dead,1,5", "4: found 4 cells, expected 3 as in the header"},
             bad_row{"more,live,2",
                     "2 (case): found 'live' in 'more' again, expected every case once in a combination (line 3 has it "
                     "too)"},
         }) {
        CAPTURE(bad.row);
        const project_folder project;
        project.write_rows(good_beams, good_loads + "FF,live,point,300 kN,,2 m,\nFF,dead,point,900 kN,,2 m,\n",
                           good_combinations + "more,live,0.3\n" + bad.row + "\n");
        const auto ran = project.run();
        CHECK(ran.status == 2);
        CHECK(ran.err ==
              "combinations.csv: line 4, column " + std::string(bad.message) + "\n3 results are in ./results.csv\n");
        CHECK(ran.out.find("incomplete: 1 combination is left out, since combinations.csv has refused rows: more.\n") !=
              std::string::npos);
        check_good_beam(project, ran, "incomplete");
        CHECK(says(table_line(ran.out, "FF"), "exceeds"));
        CHECK(project.results().count({"GOOD", "more"}) == 0);
    }
}

TEST_CASE("a row that names no combination may belong to any: none is computed") {
    const project_folder project;
    project.write_rows(good_beams, good_loads, good_combinations + ",dead,1\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err,
                   "combinations.csv: line 3, column 1 (combination): found nothing, expected the name of a "
                   "combination, in every row"));
    CHECK(says(table_line(ran.out, "GOOD"), "incomplete"));
    CHECK(project.results().empty());
}

TEST_CASE("cases that only loads or only combinations know are noted, not refused") {
    const project_folder project;
    project.write_rows(good_beams, good_loads + "CF,snw,point,1 kN,,1 m,\nFF,snw,point,1 kN,,1 m,\n",
                       good_combinations + "all,snow,1\n");
    const auto ran = project.run();
    CHECK(ran.status == 0);
    CHECK(ran.err ==
          "note: loads.csv: line 5, column 2 (case): no combination uses the case 'snw'\n"
          "note: combinations.csv: line 3, column 2 (case): no load has the case 'snow'\n"
          "3 results are in ./results.csv\n");
    check_good_beam(project, ran);
}

TEST_CASE("a refused row and an exceeded limit: the refusal wins") {
    const project_folder project;
    project.write_rows(good_beams, good_loads + "GOOD,dead,point,1 MN,,1 m,\n", good_combinations);
    CHECK(project.run().status == 1);
    project.write_rows(good_beams, good_loads + "GOOD,dead,point,1 MN,,1 m,\nCF,dead,point,1 MN,,9 m,\n",
                       good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(says(table_line(ran.out, "GOOD"), "exceeds"));
    CHECK(says(table_line(ran.out, "CF"), "refused"));
    CHECK(ran.out.find("3 beams: 1 ok, 1 exceeds, 1 refused.") != std::string::npos);
}

TEST_CASE("a beam that leaves the range of double is refused, not called ok") {
    for (const char* load : {"CF,dead,point,1e305 kN,,4 m,", "CF,dead,uniform,1.7e305 kN/m,,,"}) {
        const project_folder project;
        project.write_rows(good_beams, good_loads + load + "\n", good_combinations);
        const auto ran = project.run();
        CHECK(ran.status == 2);
        CHECK(ran.err.starts_with(
            "beams.csv: line 4, column 1 (mark): found in the beam 'CF' under the combination 'all': "));
        CHECK(says(table_line(ran.out, "CF"), "refused"));
        CHECK(project.results().count({"CF", "all"}) == 0);
        check_good_beam(project, ran);
    }
}

TEST_CASE("a cross-check that fails is shown, and the beam is not called ok") {
    const project_folder project;
    // What is left of a load of 1 kN between two that cancel has lost nine digits.
    project.write_rows(good_beams,
                       good_loads +
                           "CF,dead,point,1e10 kN,,4 m,\nCF,dead,point,-1e10 kN,,3.9999 m,\n"
                           "CF,dead,couple,-1e6 kN*m,,4 m,\n",
                       good_combinations);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(says(table_line(ran.out, "CF"), "doubtful"));
    CHECK(table_line(ran.out, "CF").find(" ! ") != std::string::npos);
    CHECK(ran.out.find("\ndoubtful: closed forms and integration differ by more than rounding") != std::string::npos);
    CHECK(ran.err.find("note: beams.csv: line 4, column 1 (mark): the beam 'CF' fails its cross-check") == 0);
    CHECK(project.results().at({"CF", "all"}).cross_check > 1e-9);
    check_good_beam(project, ran);
}

TEST_CASE("lines are counted through quoted newlines, columns as they stand in the file") {
    const project_folder project;
    write(project.path() / "beams.csv",
          "\xEF\xBB\xBFlimit,\"mark\",I,E,span,right,left,remark\r\n"
          "L/250,\"two\nlines\",8356 cm4,210 GPa,7.2 m,pinned,pinned,\"a\r\n\r\nb\"\r\n"
          "\r\n"
          "L/250,B2,8356 cm4,210 GPa,7.2 m,pinned,pinnd,\r\n"
          ",,,,,,,\r\n");
    write(project.path() / "loads.csv",
          "case,mark,kind,from,to,size_to,size\r\ndead,\"two\nlines\",uniform,,,,1 kN/m\r\ndead,\"two\nlines\",point,9 "
          "m,,,1 kN\r\n\r\n\r\n");
    write(project.path() / "combinations.csv", "factor,combination,case\r\n1,all,dead\r\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(ran.err ==
          "beams.csv: line 7, column 7 (left): found 'pinnd', expected fixed, pinned, free, or elastic and its "
          "stiffness\n"
          "loads.csv: line 4, column 4 (from): found '9 m', expected a place on the beam, from 0 m to 7.2 m\n"
          "note: beams.csv: line 1, column 8: the column 'remark' is not read\n"
          "0 results are in ./results.csv\n");
    CHECK(says(table_line(ran.out, "two\\x0alines"), "refused"));
}

TEST_CASE("a value under a column without a name is refused; empty ones are what spreadsheets leave") {
    const project_folder project;
    project.write_rows(good_beams, good_loads, "all,dead,1\n");
    write(project.path() / "combinations.csv", "combination,case,factor,,\nall,dead,1,,\n");
    CHECK(project.run().status == 0);
    write(project.path() / "combinations.csv", "combination,case,factor,,\nall,dead,1,,\nmore,dead,1,,0.7\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err,
                   "combinations.csv: line 3, column 5: found '0.7', expected nothing in a column without a name"));
}
