#!/bin/sh
# Marrowfen Glass and Tile Works, step 7: how do you know that the program is right?
#
# The auditor wants published values, computed now, with the deviation. The table can be filed: one row a
# value, with source, tolerance and the reason for the tolerance. Exit code 1 would say that one failed.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone verify en437 --csv | cut -d, -f3,5-9,11 | head -n 12
echo ...
bluecone verify en437 | sed -n '/^Checks/,$p'

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT
if bluecone verify -o "$folder/verification.csv"; then
    echo 'All areas are filed, and no value is outside its tolerance.'
fi
