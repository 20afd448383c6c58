#!/bin/sh
# Marrowfen Glass and Tile Works, step 4: 0.04 % oxygen in pipeline gas?
#
# Pipeline gas has no oxygen to speak of: some air got into the sample, and brought nitrogen along. The
# sheet puts the gas as analysed beside the same gas with its oxygen and the nitrogen and argon that belong
# to it taken out. Which of the two is right, the laboratory must say.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

sheet=$(bluecone sheet --air-free new-supply-offer.ini)
echo "$sheet" | sed -n '/^Gas A/,/Wobbe index, net/p'
echo
echo "$sheet" | sed -n '/^Warnings/,/^$/p'
