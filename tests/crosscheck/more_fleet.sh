#!/bin/bash
# A log on Apache Spark, with a master and two workers as processes of their own, against one run of one machine:
# more_fleet.sh PYTHON WORK_FOLDER
# Rows must be the same byte for byte, the summary to its last digit.
set -euo pipefail
python=$1
work=$2/fleet
mkdir -p "$work"
cd "$work"
contract=$SRC/examples/contract-marrowfen.ini
rows=200000
"${CC:-gcc}" -std=c11 -O2 -o minute_log "$SRC/tests/crosscheck/minute_log.c"
./minute_log "$rows" >log.csv

# 1: rows are outside of the contract, as they are meant to be.
alone() {
    local code=0
    bluecone stream log.csv --rows-alone --quiet --contract "$contract" "$@" || code=$?
    test "$code" -eq 1
}
alone >alone.csv 2>alone.err
alone --summary --by day --step 1min >alone.txt 2>alone.err

workers=$(dirname "$("$python" -c 'import pyspark; print(pyspark.__file__)')")/work
trap 'rm -rf "$workers"' EXIT # where a local cluster leaves what its workers wrote
"$python" "$SRC/examples/fleet/spark_pipe.py" --by day log.csv fleet.csv fleet.txt -- \
    --contract "$contract" --step 1min >fleet.out 2>fleet.err || { cat fleet.err; exit 1; }
grep -q ' 2 workers$' fleet.out || { echo "more_fleet: $(cat fleet.out)"; exit 1; }
cmp alone.csv fleet.csv
cmp alone.txt fleet.txt
test "$(wc -l <fleet.csv)" -eq $((rows + 1))
echo "$rows rows and their summary by Apache Spark $("$python" -c 'import pyspark; print(pyspark.__version__)'), $(cat fleet.out): as by one machine"
