# Compiles the wrong form of a twin and judges what the compiler says:
#   cmake -D compiler=... -D flags=... -D twin=... -D limit=BYTES -D size_file=... -D build=... -P refuse_twin.cmake
# from the top of the repository. A limit of 0 is none. The first line of a twin announces what must be said:
#   // expect: TEXT                  a sentence of the library, in the line of the first error
#   // expect in a note: TEXT        text of the library, anywhere in what belongs to the first error
#   // expect the compiler's: TEXT   the library has no sentence here; what compilers have in common
cmake_minimum_required(VERSION 3.20)

file(STRINGS ${twin} announcement REGEX "^// expect" LIMIT_COUNT 1)
if(NOT announcement MATCHES "^// expect( in a note| the compiler's)?: (.+)$")
  message(FATAL_ERROR "${twin}: the first line must announce what is expected: // expect: a length is expected here")
endif()
set(where "${CMAKE_MATCH_1}")
string(REPLACE "\\;" ";" sentence "${CMAKE_MATCH_2}")

# Plain quotation marks, and no translation.
set(ENV{LC_ALL} C)
execute_process(COMMAND ${compiler} ${flags} -fsyntax-only -DWRONG ${twin}
  RESULT_VARIABLE status OUTPUT_VARIABLE output ERROR_VARIABLE output)
if(status EQUAL 0)
  message(FATAL_ERROR "${twin}: the wrong form compiles; expected was an error with: ${sentence}")
endif()

string(FIND "${output}" "error: " start)
if(start EQUAL -1)
  message("${output}")
  message(FATAL_ERROR "${twin}: the compiler failed without an error")
endif()
string(SUBSTRING "${output}" ${start} -1 rest)
if(where)
  # Everything up to the next error; fmt's and the compiler's internals stand in the notes.
  string(SUBSTRING "${rest}" 6 -1 behind)
  string(FIND "${behind}" "error: " stop)
  if(NOT stop EQUAL -1)
    math(EXPR stop "${stop} + 6")
  endif()
else()
  string(FIND "${rest}" "\n" stop)
endif()
string(SUBSTRING "${rest}" 0 ${stop} first_error)

string(FIND "${first_error}" "${sentence}" found)
if(found EQUAL -1)
  string(FIND "${output}" "${sentence}" found_later)
  if(found_later EQUAL -1)
    set(complaint "the expected sentence is missing")
  else()
    set(complaint "the expected sentence is not in the first error")
  endif()
  message("${output}")
  message(FATAL_ERROR "${twin}: ${complaint}: ${sentence}")
endif()

# Where the folders lie is no part of the size.
string(REPLACE "${build}/" "" output "${output}")
string(REPLACE "${CMAKE_CURRENT_SOURCE_DIR}/" "" output "${output}")
string(LENGTH "${output}" size)
file(WRITE ${size_file} "${size} ${twin}\n")
message("${twin}: ${size} bytes")
if(limit GREATER 0 AND size GREATER limit)
  message("${output}")
  message(FATAL_ERROR "${twin}: the diagnostic has ${size} bytes, more than ${limit}")
endif()
