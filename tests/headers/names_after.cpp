// The library first, then the globals.
#include <sagitta/sagitta.hpp>

#include <fmt/format.h>

using namespace sagitta;
using namespace sagitta::units;

double use_the_library();

#include "names.hpp"
#include "names_use.hpp"
