#!/bin/sh
# Marrowfen Glass and Tile Works, step 19: may we sign for this gas?
#
# The supply contract limits the gas at 25/0 in kWh, its relative density at 15/15. Each limit is judged at its own
# state, with the uncertainty of the certificate: what is inside by less than that is not proven. Then what the gas
# costs on gross and net heat, and what changes against the present supply.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone contract contract-marrowfen.ini new-supply-offer.ini --against present-supply.ini
echo 'The Wobbe index is nearest to its limit, with more than ten times its uncertainty between them.'
