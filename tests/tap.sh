#!/bin/sh
# Points of the Test Anything Protocol, for scripts that have a folder $work: to be sourced.
# shellcheck disable=SC2154 # work is of the script that reads this
count=0
failed=0
# point NAME: passed when $work/wrong, which tells what is wrong, is empty.
point() {
    count=$((count + 1))
    if test -s "$work/wrong"; then
        failed=$((failed + 1))
        echo "not ok $count - $1"
        sed 's/^/# /' "$work/wrong"
    else
        echo "ok $count - $1"
    fi
    : >"$work/wrong"
}
: >"$work/wrong"
