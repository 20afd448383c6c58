# a column that nothing is made of is named, and what it may have been meant for
log() { printf 'time,CH4,%s,C02,N2,SG,HHV\n2026-03-01T00:00,93,0.5,0.5,6.5,0.61,39\n' "$1"; }
log propain | bluecone stream --add hhv
log Ethan | bluecone stream --add hhv --summary | sed -n '/^Warnings/,$p'
log station | bluecone stream --add hhv --quiet
# fractions of one, and a log without its first row
printf 'CH4,N2\n0.98,0.02\n' | bluecone stream --add hhv; echo "exit $?" >&2
printf 'CH4,N2\n0.98,0.02\n' | bluecone stream --add hhv --shares fraction
printf '2026-03-01,98,2\n' | bluecone stream --add hhv; echo "exit $?" >&2
# a time that cannot be read
printf 'time,CH4\n03/13/2026 12:00,100\n' | bluecone stream --add z
# where commas are decimal marks, a flow of 1.638 may be 1638: no heat is counted for it, by either command
printf 'time;CH4;N2;flow [m3/h]\n2026-03-01 00:00;98,5;1,5;1.638\n2026-03-01 01:00;98,5;1,5;1.638,5\n2026-03-01 02:00;98,5;1,5;1638,5\n2026-03-01 03:00;97;1,5;0.638\n' >comma.csv
bluecone stream comma.csv --summary --add hhv | sed -n '/rows with a flow/,/gross heat/p; /^Warnings/,$p'
printf '[limit hhv]\nmin = 30\nunit = MJ/m3\nat = 15/15\n' >limit.ini
bluecone contract limit.ini --log comma.csv | sed -n '/gross heat/p; /^Warnings/,$p'
# a limit that no column is for is told, with rows, in a summary and by contract; one row is one analysis
printf 'time,CH4,N2\n2026-03-01,98,2\n' >short.csv
bluecone stream short.csv --contract gb-gsmr-2025 --add hhv
bluecone stream short.csv --contract gb-gsmr-2025 --summary | sed -n '/^Warnings/,$p'
bluecone contract gb-gsmr-2025 --log short.csv | sed -n '/^Warnings/,$p'
