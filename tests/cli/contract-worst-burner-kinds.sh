# each control, Bernoulli's equation and the nozzle; trims that hold and trims that come to their end; least and most
printf '[limit wobbe-gross]\nmin = 46\nmax = 53\n[limit relative-density]\nmax = 0.7\n[range methane]\nmin = 75\n[range ethane]\nmax = 11\n[range propane]\nmax = 5\n[range hydrogen]\nmax = 8\n[range nitrogen]\nmax = 7\n' >window.ini
# show CONTROL TYPE BURNER-LINE AIR-LINE
show() {
    printf '[burner]\ntype = %s\ncontrol = %s\ninput = 500 kW\n%s\n[air]\nlambda = 1.2\n%s\n' "$2" "$1" "$3" "$4" >b.ini
    echo "== $1 $3 $4"
    bluecone contract window.ini --worst --against g20 --burner b.ini --csv --digits 7 -o out.csv; code=$?
    grep 'on the burner' out.csv | cut -d , -f 1,2,4-
    bluecone contract window.ini --worst --against g20 --burner b.ini | sed -n '/constant: /p; /end of its range/p; /isentropic/p; /^Verdict/,/^Caution/p' | sed '/^Caution/d'
    echo "exit $code"
}
show fixed nozzle-mix '' ''
show fixed nozzle-mix 'gas_pressure = 80 mbar' ''
show fixed nozzle-mix 'gas_pressure = 3 bar' ''
show pneumatic premix '' ''
show electronic-volume premix '' ''
show electronic-mass premix '' ''
show trim-air premix '' 'trim_range = 20'
show trim-air premix '' 'trim_range = 2'
show trim-gas premix '' 'trim_range = 20'
show trim-gas premix 'metering = volume' 'trim_range = 2'
show trim-gas premix 'gas_pressure = 3 bar' 'trim_range = 20'
show trim-gas premix 'gas_pressure = 3 bar' 'trim_range = 2'
show entrained atmospheric '' 'primary = 50'
