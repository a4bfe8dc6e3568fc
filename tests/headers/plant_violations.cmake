# Plants one violation at a time into a copy of the headers, and wants check_floors.cmake to name each:
#   cmake -D include=FOLDER -D floors=FILE -D scratch=FOLDER -P plant_violations.cmake
cmake_minimum_required(VERSION 3.20)

# expect_complaint(HEADER TEXT COMPLAINT): with TEXT added at the end of HEADER, the check must say COMPLAINT.
function(expect_complaint header text complaint)
  file(REMOVE_RECURSE ${scratch})
  file(COPY ${include}/sagitta DESTINATION ${scratch})
  file(APPEND ${scratch}/sagitta/${header}.hpp "${text}")
  execute_process(
    COMMAND ${CMAKE_COMMAND} -D include=${scratch} -D floors=${floors} -P ${CMAKE_CURRENT_FUNCTION_LIST_DIR}/check_floors.cmake
    RESULT_VARIABLE status OUTPUT_VARIABLE output ERROR_VARIABLE output)
  string(FIND "${output}" "${complaint}" found)
  if(status EQUAL 0 OR found EQUAL -1)
    message("${output}")
    message(FATAL_ERROR "planted into ${header}.hpp: ${text}expected was the complaint: ${complaint}")
  endif()
endfunction()

string(REPEAT "// long\n" 321 too_long)
expect_complaint(units "#include <sagitta/load.hpp>\n" "units.hpp (floor 0) includes load.hpp (floor 1)")
expect_complaint(beam "#include <sagitta/load.hpp>\n" "beam.hpp (floor 1) includes load.hpp (floor 1)")
expect_complaint(load "#include <fmt/core.h>\n" "load.hpp (floor 1) includes fmt, which only floor 6 may include")
expect_complaint(elastic_line "#include <sagitta/core.hpp>\n" "elastic_line.hpp (floor 2) includes the umbrella core.hpp")
expect_complaint(detail/scale "#include <sagitta/units.hpp>\n" "detail/scale.hpp (floor 0, by units.hpp) includes units.hpp")
expect_complaint(detail/expect "#include <sagitta/elastic_line.hpp>\n" "includes elastic_line.hpp (floor 2)")
expect_complaint(detail/shape "#include <fmt/format.h>\n" "includes fmt, which only floor 6 may include")
expect_complaint(detail/nobody "// Nobody includes this.\n" "detail/nobody.hpp is reached by no public header")
expect_complaint(novelty "// A new header.\n" "novelty.hpp stands on no floor")
expect_complaint(core "#include <sagitta/format.hpp>\n" "core.hpp must include exactly")
expect_complaint(sagitta "#include <sagitta/beam.hpp>\n" "sagitta.hpp must include exactly")
expect_complaint(ends "#include \"units.hpp\"\n" "ends.hpp includes by a quoted path")
expect_complaint(ends "#include <sagitta/nowhere.hpp>\n" "includes nowhere.hpp, which is not there")
expect_complaint(ends "${too_long}" "lines, more than 320")
file(REMOVE_RECURSE ${scratch})
