#!/bin/bash
# Every command once under Valgrind: tests/faults/valgrind.sh -b BUILD_FOLDER. Exit 1 when one reads or writes what it
# must not, uses what nobody set, or loses memory.
set -u

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
test "${1:-}" = -b || { echo "valgrind.sh: -b BUILD_FOLDER" >&2; exit 2; }
build=$(cd "$2" && pwd) || exit 2
# shellcheck source=tests/faults/scratch.sh
. "$SRC/tests/faults/scratch.sh"
sh "$SRC/tests/faults/prepare.sh" "$SRC" "$build/bluecone" || exit 2

bad=0
count=0
while read -r line; do
    # shellcheck disable=SC2086 # words are parted by blanks
    valgrind --quiet --error-exitcode=99 --leak-check=full --show-leak-kinds=definite,indirect --errors-for-leak-kinds=definite,indirect \
        --trace-children=no --child-silent-after-fork=yes --suppressions="$SRC/tests/faults/valgrind.supp" "$build/bluecone" $line >out 2>err
    code=$?
    count=$((count + 1))
    if test $code -gt 1 || grep -q '^==' err; then
        bad=$((bad + 1))
        echo "not clean (exit $code): bluecone $line"
        grep '^==' err | head -n 30
    fi
done < <(sed -e 's/^+ //' -e '/^#/d' "$SRC/tests/faults/commands")
echo "$count commands under Valgrind, $bad not clean"
test $bad -eq 0
