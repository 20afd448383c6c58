#!/bin/sh
# Marrowfen Glass and Tile Works, step 25: what the accountant and the shift want of the same log.
#
# The meter station counts cubic metres, the bill counts kilowatt hours, the shift looks at the Wobbe index. `stream` puts
# the figures behind every row of the log; what is strange about a row stands beside it, and nothing falls out.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT

echo 'The night of the hydrogen, at the state of the contract:'
bluecone stream log-of-two-weeks.csv --at 25/0 --unit kWh/m3 --add hhv,wobbe-gross,relative-density --digits 5 --contract contract-marrowfen.ini \
    --excursions "$work/note.txt" -o "$work/rows.csv" --quiet 2>"$work/told" || echo "Exit code $?: a row is outside of the contract."
cut -d, -f 1,2,12,16-20 "$work/rows.csv" | sed -n '1p;/^2026-03-10T0[2-9]/p'
echo
echo 'What the shift has to look at, and what was told:'
cut -d, -f 1,20- "$work/rows.csv" | grep -v ',,$' | tail -n +2
cat "$work/told"
echo
echo 'The energy that passed, from the columns that are there now, kWh of gross heat:'
awk -F, 'NR > 1 && $16 != "" { kwh += $14 * $16 } END { printf "%.0f\n", kwh }' "$work/rows.csv"
echo
echo 'The note to the supplier:'
sed -n '/Each excursion/,$p' "$work/note.txt"
