# Runs PROGRAM and compares what it prints with the file EXPECTED, to the letter.
execute_process(COMMAND ${PROGRAM} OUTPUT_VARIABLE printed RESULT_VARIABLE status)
file(READ ${EXPECTED} expected)
if(NOT status EQUAL 0 OR NOT printed STREQUAL expected)
  message(FATAL_ERROR "exit status ${status}; README.md says\n${expected}\nbut this was printed\n${printed}")
endif()
