# semicolons with decimal commas, tabs with decimal commas, a date and a time apart: the same figures
printf '[limit hydrogen]\nmax = 7\n' >limit.ini
printf 'time,CH4,hydrogen,flow [m3/h]\n2026-03-01T00:00,92.1,7.9,210.5\n2026-03-01T01:00,93.3,6.7,190.5\n' >comma.csv
printf 'time;CH4;hydrogen;flow [m3/h]\n2026-03-01T00:00;92,1;7,9;210,5\n2026-03-01T01:00;93,3;6,7;190,5\n' >semicolon.csv
printf 'date\ttime\tCH4\thydrogen\tflow [m3/h]\n2026-03-01\t00:00\t92,1\t7,9\t210,5\n2026-03-01\t01:00\t93,3\t6,7\t190,5\n' >tab.csv
for log in comma semicolon tab; do
    bluecone contract limit.ini --log $log.csv --csv >$log.txt
    echo "exit $?"
done
cmp comma.txt semicolon.txt && cmp comma.txt tab.txt && cat comma.txt
