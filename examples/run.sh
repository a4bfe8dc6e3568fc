#!/bin/sh
# Sets up what is missing, builds the beam schedule and runs it on its demo project. From any folder:
#     sh examples/run.sh
# The table goes to standard output, everything else to standard error.
set -eu

root=$(CDPATH='' cd -- "$(dirname -- "$0")/.." && pwd)
# shellcheck source=../.ci/setup.sh
. "$root/.ci/setup.sh"

build="$root/build/examples"

has() { command -v "$1" >/dev/null 2>&1; }

find_compiler() {
    for candidate in "${CXX:-}" g++ clang++; do
        # CXX may hold options or a launcher in front: its first word decides.
        if [ -n "$candidate" ] && has "${candidate%% *}"; then
            printf '%s' "$candidate"
            return 0
        fi
    done
}

# $1 is split into words on purpose, as above.
has_header() { echo "#include <$2>" | $1 -x c++ -E - >/dev/null 2>&1; }

say "Checking the tools ..."
wanted=
[ -n "$(find_compiler)" ] || wanted="$wanted g++"
has cmake || wanted="$wanted cmake"
has ninja || has make || wanted="$wanted make"
# shellcheck disable=SC2086
need_packages $wanted
compiler=$(find_compiler)

wanted=
has_header "$compiler" boost/units/quantity.hpp || wanted="$wanted libboost-dev"
has_header "$compiler" fmt/format.h || wanted="$wanted libfmt-dev"
# shellcheck disable=SC2086
need_packages $wanted

say "Building the beam schedule ..."
mkdir -p "$build"
log="$build/build.log"
generator='Unix Makefiles'
if has ninja; then generator=Ninja; fi
# What another generator, compiler or folder has left behind would only get in the way.
rm -rf "$build/CMakeCache.txt" "$build/CMakeFiles"
if ! {
    CXX="$compiler" cmake -S "$root" -B "$build" -G "$generator" -DCMAKE_BUILD_TYPE=Release \
        -DSAGITTA_EXAMPLES=ON -DSAGITTA_TESTS=OFF -DSAGITTA_BENCHMARKS=OFF &&
        cmake --build "$build" --target beam_schedule --parallel 2
} >"$log" 2>&1; then
    tail -n 30 "$log" >&2
    say "The build failed; all of it is in $log"
    exit 1
fi

say "Running it on examples/beam_schedule/demo, an invented project ..."
cd "$root"
"$build/examples/beam_schedule" examples/beam_schedule/demo --out build/examples/demo_results
