# Builds and runs one consumer from nothing:
#   cmake -D consumer=installed|subdirectory|fetched -D repository=... -D compiler=... -D generator=... -D scratch=...
#         -P consume.cmake
cmake_minimum_required(VERSION 3.20)

function(run)
  execute_process(COMMAND ${ARGN} RESULT_VARIABLE status OUTPUT_VARIABLE output ERROR_VARIABLE output)
  if(NOT status EQUAL 0)
    list(JOIN ARGN " " command)
    message("${output}")
    message(FATAL_ERROR "${consumer}: failed: ${command}")
  endif()
  set(output "${output}" PARENT_SCOPE)
endfunction()

function(expect_deflection program)
  run(${scratch}/build/${program})
  # 5 w L^4/(384 EI) = 5 * 4500 * 7.2^4 / (384 * 210e9 * 8356e-8) m
  if(NOT output STREQUAL "8.97 mm\n")
    message(FATAL_ERROR "${consumer}: ${program} should print 8.97 mm, but prints ${output}")
  endif()
endfunction()

# Installs the host and says which files came of it.
function(files_installed_by build result)
  file(REMOVE_RECURSE ${scratch}/prefix)
  run(${CMAKE_COMMAND} --install ${build} --prefix ${scratch}/prefix)
  file(GLOB_RECURSE files RELATIVE ${scratch}/prefix ${scratch}/prefix/*)
  set(${result} "${files}" PARENT_SCOPE)
endfunction()

file(REMOVE_RECURSE ${scratch})
set(configure ${CMAKE_COMMAND} -G ${generator} -D CMAKE_CXX_COMPILER=${compiler})
set(source ${CMAKE_CURRENT_LIST_DIR}/${consumer})

if(consumer STREQUAL "installed")
  run(${configure} -S ${repository} -B ${scratch}/sagitta
    -D SAGITTA_TESTS=OFF -D SAGITTA_EXAMPLES=OFF -D SAGITTA_BENCHMARKS=OFF)
  files_installed_by(${scratch}/sagitta files)

  # A package may be moved, and says nothing of where it comes from.
  file(RENAME ${scratch}/prefix ${scratch}/moved)
  foreach(file IN LISTS files)
    file(READ ${scratch}/moved/${file} text)
    foreach(folder IN ITEMS ${repository} ${scratch})
      string(FIND "${text}" "${folder}" found)
      if(NOT found EQUAL -1)
        message(FATAL_ERROR "${file} of the package mentions ${folder}")
      endif()
    endforeach()
  endforeach()

  run(${configure} -S ${source} -B ${scratch}/build -D CMAKE_PREFIX_PATH=${scratch}/moved)
  run(${CMAKE_COMMAND} --build ${scratch}/build)
  expect_deflection(consumer)
  expect_deflection(core_only)
  return()
endif()

run(${configure} -S ${source} -B ${scratch}/build -D SAGITTA_REPOSITORY=${repository})
run(${CMAKE_COMMAND} --build ${scratch}/build)
expect_deflection(consumer)
files_installed_by(${scratch}/build files)
if(files)
  message(FATAL_ERROR "${consumer}: installing the host also installs ${files}")
endif()

# Asked to, it does install itself with its host; so the check above would have seen it.
run(${configure} -S ${source} -B ${scratch}/build -D SAGITTA_INSTALL=ON)
files_installed_by(${scratch}/build files)
if(NOT "include/sagitta/version.hpp" IN_LIST files)
  message(FATAL_ERROR "${consumer}: with SAGITTA_INSTALL the headers are not installed, only: ${files}")
endif()
