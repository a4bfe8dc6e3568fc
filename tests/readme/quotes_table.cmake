# The table of the demo stands in README.md as the program prints it.
file(READ ${README} readme)
file(READ ${TABLE} table)
string(STRIP "${table}" table)
string(FIND "${readme}" "${table}" place)
if(place EQUAL -1)
  message(FATAL_ERROR "README.md does not quote ${TABLE} to the letter")
endif()
