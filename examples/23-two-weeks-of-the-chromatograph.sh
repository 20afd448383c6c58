#!/bin/sh
# Marrowfen Glass and Tile Works, step 23: did the supplier keep the contract?
#
# The chromatograph at the gate writes a row an hour. In two weeks of March 2026 hydrogen from a trial of the grid came
# down the pipe; the analyser was calibrated, failed once, and stood still for a morning. How long and for how much heat
# was the contract broken, and what does the answer not rest on?
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

code=0
bluecone contract contract-marrowfen.ini --log log-of-two-weeks.csv || code=$?
echo
echo "Exit code $code: the claim on the supplier is the five hours of 10 March, no more; the seven"
echo 'hours without an analysis prove nothing, and sulphur was not looked for at all.'
