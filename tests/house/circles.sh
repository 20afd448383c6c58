#!/bin/sh
# No project header includes itself, however many others lie between.
set -eu

sh "$(dirname "$0")/edges.sh" | awk '
$1 == $2 { print "circles: " $1 " includes itself"; bad = 1 }
{ print >"/dev/fd/3" }
END { exit bad }' 3>"$WORK/edges"
tsort "$WORK/edges" 2>&1 >/dev/null | sed 's/^tsort: /circles: /' >"$WORK/circles"
cat "$WORK/circles"
test ! -s "$WORK/circles"
