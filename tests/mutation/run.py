# SPDX-License-Identifier: MIT
"""Changes the physics in small ways, one at a time, and asks whether a test notices; called by `make mutation`.

It wants the tree in $SRC, a build with every symbol visible in $BASE, the compiler with its flags in $COMPILE,
and in $LINK_LIB and $LINK_TEST what comes behind the objects of the library and of a test. The test programs are
linked once, against a shared library: a mutant costs one compilation and one link. Killed is a mutant at which
a test fails, crashes or computes more than ten times as long as over the unchanged library; that is processor time,
which other work on the machine does not lengthen, and the report counts these kills apart. Not counted is one that does not compile, or whose object code is
that of the original (equivalent beyond doubt: Papadakis et al., ICSE 2015), or that equivalent.txt excuses. MUTANTS, SEED: how many, which;
JOBS: at once; ONLY=survivors asks the survivors of the last run again, after tests were added.
"""
import concurrent.futures
import glob
import hashlib
import math
import os
import queue
import shlex
import shutil
import signal
import subprocess
import sys
import threading

from sites import mutants_of

LEAST_PERCENT = 90
CPU_S = 10, 10  # what a test may compute: so long, and so many times what it takes without a mutant
WALL_PER_CPU = 20  # what waits for ever computes nothing, so a clock ends it, late enough for a busy machine
MEASURE_S = 60  # what a test is thought to take before it was measured
BY_TIME = " (time)"
GROUP = 16  # goldens asked together
MEMORY_KB = 8_000_000
FILE_BLOCKS = 1_000_000
PHYSICS = ["src/gas/*.c", "src/value/*.c", "src/flame/*.c"] + [
    f"src/supply/{name}.c" for name in (
        "aga36", "weaver", "dutton", "mcp", "gbt_cp", "methane_number", "air_index", "burner_response",
        "burner_ratio", "ratio", "blend", "aim", "optimum_model", "worst*", "limits", "assess", "trade", "tally*")]
# Floors below the physics and those that may not know of it cannot see a mutant; a module brings its own copy of the library.
BLIND = ("base", "output", "house", "sqlite")

SRC = os.environ["SRC"]
BASE = os.path.join(SRC, os.environ["BASE"])
ROOT = os.path.dirname(BASE)
RESULTS = os.path.join(ROOT, "results.tsv")


class Mutant:
    """What it is, apart from where: path, line of source, which of the lines that read so, column, operator, change."""

    def __init__(self, path, site, text, lines):
        line, column, start, end, operator, new = site
        self.path, self.line = path, line
        self.text = text[:start] + new + text[end:]
        source = lines[line - 1]
        same = lines[:line].count(source)
        self.identity = (path, source.strip(), str(same), str(column), operator, self.change(operator, text[start:end], new))

    @staticmethod
    def change(operator, old, new):
        old, new = " ".join(old.split()), " ".join(new.split())
        if operator == "deletion":
            return f"deleted: {old}"
        return f"negated: {old}" if operator == "condition" else f"{old} -> {new}"

    def rank(self, seed):
        """A random order that a change elsewhere in the source leaves as it is."""
        return hashlib.sha256("|".join((str(seed), *self.identity)).encode()).digest()

    def row(self, verdict):
        return (*self.identity, str(self.line), verdict)


def run(command, **more):
    return subprocess.run(command, cwd=SRC, stdin=subprocess.DEVNULL, stdout=subprocess.DEVNULL,
                          stderr=subprocess.DEVNULL, **more).returncode


def must(command, **more):
    done = subprocess.run(command, cwd=SRC, stderr=subprocess.STDOUT, stdout=subprocess.PIPE, text=True, **more)
    if done.returncode:
        sys.exit(f"mutation: {shlex.join(command)[:200]}...\n{done.stdout}")


def read(path, mode="r"):
    with open(path, mode, encoding=None if "b" in mode else "utf-8") as file:
        return file.read()


