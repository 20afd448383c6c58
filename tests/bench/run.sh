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

$cc -O2 -I "$SRC/include" -D_POSIX_C_SOURCE=200809L -o "$work/bench_quantity" "$SRC/tests/bench/bench_quantity.c" \
    "$build/libbluecone.a" -liniparser -lm
echo "library: a row of a log, 10 quantities one by one"
"$work/bench_quantity"

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
echo "library: worst gas of 20 components"
"$work/bench_worst"

if [ -e "$build/bluecone_sqlite.so" ]; then
    # The shell tells the time of each query; of the processor; the best of three counts.
    echo "SQL: one quantity of 1 000 000 rows of 12 components, in memory (target 500 000 rows a second)"
    "$SRC/tests/sqlite/bin/sqlite3" -cmd '.load bluecone_sqlite' :memory: <"$SRC/tests/bench/bench_sqlite.sql" | awk -F ': ' '
        /^row: / { name = $2; if (!(name in best)) order[++rows] = name }
        /^Run Time/ { split($2, part, " "); used = part[4] + part[6]; if (name != "" && (!(name in best) || used < best[name])) best[name] = used }
        END { for (i = 1; i <= rows; i++) printf "  %-44s %.2f million rows a second\n", order[i], 1 / best[order[i]] }'
fi

# A contract with as many components as the trade has, and one with as many limits: `limit WHAT MIN MAX`, - for none.
limit() {
    printf '[limit %s]\n' "$1"
    [ "$2" = - ] || printf 'min = %s\n' "$2"
    [ "$3" = - ] || printf 'max = %s\n' "$3"
}
{
    limit wobbe-gross 46.1 56.5; limit wobbe-net 40 53; limit hhv 30 47; limit lhv 28 44; limit hhv-mass 30 -
    limit relative-density 0.5 0.75; limit density 0.6 0.95; limit z 0.9 1; limit air-demand 7 13; limit co2-factor-net - 70
    limit methane 60 -; limit ethane - 14; limit propane - 6; limit c4+ - 4; limit inerts - 14
    limit hydrogen - 10; limit oxygen - 1; limit carbon-dioxide - 6; limit total-sulphur - 150; limit hydrogen-sulfide - 20
} >"$work/twenty.ini"
{
    limit wobbe-gross 46.1 56.5; limit wobbe-net 41 52; limit hhv 34 46; limit relative-density 0.55 0.7
    printf '[range methane]\nmin = 60\n'
    for range in ethane=12 propane=6 n-butane=1.5 isobutane=1.5 n-pentane=0.4 isopentane=0.4 neopentane=0.1 n-hexane=0.2 \
        n-heptane=0.1 n-octane=0.05 benzene=0.05 toluene=0.01 hydrogen=10 carbon-monoxide=0.5 nitrogen=12 helium=0.5 \
        carbon-dioxide=5 oxygen=0.2 hydrogen-sulfide=0.0005; do
        printf '[range %s]\nmax = %s\n' "${range%=*}" "${range#*=}"
    done
} >"$work/wide.ini"

# row NAME ARGUMENT...: adds a command to the rows, named with its target.
rows=()
row() {
    local name=$1
    shift
    ln -s "$(command -v bluecone)" "$work/$name"
    rows+=(-- "$work/$name" "$@")
}
wide=(contract "$work/wide.ini" pipeline-h --against g20)
row "get" get wobbe-gross pipeline-h
row "20 limits: get + 1000 us" contract "$work/twenty.ini" pipeline-h
row "worst, 20 components: 500 ms" "${wide[@]}" --worst
row "report.html: 150 ms" "${wide[@]}" -o "$work/report.html"
row "report.xlsx: 150 ms" "${wide[@]}" -o "$work/report.xlsx"
row "chart.svg: 150 ms" "${wide[@]}" -o "$work/chart.svg"
row "chart.svg, worst: 500 ms" "${wide[@]}" --worst -o "$work/chart.svg"
echo "contracts, whole processes: what was done and its target, then what was measured (--worst searches flame temperature"
echo "and interchangeability, too; with a chart it also traces the reachable region)"
"$work/bench_start" 60 "${rows[@]:1}"

echo "a log of a million rows, twelve components, whole processes"
bash "$SRC/tests/bench/stream.sh"
