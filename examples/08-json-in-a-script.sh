#!/bin/sh
# Marrowfen Glass and Tile Works, step 8: how does a figure get into another program?
#
# A number alone: --bare. Everything that belongs to it (state, unit, uncertainty, method, warnings): --json,
# one object, which any language reads. Here a shell alone picks a figure out: each member stands on its
# own line.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

hhv=$(bluecone get hhv --bare --at 25/0 --unit kWh/Nm3 present-supply.ini)
echo "One number: $hhv"

bluecone get hhv --json --at 25/0 --unit kWh/Nm3 present-supply.ini |
    sed -n '/"results"/,/]/s/^ *"\(value\|unit\|uncertainty\|method\)": "*\([^",]*\)"*,*$/\1: \2/p'

# The exit code tells 2 (wrong call), 3 (bad data) and 4 (a file failed) apart; 0 is an answer.
if ! bluecone get hhv --bare methane=92,ethane=5 2>/dev/null; then
    echo 'A composition that adds up to 97 % gets no number.'
fi