def all_mutants():
    found = []
    for path in sorted({p for pattern in PHYSICS for p in glob.glob(pattern, root_dir=SRC)}):
        text = read(os.path.join(SRC, path))
        lines = text.split("\n")
        found += [Mutant(path, site, text, lines) for site in mutants_of(text)]
    return found


class Tests:
    """The test programs and goldens, and how long each takes."""

    def __init__(self):
        self.programs = [p for p in sorted(glob.glob("tests/*/test_*.c", root_dir=SRC))
                         if p.split("/")[1] not in BLIND]
        self.programs = [p[:-2] for p in self.programs]
        goldens = [os.path.basename(p)[:-3] for p in sorted(glob.glob("tests/cli/*.sh", root_dir=SRC))]
        self.goldens = [" ".join(goldens[i:i + GROUP]) for i in range(0, len(goldens), GROUP)]
        self.seconds = {}  # of processor time

    def link(self, library):
        parts = [p for p in glob.glob(f"{BASE}/src/output/*.o") + glob.glob(f"{BASE}/src/cli/*.o")
                 if not os.path.basename(p).startswith(("chart_draw", "book"))]
        main = [p for p in parts if p.endswith("/main.o")]
        parts = [p for p in parts if p not in main]
        for name in self.programs:
            out = os.path.join(ROOT, name)
            os.makedirs(os.path.dirname(out), exist_ok=True)
            must([*LINKER, "-pie", f"{BASE}/{name}.o", *parts, library, *LINK_TEST, "-o", out])
        must([*LINKER, "-pie", *main, *parts, library, *LINK_TEST, "-o", f"{ROOT}/bluecone"])
        for module in glob.glob(f"{BASE}/bluecone_*.so"):
            shutil.copy(module, ROOT)

    def verdict(self, test, folder):
        """'' for passed, 'time' or 'failed', and the seconds computed. A group of goldens are names without a folder. What a
        mutant may take is limited, and what it leaves is removed."""
        scratch = os.path.join(folder, "tmp")
        os.makedirs(scratch, exist_ok=True)
        least, times = CPU_S
        limit = math.ceil(least + times * self.seconds.get(test, MEASURE_S))
        command = [os.path.join(ROOT, test)] if "/" in test else ["sh", "tests/run_cli.sh", "-b", ROOT, *test.split()]
        child = subprocess.Popen(["sh", "-c", f'ulimit -t {limit}; ulimit -v {MEMORY_KB}; ulimit -f {FILE_BLOCKS}; exec "$@"', "sh", *command],
                                 cwd=SRC, env=dict(os.environ, LD_LIBRARY_PATH=folder, TMPDIR=scratch),
                                 stdin=subprocess.DEVNULL, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL,
                                 start_new_session=True)
        waiting = threading.Timer(WALL_PER_CPU * limit, os.killpg, (child.pid, signal.SIGKILL))
        waiting.start()
        try:
            _, status, usage = os.wait4(child.pid, 0)
        finally:
            waiting.cancel()
            try:
                os.killpg(child.pid, signal.SIGKILL)  # the whole group, which the child leads
            except ProcessLookupError:
                pass
            for path in glob.glob(f"/tmp/bluecone-test-{child.pid}.*"):  # scratch_path() of tests/support.h
                os.remove(path)
            shutil.rmtree(scratch)
        code = child.returncode = os.waitstatus_to_exitcode(status)
        how = "" if code == 0 else "time" if code in (-signal.SIGXCPU, -signal.SIGKILL) else "failed"
        return how, usage.ru_utime + usage.ru_stime

    def measure(self, folder):
        """All must pass over the unchanged library."""
        for test in self.programs + self.goldens:
            how, seconds = self.verdict(test, folder)
            if how:
                sys.exit(f"mutation: {test} fails without a mutant")
            self.seconds[test] = seconds

    def order(self, path):
        """Those that mirror the file's name, then its folder, then the rest, then goldens; quick ones first."""
        folder, name = path.split("/")[1], os.path.basename(path)[:-2]

        def rank(program):
            own = program.split("/")[1] == folder
            stem = program.split("/test_")[1]
            alike = own and len(os.path.commonprefix([stem, name])) >= min(4, len(name))
            return (0 if own and stem == name else 1 if alike else 2 if own else 3, self.seconds[program])
        return sorted(self.programs, key=rank) + self.goldens


