#!/usr/bin/env python3
"""Changes one token in one header at a time and asks the tests that mirror the header whether they notice.

    sh tests/mutation/run.sh [--headers NAME ...] [--kinds KIND ...] [--count N] [--seed S] [--jobs J]

A mutant counts as caught if it does not compile, if a test fails, if a twin of tests/compile_fail is not refused as it
should be, or if it takes far longer than the headers as they stand. Which mutants are tried, and in which order,
depends on the seed alone, so a run can be stopped, continued and repeated: what is known is read from results.jsonl in
the build folder. A survivor that does not stand in survivors.txt, with the reason why it is equivalent, fails the run.

    --list       prints what would be tried
    --again      tries the known survivors once more
    --report     counts what is known so far, and lists the survivors; tries nothing
    --stop-after SECONDS   starts no further mutant after that time

The headers are copied; the tree is never touched.
"""

import argparse
import collections
import json
import os
import pathlib
import random
import re
import resource
import shutil
import subprocess
import sys
import threading
import time

from mutants import mutants_of

here = pathlib.Path(__file__).resolve().parent
root = here.parent.parent
headers_folder = root / "include" / "sagitta"


def read_suites():
    """Which tests look at a header: its lines of suites.txt, in the order in which they are asked."""
    suites = {}
    for line in (here / "suites.txt").read_text().splitlines():
        line = line.split("#")[0].strip()
        if line:
            header, tests = line.split(":")
            suites[header.strip() + ".hpp"] = tests.split()
    return suites


def read_accepted():
    """The survivors that are known to be equivalent."""
    accepted = set()
    for line in (here / "survivors.txt").read_text().splitlines():
        if line.strip() and not line.startswith(("#", "    ")):
            accepted.add(line.strip())
    return accepted


def limited(seconds):
    def set_limits():
        resource.setrlimit(resource.RLIMIT_CPU, (int(seconds) + 1, int(seconds) + 2))
        resource.setrlimit(resource.RLIMIT_AS, (4 << 30, 4 << 30))

    return set_limits


def run(command, seconds, said=subprocess.DEVNULL):
    """The exit status, or None where it took too long. Seconds of the processor, so that a busy machine kills nobody."""
    try:
        done = subprocess.run(command, stdout=subprocess.DEVNULL, stderr=said, preexec_fn=limited(seconds),
                              timeout=20 * seconds + 60)
    except subprocess.TimeoutExpired:
        return None
    return None if done.returncode in (-24, -9) else done.returncode


def announced(twin):
    """What the compiler must say of the wrong form of a twin."""
    return re.match(r"// expect(?: in a note| the compiler's)?: (.+)", twin.read_text()).group(1)


class bench:
    """Compiles and runs single tests against one copy of the headers."""

    def __init__(self, build, compiler, name):
        self.build, self.compiler = build, compiler
        self.folder = build / name
        self.include = self.folder / "include"
        shutil.rmtree(self.folder, ignore_errors=True)
        shutil.copytree(root / "include", self.include)

    def flags(self):
        return [self.compiler, "-std=c++20", "-O0", "-w", "-I", str(self.include), "-I", str(root / "tests"),
                "-include-pch", str(self.build / "common.pch")]

    def outcome_of_twins(self, folder, seconds):
        """'fail' if a wrong form compiles, or the compiler does not say what it should."""
        said = self.folder / "said"
        for twin in sorted((root / "tests" / folder).glob("*.cpp")):
            with open(said, "wb") as file:
                status = run(self.flags() + ["-fsyntax-only", "-D", "WRONG", "-I", str(root / "tests" / "compile_fail"),
                                             str(twin)], seconds, file)
            if status is None:
                return "time"
            if status == 0 or announced(twin).replace("\\;", ";") not in said.read_text(errors="replace"):
                return "fail"
        return None

    def outcome_of(self, test, limits):
        """'compile', 'fail' or 'time' if the test notices something, else None."""
        if test.startswith("compile_fail/"):
            return self.outcome_of_twins(test, limits[0])
        program = self.folder / "test"
        compile_limit, run_limit = limits
        status = run(self.flags() + ["-fuse-ld=lld", str(root / "tests" / "sagitta" / (test + ".cpp")),
                                     str(self.build / "main.o"), "-lfmt", "-o", str(program)], compile_limit)
        if status != 0:
            return "time" if status is None else "compile"
        status = run([str(program), "--abort-after=1"], run_limit)
        return None if status == 0 else "time" if status is None else "fail"

    def outcome(self, mutant, suite, limits):
        path = self.include / "sagitta" / mutant.header
        original = path.read_text()
        path.write_text(mutant.applied_to(original))
        try:
            for test in suite:
                how = self.outcome_of(test, limits[test])
                if how:
                    return how, test
            return "survived", None
        finally:
            path.write_text(original)


