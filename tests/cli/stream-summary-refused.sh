try() { "$@" >/dev/null; echo "exit $?" >&2; }
cd "$SRC/examples" || exit
log='log-of-two-weeks.csv'
try bluecone stream $log --summary --summary-part
try bluecone stream $log --json
try bluecone stream $log --by day
try bluecone stream $log --summary --by week
try bluecone stream $log --excursions note.txt
try bluecone stream $log --summary-part
try bluecone stream --merge
try bluecone stream --merge $log
try bluecone stream --merge missing.json
try bluecone stream --merge $log --add hhv
cd "$OLDPWD" || exit
bluecone stream "$SRC/examples/$log" --summary-part --step 1h -o one.json --quiet 2>/dev/null
bluecone stream "$SRC/examples/$log" --summary-part --step 2h -o other.json --quiet 2>/dev/null
try bluecone stream --merge one.json other.json
try bluecone stream --merge one.json one.json
head -c 900 one.json >torn.json; try bluecone stream --merge one.json torn.json
