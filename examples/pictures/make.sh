#!/bin/sh
# Makes the pictures of README.md: make.sh, from what bluecone answers now; chromium photographs the page.
#
# make.sh FOLDER makes the chart and the words of the page only, there.
set -eu

pictures=$(cd "$(dirname "$0")" && pwd)
folder=$(cd "${1:-$pictures}" && pwd)
cd "$pictures/.."
PATH=$PATH:../build/release # a bluecone that was installed goes first
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT

# Three limits of the contract make a picture that is not too high.
sed -n '/^\[contract\]/,/^$/p; /^\[limit wobbe-gross\]/,/^$/p; /^\[limit relative-density\]/,/^$/p; /^\[limit hydrogen\]/,/^$/p' \
    contract-marrowfen.ini >"$work/three-limits.ini"
bluecone blend --quiet --at 25/0 0..30/2 hydrogen-offer.ini rest present-supply.ini --within "$work/three-limits.ini" -o "$work/blend.svg" || test $? -eq 1
cp "$work/blend.svg" "$folder/blend.svg"

bluecone contract --quiet contract-marrowfen.ini new-supply-offer.ini -o "$work/report.html"
# Its words, for those who cannot see the picture: without style, drawings and tags.
sed -e '/<style/,/<\/style>/d' -e '/<svg/,/<\/svg>/d' -e 's/<[^>]*>/ /g' -e 's/  */ /g' -e 's/ \(\.[0-9]\)/\1/g' -e 's/^ //; s/ $//' -e '/^$/d' "$work/report.html" >"$folder/report.txt"

test $# -eq 0 || exit 0
sandbox=
test "$(id -u)" -ne 0 || sandbox=--no-sandbox # Chromium has none for root
# shellcheck disable=SC2086 # one word or none
chromium --headless $sandbox --disable-gpu --hide-scrollbars --force-device-scale-factor=0.72 --window-size=900,2225 \
    --screenshot="$work/report.png" "file://$work/report.html" 2>"$work/log" || { cat "$work/log"; exit 4; }
cp "$work/report.png" "$folder/report.png"
