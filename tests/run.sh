#!/bin/sh
# Builds and runs all tests with g++ and then with clang++: sh tests/run.sh, from any folder. A newer compiler of
# Debian's packages reads each header by itself first.
#
# Packages that are missing are installed where that is allowed. The last line is "N passed, N failed", the sum
# over both compilers; the exit status is 0 only if nothing failed.
set -u
cd "$(dirname "$0")/.." || exit 1
. ./.ci/setup.sh

packages="libboost-dev libfmt-dev doctest-dev"
command -v g++ > /dev/null || packages="$packages g++"
command -v clang++ > /dev/null || packages="$packages clang"
newer_compiler=clang++-16
command -v "$newer_compiler" > /dev/null || packages="$packages clang-16"
packages="$packages libclang-rt-dev" # libFuzzer and the sanitizers of clang
command -v cmake > /dev/null || packages="$packages cmake"
command -v ninja > /dev/null || command -v make > /dev/null || packages="$packages ninja-build"
# shellcheck disable=SC2086 # a list of words
need_packages $packages || exit 1

generator="Unix Makefiles"
keep_going=-k
if command -v ninja > /dev/null; then
    generator=Ninja
    keep_going="-k 0"
fi
jobs=$(getconf _NPROCESSORS_ONLN 2> /dev/null) || jobs=2
passed=0
failed=0

run_with() { # run_with COMPILER BUILD_FOLDER, with $optimization and the $options of CMake
    echo "== $1: configuring"
    # A cache that another generator, compiler or folder has left behind would only get in the way.
    rm -rf "$2/CMakeCache.txt" "$2/CMakeFiles"
    # shellcheck disable=SC2086 # options are words
    if ! cmake -S . -B "$2" -G "$generator" -D CMAKE_CXX_COMPILER="$1" -D CMAKE_CXX_FLAGS="$optimization" \
        -D SAGITTA_BENCHMARKS=OFF $options > "$2.log" 2>&1; then
        cat "$2.log"
        echo "== $1: configuring failed"
        failed=$((failed + 1))
        return
    fi

    echo "== $1: building"
    # One program that does not build must not hide what the others say.
    # shellcheck disable=SC2086 # two words
    if ! cmake --build "$2" --parallel "$jobs" -- $keep_going; then
        echo "== $1: building failed"
        failed=$((failed + 1))
    fi

    echo "== $1: testing"
    (cd "$2" && ctest --output-on-failure --parallel "$jobs" 2>&1) | tee "$2.log" | grep -v '^ *Start *[0-9]*: '
    sizes="$2/tests/compile_fail/diagnostic_sizes.txt"
    if [ -f "$sizes" ]; then
        echo "== $1: the longest diagnostics of wrong uses, in bytes"
        head -n 5 "$sizes"
    fi

    # "97% tests passed, 5 tests failed out of 165"
    summary=$(sed -n 's/.* tests passed, \([0-9]*\) tests failed out of \([0-9]*\)$/\1 \2/p' "$2.log")
    if [ -z "$summary" ]; then
        echo "== $1: no test was run"
        failed=$((failed + 1))
        return
    fi
    failed_here=${summary% *}
    failed=$((failed + failed_here))
    passed=$((passed + ${summary#* } - failed_here))
}

headers_with() { # headers_with COMPILER: each public header by itself, with the warnings of the tests
    echo "== $1: each header by itself"
    for header in include/sagitta/*.hpp; do
        if echo "#include <${header#include/}>" | "$1" -std=c++20 -fsyntax-only -Wall -Wextra -Wpedantic -Wconversion \
            -Wshadow -Werror -Iinclude -x c++ -; then
            passed=$((passed + 1))
        else
            echo "$header fails"
            failed=$((failed + 1))
        fi
    done
}

mkdir -p build
headers_with "$newer_compiler"
# Random beams by the thousand are run once, by the compiler that optimizes; the other one compiles in half the time.
optimization=-O1
options=
run_with g++ build/tests-gcc
optimization=-O0
options="-DSAGITTA_FUZZ=ON -DSAGITTA_SKIP_RANDOM=ON"
run_with clang++ build/tests-clang

echo "$passed passed, $failed failed"
[ "$failed" -eq 0 ]
