# figures, limits, tables: blocks with an empty line between, each table under a row that names it
printf '[limit wobbe-gross]\nmin = 47\nmax = 52\n[range methane]\nmin = 80\n[range ethane]\nmax = 11\n' >window.ini
bluecone contract window.ini g20 --worst --traps --csv >answer.csv; echo $?
grep -c '^$' answer.csv
grep -A1 '^limit,\|^table,' answer.csv
head -n 3 answer.csv
