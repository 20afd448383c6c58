# Entrained air: the two ways to the heat ask for different air.
cat >cooker.ini <<END
[burner]
type = atmospheric
control = entrained
input = 21 kW
gas_pressure = 20 mbar
[air]
excess = 45
primary = 52
END
bluecone switch g20 g25 --burner cooker.ini | sed -n "/^On the burner/,/^Old gas/p; /^Criteria/,\$p"
