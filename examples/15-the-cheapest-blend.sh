#!/bin/sh
# Marrowfen Glass and Tile Works, step 15: which gases to take, at which cost and at which CO2?
#
# Pipeline gas, the neighbour's biomethane, hydrogen and propane of the tank can be had, each at its price and
# as far as there is any. The works takes 25 MW. The cheapest blend within the contract is one question, the
# greenest another; both answers name what holds them, and what one unit more of it would save.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

# blend WHAT: the blend with the least of it, the essential lines.
blend() {
    bluecone blend free present-supply.ini free biomethane-offer.ini free hydrogen-offer.ini free propane-works.ini \
        --price 1=34EUR/MWh --co2 1=22kg/MWh --within contract-marrowfen.ini --flow 25MW --least "$1" |
        sed -n '/^Recipe/,/^Heat/p; /^Cost/,/^$/p; /^Verdict/,/^Caution/p' | sed '/^Heat/d; /^Caution/d'
}
blend cost
blend co2
echo 'The cheapest is the supply as it is. The greenest takes all biomethane and the hydrogen that'
echo 'the contract allows; the shadow prices tell which of the two to ask more of first.'
