#!/bin/sh
# Fuzzes the readers of the beam schedule for so many seconds: sh tests/fuzz/run.sh [SECONDS], from any folder.
# Without a number for 20 minutes. What is discovered stays in build/fuzz, so that the next run goes on from there.
set -eu
cd "$(dirname "$0")/../.."
. ./.ci/setup.sh
need_packages libboost-dev libfmt-dev doctest-dev clang libclang-rt-dev cmake make

mkdir -p build
cmake -S . -B build/fuzz -D CMAKE_CXX_COMPILER=clang++ -D CMAKE_CXX_FLAGS=-O1 -D SAGITTA_FUZZ=ON \
    -D SAGITTA_BENCHMARKS=OFF > build/fuzz.log || { cat build/fuzz.log; exit 1; }
cmake --build build/fuzz --target fuzz_read_schedule
cmake -D program=build/fuzz/tests/fuzz/fuzz_read_schedule -D seconds="${1:-1200}" \
    -D demo=examples/beam_schedule/demo -D scratch=build/fuzz/scratch -P tests/fuzz/fuzz.cmake
