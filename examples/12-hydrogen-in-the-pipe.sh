#!/bin/sh
# Marrowfen Glass and Tile Works, step 12: how much hydrogen may come with the gas?
#
# The grid operator asks. The contract has an answer in each of its limits: the share at which it is crossed
# is found by itself, so the rows of the table need not be fine. The chart is for the meeting.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone blend --by volume 0..30/5 hydrogen-offer.ini rest present-supply.ini --within contract-marrowfen.ini |
    sed -n '/^Share/,/^Verdict/p' | sed '/^Verdict/d'
bluecone blend --by volume 0..30/5 hydrogen-offer.ini rest present-supply.ini --within contract-marrowfen.ini --json |
    sed -n 's/^  "verdict": "\(.*\)",*$/\1/p'

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT
bluecone blend --by volume 0..30/5 hydrogen-offer.ini rest present-supply.ini --within contract-marrowfen.ini --quiet -o "$folder/hydrogen.svg"
test -s "$folder/hydrogen.svg" && echo 'The same as a chart: -o hydrogen.svg'
echo 'The hydrogen limit itself comes first here. Were it lifted, the heating value would be next,'
echo 'the density after it, and the Wobbe index only far beyond.'
