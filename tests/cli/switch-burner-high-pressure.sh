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
# The same pressure in other units, all above the atmosphere: 28 inches of water.
for p in 69.745mbar 69.745mbarg 6.9745kPa 28inH2O 711.2mmH2O 1.01157psi; do
    printf '[burner]\ntype = premix\ncontrol = fixed\ngas_pressure = %s\n' "$p" >same.ini
    bluecone switch g20 g25 --burner same.ini | sed -n '/gas_pressure/p'
done
