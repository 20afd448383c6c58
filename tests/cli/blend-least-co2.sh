# Biogenic carbon does not count; making does.
printf '[gas]\nname = Biomethane of the works\nfamily = biomethane\n[components]\nmethane = 97\ncarbon dioxide = rest\n' >bio.ini
printf '[supply]\nprice = 61 EUR/MWh\nco2 = 18 kg/MWh\ncarbon = biogenic\n' >>bio.ini
bluecone blend free bio.ini free pipeline-h --least co2 --within "$SRC/examples/contract-es-pd01.ini" |
    sed -n '/^Recipe/,/^Heat/p; /^Cost/,/^$/p; /^Warnings/,/^Caution/p'
