# a trend with time below and a histogram for each limited figure
bluecone contract "$SRC/examples/contract-marrowfen.ini" --log "$SRC/examples/log-of-two-weeks.csv" -o log.svg --quiet; echo $?
grep -o 'Hours by [^<]*' log.svg
grep -c 'time of the log' log.svg
bluecone contract "$SRC/examples/contract-marrowfen.ini" --log "$SRC/examples/log-of-two-weeks.csv" -o log.html --quiet; echo $?
grep -c 'Hours by hydrogen' log.html
