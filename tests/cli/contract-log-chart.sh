# a trend with time below and a histogram for each limited figure
bluecone contract "$SRC/examples/contract-marrowfen.ini" --log "$SRC/examples/log-of-two-weeks.csv" -o log.svg --quiet; echo $?
grep -o 'Hours by [^<]*' log.svg
grep -c 'time of the log' log.svg
# the chart alone tells what a bound is, what the verdict is, and that it may be dangerous
grep -o '^m[axin]* [0-9.]*$\|Verdict: NOT within the contract\|Caution: A gas outside' log.svg | sort | uniq -c
bluecone contract "$SRC/examples/contract-marrowfen.ini" --log "$SRC/examples/log-of-two-weeks.csv" -o log.html --quiet; echo $?
grep -c 'Hours by hydrogen' log.html
