# Runs a program and compares what it prints: cmake -D program=... -D expected=... -P same_output.cmake
cmake_minimum_required(VERSION 3.20)

execute_process(COMMAND ${program} OUTPUT_VARIABLE printed ERROR_VARIABLE complaints RESULT_VARIABLE result)
file(READ ${expected} wanted)
if(NOT result EQUAL 0 OR NOT complaints STREQUAL "")
  message(FATAL_ERROR "${program} ended with ${result}\n${complaints}")
endif()
if(NOT printed STREQUAL wanted)
  message(FATAL_ERROR "${program} printed\n${printed}\ninstead of ${expected}\n${wanted}")
endif()
