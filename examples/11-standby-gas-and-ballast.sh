#!/bin/sh
# Marrowfen Glass and Tile Works, step 11: what must the standby mixer make, and how is a rich gas ballasted?
#
# When the pipeline fails, LPG and air stand in. The burners look at the Wobbe index, so the mixer is set for
# the Wobbe index of the present supply, not for its heat. The same question turned round: a rich LNG is
# brought down to the same index with nitrogen.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

wobbe=$(bluecone get wobbe-gross --bare present-supply.ini)
folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT

echo "Wobbe index of the present supply: $wobbe MJ/m3"
bluecone blend --by volume free propane-works.ini free air --aim "wobbe-gross=${wobbe}MJ/m3" -o "$folder/standby.ini" |
    sed -n '/^Solutions/,/^$/p'
echo 'Heat, air demand and flammability of what the mixer makes, beside the supply:'
for gas in present-supply.ini "$folder/standby.ini"; do
    bluecone get hhv,relative-density,air-demand,ufl --quiet "$gas" | tr '\n' ' '
    echo
done
echo
echo 'Nitrogen for a rich LNG, for the same index:'
bluecone blend --by volume free nitrogen=100 rest lng-rich --aim "wobbe-gross=${wobbe}MJ/m3" | sed -n '/^Solutions/,/^$/p'
echo 'Equal Wobbe index is equal heat at the burner; the standby gas carries half as much'
echo 'heat again per cubic metre, and air of its own: keep it well above its upper flammability limit.'
