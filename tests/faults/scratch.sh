#!/bin/sh
# An empty folder $work to be in, removed at the end, and an environment that is the same everywhere: to be sourced by a
# script that has $SRC.
# shellcheck disable=SC2154 # SRC is of the script that reads this
work=$(mktemp -d) || exit 2
trap 'rm -rf "$work"' EXIT
trap 'exit 2' INT TERM
cd "$work" || exit 2
unset NO_COLOR COLUMNS
export LC_ALL=C BLUECONE_PATH="$SRC/compositions"
