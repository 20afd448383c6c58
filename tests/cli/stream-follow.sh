# a log that grows: every row as soon as it is whole; a signal ends it in order
printf 'time,methane,nitrogen\n2026-03-01T00:00,98,2\n' >log.csv
follow() { : >rows.csv; timeout 30 bluecone stream --follow --add hhv --quiet log.csv >rows.csv & pid=$!; }
until_rows() { i=0; while test "$(wc -l <rows.csv)" -lt "$1" && test $i -lt 200; do sleep 0.05; i=$((i + 1)); done; }
follow; until_rows 2; wc -l <rows.csv
printf '2026-03-01T01:00,97' >>log.csv; sleep 0.4; wc -l <rows.csv
printf ',3\n2026-03-01T02:00,96,4\n' >>log.csv; until_rows 4
kill -TERM $pid; wait $pid; echo "exit $?"
cat rows.csv
# a log that is written anew is no continuation
follow; until_rows 4; printf 'x\n' >log.csv; wait $pid; echo "exit $?"
