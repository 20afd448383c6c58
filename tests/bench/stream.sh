#!/bin/bash
# One million rows of twelve components through `bluecone stream`, and one figure of them by two programs for tables that
# do the same sums; called by tests/bench/run.sh.
set -euo pipefail
work=$(mktemp -d)
trap 'rm -rf "$work"' EXIT
rows=${ROWS:-1000000}
components=(methane ethane propane isobutane n-butane isopentane n-pentane n-hexane nitrogen 'carbon dioxide' hydrogen oxygen)
log=$work/log.csv

# A supply that wanders, a row a minute; the generator of random numbers is our own so that every machine has the same log.
mawk -v n="$rows" 'function next_one() { state = (state * 16807) % 2147483647; return state / 2147483647 }
BEGIN {
    state = 1
    print "time,methane,ethane,propane,isobutane,n-butane,isopentane,n-pentane,n-hexane,nitrogen,carbon dioxide,hydrogen,oxygen,flow [m3/h]"
    for (i = 0; i < n; i++) {
        day = int(i / 1440); minute = i % 1440
        e = 3 + next_one(); p = 0.8 + 0.3 * next_one(); c = 1 + 0.5 * next_one(); b = 0.9 + 0.4 * next_one(); h = 1 + 2 * next_one()
        printf "%04d-%02d-%02dT%02d:%02d,%.4f,%.4f,%.4f,0.16,0.18,0.04,0.03,0.05,%.4f,%.4f,%.4f,0.01,%d\n",
            2026 + int(day / 336), int(day / 28) % 12 + 1, day % 28 + 1, int(minute / 60), minute % 60,
            99.53 - e - p - c - b - h, e, p, b, c, h, 1500 + 900 * next_one()
    }
}' >"$log"

# Heat of a mole and root of 1 - Z of each component at 15/15, from the program itself: both sides then use the same table.
heats=() roots=()
for component in "${components[@]}"; do
    heats+=("$(bluecone get hhv-mole --bare --digits 12 "$component=100")")
    sign=1
    test "$component" != hydrogen || sign=-1 # the one summation factor of ISO 6976:2016 below zero here
    roots+=("$(bluecone get z --bare --digits 12 "$component=100" | mawk -v sign=$sign '{ printf "%.9f", sign * sqrt(1 - $1) }')")
done
volume=$(mawk 'BEGIN { printf "%.12f", 8.3144621 * 288.15 / 101325 }') # R T/p, m3/mol, R of ISO 6976:2016

# shellcheck disable=SC2016 # $0 is that of mawk
program='BEGIN { FS = OFS = "," } NR == 1 { print $0, "hhv"; next } { n = 0; h = 0; s = 0;'

sum='' heat='' root=''
for i in "${!components[@]}"; do
    program+=" n += \$$((i + 2)); h += \$$((i + 2)) * ${heats[i]}; s += \$$((i + 2)) * ${roots[i]};"
    sum+="${sum:+ + }\${${components[i]}}"
    heat+="${heat:+ + }\${${components[i]}} * ${heats[i]}"
    root+="${root:+ + }\${${components[i]}} * ${roots[i]}"
done
program+=" h /= n; s /= n; print \$0, sprintf(\"%.7g\", h * 1e-3 / $volume / (1 - s * s)) }"
expression="n = $sum; h = ($heat) / n; s = ($root) / n; \$hhv = fmtnum(h * 1e-3 / $volume / (1 - s * s), \"%.5f\")"

# measure NAME COMMAND...: the best of three runs, s
declare -A best
measure() {
    local name=$1 spent TIMEFORMAT=%R
    shift
    for _ in 1 2 3; do
        spent=$({ time "$@" >/dev/null 2>&1; } 2>&1)
        if [[ -z ${best[$name]:-} ]] || mawk "BEGIN { exit !($spent < ${best[$name]}) }"; then best[$name]=$spent; fi
    done
}
tell() { mawk -v name="$1" -v s="${best[$1]}" -v n="$rows" -v base="${best[$2]}" -v what="$3" 'BEGIN { printf "  %-44s %7.2f s  %9.0f rows/s  %6.2f x %s\n", name, s, n / s, base / s, what }'; }

bluecone stream --quiet --add hhv "$log" | tail -n 1 | cut -d, -f15 >"$work/ours"
mawk "$program" "$log" | tail -n 1 | cut -d, -f15 >"$work/theirs"
cmp -s "$work/ours" "$work/theirs" || echo "  the programs do not agree: $(cat "$work/ours") and $(cat "$work/theirs")"

${CC:-gcc} -O2 -o "$work/bench_csv" "$SRC/tests/bench/bench_csv.c" -lcsv
measure 'cells through libcsv, nothing else' "$work/bench_csv" "$log"
measure 'six figures, one core' bluecone stream --quiet --jobs 1 "$log"
measure 'six figures, two cores' bluecone stream --quiet --jobs 2 "$log"
measure 'one figure, one core' bluecone stream --quiet --jobs 1 --add hhv "$log"
measure 'one figure, two cores' bluecone stream --quiet --jobs 2 --add hhv "$log"
measure 'summary of six figures, one core' bluecone stream --quiet --jobs 1 --summary "$log"
measure 'one figure in mawk' mawk "$program" "$log"
measure 'one figure in Miller' mlr --icsv --ocsv put -q "$expression; emit \$*" "$log"
tell 'six figures, one core' 'six figures, one core' '(target 500 000 rows/s)'
tell 'six figures, two cores' 'six figures, one core' 'one core (target 1.8)'
tell 'summary of six figures, one core' 'six figures, one core' 'the rows'
tell 'one figure, one core' 'one figure in mawk' 'mawk (target 5)'
tell 'one figure, two cores' 'one figure in mawk' 'mawk'
tell 'one figure, one core' 'one figure in Miller' 'Miller (target 15)'
tell 'one figure in mawk' 'one figure in mawk' ''
tell 'one figure in Miller' 'one figure in Miller' ''
tell 'cells through libcsv, nothing else' 'six figures, one core' 'the whole stream'
