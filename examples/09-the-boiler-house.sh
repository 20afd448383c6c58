#!/bin/sh
# Marrowfen Glass and Tile Works, step 9: what does the boiler house make of the offer?
#
# The boiler gives 4 MW of steam heat; its burner was set on the present supply to 3.2 % oxygen in the dry
# flue gas, which leaves at 142 C. Three cases: the present supply; the offer, through the same burner at
# the same gas pressure and with the same air, before anybody sets it anew; the offer after that. Without a
# new setting the gas flow follows 1/sqrt(relative density), and the richer gas takes its excess air.
set -eu
cd "$(dirname "$0")"
PATH=$PATH:../build/release # a bluecone that was installed goes first

folder=$(mktemp -d)
trap 'rm -rf "$folder"' EXIT

# burn NAME OPTIONS...: one case of the boiler, a row a figure, into a file.
burn() {
    name=$1
    shift
    bluecone burn --csv --quiet --humidity 60% --oxidant-temp 22 --flue-temp 142 --casing-loss 0.7 "$@" >"$folder/$name"
}
# figure NAME ID: one of its figures; the name of a gas may hold commas, and is quoted then.
figure() { sed -n "s/^$2,\"*[^\"]*\"*,\([-0-9.]*\),[^,]*,,.*/\1/p" "$folder/$1"; }

burn present --flue-o2 3.2 --duty 4MW present-supply.ini
burn set --flue-o2 3.2 --duty 4MW new-supply-offer.ini

old=$(bluecone get relative-density --bare present-supply.ini)
new=$(bluecone get relative-density --bare new-supply-offer.ini)
rate=$(echo "$(figure present fuel-volume-rate) $old $new" | awk '{ printf "%.3f", $1 * sqrt($2 / $3) }')
lambda=$(echo "$(figure present fuel-volume-rate) $(figure present oxidant-supplied) $rate $(figure set oxidant-need)" |
    awk '{ printf "%.4f", $1 * $2 / ($3 * $4) }')
burn unset --lambda "$lambda" --rate "${rate}m3/h" new-supply-offer.ini

printf '%-34s %10s %10s %10s\n' '' present 'offer, as' 'offer, set'
printf '%-34s %10s %10s %10s\n' '' supply 'it comes' 'anew'
row() { printf "%-34s %10.$3f %10.$3f %10.$3f\n" "$1" "$(figure present "$2")" "$(figure unset "$2")" "$(figure set "$2")"; }
row 'gas, m3/h at 15 C'            fuel-volume-rate 1
row 'useful heat, kW'              duty 0
row 'oxygen in dry flue gas, %'    flue-o2-dry 2
row 'CO2 in dry flue gas, %'       flue-co2-dry 2
row 'flame temperature, C'         flame-temperature 0
row 'efficiency on net heat, %'    efficiency-net 2
row 'efficiency on gross heat, %'  efficiency-gross 2
row 'water dew point, C'           water-dew-point 1
row 'CO2, kg/h'                    co2-mass-rate 1
row 'CO2, kg per GJ of net heat'   co2-factor-net 3

echo
echo "Unset, the burner keeps an air factor of $lambda. Below 1 carbon monoxide forms, here at 0.98:"
bluecone burn --lambda 0.98 new-supply-offer.ini | sed -n '/^Flue gas as it leaves/,/^  H2 /p; /^Verdict/,$p'
