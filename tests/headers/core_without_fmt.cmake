# Lists the files that the compiler opens for core.hpp: fmt must not be among them.
#   cmake -D compiler=... -D standard=... -D include=... -P core_without_fmt.cmake
cmake_minimum_required(VERSION 3.20)

function(files_opened_for header result)
  execute_process(COMMAND ${compiler} ${standard} -I ${include} -M -x c++ ${include}/sagitta/${header}.hpp
    RESULT_VARIABLE status OUTPUT_VARIABLE output ERROR_VARIABLE complaint)
  if(NOT status EQUAL 0)
    message(FATAL_ERROR "${header}.hpp cannot be read:\n${complaint}")
  endif()
  set(${result} "${output}" PARENT_SCOPE)
endfunction()

# The whole library does include fmt: if this does not show, the check is blind.
files_opened_for(sagitta opened)
if(NOT opened MATCHES "/fmt/")
  message(FATAL_ERROR "sagitta.hpp seems not to include fmt, so that nothing can be said about core.hpp")
endif()
files_opened_for(core opened)
if(opened MATCHES "[^ ]*/fmt/[^ \n]*")
  message(FATAL_ERROR "core.hpp must do without fmt, but includes ${CMAKE_MATCH_0}")
endif()
