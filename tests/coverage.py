#!/usr/bin/env python3
"""Adds up what gcov says about the headers of the library: python3 tests/coverage.py BUILD_FOLDER LEAST_PERCENT

A line counts as run if any instantiation of it, in any program, was. A branch is one outcome of one condition of a line;
it counts as taken if it was in any instantiation; the ways that exceptions take are left out. gcov knows only lines that
the compiler made code of: a template that nobody instantiates is invisible here (tests/headers and tests/mutation see it).
"""

import collections
import json
import pathlib
import subprocess
import sys

root = pathlib.Path(__file__).resolve().parent.parent
headers = root / "include" / "sagitta"


def main():
    build, least = pathlib.Path(sys.argv[1]).resolve(), float(sys.argv[2])
    lines = collections.defaultdict(lambda: collections.defaultdict(int))
    branches = collections.defaultdict(lambda: collections.defaultdict(int))
    data = sorted(build.rglob("*.gcda"))
    if not data:
        sys.exit(f"no program in {build} has left a .gcda file")
    for file in data:
        said = subprocess.run(["gcov", "--json-format", "--stdout", "--branch-probabilities", str(file)],
                              cwd=build, capture_output=True, check=True).stdout
        for document in said.splitlines():
            report = json.loads(document)
            working = pathlib.Path(report["current_working_directory"])
            for source in report["files"]:
                path = (working / source["file"]).resolve()
                if headers not in path.parents:
                    continue
                name = str(path.relative_to(headers))
                for line in source["lines"]:
                    number = line["line_number"]
                    lines[name][number] += line["count"]
                    ordinary = [b for b in line["branches"] if not b["throw"]]
                    for place, branch in enumerate(ordinary):
                        branches[name][number, place] += branch["count"]

    def share(counts):
        return sum(1 for n in counts.values() if n), len(counts)

    def percent(run, count):
        return f"{run:>6} of {count:<5} {100 * run / count if count else 100:>6.1f} %"

    print(f"{'':<34}{'lines':<22}  branches")
    total = collections.Counter()
    for name in sorted(lines):
        run, count = share(lines[name])
        taken, ways = share(branches[name])
        total.update(run=run, count=count, taken=taken, ways=ways)
        print(f"{name:<34}{percent(run, count)}  {percent(taken, ways)}")
    print(f"{'together':<34}{percent(total['run'], total['count'])}  {percent(total['taken'], total['ways'])}")
    for name in sorted(lines):
        text = (headers / name).read_text().splitlines()
        for number in sorted(n for n, runs in lines[name].items() if not runs):
            print(f"not run: {name}:{number}: {text[number - 1].strip()}")
    return 0 if 100 * total["run"] >= least * total["count"] else 1


if __name__ == "__main__":
    sys.exit(main())