def prepare(build, compiler):
    """What all mutants share: main of the tests and the headers from elsewhere, none of them ours."""
    build.mkdir(parents=True, exist_ok=True)
    common = [compiler, "-std=c++20", "-O0", "-w"]
    for source, made, more in ((root / "tests" / "main.cpp", build / "main.o", ["-c"]),
                               (here / "common.hpp", build / "common.pch",
                                ["-x", "c++-header", "-fpch-instantiate-templates"])):
        if not made.exists() or made.stat().st_mtime < source.stat().st_mtime:
            if subprocess.run(common + more + [str(source), "-o", str(made)]).returncode:
                sys.exit(f"{source} does not compile")


def measure(build, compiler, tests):
    """The seconds (of the processor) that each test takes with the headers as they are, to compile and to run."""
    path = build / "seconds.json"
    known = json.loads(path.read_text()) if path.exists() else {}
    table = bench(build, compiler, "unchanged")
    for test in tests:
        is_twins = test.startswith("compile_fail/")
        newest = (root / "tests" / (test if is_twins else "sagitta/" + test + ".cpp")).stat().st_mtime
        if test in known and known[test]["of"] == newest:
            continue
        spent = []
        for what in ("compile", "run"):
            before = resource.getrusage(resource.RUSAGE_CHILDREN)
            if what == "compile":
                how = table.outcome_of(test, (600, 600))
                if how:
                    sys.exit(f"{test} notices something ({how}) where nothing is changed")
            elif not is_twins:
                run([str(table.folder / "test")], 600)
            after = resource.getrusage(resource.RUSAGE_CHILDREN)
            spent.append(after.ru_utime + after.ru_stime - before.ru_utime - before.ru_stime)
        known[test] = {"of": newest, "compile": spent[0] - spent[1], "run": spent[1]}
        print(f"{test}: {known[test]['compile']:.1f} s to compile, {known[test]['run']:.2f} s to run", flush=True)
        path.write_text(json.dumps(known, indent=1))
    return {test: (5 * known[test]["compile"] + 10, 10 * known[test]["run"] + 3) for test in tests}


def read_results(build):
    path = build / "results.jsonl"
    results = {}
    if path.exists():
        for line in path.read_text().splitlines():
            result = json.loads(line)
            results[result["key"]] = result
    return results


def report(results, wanted, accepted):
    """Prints what is known about the wanted mutants: how many of each kind are caught, of all and of those that are
    unlike the original. True if every survivor is accepted."""
    known = [(m, results[m.key]) for m in wanted if m.key in results]
    print(f"\n{len(known)} of {len(wanted)} mutants tried")
    rows = collections.defaultdict(collections.Counter)
    for m, result in known:
        how = result["how"]
        if how == "survived" and m.key in accepted:
            how = "equivalent"
        rows[m.kind][how] += 1
        rows["together"][how] += 1
    columns = ["compile", "fail", "time", "equivalent", "survived"]
    print(f"{'':<12}" + "".join(f"{c:>12}" for c in ["tried", *columns, "caught", "of unlike"]))
    for kind in sorted(rows, key=lambda kind: (kind == "together", kind)):
        count = sum(rows[kind].values())
        caught = sum(rows[kind][how] for how in ("compile", "fail", "time"))
        print(f"{kind:<12}{count:>12}" + "".join(f"{rows[kind][c]:>12}" for c in columns)
              + f"{caught / count:>12.1%}{caught / max(count - rows[kind]['equivalent'], 1):>12.1%}")
    survivors = [m for m, result in known if result["how"] == "survived" and m.key not in accepted]
    for m in survivors:
        print(f"survived: {m.header}:{m.line}: {m.kind}\n{m.key}")
    return not survivors


