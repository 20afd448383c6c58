#!/bin/sh
# Marrowfen Glass and Tile Works, step 24: what can the contract do to the burners?
#
# Step 16 asked whether the burners take the gas of one offer. But the seller may send any gas of the contract. Over
# all of them: the least and the most heat, air and flame of each burner as it is set today, proven where it says
# "exact", and whether the limits of its file are kept. Exit 1 stands for "not by every gas".
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

report=$(mktemp)
trap 'rm -f "$report"' EXIT

for burner in kiln boiler engine; do
    echo "== $burner"
    bluecone contract contract-marrowfen.ini --worst --against present-supply.ini --burner $burner.ini --digits 5 >"$report" || true
    sed -n '/^  figure .* max *proof/p; /on the burner/p; /^Limits of the burner/,/^$/p; /^Verdict/,/^Caution/p' "$report" | sed '/^Caution/d'
    echo
done
echo 'The kiln needs a narrower Wobbe window than the contract grants, or a trim. The boiler keeps its limits, its oxygen'
echo 'as far as was searched. The trim of the engine holds the oxygen on every gas, but hydrogen leaves its knock rating'
echo 'open: ask its maker.'
