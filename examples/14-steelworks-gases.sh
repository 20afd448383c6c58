#!/bin/sh
# Marrowfen Glass and Tile Works, step 14: a sister company mixes three gases of a steelworks.
#
# Blast-furnace gas is there in plenty and hardly burns; coke-oven gas is rich; converter gas comes in bursts
# and is mostly carbon monoxide. A reheating furnace wants a fixed net heat. First the mixture that gives it
# from two of them, then the one that spares coke-oven gas when converter gas is there.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

echo 'Without converter gas: a net heat of 8.4 MJ/m3 at 0/0'
bluecone blend --by volume --at 0/0 free blast-furnace-gas free coke-oven-gas --aim lhv=8.4MJ/m3 | sed -n '/^Solutions/,/^$/p'

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT
cat >"$folder/furnace.ini" <<'END'
[contract]
name = Reheating furnace
at   = 0/0

[limit lhv]
min  = 8.2
max  = 8.6
unit = MJ/m3

[limit carbon-monoxide]
max  = 40
unit = mol %

[limit flame-temperature]
min  = 1750
unit = C
END
echo 'With converter gas: least coke-oven gas within the limits of the furnace'
bluecone blend --by volume --at 0/0 free blast-furnace-gas free coke-oven-gas free converter-gas \
    --within "$folder/furnace.ini" --least share:coke-oven-gas |
    sed -n '/^Recipe/,/^Heat/p; /^Limits/,/^$/p; /^Verdict/,/^Caution/p' | sed '/^Heat/d; /^Caution/d'
echo 'The shadow prices say what each limit costs in coke-oven gas.'
