#!/bin/sh
# Puts what the commands of tests/faults/commands read into the current folder: prepare.sh SRC PROGRAM
set -eu
cp "$1/examples/present-supply.ini" supply.ini
cp "$1/examples/new-supply-offer.ini" offer.ini
cp "$1/examples/contract-marrowfen.ini" contract.ini
cp "$1/examples/boiler.ini" .
head -n 60 "$1/examples/log-of-two-weeks.csv" >log.csv
printf '{"time":"2026-03-01T%02d:00","methane":%s,"nitrogen":%s}\n' 1 97.5 2.5 2 '"<0.1"' 100 3 90.25 9.75 >log.ndjson
for part in 1 2; do
    { head -n 1 log.csv; sed -n "$((part * 20)),$((part * 20 + 19))p" log.csv; } |
        "$2" stream - --step 1h --summary-part --quiet >part$part
done