def main():
    parser = argparse.ArgumentParser(description=__doc__, formatter_class=argparse.RawDescriptionHelpFormatter)
    parser.add_argument("--headers", nargs="*", help="below include/sagitta, without .hpp; default: all that have a suite")
    parser.add_argument("--kinds", nargs="*")
    parser.add_argument("--count", type=int, help="so many of each header at most, drawn by the seed")
    parser.add_argument("--seed", type=int, default=1)
    parser.add_argument("--jobs", type=int, default=1)
    parser.add_argument("--build", type=pathlib.Path, default=root / "build" / "mutation")
    parser.add_argument("--compiler", default="clang++")
    parser.add_argument("--stop-after", type=float, default=float("inf"))
    parser.add_argument("--list", action="store_true")
    parser.add_argument("--again", action="store_true")
    parser.add_argument("--report", action="store_true")
    options = parser.parse_args()

    suites = read_suites()
    names = [name + ".hpp" for name in options.headers] if options.headers else list(suites)
    wanted = []
    for name in names:
        if name not in suites:
            sys.exit(f"{name} has no line in tests/mutation/suites.txt")
        found = mutants_of(name, (headers_folder / name).read_text())
        if options.kinds:
            found = [m for m in found if m.kind in options.kinds]
        # The order is the header's own, so that other headers and options leave it alone.
        random.Random(f"{options.seed} {name}").shuffle(found)
        wanted += found[: options.count]
    if options.list:
        for m in wanted:
            print(f"{m.kind:<12}{m.header}:{m.line}  {m.old} -> {m.new or 'nothing'}  in  {m.source}")
        print(len(wanted), "mutants")
        return 0

    results = read_results(options.build)
    accepted = read_accepted()
    if not options.report:
        def is_open(m):
            return m.key not in results or (options.again and results[m.key]["how"] == "survived" and m.key not in accepted)

        waiting = collections.deque(m for m in wanted if is_open(m))
        prepare(options.build, options.compiler)
        used = dict.fromkeys(m.header for m in waiting)
        limits = measure(options.build, options.compiler, dict.fromkeys(t for h in used for t in suites[h]))
        began = time.monotonic()
        lock = threading.Lock()

        def work(number):
            table = bench(options.build, options.compiler, f"worker-{os.getpid()}-{number}")
            while time.monotonic() - began < options.stop_after:
                with lock:
                    if not waiting:
                        return
                    m = waiting.popleft()
                started = time.monotonic()
                how, test = table.outcome(m, suites[m.header], limits)
                seconds = round(time.monotonic() - started, 1)
                with lock:
                    results[m.key] = {"key": m.key, "kind": m.kind, "how": how, "by": test, "seconds": seconds}
                    with open(options.build / "results.jsonl", "a") as file:
                        file.write(json.dumps(results[m.key]) + "\n")
                    print(f"{how:<9}{seconds:>6} s  {m.header}:{m.line}: {m.old} -> {m.new or 'nothing'}  in  {m.source}", flush=True)

        workers = [threading.Thread(target=work, args=(number,)) for number in range(options.jobs)]
        for worker in workers:
            worker.start()
        for worker in workers:
            worker.join()
    return 0 if report(results, wanted, accepted) else 1


if __name__ == "__main__":
    sys.exit(main())
