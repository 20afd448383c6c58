#!/bin/sh
# The goldens of the command line: tests/run_cli.sh [-b FOLDER_OF_BLUECONE] [NAME...]
#
# Each tests/cli/NAME.sh runs in an empty folder, with bluecone first in PATH and the source tree in
# $SRC. Its stdout must be NAME.out, its stderr NAME.err, its exit code the number in NAME.exit; a
# file that is not there stands for nothing written and for 0. In the goldens $SRC and $TMP stand
# for the source tree and that folder. UPDATE=1 rewrites the goldens instead of comparing.
#
# Speaks the Test Anything Protocol; exit 1 when one golden differs.
set -u

SRC=$(cd "$(dirname "$0")/.." && pwd) || exit 2
bin=$SRC/build/release
while getopts b: option; do
    case $option in
    b) bin=$(cd "$OPTARG" && pwd) || exit 2 ;;
    *) exit 2 ;;
    esac
done
shift $((OPTIND - 1))
test -x "$bin/bluecone" || { echo "run_cli.sh: no program $bin/bluecone: run make first" >&2; exit 2; }

work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
trap 'exit 2' INT TERM

# A path as sed's literal pattern.
literal() { printf '%s\n' "$1" | sed 's/[][\\.*^$|]/\\&/g'; }
src_pattern=$(literal "$SRC")
tmp_pattern=$(literal "$work/cwd")
portable() { sed -e "s|$tmp_pattern|\$TMP|g" -e "s|$src_pattern|\$SRC|g" "$1"; }

# run NAME: leaves $work/out, $work/err and the exit code in $work/exit.
run() {
    rm -rf "$work/cwd" && mkdir "$work/cwd" || exit 2
    (
        unset BLUECONE_PATH NO_COLOR COLUMNS
        export SRC LC_ALL=C PATH="$bin:$PATH"
        cd "$work/cwd" && exec sh "$SRC/tests/cli/$1.sh"
    ) </dev/null >"$work/out.raw" 2>"$work/err.raw"
    echo $? >"$work/exit"
    portable "$work/out.raw" >"$work/out"
    portable "$work/err.raw" >"$work/err"
}

# compare NAME: prints what differs.
compare() {
    same=0
    echo 0 >"$work/none.exit"
    : >"$work/none.out" && : >"$work/none.err"
    for kind in out err exit; do
        want=$SRC/tests/cli/$1.$kind
        test -e "$want" || want=$work/none.$kind
        diff -u --label "tests/cli/$1.$kind" --label "got $kind" "$want" "$work/$kind" || same=1
    done
    return $same
}

# accept NAME: makes the goldens what was got; a file that would say nothing is removed.
accept() {
    for kind in out err exit; do
        golden=$SRC/tests/cli/$1.$kind
        if test ! -s "$work/$kind" || { test $kind = exit && test "$(cat "$work/exit")" = 0; }; then
            rm -f "$golden"
        else
            cp "$work/$kind" "$golden" || exit 2
        fi
    done
}

if test $# -eq 0; then
    # Every script, and every golden that has lost its script.
    # shellcheck disable=SC2046 # names of goldens have no blanks
    set -- $(cd "$SRC/tests/cli" 2>/dev/null && for f in *.sh *.out *.err *.exit; do
        test ! -e "$f" || echo "${f%.*}"; done | LC_ALL=C sort -u)
fi

passed=0
failed=0
echo "1..$#"
for name; do
    number=$((passed + failed + 1))
    if test ! -e "$SRC/tests/cli/$name.sh"; then
        difference="no script tests/cli/$name.sh"
        verdict='not ok'
    else
        run "$name"
        test "${UPDATE:-0}" = 0 || accept "$name"
        verdict=ok
        difference=$(compare "$name") || verdict='not ok'
    fi
    if test "$verdict" = ok; then passed=$((passed + 1)); else failed=$((failed + 1)); fi
    echo "$verdict $number - $name"
    test -z "$difference" || printf '%s\n' "$difference" | sed 's/^/# /'
done
echo "$passed passed, $failed failed"
test "$failed" -eq 0
