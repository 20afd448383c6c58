#!/bin/sh
# Marrowfen Glass and Tile Works, step 6: analysed dry, delivered wet: what does the engine get?
#
# The laboratory dries the sample; the engine gets the gas saturated at 35 C. At the meter, at 15 C, most of
# that water has condensed. Three figures for one gas, each right for its own question, 5 % apart.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT
sed 's/^moisture .*/moisture = dry/' digester-gas.ini >"$folder/dry.ini"

echo 'As the laboratory has it, dry:'
bluecone get lhv --quiet "$folder/dry.ini"
echo 'As the digester delivers it, saturated at 35 C:'
bluecone get lhv --quiet digester-gas.ini
echo 'As a meter at 15 C counts it, saturated there:'
bluecone get lhv --quiet --saturated digester-gas.ini