class Bench:
    """One place to build a mutant in: its library, while no other mutant is there."""

    def __init__(self, number, objects):
        self.folder = os.path.join(ROOT, f"bench{number}")
        self.objects = objects
        self.plain = {}
        os.makedirs(self.folder, exist_ok=True)

    def library(self):
        return os.path.join(self.folder, "libphysics.so")

    def link(self, objects):
        must([*LINKER, "-shared", "-Wl,-Bsymbolic", "-Wl,-soname,libphysics.so", *objects, *LINK_LIB, "-o", self.library()])

    def compile(self, path, text, out):
        source = os.path.join(self.folder, os.path.basename(path))
        with open(source, "w", encoding="utf-8") as file:
            file.write(text)
        return run([*COMPILE, "-w", f"-ffile-prefix-map={self.folder}=.", "-iquote", os.path.dirname(path), "-c", source, "-o", out])

    def plain_object(self, path):
        """The object code of the unchanged source, compiled in this place."""
        if path not in self.plain:
            out = os.path.join(self.folder, "plain.o")
            self.compile(path, read(os.path.join(SRC, path)), out)
            self.plain[path] = read(out, "rb")
        return self.plain[path]

    def judge(self, mutant, tests):
        """'invalid', 'same', the test that killed it, or '' for a survivor."""
        out = os.path.join(self.folder, "mutant.o")
        if self.compile(mutant.path, mutant.text, out):
            return "invalid"
        if read(out, "rb") == self.plain_object(mutant.path):
            return "same"
        original = os.path.join(BASE, mutant.path[:-2] + ".o")
        self.link([out if o == original else o for o in self.objects])
        for test in tests.order(mutant.path):
            if test == tests.goldens[0]:
                print(f"{mutant.path}:{mutant.line}: {mutant.identity[-1]}: no test program noticed", flush=True)
            how, _ = tests.verdict(test, self.folder)
            if how:
                return (test if "/" in test else f"tests/cli: {test.split()[0]} ...") + (BY_TIME if how == "time" else "")
        return ""


def judge_all(mutants, wanted, benches, tests):
    """The first `wanted` mutants that count, in their order, and all verdicts on the way."""
    free = queue.Queue()
    for bench in benches:
        free.put(bench)

    def one(mutant):
        bench = free.get()
        try:
            verdict = bench.judge(mutant, tests)
        finally:
            free.put(bench)
        print(f"{mutant.path}:{mutant.line}: {mutant.identity[-1]}: {verdict or 'SURVIVED'}", flush=True)
        return mutant, verdict

    done, at = [], 0
    with concurrent.futures.ThreadPoolExecutor(len(benches)) as pool:
        while at < len(mutants):
            missing = wanted - sum(v not in ("invalid", "same") for _, v in done)
            if missing <= 0:
                break
            done += pool.map(one, mutants[at:at + missing])
            at += missing
    return done


def known_equivalents():
    """Reasons by (path, text of the line, change), from equivalent.txt; the text may end in #N, the Nth line that reads so."""
    rows = [line.split(" | ") for line in read(os.path.join(os.path.dirname(__file__), "equivalent.txt")).splitlines()
            if not line.startswith("#")]
    return {(path, text, change): why for path, text, change, why in rows}


def reason_of(row, reasons):
    """Why a survivor is equivalent; None when it is not known to be."""
    path, source, same, _, _, change = row[:6]
    return reasons.get((path, source, change)) or reasons.get((path, f"{source} #{same}", change))


