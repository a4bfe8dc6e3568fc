// The globals first, and even the using directives, then the library.
namespace sagitta::units {}
using namespace sagitta;
using namespace sagitta::units;

#include "names.hpp"

double use_the_library();

#include <fmt/format.h>

#include <sagitta/sagitta.hpp>

#include "names_use.hpp"
