#!/bin/sh
# Marrowfen Glass and Tile Works, step 3: the shares make 99.88: what if the rest is a gas that was not measured?
#
# Normalising spreads the missing 0.12 over all components as if nothing were missing. That is right when
# the cause is scatter, and wrong when the chromatograph does not see a gas. The sheet shows four suspects;
# here one of them is tried in full, by writing the missing share as hydrogen.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone sheet new-supply-offer.ini | sed -n '/^What the missing/,/^$/p'

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT
sed 's/^oxygen /hydrogen       =  0.12\n&/' new-supply-offer.ini >"$folder/with-hydrogen.ini"
echo 'Heating value as normalised, and with the missing share as hydrogen:'
bluecone get hhv --quiet new-supply-offer.ini
bluecone get hhv --quiet "$folder/with-hydrogen.ini"
echo 'Ask the laboratory which gases it can see before the difference is argued about.'
