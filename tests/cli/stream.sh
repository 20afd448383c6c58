# two weeks of analyses: the header, the first row, and the rows that something is told of
bluecone stream "$SRC/examples/log-of-two-weeks.csv" >rows.csv; echo "exit $?"
sed -n '1,2p' rows.csv
grep -v ',,$' rows.csv | tail -n +2
# nothing vanishes
wc -l <"$SRC/examples/log-of-two-weeks.csv"; wc -l <rows.csv
