# the note that a clause on gas outside of its specification asks for
cd "$SRC/examples" || exit
bluecone stream log-of-two-weeks.csv --quiet --contract contract-marrowfen.ini --excursions "$OLDPWD/note.txt" >"$OLDPWD/rows.csv"; echo "exit $?"
cat "$OLDPWD/note.txt"; wc -l <"$OLDPWD/rows.csv"
bluecone stream log-of-two-weeks.csv --quiet --contract contract-marrowfen.ini --excursions "$OLDPWD/note.csv" --summary >/dev/null; echo "exit $?"
cat "$OLDPWD/note.csv"
