#!/bin/sh
# A short tour at Marrowfen Glass and Tile Works; `make demo` plays it.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

say() {
    echo
    printf '%s\n' "$@" | sed 's/^/| /'
    echo
}

# run COMMAND...: shows the command as it would be typed, then runs it.
run() {
    echo "\$ $*"
    "$@"
}

say 'Marrowfen Glass and Tile Works (invented) melts glass in a regenerative' \
    'furnace, fires tiles, raises steam and runs a gas engine, all on pipeline' \
    'gas. A new supply is on offer.' \
    '' \
    'First a gas that comes with bluecone: what is it worth, and how sure is that?'
run bluecone sheet pipeline-h

say 'Now the certificate of the offer beside the present supply, as the contract' \
    'counts it: burnt at 25 C, metered at 0 C, in kilowatt hours.'
run bluecone sheet --at 25/0 --unit kWh/Nm3 present-supply.ini new-supply-offer.ini

old=$(bluecone get wobbe-gross --bare --at 25/0 present-supply.ini)
new=$(bluecone get wobbe-gross --bare --at 25/0 new-supply-offer.ini)
change=$(echo "$old $new" | awk '{ printf "%+.1f", 100 * ($2 / $1 - 1) }')
say 'What to look at:' \
    "- Wobbe index, gross: $change % against the present supply. A burner that is not" \
    '  set anew gives that much more heat with the same air.' \
    '- Warnings: the certificate adds up to 99.88 % and holds a trace of air. The' \
    '  table above tells what the missing 0.12 % would mean: 0.4 % of the heat at' \
    '  most.' \
    '- Second route: the heats come out again from enthalpies of formation, with a' \
    '  gap of 0.001 %: a mistyped heat would show here.'
echo 'Next: write your certificate as examples/new-supply-offer.ini does, then run'
echo '      build/release/bluecone sheet YOUR-FILE.ini'
echo '      examples/[0-9]*.sh go on from here, a step each.'
