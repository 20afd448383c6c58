# whatever number an option is given: an answer of finite figures or a refusal, never an end by a signal
cp "$SRC"/examples/contract-marrowfen.ini "$SRC"/examples/boiler.ini "$SRC"/examples/new-supply-offer.ini .
run() {
    bluecone "$@" --quiet >out 2>err
    code=$?
    if test $code -gt 4 || grep -qE '[ ,:-](inf|nan|Infinity|NaN)([^a-z]|$)' out err; then echo "exit $code: $*"; fi
}
for v in 1e308 1e150 1e-320 0; do
    for o in fuel-temp oxidant-temp flue-temp excess lambda flue-o2 casing-loss so3 reference-o2 humidity; do run burn g20 --$o $v --json; done
    run burn g20 --humidity dew:${v}C --csv
    run burn g20 --oxidant enriched:$v --json
    run burn g20 --pressure ${v}bar --json
    run burn g20 --sweep excess=0..$v --json
    run burn g20 --duty ${v}W --json
    run burn g20 --rate ${v}m3/h --json
    run burn g20 --excess 3 --reading nox=${v}ppm,co=${v}mg/m3,so2=${v}mg/MJ --json
    run get hhv,z,flame-temperature,lfl methane=$v,ethane=1 --json
    run get hhv g20 --at $v/15@${v}psi --csv
    run sheet "methane=50~$v,ethane=50" --json
    run blend $v g20 rest g25 --json
    run blend 0..10/$v g20 rest g25 --json
    run blend free g20 rest g25 --aim wobbe-gross=${v}MJ/m3 --json
    run blend 50 g20 rest biogas --price g20=${v}EUR/MWh,2=20EUR/mg --co2 2=${v}kg/MWh --json
    run blend free g20 free biogas --least cost --price g20=3EUR/MWh,2=20EUR/MWh --flow ${v}kW --max-flow 2=${v}m3/h --json
    run switch g20 g25 --burner boiler.ini --fuel-temp ${v}K --json
    run contract contract-marrowfen.ini g20 --coverage $v --json
    run contract contract-marrowfen.ini g20 --printed hhv=${v}MJ/m3 --json
    printf '[contract]\nprice = %s EUR/MWh\nannual_energy = %s GWh\n[limit hhv]\nmax = %s\n[limit c4+]\nmax = %s\nunit = mg/m3\n' $v $v $v $v >terms.ini
    run contract terms.ini new-supply-offer.ini --against g20 --json
    run contract terms.ini --worst --json
    printf '[contract]\nprice = %s EUR/MWh\nannual_volume = %s m3\n[limit hhv]\nmin = 3\n' $v 3 >terms.ini
    run contract terms.ini new-supply-offer.ini --json
    printf 'methane,ethane,flow [m3/h]\n%s,1,2\n99,1,%s\n' $v $v >log.csv
    run stream log.csv --add hhv
    run stream log.csv --summary --json
done
echo "all tried"
