#!/bin/bash
# Ten million rows through a pipe, and where memory peaks: more_soak.sh PYTHON WORK_FOLDER
# A row comes out for each that goes in, below 64 MiB, and no more than 2 MiB above what a million rows need. Periods are
# kept until the end, so that a summary by day is let off the second; one by month is not.
set -euo pipefail
work=$2/soak
mkdir -p "$work"
cd "$work"
limit_kib=$((64 * 1024))
growth_kib=$((2 * 1024))
contract=$SRC/examples/contract-marrowfen.ini
"${CC:-gcc}" -std=c11 -O2 -o minute_log "$SRC/tests/crosscheck/minute_log.c"

failed=0
complain() {
    echo "more_soak: $*"
    failed=1
}

# stream ROWS OPTION...: sets peak (KiB), seconds (of the processor) and lines (that came out).
stream() {
    local rows=$1 code=0
    shift
    ./minute_log "$rows" | command time -q -f '%M %U %S' -o used bluecone stream --quiet "$@" 2>told | wc -l >lines || code=$?
    test "$code" -le 1 || complain "bluecone stream $*: exit status $code: $(cat told)"
    read -r peak user system <used
    seconds=$(echo "$user $system" | awk '{ print $1 + $2 }')
    lines=$(cat lines)
}

# soak WHAT OPTION...: a million rows, then ten million.
soak() {
    local what=$1 few million=1000000 many=10000000
    shift
    stream $million "$@"
    few=$peak
    stream $many "$@"
    case $what in
    rows*) test "$lines" -eq $((many + 1)) || complain "$what: $lines lines for $many rows" ;;
    *) test "$lines" -gt 100 || complain "$what: $lines lines" ;;
    esac
    test "$peak" -lt $limit_kib || complain "$what: $peak KiB, which is not below $limit_kib"
    case $what in
    *day*) ;;
    *) test $((peak - few)) -le $growth_kib || complain "$what: $peak KiB where a million rows need $few" ;;
    esac
    echo "$what: $few KiB for $million rows, $peak KiB for $many, $(echo "$many $seconds" | awk '{ printf "%.0f", $1 / $2 }') rows a second and core"
}
soak 'rows, 1 job' --jobs 1
soak 'rows, 2 jobs' --jobs 2
soak 'rows, 16 jobs' --jobs 16
soak 'summary by month and contract, 2 jobs' --jobs 2 --summary --by month --contract "$contract"
soak 'summary by day and contract, 16 jobs' --jobs 16 --summary --by day --contract "$contract"
exit $failed
