# A trim at the end of its range lets the oxygen go; by volume meter LPG-air asks too much of it.
cat >trim.ini <<END
[burner]
type = nozzle-mix
control = trim-air
metering = volume
[air]
flue_o2 = 3
o2_basis = wet
trim_range = 8
END
bluecone switch pipeline-h lpg-air --burner trim.ini | sed -n "/^On the burner/,/^Old gas/p; /^Warnings/,\$p"
