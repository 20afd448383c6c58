# every row of a random log is what `get` says of the gas alone
ids=hhv,lhv,wobbe-gross,wobbe-net,density,relative-density,z,molar-mass,air-demand,co2-factor-net
awk 'BEGIN { srand(11); print "methane,ethane,propane,n-butane,nitrogen,carbon dioxide,hydrogen"
    for (i = 0; i < 60; i++) {
        e = 8 * rand(); p = 3 * rand(); b = rand(); n = 10 * rand(); c = 3 * rand(); h = 20 * rand()
        printf "%.4f,%.4f,%.4f,%.4f,%.4f,%.4f,%.4f\n", 100 - e - p - b - n - c - h, e, p, b, n, c, h
    } }' >log.csv
bluecone stream --quiet --digits 10 --add $ids log.csv | tail -n +2 | cut -d, -f8-17 >streamed
tail -n +2 log.csv | while IFS=, read -r m e p b n c h; do
    bluecone get $ids --quiet --csv --digits 10 "methane=$m,ethane=$e,propane=$p,n-butane=$b,nitrogen=$n,carbon dioxide=$c,hydrogen=$h" |
        sed "s/\"[^\"]*\"/gas/" | awk -F, 'NR > 1 && $3 != "" { printf "%s%s", sep, $3; sep = "," } END { print "" }'
done >alone
wc -l <alone
cmp streamed alone && echo equal
