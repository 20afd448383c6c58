# a burner needs --worst and the gas that it was set on; files that are no burner; spaces with gases that do not burn
printf '[limit wobbe-gross]\nmax = 55\n[range methane]\nmin = 90\n' >window.ini
printf '[burner]\ntype = premix\ncontrol = fixed\n[air]\nlambda = 1.3\n' >b.ini
printf 'time,methane\n2026-03-01T12:00,100\n' >log.csv
bluecone contract window.ini --burner b.ini; echo $?
bluecone contract window.ini g20 --against g20 --burner b.ini; echo $?
bluecone contract window.ini --worst --burner b.ini; echo $?
bluecone contract window.ini --log log.csv --burner b.ini; echo $?
bluecone contract window.ini --worst --against g20 --burner missing.ini; echo $?
bluecone contract window.ini --worst --against g20 --burner window.ini; echo $?
bluecone contract window.ini --worst --against nitrogen=100 --burner b.ini; echo $?
# no air factor without a gas that burns; no methane number with hydrogen
printf '[limit wobbe-gross]\nmax = 55\n[range methane]\nmax = 100\n[range nitrogen]\nmax = 100\n' >inert.ini
bluecone contract inert.ini --worst --against g20 --burner b.ini >out.txt; echo $?
sed -n '/on the burner/p; /^Limits of the burner/,/^$/p; /^Verdict/,/^Caution/p' out.txt
printf '[limits]\nmethane_number_min = 70\ninput_min = 60\n' >>b.ini
bluecone contract window.ini --worst --against g20 hydrogen=5,methane=95 --burner b.ini >out.txt; echo $?
sed -n '/^Limits of the burner/,/^$/p; /^Verdict/,/^Caution/p' out.txt
# limits that leave no gas
printf '[limit wobbe-gross]\nmin = 56\n[range methane]\nmin = 90\n' >none.ini
bluecone contract none.ini --worst --against g20 --burner b.ini | sed -n '/^Verdict/,$p'
