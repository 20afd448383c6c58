#!/bin/sh
# Marrowfen Glass and Tile Works, step 22: what could come down this pipe?
#
# A contract does not promise the gas of the certificate but any gas within its ranges and limits. Which is the worst
# for the furnace, which limits do no work, and which does the seller's window leave open?
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

bluecone contract contract-marrowfen.ini --worst --against present-supply.ini --quiet | sed '/^Gases that/,/^$/d'
echo 'The contract lets the heat input of a burner set for today move from 93 to 104 %.'
