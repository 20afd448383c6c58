#!/bin/sh
# Marrowfen Glass and Tile Works, step 10: what would enriched air bring to the glass furnace?
#
# The furnace takes 3.6 MW into the melt and its walls. The regenerators heat the air to 1150 C, and the
# flue gas leaves the furnace at 1420 C with 8 % excess. Oxygen from a small plant would replace part of the
# air: less nitrogen to heat, less fuel, less flue gas, a hotter flame. The flame is the limit: the crown
# bears no more than it was built for, and hot flames with nitrogen about make nitrogen oxides.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT
figure() { sed -n "s/^$1,[^,]*,\([-0-9.]*\),.*/\1/p" "$folder/case"; }

printf '%-16s %8s %9s %9s %9s %9s\n' oxidant 'flame C' 'gas m3/h' 'air kg/h' 'flue kg/h' 'CO2 kg/h'
for oxidant in air enriched:23 enriched:25 enriched:28; do
    bluecone burn --csv --quiet --oxidant $oxidant --oxidant-temp 1150 --excess 8 --flue-temp 1420 --duty 3.6MW present-supply.ini >"$folder/case"
    printf '%-16s %8.0f %9.1f %9.0f %9.0f %9.0f\n' $oxidant "$(figure flame-temperature)" "$(figure fuel-volume-rate)" \
        "$(figure oxidant-mass-rate)" "$(figure flue-mass-rate)" "$(figure co2-mass-rate)"
done

echo
echo 'Where the heat goes, by the path, with 25 % oxygen:'
bluecone burn --oxidant enriched:25 --oxidant-temp 1150 --excess 8 --flue-temp 1420 --duty 3.6MW present-supply.ini |
    sed -n '/^Enthalpy path/,/Sum/p'
echo 'The line of the oxidant is what the regenerators give back: a credit, not heat of the'
echo 'fuel. The sum is what the furnace gets.'
