// The whole library.
#pragma once

#include <sagitta/core.hpp>
#include <sagitta/format.hpp>
#include <sagitta/parse.hpp>
