# Runs the fuzz target over the corpus and the files of the demo, and then on for some seconds; what it discovers is
# kept in scratch for the next run:
#   cmake -D program=... -D seconds=... -D demo=FOLDER -D scratch=FOLDER -P fuzz.cmake
cmake_minimum_required(VERSION 3.20)

# The demo as one input: its files parted by FS, in the order in which the target takes them.
string(ASCII 28 separator)
set(project "")
foreach(name IN ITEMS beams loads combinations supports)
  file(READ ${demo}/${name}.csv text)
  string(APPEND project "${text}${separator}")
endforeach()
file(MAKE_DIRECTORY ${scratch}/found)
file(WRITE ${scratch}/demo/demo.txt "${project}")

execute_process(
  COMMAND ${program} -max_total_time=${seconds} -max_len=8192 -timeout=10 -rss_limit_mb=2048 -print_final_stats=1
          -dict=${CMAKE_CURRENT_LIST_DIR}/schedule.dict -artifact_prefix=${scratch}/
          ${scratch}/found ${CMAKE_CURRENT_LIST_DIR}/corpus ${scratch}/demo
  RESULT_VARIABLE status OUTPUT_VARIABLE output ERROR_VARIABLE output)
string(REGEX MATCHALL "stat::[^\n]*" statistics "${output}")
list(JOIN statistics "\n" statistics)
message("${statistics}")
if(NOT status EQUAL 0)
  message("${output}")
  message(FATAL_ERROR "the readers of the schedule are beaten; the input is kept in ${scratch}")
endif()
