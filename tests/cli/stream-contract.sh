# a column says of each row how it stands to the limits of a contract
bluecone stream "$SRC/examples/log-of-two-weeks.csv" --contract "$SRC/examples/contract-marrowfen.ini" --add wobbe-gross >rows.csv; echo "exit $?"
cut -d, -f17 rows.csv | sort | uniq -c
