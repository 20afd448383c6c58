# Input, pressure and orifice that cannot agree are told.
cat >odd.ini <<END
[burner]
type = nozzle-mix
control = fixed
input = 3 MW
orifice = 6.3 mm
gas_pressure = 20 mbar
END
bluecone switch g20 g25 --burner odd.ini | sed -n "/^Warnings/,/^$/p"
