#!/bin/sh
# Marrowfen Glass and Tile Works, step 20: how wrong can one be?
#
# The furnace's builder asks for the British limits, in MJ/m3 at 15/15. Which confusion of state, basis or analysis
# would move the verdict on the present supply, and by how much?
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone contract gb-gsmr-2025 present-supply.ini --traps --quiet | sed -n '/^Confusions/,/^Verdict/p' | sed '/^Verdict/d'
echo 'To read figures per normal cubic metre as if they were per standard ones breaks the Wobbe limit that the'
echo 'gas keeps; to take net for gross breaks it at the other end.'
