// What cannot be accepted of supports.csv and of elastic ends: said with its place, never called ok, and never in the
// way of the other beams.
#include "project_folder.hpp"

#include <doctest/doctest.h>

#include <array>
#include <string>

namespace {

using namespace examples_test;

const std::string good_beams =
    "GOOD,pinned,pinned,7.2 m,210 GPa,8356 cm4,L/250\n"
    "TWO,pinned,pinned,6 m,210 GPa,8356 cm4,L/250\n"
    "X,pinned,free,6 m,210 GPa,8356 cm4,L/250\n";
const std::string good_loads =
    "GOOD,dead,uniform,4.5 kN/m,,,\n"
    "TWO,dead,uniform,4.5 kN/m,,,\n"
    "X,dead,uniform,4.5 kN/m,,,\n";
const std::string good_supports = "TWO,3 m,pinned,,\nX,4 m,pinned,,\n";
const std::string good_combinations = "all,dead,1\n";

void check_good_beams(const project_folder& project, const run_outcome& ran, const std::string& verdict = "ok") {
    const auto results = project.results();
    for (const char* mark : {"GOOD", "TWO"}) {
        CHECK(says(table_line(ran.out, mark), verdict));
        REQUIRE(results.count({mark, "all"}) == 1);
        CHECK(results.at({mark, "all"}).verdict == "ok");
    }
    CHECK(project.supports().at({"TWO", "all"}).size() == 3);
}

/// Rows behind good ones are refused with this message, and X is not computed.
void check_refused(const std::string& rows, const std::string& message) {
    CAPTURE(rows);
    const project_folder project;
    project.write_rows(good_beams, good_loads, good_combinations);
    project.write_supports(good_supports + rows + "\n");
    const auto ran = project.run();
    CAPTURE(ran.err);
    CHECK(ran.status == 2);
    CHECK(ran.err == message +
                         "\n2 results are in ./results.csv\n2 results of spans are in ./results_spans.csv\n"
                         "3 results of supports are in ./results_supports.csv\n");
    CHECK(says(table_line(ran.out, "X"), "refused"));
    CHECK(project.supports().count({"X", "all"}) == 0);
    check_good_beams(project, ran);
}
void check_bad_row(const std::string& row, const std::string& message) {
    check_refused(row, "supports.csv: line 4, column " + message);
}

/// A beam that its supports do not carry: what can move is said.
void check_mechanism(const std::string& ends, const std::string& supports, const std::string& place) {
    CAPTURE(ends);
    CAPTURE(supports);
    const project_folder project;
    project.write_rows("X," + ends + ",6 m,210 GPa,8356 cm4,L/250\n" + good_beams.substr(0, good_beams.find("X,")),
                       good_loads, good_combinations);
    project.write_supports("TWO,3 m,pinned,,\n" + supports);
    const auto ran = project.run();
    CAPTURE(ran.err);
    CHECK(ran.status == 2);
    CHECK(
        ran.err.starts_with("beams.csv: line 2, column 1 (mark): found in the beam 'X' on its supports: "
                            "continuous_beam: the place = " +
                            place));
    CHECK(has_line(ran.err.substr(ran.err.find("the beam is")),
                   "the beam is a mechanism, expected ends and supports that hold every part of it"));
    CHECK(says(table_line(ran.out, "X"), "refused"));
    check_good_beams(project, ran);
}

}  // namespace

TEST_CASE("refused supports") {
    check_bad_row("X,2 m,roller,,", "3 (kind): found 'roller', expected pinned, spring or hinge");
    check_bad_row("X,2 m,,,", "3 (kind): found nothing, expected pinned, spring or hinge");
    check_bad_row("X,6.1 m,pinned,,", "2 (at): found '6.1 m', expected a place on the beam, from 0 m to 6 m");
    check_bad_row("X,-1 mm,pinned,,", "2 (at): found '-1 mm', expected a place on the beam, from 0 m to 6 m");
    check_bad_row("X,two,pinned,,", "2 (at): found 'two', expected a number with a unit, such as '7.2 m'");
    check_bad_row("X,nan m,pinned,,", "2 (at): found 'nan m', expected a number with a unit, such as '7.2 m'");
    check_bad_row("X,2 kN,pinned,,",
                  "2 (at): found '2 kN': the unit 'kN', expected one of the units m, mm, cm, ft, in");
    check_bad_row("X,2 m,spring,,",
                  "4 (stiffness): found nothing, expected the stiffness of the spring, such as 8 kN/mm");
    check_bad_row("X,2 m,spring,-8 kN/mm,", "4 (stiffness): found '-8 kN/mm', expected more than 0");
    check_bad_row("X,2 m,spring,0 kN/mm,", "4 (stiffness): found '0 kN/mm', expected more than 0");
    check_bad_row("X,2 m,spring,8 kN*m/rad,",
                  "4 (stiffness): found '8 kN*m/rad': the unit 'kN*m/rad', "
                  "expected one of the units kN/m, N/m, kip/ft, lbf/ft");
    check_bad_row("X,2 m,pinned,,2 kN",
                  "5 (settlement): found '2 kN': the unit 'kN', expected one of the units m, mm, cm, ft, in");
    check_bad_row("X,2 m,pinned,", "5 (settlement): found 4 cells, expected 5 as in the header");
}

