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
echo "library: flames (targets 50 000 in equilibrium, 300 000 complete)"
"$work/bench_flame"

echo "library: HHV, LHV, Z, relative density and both Wobbe indices of one gas"
"$work/bench_values"
