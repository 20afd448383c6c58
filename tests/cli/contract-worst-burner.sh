# a burner that is set on the present supply: its figures over all allowed gases, and its limits
printf '[limit wobbe-gross]\nmin = 47\nmax = 52\n[range methane]\nmin = 80\n[range ethane]\nmax = 11\n[range nitrogen]\nmax = 7\n' >window.ini
printf '[burner]\nname = Test rig\ntype = premix\ncontrol = fixed\ninput = 240 kW\n[air]\nlambda = 1.25\n[limits]\ninput_min = 90\ninput_max = 102\n' >fixed.ini
bluecone contract window.ini --worst --against g20 --burner fixed.ini --digits 5 >out.txt
echo "exit $?"
sed -n '/^What a gas/,$p' out.txt | grep -v '^  weaver\|^  aga'
bluecone contract window.ini --worst --against g20 --burner fixed.ini --json | sed -n '/"id": "heat-input-ratio"/,/^    }/p'
# behind the verdict on a gas; a burner without heat input has its ratio alone, and air that nobody stated is told
printf '[burner]\ntype = premix\ncontrol = electronic-mass\n[limits]\ninput_min = 50\ninput_max = 110\n' >mass.ini
bluecone contract window.ini g20 --worst --against g20 --burner mass.ini --csv --digits 6 -o both.csv
echo "exit $?"
grep 'on the burner' both.csv
bluecone contract window.ini g20 --worst --against g20 --burner mass.ini | sed -n '/states no air/,/rest on it/p; /^Verdict/,/^Caution/p'
bluecone contract window.ini g20 --worst --against g20 --burner fixed.ini --quiet >both.txt
echo "exit $?"
sed -n '/^Verdict/,/^Caution/p' both.txt
# a burner file is an input of the report
bluecone contract window.ini --worst --against g20 --burner fixed.ini -o r.json; grep -c '"name": "fixed.ini"' r.json
