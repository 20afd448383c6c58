# a component without a value was not measured: limits that count it are open, unless the rest alone is above them
printf '[contract]\nname = Grid\n[limit hydrogen]\nmax = 10\n[limit inerts]\nmax = 6\n[limit methane]\nmin = 80\n[limit hhv]\nmin = 30\nunit = MJ/m3\n' >grid.ini
cat >log.csv <<'END'
methane,hydrogen,nitrogen,carbon dioxide
95,0,3,2
97,,3,
93,0,7,
,5,3,92
,5,3,1
END
bluecone stream log.csv --add hhv --contract grid.ini --quiet; echo "exit $?"
printf '{"methane":97,"hydrogen":null,"nitrogen":3}\n' | bluecone stream --add hhv --contract grid.ini --quiet; echo "exit $?"
bluecone stream log.csv --add hhv --contract grid.ini --summary --quiet | sed -n '/^Verdict/,$p'
