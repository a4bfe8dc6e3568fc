#!/bin/sh
# Which lines and branches of include/sagitta the unit tests and the published values run through, header by header:
# sh tests/coverage.sh, from any folder. Takes as long as a full build without optimization. Fails below 98 % of lines.
set -eu
cd "$(dirname "$0")/.."
. ./.ci/setup.sh
need_packages libboost-dev libfmt-dev doctest-dev g++ cmake make python3

jobs=${JOBS:-$(getconf _NPROCESSORS_ONLN 2> /dev/null || echo 2)}
mkdir -p build
build=build/coverage
cmake -S . -B $build -G "Unix Makefiles" -D CMAKE_CXX_COMPILER=g++ -D CMAKE_CXX_FLAGS="-O0 --coverage" \
    -D SAGITTA_BENCHMARKS=OFF -D SAGITTA_EXAMPLES=OFF > $build.log || { cat $build.log; exit 1; }
cmake --build $build --parallel "$jobs" --target unit_tests published_tests
find $build -name '*.gcda' -exec rm {} +
$build/tests/unit_tests
$build/tests/published_tests
python3 tests/coverage.py $build 98
