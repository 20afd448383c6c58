# the four classes, by gases that stand about a limit of 10 %
printf '[limit hydrogen]\nmax = 10\n' >limit.ini
for share in 9.5 9.9 10.1 10.5; do
    bluecone contract limit.ini methane=rest,hydrogen=$share~0.1 --csv --quiet | sed -n 's/^hydrogen,[^,]*,//p'
    echo $?
done
bluecone contract limit.ini methane=rest,hydrogen=9.9~0.1 --coverage 50 --csv --quiet | sed -n 's/^hydrogen,[^,]*,//p'
bluecone contract limit.ini methane=rest,hydrogen=10.1~0.1 --quiet >told.txt
echo "exit $?"
grep -A 3 Verdict told.txt
