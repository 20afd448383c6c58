# Temperatures in C, bare, K and F are one; pressures, too, barg above the atmosphere.
for t in 148.89C 148.89 422.04K 300.002F; do
    bluecone burn --flue-temp $t g20 | sed -n '/^  flue gas leaves/p; /Stack loss, of net/p'
done
for p in 1.2bar 120kPa 1200mbar 120000Pa 0.18675barg 74.9732inH2O; do
    bluecone burn --pressure $p g20 | sed -n '/^  pressure/p; /Water dew/p'
done
# Nothing leaves hotter than it burns.
bluecone burn --flue-temp 2300 g20 | sed -n '/^Losses/,/^$/p; /^Warnings/,/^$/p'
