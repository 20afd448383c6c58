#!/bin/sh
# Marrowfen Glass and Tile Works, step 18: may the burners run on the LPG-air standby?
#
# The standby mixer is set to the Wobbe index of the pipeline, near enough. Equal heat is not equal flame: air
# in the gas moves yellow tips and carbon monoxide, and an engine knocks on propane. Only what a
# method covers is judged.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

echo 'What each kind of control makes of it:'
bluecone switch --burner kiln.ini present-supply.ini lpg-air-standby.ini | sed -n '/^  control/,/^$/p'
for burner in boiler kiln engine; do
    echo "== $burner"
    bluecone switch --burner $burner.ini present-supply.ini lpg-air-standby.ini | sed -n '/^Checks/,/^$/p; /^Verdict/,/^Caution/p' | sed '/^Caution/d'
done
