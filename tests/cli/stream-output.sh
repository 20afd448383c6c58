# nothing half written: a full disk, a reader that goes, a signal, a limit of size
log="$SRC/examples/log-of-two-weeks.csv"
tell() { "$@"; echo "exit $?" >&2; }
tell bluecone stream --quiet "$log" >/dev/full
tell bluecone stream --quiet "$log" -o /dev/full
(ulimit -f 40; tell bluecone stream --quiet "$log" -o big.csv)
tell bluecone stream --quiet "$log" -o new.csv; wc -l <new.csv
# a reader that goes away
yes "$(sed -n 2,9p "$log")" | { timeout 20 bluecone stream --quiet --no-header --columns "$(head -n 1 "$log")" 2>err; echo "exit $?" >&2; } | head -n 1 >/dev/null
cat err >&2
# a signal in the midst of it: the file stays as it was
echo old >there.csv
mkfifo pipe
timeout 20 bluecone stream --quiet -o there.csv <pipe & pid=$!
exec 3>pipe; cat "$log" >&3; sleep 0.3
kill -TERM $pid; wait $pid; echo "exit $?" >&2
cat there.csv; ls
