#!/bin/sh
# Marrowfen Glass and Tile Works, step 16: do the burners take the offer?
#
# The boiler follows its air with the gas pressure, the tile kiln has fixed orifices, the engine trims its
# mixture to a lean oxygen. Each burner file states what the burner was set to and what it may do. The
# verdict is the last line; exit 1 stands for "not as it is", so that nothing is switched by a script.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

report=$(mktemp)
trap 'rm -f "$report"' EXIT

for burner in boiler kiln engine; do
    echo "== $burner"
    bluecone switch --burner $burner.ini present-supply.ini new-supply-offer.ini >"$report" || true
    sed -n '/^Criteria/,/^$/p; /^Verdict/,/^Caution/p' "$report" | sed '/^Caution/d'
    echo
done
