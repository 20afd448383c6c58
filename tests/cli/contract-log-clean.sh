# a log without anything to say: exit 0; BOM, CRLF, quoted cells, a blank line, no line end behind the last row
printf '[limit hydrogen]\nmax = 10\n[limit wobbe-gross]\nmin = 45\nmax = 53\n' >limit.ini
printf '\357\273\277"timestamp","Methane (mol %%)","H2 %%"\r\n2026-03-01 00:00:00,"92.1",7.9\r\n\r\n2026-03-01 01:00:00,93.3,"6.7"\r\n2026-03-01 02:00:00,95.2,4.8' >clean.csv
bluecone contract limit.ini --log clean.csv; echo "exit $?"
