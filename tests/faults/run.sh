#!/bin/bash
# Every command while calls of the C library fail: tests/faults/run.sh -b BUILD_FOLDER MOST [daily|PATTERN]
#
# MOST runs for each command and kind of fault; `daily` takes the commands for every day, a PATTERN those that match.
# Speaks the Test Anything Protocol.
# shellcheck disable=SC2015
set -u

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
test "${1:-}" = -b && test $# -ge 3 || { echo "run.sh: -b BUILD_FOLDER MOST [daily|PATTERN]" >&2; exit 2; }
build=$(cd "$2" && pwd) || exit 2
# shellcheck source=tests/faults/scratch.sh
. "$SRC/tests/faults/scratch.sh"
export HOME="$work" XDG_CACHE_HOME="$work/cache"
sh "$SRC/tests/faults/prepare.sh" "$SRC" "$build/bluecone" || exit 2
case ${4:-.} in
daily) sed -n 's/^+ //p' "$SRC/tests/faults/commands" ;;
*) sed 's/^+ //' "$SRC/tests/faults/commands" | grep -e "${4:-.}" ;;
esac >commands
exec "$build/tests/faults/faults" "$build/tests/faults/inject.so" "$build/bluecone" commands "$3"
