# what does not go with a log; limits on indices need the present supply
printf '[limit wobbe-ratio]\nmin = 0.95\nmax = 1.05\n' >limit.ini
printf 'time,methane\n2026-03-01,100\n2026-03-02,100\n' >log.csv
bluecone contract limit.ini --log log.csv g20; echo $?
bluecone contract limit.ini --log log.csv --worst; echo $?
bluecone contract limit.ini --log log.csv --coverage 90; echo $?
bluecone contract limit.ini --log log.csv; echo $?
bluecone contract limit.ini --log log.csv --against g20 --quiet | grep -A 1 Verdict
