#!/bin/sh
# Instruction counts of the library against the same deflections by hand (GCC, -O2; callgrind repeats exactly); then what a
# continuous beam costs by its number of spans.
set -eu
root=$(cd "$(dirname "$0")/.." && pwd)
. "$root/.ci/setup.sh"
need_packages g++ cmake make libboost-dev libfmt-dev valgrind
build="$root/build/benchmarks"
cmake -S "$root" -B "$build" -DCMAKE_BUILD_TYPE=Release -DCMAKE_CXX_FLAGS_RELEASE=-O2 -DCMAKE_CXX_COMPILER=g++ \
    -DSAGITTA_TESTS=OFF -DSAGITTA_EXAMPLES=OFF >/dev/null
cmake --build "$build" --target instruction_counts --target spans >/dev/null
program="$build/benchmarks/instruction_counts"
"$program"

count() {
    valgrind --tool=callgrind --callgrind-out-file=/dev/null --collect-atstart=no --toggle-collect="$1" \
        "$program" 2>&1 | sed -n 's/.*Collected : *//p'
}
row() {
    library=$(count "$2")
    hand=$(count "$3")
    awk -v what="$1" -v l="$library" -v h="$hand" \
        'BEGIN { printf "%-62s %8.1f %8.1f %7.2f\n", what, l / 1000, h / 1000, l / h }'
}
printf '%-62s %8s %8s %7s\n' "instructions a call" library "by hand" ratio
row "evaluate one point load, against the textbook formula" library_evaluates_one_load textbook_evaluates_one_load
row "evaluate three loads, against textbook formulas" library_evaluates_three_loads textbook_evaluates_three_loads
row "compose three and evaluate, against the same with its checks" library_composes_and_evaluates same_formulas_checked
row "compose three and evaluate, against the same, nothing checked" library_composes_and_evaluates same_formulas_unchecked
row "compose three and evaluate, against textbook, nothing checked" library_composes_and_evaluates textbook_evaluates_three_loads

echo
"$build/benchmarks/spans"
