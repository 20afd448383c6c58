#!/bin/sh
# Marrowfen Glass and Tile Works, step 5: five gases, one burner setting: how far apart are they?
#
# A burner at a fixed gas pressure gives heat in proportion to the Wobbe index, whatever the heating value:
# the LPG-air mixer of the standby plant is set by this figure. Equal heat is the first condition for one
# gas to follow another, not the last: flame speed and soot have theirs, above all with hydrogen. The
# digester gas is far off and has burners of its own.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

gases='present-supply new-supply-offer hydrogen-blend lpg-air-standby digester-gas'
present=$(bluecone get wobbe-gross --bare present-supply.ini)

printf '%-18s %12s %12s %10s\n' gas 'Wobbe MJ/m3' 'HHV MJ/m3' 'to present'
for gas in $gases; do
    # --bare prints the numbers alone, one a line, in the order asked for
    # shellcheck disable=SC2046 # two numbers, two words
    set -- $(bluecone get wobbe-gross,hhv --bare "$gas.ini")
    echo "$gas $1 $2 $present" | awk '{ printf "%-18s %12.2f %12.2f %+8.1f %%\n", $1, $2, $3, 100 * ($2 / $4 - 1) }'
done
