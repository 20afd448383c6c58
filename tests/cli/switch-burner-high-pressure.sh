# Gas at 2 bar: the orifice chokes, and the pressure that restores the heat goes with the absolute one.
cat >choked.ini <<END
[burner]
type = nozzle-mix
control = fixed
orifice = 6.3 mm
orifices = 8
gas_pressure = 2 bar
[air]
excess = 10
END
bluecone switch g20 g25 --burner choked.ini | sed -n "/^On the burner/,/^New gas/p; /^Warnings/,/^$/p"
