#!/bin/sh
# Changes one token in one header at a time and asks the tests whether they notice: sh tests/mutation/run.sh [OPTIONS],
# from any folder; the options are those of mutate.py.
set -eu
cd "$(dirname "$0")/../.."
. ./.ci/setup.sh
need_packages python3 clang lld libboost-dev libfmt-dev doctest-dev
exec python3 tests/mutation/mutate.py "$@"
