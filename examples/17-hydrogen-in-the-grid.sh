#!/bin/sh
# Marrowfen Glass and Tile Works, step 17: the grid plans 20 % of hydrogen.
#
# Burners in general are not cleared: indices made for natural gas end at 10 % of hydrogen. The kiln is
# judged by its own limits. How far may the blend go before each limit is broken? The shares are exact, not
# read from a grid; "not covered" is where a method ends.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

echo 'Burners in general:'
bluecone switch present-supply.ini hydrogen-blend.ini | sed -n '/^Methods that could/,/^$/p; /^Verdict/,/^Caution/p' | sed '/^Caution/d'
echo
echo 'The kiln, and what would set it back:'
bluecone switch --burner kiln.ini present-supply.ini hydrogen-blend.ini | sed -n '/^What restores/,/^$/p; /^Verdict/,/^Caution/p' | sed '/^Caution/d'
echo
echo 'The boiler, share by share of pure hydrogen:'
bluecone switch --burner boiler.ini --blend-in present-supply.ini hydrogen | sed -n '/^Share/,/^$/p'
