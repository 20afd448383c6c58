#!/bin/bash
# Builds and runs the benchmarks; called by `make bench`, which sets SRC and PATH.
set -euo pipefail
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
build=$(dirname "$(command -v bluecone)")
cc=${CC:-gcc}

echo "machine: $(sed -n 's/^model name[^:]*: //p' /proc/cpuinfo | head -n 1), $(nproc) cores, $($cc --version | head -n 1)"

$cc -O2 -o "$work/minimal" "$SRC/tests/bench/minimal.c" -liniparser
$cc -O2 -o "$work/bench_start" -D_POSIX_C_SOURCE=200809L "$SRC/tests/bench/bench_start.c"
$cc -O2 -I "$SRC/include" -D_POSIX_C_SOURCE=200809L -o "$work/bench_values" "$SRC/tests/bench/bench_values.c" \
    "$build/libbluecone.a" -liniparser -lm

echo "one answer: bluecone get wobbe-gross FILE against a minimal program that loads the same file (target 1.5 x)"
file="$SRC/compositions/pipeline-h.ini"
"$work/bench_start" 1500 "$work/minimal" "$file" -- bluecone get wobbe-gross "$file" -- bluecone burn "$file" -- bluecone sheet "$file"

$cc -O2 -I "$SRC/include" -I "$SRC/src" -D_POSIX_C_SOURCE=200809L -o "$work/bench_flame" "$SRC/tests/bench/bench_flame.c" \
    "$build/libbluecone.a" -liniparser -lm
echo "one decision: bluecone switch OLD NEW with a burner, as a whole process"
old="$SRC/examples/present-supply.ini"
new="$SRC/examples/new-supply-offer.ini"
"$work/bench_start" 300 "$work/minimal" "$old" -- bluecone switch "$old" "$new" -- bluecone switch --burner "$SRC/examples/kiln.ini" "$old" "$new"
echo "the same with all shares (--blend-in), about 600 judgements"
"$work/bench_start" 30 "$work/minimal" "$old" -- bluecone switch --blend-in --burner "$SRC/examples/kiln.ini" "$old" "$new"

echo "library: flames (targets 50 000 in equilibrium, 300 000 complete)"
"$work/bench_flame"

echo "library: HHV, LHV, Z, relative density and both Wobbe indices of one gas"
"$work/bench_values"

echo "blends, whole processes (targets: least cost of 5 parts within 8 limits 20 ms; 1001 points of every quantity 15 ms"
echo "without and 150 ms with chemical equilibrium)"
for name in least-cost sweep-without sweep-with; do ln -s "$(command -v bluecone)" "$work/$name"; done
quantities=$(bluecone list quantities --bare | grep -vx flame-temperature | paste -sd,)
"$work/bench_start" 60 "$work/minimal" "$file" -- \
    "$work/least-cost" blend free biomethane free pipeline-h free hydrogen free propane free nitrogen=100 --least cost --json \
    --within "$SRC/examples/contract-marrowfen.ini" --price 1=61EUR/MWh,2=34EUR/MWh,3=8EUR/MWh,4=0.9EUR/kg,5=0.05EUR/m3 -- \
    "$work/sweep-without" blend 0..30/0.03 hydrogen rest pipeline-h --csv --show "$quantities" -- \
    "$work/sweep-with" blend 0..30/0.03 hydrogen rest pipeline-h --csv --show all
$cc -O2 -I "$SRC/include" -D_POSIX_C_SOURCE=200809L -o "$work/bench_worst" "$SRC/tests/bench/bench_worst.c" \
    "$build/libbluecone.a" -liniparser -lm
echo "library: worst gas of 20 components (targets 30 ms exact, 500 ms with what is searched)"
"$work/bench_worst"
