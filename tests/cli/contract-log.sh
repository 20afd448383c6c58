# two weeks with one excursion, a gap and two rows without use; what stands outside tables is asked for as JSON, too
bluecone contract "$SRC/examples/contract-marrowfen.ini" --log "$SRC/examples/log-of-two-weeks.csv"; echo "exit $?"
bluecone contract "$SRC/examples/contract-marrowfen.ini" --log "$SRC/examples/log-of-two-weeks.csv" --json | grep -E "\"(verdict|judgement)\""
