// Everything but presentation: floors 0 to 5, which need Boost headers only.
#pragma once

#include <sagitta/beam.hpp>
#include <sagitta/chord.hpp>
#include <sagitta/continuous_beam.hpp>
#include <sagitta/cross_check.hpp>
#include <sagitta/elastic_line.hpp>
#include <sagitta/ends.hpp>
#include <sagitta/extremes.hpp>
#include <sagitta/force_method.hpp>
#include <sagitta/influence_line.hpp>
#include <sagitta/invalid_input.hpp>
#include <sagitta/load.hpp>
#include <sagitta/load_list.hpp>
#include <sagitta/load_train.hpp>
#include <sagitta/moment_area.hpp>
#include <sagitta/pattern_loading.hpp>
#include <sagitta/piecewise.hpp>
#include <sagitta/release.hpp>
#include <sagitta/series.hpp>
#include <sagitta/shear_flexible.hpp>
#include <sagitta/tolerance_not_reached.hpp>
#include <sagitta/units.hpp>
#include <sagitta/version.hpp>
#include <sagitta/zeros.hpp>
