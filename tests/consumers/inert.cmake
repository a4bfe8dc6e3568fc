# A guest in somebody's build adds its two libraries and nothing else: no programs, no tests, no folders below, and
# what its host has set stays as it is. (That it installs nothing is seen by installing the host.)
set(inert_directory_properties COMPILE_DEFINITIONS COMPILE_OPTIONS INCLUDE_DIRECTORIES LINK_LIBRARIES LINK_OPTIONS
  BUILDSYSTEM_TARGETS TESTS)

# What CMake itself sets anew at every step, and what is ours.
set(inert_passing "^(CMAKE_MATCH_|ARG|_|inert_|FETCHCONTENT_|__)")
# What a guest may leave behind in the cache: its own options, its folders, and where it has found its libraries.
set(inert_own "^(SAGITTA_|sagitta_|Boost_|boost_|fmt_|FIND_PACKAGE_MESSAGE_DETAILS_|FETCHCONTENT_)")

# A macro, since it looks at the variables of its caller.
macro(remember_parent)
  get_cmake_property(inert_names VARIABLES)
  list(FILTER inert_names EXCLUDE REGEX "${inert_passing}")
  get_cmake_property(inert_cache CACHE_VARIABLES)
  foreach(inert_name IN LISTS inert_names)
    set(inert_before_${inert_name} "${${inert_name}}")
  endforeach()
  foreach(inert_name IN LISTS inert_directory_properties)
    get_directory_property(inert_property_${inert_name} ${inert_name})
  endforeach()
endmacro()

macro(expect_inert folder)
  set(inert_complaints)
  foreach(inert_name IN LISTS inert_names)
    if(NOT "${${inert_name}}" STREQUAL "${inert_before_${inert_name}}")
      list(APPEND inert_complaints
        "${inert_name} was '${inert_before_${inert_name}}' and is now '${${inert_name}}'")
    endif()
  endforeach()
  foreach(inert_name IN LISTS inert_directory_properties)
    get_directory_property(inert_now ${inert_name})
    if(NOT "${inert_now}" STREQUAL "${inert_property_${inert_name}}")
      list(APPEND inert_complaints "the directory property ${inert_name} is now '${inert_now}'")
    endif()
  endforeach()

  get_cmake_property(inert_cache_now CACHE_VARIABLES)
  list(REMOVE_ITEM inert_cache_now ${inert_cache})
  list(FILTER inert_cache_now EXCLUDE REGEX "${inert_own}")
  # The install rules, if the host asks for them, come with the names of the usual folders.
  if(inert_cache_now AND NOT SAGITTA_INSTALL)
    list(APPEND inert_complaints "new in the cache: ${inert_cache_now}")
  endif()

  get_directory_property(inert_now DIRECTORY ${folder} BUILDSYSTEM_TARGETS)
  list(SORT inert_now)
  if(NOT "${inert_now}" STREQUAL "sagitta;sagitta_core")
    list(APPEND inert_complaints "more targets than the two libraries: ${inert_now}")
  endif()
  foreach(inert_name IN ITEMS SUBDIRECTORIES TESTS)
    get_directory_property(inert_now DIRECTORY ${folder} ${inert_name})
    if(inert_now)
      list(APPEND inert_complaints "its ${inert_name} are not empty: ${inert_now}")
    endif()
  endforeach()

  if(inert_complaints)
    list(JOIN inert_complaints "\n  " inert_complaints)
    message(FATAL_ERROR "sagitta is no quiet guest:\n  ${inert_complaints}")
  endif()
endmacro()