def table(counted):
    yield f"{'folder':<12} {'killed':>7} {'survived':>9} {'total':>6} {'%':>6}"
    for folder in sorted({row[0].split("/")[1] for row in counted}) + ["all"]:
        verdicts = [row[-1] for row in counted if folder in ("all", row[0].split("/")[1])]
        killed = sum(bool(v) for v in verdicts)
        yield f"{folder:<12} {killed:>7} {len(verdicts) - killed:>9} {len(verdicts):>6} {100 * killed / max(len(verdicts), 1):>6.1f}"


def report(rows, seed):
    """Counts the rows of results, names the survivors; true when enough were killed."""
    reasons = known_equivalents()
    counted = sorted((row for row in rows if row[-1] not in ("invalid", "same")), key=lambda row: (row[0], int(row[-2])))
    excused = [row for row in counted if row[-1] == "" and reason_of(row, reasons)]
    judged = [row for row in counted if row not in excused]
    lines = [f"{len(counted)} mutants, seed {seed}; besides {sum(row[-1] == 'invalid' for row in rows)} that do not compile and "
             f"{sum(row[-1] == 'same' for row in rows)} of the same object code; "
             f"{sum(row[-1].endswith(BY_TIME) for row in counted)} of the killed by time"]
    lines += table(counted)
    lines += [f"without {len(excused)} survivors that are known to be equivalent:", *table(judged), "survivors:"]
    lines += [f"{row[0]}:{row[-2]}: {row[5]}" for row in judged if row[-1] == ""]
    lines += ["known to be equivalent:"]
    lines += [f"{row[0]}:{row[-2]}: {row[5]}: {reason_of(row, reasons)}" for row in excused]
    text = "\n".join(lines) + "\n"
    print(text, end="")
    with open(os.path.join(ROOT, "report.txt"), "w", encoding="utf-8") as file:
        file.write(text)
    return 100 * sum(row[-1] != "" for row in judged) >= LEAST_PERCENT * len(judged)


def last_results():
    return [tuple(line.split("\t")) for line in read(RESULTS).splitlines()]


def open_benches(count):
    objects = sorted(o for floor in ("base", "gas", "value", "flame", "supply") for o in glob.glob(f"{BASE}/src/{floor}/*.o"))
    return [Bench(i, objects) for i in range(count)]


def open_tests(bench):
    bench.link(bench.objects)
    tests = Tests()
    tests.link(bench.library())
    tests.measure(bench.folder)
    return tests


def chosen(seed):
    """The mutants in a random order, how many to judge, and the results that stay. Of the survivors those whose line is
    gone drop out, and those that are known to be equivalent are not asked again."""
    mutants = all_mutants()
    if os.environ.get("ONLY") != "survivors":
        return sorted(mutants, key=lambda m: m.rank(seed)), int(os.environ.get("MUTANTS") or 300), []
    reasons = known_equivalents()
    rows = last_results()
    stay = [row for row in rows if row[-1] != "" or reason_of(row, reasons)]
    left = {row[:6] for row in rows if row not in stay}
    mutants = [m for m in mutants if m.identity in left]
    print(f"{len(left) - len(mutants)} survivors drop out, as their lines are gone")
    return mutants, len(mutants), stay


def main():
    seed = int(os.environ.get("SEED") or 1)
    benches = open_benches(int(os.environ.get("JOBS") or 2))
    tests = open_tests(benches[0])
    mutants, wanted, rows = chosen(seed)
    print(f"{wanted} of {len(mutants)} mutants, {sum(tests.seconds.values()):.0f} s for all tests", flush=True)
    rows += [mutant.row(verdict) for mutant, verdict in judge_all(mutants, wanted, benches, tests)]
    with open(RESULTS, "w", encoding="utf-8") as file:
        file.writelines("\t".join(row) + "\n" for row in rows)
    sys.exit(0 if report(rows, seed) else 1)


COMPILE = shlex.split(os.environ["COMPILE"])
LINKER = shlex.split(os.environ["LINKER"])
LINK_LIB = shlex.split(os.environ["LINK_LIB"])
LINK_TEST = shlex.split(os.environ["LINK_TEST"])
if __name__ == "__main__":
    main()
