# every row without use is told with its line; a quoted cell may hold a line break; a missing flow costs only the heat
printf '[limit hydrogen]\nmax = 10\n' >limit.ini
cat >log.csv <<'END'
time,methane,hydrogen,note,flow [kg/h]
2026-03-01T00:00,92.1,7.9,,120
2026-03-01T01:00,52.1,7.9,sum,120
2026-03-01T02:00,,7.9,empty,120
2026-03-01T03:00,fault,7.9,no number,120
2026-03-01T04:00,100.3,-0.3,negative,120
2026-03-01T05:00,92.1,7.9,"two
lines",120
2026-03-01T05:00,92.1,7.9,the same time,120
1 March 2026,92.1,7.9,no time,120
2026-03-01T06:00Z,92.1,7.9,a zone,120
2026-03-01T07:00,92.1,7.9
2026-03-01T08:00,88.4,11.6,no flow,
2026-03-01T09:00,92.1,7.9,well,120
END
bluecone contract limit.ini --log log.csv; echo "exit $?"
head -4 log.csv | sed 2d >none.csv
bluecone contract limit.ini --log none.csv; echo "exit $?"
