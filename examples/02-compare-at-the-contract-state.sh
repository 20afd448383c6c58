#!/bin/sh
# Marrowfen Glass and Tile Works, step 2: is the offer the gas that the burners are set for?
#
# The contract counts normal cubic metres, burnt at 25 C and metered at 0 C, in kilowatt hours. Both gases
# must be read at that state: a figure at 15 C beside one at 0 C would be off by five per cent. Heat per
# volume decides what is paid for; the Wobbe index decides what a burner at a fixed pressure gives.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone sheet --at 25/0 --unit kWh/Nm3 present-supply.ini new-supply-offer.ini |
    sed -n '/^State/G; /^State/p; /^Heat per volume/,/^$/p; /^Density/,/^$/p'

old=$(bluecone get wobbe-gross --bare --at 25/0 present-supply.ini)
new=$(bluecone get wobbe-gross --bare --at 25/0 new-supply-offer.ini)
echo "$old $new" | awk '{ printf "Wobbe index of the offer against the present supply: %+.2f %%\n", 100 * ($2 / $1 - 1) }'
echo 'At equal gas pressure and equal air a burner gets that much more heat, and has that'
echo 'much less excess air, until it is set anew.'