TEST_CASE("a value that a kind of support does not use is refused") {
    check_bad_row("X,2 m,pinned,8 kN/mm,",
                  "4 (stiffness): found '8 kN/mm', expected nothing, since the kind pinned does not use it");
    check_bad_row("X,2 m,hinge,8 kN/mm,",
                  "4 (stiffness): found '8 kN/mm', expected nothing, since the kind hinge does not use it");
    check_bad_row("X,2 m,hinge,,2 mm",
                  "5 (settlement): found '2 mm', expected nothing, since the kind hinge does not use it");
}

TEST_CASE("places that are taken") {
    check_bad_row("X,0 m,pinned,,",
                  "2 (at): found '0 m', the left end, which is pinned, "
                  "expected a place between the ends of the beam, or a free end");
    check_bad_row("X,6 m,hinge,,", "2 (at): found '6 m', expected a place between the ends of the beam, for a hinge");
    check_bad_row("X,4 m,pinned,,",
                  "2 (at): found another support at 4 m, expected one at a place (line 3 has it too)");
    check_bad_row("X,4000 mm,spring,8 kN/mm,",
                  "2 (at): found another support at 4000 mm, expected one at a place (line 3 has it too)");
    check_refused("X,2 m,hinge,,\nX,200 cm,hinge,,",
                  "supports.csv: line 5, column 2 (at): found another hinge at 200 cm, "
                  "expected one at a place (line 4 has it too)");
    check_refused("X,6 m,pinned,,\nX,600 cm,pinned,,",
                  "supports.csv: line 5, column 2 (at): found another support at 600 cm, "
                  "expected one at a place (line 4 has it too)");
}

TEST_CASE("every fault of a row is told at once") {
    check_bad_row("X,6.1 m,spring,8 kN,two",
                  "2 (at): found '6.1 m', expected a place on the beam, from 0 m to 6 m\n"
                  "supports.csv: line 4, column 4 (stiffness): found '8 kN': the unit 'kN', "
                  "expected one of the units kN/m, N/m, kip/ft, lbf/ft\n"
                  "supports.csv: line 4, column 5 (settlement): found 'two', "
                  "expected a number with a unit, such as '7.2 m'");
}

TEST_CASE("a beam that its supports do not carry") {
    check_mechanism("free,free", "X,3 m,pinned,,\n", "6 m can move freely");
    check_mechanism("free,free", "X,3 m,spring,8 kN/mm,\n", "6 m can move freely");
    check_mechanism("pinned,free", "X,3 m,hinge,,\n", "3 m can move freely");
    check_mechanism("pinned,pinned", "X,3 m,hinge,,\n", "3 m can move freely");
    check_mechanism("fixed,free", "X,2 m,hinge,,\n", "6 m can move freely");
    check_mechanism("pinned,pinned", "X,2 m,hinge,,\nX,4 m,pinned,,\nX,3 m,hinge,,\n", "2 m can move freely");
}

TEST_CASE("without a row in supports.csv the ends alone must carry the beam") {
    const project_folder project;
    project.write_rows(good_beams, good_loads, good_combinations);
    project.write_supports("TWO,3 m,pinned,,\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(has_line(ran.err,
                   "beams.csv: line 4, column 3 (right): found 'free' behind 'pinned' at the left, a mechanism, "
                   "expected one fixed or elastic end, both ends pinned, or further supports in supports.csv"));
    check_good_beams(project, ran);
}

TEST_CASE("a support of a beam that does not exist is refused, and the table says so") {
    const project_folder project;
    project.write_rows(good_beams, good_loads, good_combinations);
    project.write_supports(good_supports + "Y,4 m,pinned,,\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(ran.err.starts_with(
        "supports.csv: line 4, column 1 (mark): found 'Y', expected the mark of a beam in beams.csv\n"));
    CHECK(ran.out.find("\n1 row of supports.csv is on no beam: beams.csv does not have the mark.\n") !=
          std::string::npos);
    check_good_beams(project, ran);
    CHECK(says(table_line(ran.out, "X"), "ok"));
}

