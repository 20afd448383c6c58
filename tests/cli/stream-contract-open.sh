# a limit that a row has no figure for is not kept: rows, summary and note end with 1 as a contract does
printf '[contract]\nname = Knock\n[limit methane-number]\nmin = 70\n' >knock.ini
printf 'methane,hydrogen\n100,0\n90,10\n' >log.csv
bluecone stream log.csv --add hhv --contract knock.ini; echo "exit $?"
bluecone stream log.csv --add hhv --contract knock.ini --summary --quiet | sed -n '/^Verdict/,$p'
bluecone stream log.csv --add hhv --contract knock.ini --summary --quiet >/dev/null; echo "exit $?"
printf 'methane\n100\n' | bluecone stream --add hhv --contract knock.ini --quiet; echo "exit $?"
bluecone stream log.csv --add hhv --contract knock.ini --excursions note.txt --quiet >/dev/null; echo "exit $?"
