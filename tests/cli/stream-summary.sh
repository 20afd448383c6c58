# two weeks summed up; in parts and merged it is the same, whatever the number of threads
cd "$SRC/examples" || exit
out=$OLDPWD
bluecone stream log-of-two-weeks.csv --summary --by day --contract contract-marrowfen.ini --step 1h >"$out/whole.txt"; echo "exit $?"
cat "$out/whole.txt"
columns=$(head -n 1 log-of-two-weeks.csv)
tail -n +2 log-of-two-weeks.csv | split -l 50 - "$out/part."
for part in "$out"/part.a?; do
    bluecone stream --no-header --columns "$columns" --summary-part --by day --contract contract-marrowfen.ini --step 1h -o "$part.json" --quiet "$part" 2>/dev/null
done
for jobs in 1 3; do bluecone stream log-of-two-weeks.csv --jobs $jobs --summary --by day --contract contract-marrowfen.ini --step 1h --json 2>/dev/null >"$out/$jobs.json"; done
cmp "$out/1.json" "$out/3.json" && echo equal
cd "$out" || exit
bluecone stream --merge part.*.json --csv >merged.csv; echo "exit $?"
# the rules about neighbours see the edges of parts: their row of the remarks is left out
cd "$SRC/examples" && bluecone stream log-of-two-weeks.csv --summary --by day --contract contract-marrowfen.ini --step 1h --csv 2>/dev/null >"$out/whole.csv"
cd "$out" || exit
grep -v 'usual steps since' whole.csv >a; grep -v 'usual steps since' merged.csv >b; cmp a b && echo equal
bluecone stream --merge part.aa.json part.ab.json --summary-part -o first.json && bluecone stream --merge part.a[c-z].json first.json --csv | grep -v 'usual steps since' | cmp - a && echo equal
