#!/bin/sh
# The unit tests, the published values and the tests of the schedule with the address and undefined-behaviour
# sanitizers: sh tests/sanitize.sh [COMPILER], from any folder. Takes about as long as a full build. The first finding
# of either sanitizer ends its program, and this, with a failure.
set -eu
cd "$(dirname "$0")/.."
. ./.ci/setup.sh
need_packages libboost-dev libfmt-dev doctest-dev clang libclang-rt-dev cmake make

jobs=${JOBS:-$(getconf _NPROCESSORS_ONLN 2> /dev/null || echo 2)}
compiler=${1:-clang++}
mkdir -p build
build=build/sanitize
sanitizers="-fsanitize=address,undefined -fno-sanitize-recover=all -fno-omit-frame-pointer"
cmake -S . -B $build -G "Unix Makefiles" -D CMAKE_CXX_COMPILER="$compiler" -D CMAKE_CXX_FLAGS="-O1 $sanitizers" \
    -D SAGITTA_BENCHMARKS=OFF > $build.log || { cat $build.log; exit 1; }
cmake --build $build --parallel "$jobs" --target unit_tests published_tests example_tests
status=0
for program in unit_tests published_tests examples/example_tests; do
    echo "== $program"
    $build/tests/$program || status=1
done
exit $status
