# Wrong temperatures, pressures, rates and readings: each with its cause.
refused() {
    bluecone burn "$@" g20
    echo "exit $?" >&2
}
refused --flue-temp 2800
refused --flue-temp 20000
refused --fuel-temp -40
refused --oxidant-temp 25X
refused --oxidant-temp warm
refused --pressure 1
refused --pressure 0bar
refused --pressure 200bar
refused --pressure 1parsec
refused --rate 5
refused --rate 5kg
refused --rate 5kW
refused --rate 5furlong/h
refused --rate -3kg/h
refused --rate 100Nm3/h
refused --rate 5kg/h --duty 1kW
refused --duty 5
refused --duty 5kg/h
refused --duty 0kW
refused --duty 1MW --flue-temp 2500
refused --casing-loss 120
refused --casing-loss x
refused --so3 -1
refused --so3 5ppm
refused --reading nox
refused --reading nox=12
refused --reading nox=12g
refused --reading soot=1ppm
refused --reading nox=-1ppm
refused --reading co=1ppm,co=1ppm,co=1ppm,co=1ppm,co=1ppm,co=1ppm,co=1ppm,co=1ppm,co=1ppm
refused --reading nox=1ppm --reference-o2 21
refused --reading nox=1ppm
refused --reference-o2 -3
refused --reading nox=1ppm --oxidant oxygen --lambda 1.2
refused --lambda 0.9 --duty 1MW
refused --lambda 0.9 --rate 9kg/h
refused --lambda 0.9 --casing-loss 1
refused --lambda 0.9 --so3 1
refused --lambda 0.9 --reading co=90ppm
refused --excess -4 --reference-o2 5
refused --lambda 0.9 --working
refused --unit furlong
refused --unit kWh
refused --digits 1
refused --bare
refused --temp 20C
refused g21
refused -o case.docx
bluecone burn
echo "exit $?" >&2
# numbers that no burner has, and no double multiplies
for rate in 1e308m3/h 1e-322kg/h; do bluecone burn g20 --rate $rate; echo $?; done
bluecone burn g20 --duty 1e305W; echo $?
bluecone burn g20 --reading nox=1e308ppm --excess 3; echo $?
