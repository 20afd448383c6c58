#!/bin/sh
# Marrowfen Glass and Tile Works, step 13: what does biomethane need to be billed as pipeline gas?
#
# The neighbour's biomethane burns with a lower heating value than the supply. Where both flow through one
# meter the bill wants equal heat, so propane is added: as much as is needed, and not more than the limits on
# density and heavy hydrocarbons allow.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

heat=$(bluecone get hhv --at 25/0 --bare present-supply.ini)
echo "Heating value of the supply at 25/0: $heat MJ/m3"
bluecone blend --by volume --at 25/0 free propane-works.ini rest biomethane-offer.ini --aim "hhv=${heat}MJ/m3" \
    --within contract-marrowfen.ini | sed -n '/^Recipe/,/^Heat/p; /^Limits/,/^$/p; /^Verdict/,/^Caution/p' | sed '/^Heat/d; /^Caution/d'
echo 'The heat is met with a few per cent of propane, which bring far more than their share of'
echo 'the energy: the recipe on all four bases is what buyer, meter and mixer each need.'
