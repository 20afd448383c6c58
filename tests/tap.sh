#!/bin/sh
# Points of the Test Anything Protocol, for scripts that have a folder $work: to be sourced.
# shellcheck disable=SC2154 # work is of the script that reads this
count=0
failed=0
# point NAME [FILE]: passed when the file, else $work/wrong, which tells what is wrong, is empty. It is emptied.
point() {
    count=$((count + 1))
    if test -s "${2:-$work/wrong}"; then
        failed=$((failed + 1))
        echo "not ok $count - $1"
        sed 's/^/# /' "${2:-$work/wrong}"
    else
        echo "ok $count - $1"
    fi
    : >"${2:-$work/wrong}"
}
: >"$work/wrong"
