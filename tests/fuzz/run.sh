#!/bin/bash
# The fuzz targets, each for a while: tests/fuzz/run.sh -b BUILD_FOLDER SECONDS [TARGET...]
#
# What libFuzzer finds new is kept in BUILD_FOLDER/fuzz/TARGET and taken up again by the next run; what fails goes to
# BUILD_FOLDER/fuzz/findings. Prints a row for each target; exit 1 when one has a finding.
set -u

SRC=$(cd "$(dirname "$0")/../.." && pwd) || exit 2
test "${1:-}" = -b || { echo "run.sh: -b BUILD_FOLDER SECONDS [TARGET...]" >&2; exit 2; }
build=$(cd "$2" && pwd) || exit 2
seconds=$3
shift 3
if test $# -eq 0; then
    for f in "$SRC"/tests/fuzz/fuzz_*.c; do
        name=${f##*/fuzz_}
        set -- "$@" "${name%.c}"
    done
fi
kept=$build/fuzz
mkdir -p "$kept/findings" || exit 2
export ASAN_OPTIONS=allocator_may_return_null=1:detect_stack_use_after_return=1 UBSAN_OPTIONS=print_stacktrace=1
export LSAN_OPTIONS=print_suppressions=0:suppressions=$SRC/tests/house/leaks.supp

# The longest input worth trying, and seconds after which one counts as a hang.
limits() {
    case $1 in
    stream | part) echo 6144 25 ;;
    ini | composition | contract | burner) echo 3072 25 ;;
    commands) echo 400 60 ;;
    options | literal) echo 512 25 ;;
    *) echo 128 25 ;;
    esac
}

bad=0
printf '%-12s %9s %12s %8s %9s %8s\n' target seconds executions edges corpus findings
for target; do
    corpus=$kept/$target
    log=$kept/$target.log
    read -r longest hang <<<"$(limits "$target")"
    dict=$SRC/tests/fuzz/$target.dict
    test -e "$dict" || dict=$SRC/tests/fuzz/words.dict
    mkdir -p "$corpus"
    before=$(find "$kept/findings" -name "$target-*" | wc -l)
    start=$(date +%s)
    "$build/tests/fuzz/fuzz_$target" -max_total_time="$seconds" -max_len="$longest" -timeout="$hang" -rss_limit_mb=1500 -dict="$dict" \
        -print_final_stats=1 -artifact_prefix="$kept/findings/$target-" "$corpus" "$SRC/tests/fuzz/seeds/$target" >"$log" 2>&1
    code=$?
    found=$(($(find "$kept/findings" -name "$target-*" | wc -l) - before))
    edges=$(sed -n 's/.* cov: \([0-9]*\) .*/\1/p' "$log" | tail -n 1)
    executions=$(sed -n -e 's/^stat::number_of_executed_units: *//p' "$log" | tail -n 1)
    printf '%-12s %9d %12s %8s %9d %8d\n' "$target" $(($(date +%s) - start)) "${executions:-?}" "${edges:-?}" \
        "$(find "$corpus" -type f | wc -l)" "$found"
    if test $code -ne 0 || test "$found" -gt 0; then
        bad=1
        grep -E -m 3 'does not hold|said:|ERROR|runtime error|SUMMARY' "$log" | sed 's/^/    /'
    fi
done
exit $bad
