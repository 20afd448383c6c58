#!/bin/sh
# Marrowfen Glass and Tile Works, step 1: what does the certificate of the offer say?
#
# The works burns pipeline gas in a regenerative glass furnace, a tile kiln, a boiler house and a gas
# engine. A new pipeline supply is on offer, with a laboratory certificate. One sheet shows what the gas is
# worth, and below it what was odd about the certificate: read the warnings before the figures.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone sheet new-supply-offer.ini

echo
echo 'Read: every figure of the gas has a u from the stated uncertainties; three things are'
echo 'told about the certificate: the sum, the oxygen, and a factor of the other edition.'