TEST_CASE("a support without a mark may belong to any beam: none is called ok") {
    const project_folder project;
    project.write_rows(good_beams, good_loads, good_combinations);
    project.write_supports(good_supports + ",4 m,pinned,,\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(ran.err.starts_with(
        "supports.csv: line 4, column 1 (mark): found nothing, expected the mark of a beam in beams.csv\n"));
    CHECK(ran.out.find("incomplete: 1 row of supports.csv is refused; nobody can tell of which beam.") !=
          std::string::npos);
    check_good_beams(project, ran, "incomplete");
    CHECK(says(table_line(ran.out, "  1"), "incomplete"));
}

TEST_CASE("of a refused beam the supports are read for their own faults only") {
    const project_folder project;
    project.write_rows(good_beams + "BAD,pinned,free,-6 m,210 GPa,8356 cm4,L/250\n", good_loads, good_combinations);
    project.write_supports(good_supports + "BAD,400 m,pinned,,\nBAD,4 m,spring,8 kN,\n");
    const auto ran = project.run();
    CHECK(
        ran.err.starts_with("beams.csv: line 5, column 4 (span): found '-6 m', expected more than 0\n"
                            "supports.csv: line 5, column 4 (stiffness): found '8 kN': the unit 'kN', "
                            "expected one of the units kN/m, N/m, kip/ft, lbf/ft\n"));
    CHECK(says(table_line(ran.out, "BAD"), "refused"));
    check_good_beams(project, ran);
}

TEST_CASE("refused elastic ends") {
    const char* behind = "expected a rotational stiffness of more than 0 behind elastic, such as elastic 500 kN*m/rad";
    const char* words = "expected fixed, pinned, free, or elastic and its stiffness";
    const char* units = "expected one of the units kN*m/rad, N*m/rad, kip*ft/rad, kip*in/rad";
    for (const auto& bad : {
             std::array{"elastic", "'elastic'", behind},
             std::array{"elastic 0 kN*m/rad", "'elastic 0 kN*m/rad'", behind},
             std::array{"elastic -5 kN*m/rad", "'elastic -5 kN*m/rad'", behind},
             std::array{"elastic inf kN*m/rad", "'elastic inf kN*m/rad'", behind},
             std::array{"elastic stiff", "'elastic stiff'", behind},
             std::array{"elastic 500", "'elastic 500': no unit", units},
             std::array{"elastic 500 kN*m", "'elastic 500 kN*m': the unit 'kN*m'", units},
             std::array{"elastic500 kN*m/rad", "'elastic500 kN*m/rad'", words},
             std::array{"spring", "'spring'", words},
         }) {
        const std::string cell = bad[0];
        const std::string found = bad[1];
        const std::string expected = bad[2];
        CAPTURE(cell);
        const project_folder project;
        project.write_rows(good_beams + "E,pinned," + cell + ",6 m,210 GPa,8356 cm4,L/250\n", good_loads,
                           good_combinations);
        project.write_supports(good_supports);
        const auto ran = project.run();
        CHECK(ran.status == 2);
        CHECK(ran.err.starts_with("beams.csv: line 5, column 3 (right): found " + found + ", " + expected + "\n"));
        CHECK(says(table_line(ran.out, "E"), "refused"));
        check_good_beams(project, ran);
    }
}

TEST_CASE("a continuous beam that leaves the range of double is refused, with all its rows") {
    const project_folder project;
    project.write_rows(good_beams, good_loads + "X,live,point,1e305 kN,,5 m,\n", "all,dead,1\nmore,live,1\n");
    project.write_supports(good_supports);
    const auto ran = project.run();
    CHECK(ran.status == 2);
    CHECK(ran.err.starts_with(
        "beams.csv: line 4, column 1 (mark): found in the beam 'X' under the combination 'more': "));
    CHECK(says(table_line(ran.out, "X"), "refused"));
    CHECK(project.results().count({"X", "all"}) == 0);
    CHECK(project.spans().count({"X", "all"}) == 0);
    CHECK(project.supports().count({"X", "all"}) == 0);
    check_good_beams(project, ran);
}

TEST_CASE("cells of supports.csv cannot steer the terminal") {
    const project_folder project;
    project.write_rows(good_beams, good_loads, good_combinations);
    project.write_supports(good_supports + "X,\x1b[2J,\x1b]0;t\x07,\x9b,\r\n");
    const auto ran = project.run();
    CHECK(ran.status == 2);
    for (const std::string& text : {ran.out, ran.err}) {
        for (const char c : text) {
            const auto byte = static_cast<unsigned char>(c);
            CHECK((c == '\n' || (byte >= 0x20 && byte < 0x7F)));
        }
    }
}
